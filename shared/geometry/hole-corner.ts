import { halfAngle } from './half-angle';

/**
 * Radius of the corners of the centre hole, an n-gon of inradius r0 + e_n.
 *
 * @param narrowAtIn raw narrow edge r0, inches from the centre
 * @param narrowTurningIn e_n: 0 when a centre circle covers the raw edge
 * @returns inches: (r0 + e_n)/cos θ
 * @example holeCorner(2, 0, 20) // 2.0249…
 */
export function holeCorner(
  narrowAtIn: number,
  narrowTurningIn: number,
  wedgeCount: number,
): number {
  return (narrowAtIn + narrowTurningIn) / Math.cos(halfAngle(wedgeCount));
}
