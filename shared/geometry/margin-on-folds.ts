import { halfAngle } from './half-angle';

/**
 * Margin between the ring and the block's side when seams lie on the fold lines (n mod 4 = 0).
 *
 * @param blockIn finished side B, inches
 * @param reachIn finished reach R, inches
 * @returns inches: B/2 − R·cos θ
 * @example marginOnFolds(14, 6.5, 20) // 0.58002…
 */
export function marginOnFolds(blockIn: number, reachIn: number, wedgeCount: number): number {
  return blockIn / 2 - reachIn * Math.cos(halfAngle(wedgeCount));
}
