import { Fraction } from 'fraction.js';

/**
 * The sixteenth of an inch nearest to a measured size, for showing only; halves go up.
 *
 * @param inches measured or computed, ≥ 0
 * @example nearestSixteenth(1.305445049) // 21/16
 */
export function nearestSixteenth(inches: number): Fraction {
  return new Fraction(Math.round(inches * 16), 16);
}
