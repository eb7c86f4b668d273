const TOLERANCE = 1e-9;

/**
 * Wedges that one strip yields: ⌊(U − c_w)/pitch⌋ + 1, or none when not even one fits.
 *
 * @param usableIn usable width U after the strip's end is squared, inches
 * @param cutWideIn width of the raw wide edge, inches
 * @param pitchIn from one wedge to the next, inches
 * @example wedgesPerStrip(42, 2.644423, 1.892096) // 21
 */
export function wedgesPerStrip(usableIn: number, cutWideIn: number, pitchIn: number): number {
  if (usableIn < cutWideIn - TOLERANCE) return 0;
  return Math.floor((usableIn - cutWideIn) / pitchIn + TOLERANCE) + 1;
}
