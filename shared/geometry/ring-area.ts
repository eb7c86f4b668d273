import type { PlanRequest } from '../model/plan-request';
import { halfAngle } from './half-angle';
import { shoulder } from './shoulder';

/**
 * Area of the finished ring, without its hole.
 *
 * @param holeIn inradius of the hole, inches
 * @param reachIn finished reach R, inches
 * @returns square inches: the trapezoids up to the shoulder n·tan θ(x² − r²), and the tips: a right
 *   angle (x·tan θ)² each, or a half circle; flat wedges are trapezoids up to R
 * @example ringArea('pointed', 2, 6.5, 20) // 102.865…
 */
export function ringArea(
  tip: PlanRequest['tip']['shape'],
  holeIn: number,
  reachIn: number,
  wedgeCount: number,
): number {
  const tan = Math.tan(halfAngle(wedgeCount));
  if (tip === 'flat') return wedgeCount * tan * (reachIn ** 2 - holeIn ** 2);
  const { atIn, halfWidthIn } = shoulder(reachIn, wedgeCount);
  const tipArea = halfWidthIn ** 2 * (tip === 'pointed' ? 1 : Math.PI / 2);
  return wedgeCount * (tan * (atIn ** 2 - holeIn ** 2) + tipArea);
}
