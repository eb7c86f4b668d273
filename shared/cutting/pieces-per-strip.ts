import { type Fraction } from 'fraction.js';

/**
 * Straight pieces across one strip: ⌊U/w⌋.
 *
 * @param usableWidth U, inches
 * @param width cut width of a piece, inches, above 0
 * @example piecesPerStrip(new Fraction(44), new Fraction('7/2')) // 12
 */
export function piecesPerStrip(usableWidth: Fraction, width: Fraction): number {
  return Number(usableWidth.div(width).floor().n);
}
