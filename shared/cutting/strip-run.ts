/**
 * Length of strip under a run of wedges: c_w + (k − 1)·pitch, exact for k odd and even.
 *
 * @param wedges k, ≥ 1
 * @param cutWideIn width of the raw wide edge, inches
 * @param pitchIn from one wedge to the next, inches
 * @returns inches, without squaring the ends
 */
export function stripRun(wedges: number, cutWideIn: number, pitchIn: number): number {
  return cutWideIn + (wedges - 1) * pitchIn;
}
