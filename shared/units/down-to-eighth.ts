import { type Fraction } from 'fraction.js';

/**
 * Rounds down to an eighth of an inch: the most that still fits.
 *
 * @param exact inches
 * @example downToEighth(new Fraction(4.722)) // 37/8
 */
export function downToEighth(exact: Fraction): Fraction {
  return exact.mul(8).floor().div(8);
}
