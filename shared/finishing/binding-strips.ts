import { type Fraction } from 'fraction.js';

/**
 * Strips for a length of binding joined on the diagonal: the least k with kU − (k − 1)w ≥ L.
 *
 * @param length L, inches
 * @param usableWidth U: length of one strip, inches, above the width
 * @param width cut width w of the strips, inches
 * Source: derived from what a diagonal join loses; see joinedStrips.
 * @example bindingStrips(new Fraction(290), new Fraction(42), new Fraction('5/2')) // 8
 */
export function bindingStrips(length: Fraction, usableWidth: Fraction, width: Fraction): number {
  return Number(length.sub(width).div(usableWidth.sub(width)).ceil().n);
}
