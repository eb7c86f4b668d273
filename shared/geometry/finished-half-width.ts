import { halfAngle } from './half-angle';

/**
 * Half of a ring wedge's width between its side seams.
 *
 * @param atIn distance from the plate's centre along the wedge's axis, inches
 * @param wedgeCount wedges in the full ring, ≥ 3
 * @returns inches: x·tan θ
 * Source: right-triangle trigonometry.
 * @example finishedHalfWidth(6.5, 20) // 1.0294…
 */
export function finishedHalfWidth(atIn: number, wedgeCount: number): number {
  return atIn * Math.tan(halfAngle(wedgeCount));
}
