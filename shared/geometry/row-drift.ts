/**
 * How much a straight row of pieces changes when every seam edge is off by the same amount.
 *
 * @param perEdgeIn error per seam edge, inches
 * @param pieces pieces in the row, ≥ 1
 * @returns inches: 2e(k − 1)
 * @example rowDrift(1 / 32, 9) // 0.5
 */
export function rowDrift(perEdgeIn: number, pieces: number): number {
  return 2 * perEdgeIn * (pieces - 1);
}
