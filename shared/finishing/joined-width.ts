import { type Fraction } from 'fraction.js';

/**
 * Raw width of pieces sewn side by side, as in a strip set: every join takes a seam of both.
 *
 * @param pieces k ≥ 1
 * @param width cut width of one piece, inches
 * @param seam allowance a, inches
 * @returns inches: k·w − 2a(k − 1)
 * Source: three 2½ strips measure 6½ (tamarinis.typepad.com).
 * @example joinedWidth(3, new Fraction('5/2'), new Fraction('1/4')) // 13/2
 */
export function joinedWidth(pieces: number, width: Fraction, seam: Fraction): Fraction {
  return width.mul(pieces).sub(seam.mul(2 * (pieces - 1)));
}
