import { type Fraction } from 'fraction.js';

/**
 * Length of strips joined end to end on the diagonal: each join loses one strip's width.
 *
 * @param strips how many, ≥ 1
 * @param length of one strip, inches
 * @param width cut width of the strips, inches
 * @returns inches: kU − (k − 1)w
 * Source: two 3 × 10 strips make 17 (crayonboxquiltstudio.com, 2012-04).
 * @example joinedStrips(2, new Fraction(10), new Fraction(3)) // 17
 */
export function joinedStrips(strips: number, length: Fraction, width: Fraction): Fraction {
  return length.mul(strips).sub(width.mul(strips - 1));
}
