import { InvariantError } from '../result';

/**
 * Half the angle of one wedge, θ = π/n: the side seams lie on the rays at ±θ to its axis.
 *
 * @param wedgeCount wedges in the full ring, ≥ 3
 * @returns radians
 * @throws InvariantError when wedgeCount is no whole number ≥ 3
 * @example halfAngle(20) // 0.157… (9°)
 */
export function halfAngle(wedgeCount: number): number {
  if (!Number.isInteger(wedgeCount) || wedgeCount < 3) {
    throw new InvariantError(`a ring needs 3 wedges or more, not ${wedgeCount}`);
  }
  return Math.PI / wedgeCount;
}
