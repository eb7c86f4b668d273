import { type Fraction } from 'fraction.js';

/**
 * Side of the square from which continuous bias binding is cut, before its joins, up to the inch.
 *
 * @param length of bias binding, inches
 * @param width cut width of the binding, inches
 * @returns inches: ⌈√(L·w)⌉
 * Source: the square's area becomes the binding's.
 * @example biasSquareSide(new Fraction(250), new Fraction(2)) // 23
 */
export function biasSquareSide(length: Fraction, width: Fraction): number {
  return Math.ceil(Math.sqrt(length.mul(width).valueOf()));
}
