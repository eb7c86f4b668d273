import { halfAngle } from './half-angle';

/**
 * Margin between a ring of flat tips and the block's side: the chord's corners reach farthest.
 *
 * @param blockIn finished side B, inches
 * @param reachIn finished reach R on a wedge's axis, inches
 * @returns inches: B/2 − R/cos θ
 */
export function chordMargin(blockIn: number, reachIn: number, wedgeCount: number): number {
  return blockIn / 2 - reachIn / Math.cos(halfAngle(wedgeCount));
}
