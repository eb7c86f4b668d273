/**
 * How far one wedge lies from the next along a strip. Neighbours are flipped (a tumbling cut), so
 * two of them fill a narrow and a wide edge; a one-way print cannot be flipped and takes a whole
 * wide edge each time.
 *
 * @param cutNarrowIn width of the raw narrow edge, inches
 * @param cutWideIn width of the raw wide edge, inches
 * @returns inches: (c_n + c_w)/2, or c_w for a one-way print
 */
export function wedgePitch(cutNarrowIn: number, cutWideIn: number, oneWay: boolean): number {
  return oneWay ? cutWideIn : (cutNarrowIn + cutWideIn) / 2;
}
