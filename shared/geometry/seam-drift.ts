import { halfAngle } from './half-angle';

/**
 * How much the whole ring shrinks when every side seam is too wide by the same amount. It still
 * lies flat: only tapered seams or a wrong cutting angle leave a gap or a cup.
 *
 * @param perEdgeIn error per seam edge, inches; negative when scant, and the ring grows
 * @returns inches, on every distance from the centre: e/sin θ
 * @example seamDrift(1 / 32, 20) // 0.1997…
 */
export function seamDrift(perEdgeIn: number, wedgeCount: number): number {
  return perEdgeIn / Math.sin(halfAngle(wedgeCount));
}
