import { finishedHalfWidth } from './finished-half-width';
import { halfAngle } from './half-angle';

/**
 * Half of a ring wedge's width between its raw side edges.
 *
 * @param atIn distance from the plate's centre along the wedge's axis, inches
 * @param wedgeCount wedges in the full ring, ≥ 3
 * @param seamIn seam allowance, inches
 * @returns inches: x·tan θ + a/cos θ
 * Source: right-triangle trigonometry; checked against clipper-lib's mitre offset.
 * @example cutHalfWidth(6, 20, 0.25) // 1.2034…
 */
export function cutHalfWidth(atIn: number, wedgeCount: number, seamIn: number): number {
  return finishedHalfWidth(atIn, wedgeCount) + seamIn / Math.cos(halfAngle(wedgeCount));
}
