import { type Fraction } from 'fraction.js';

import { piecesPerStrip } from './pieces-per-strip';

/**
 * Squares from a piece of cloth, cut in rows: ⌊width/s⌋ · ⌊length/s⌋.
 *
 * @param width and length of the cloth, inches
 * @param side of one square, inches
 * @example squaresFromPiece(new Fraction(22), new Fraction(18), new Fraction(5)) // 12
 */
export function squaresFromPiece(width: Fraction, length: Fraction, side: Fraction): number {
  return piecesPerStrip(width, side) * piecesPerStrip(length, side);
}
