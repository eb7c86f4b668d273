import { type Fraction } from 'fraction.js';

/**
 * How far the finished ring reaches from the plate's centre: R = r0 + H − e_w. The corners of a
 * flat chord reach farther, to R/cos θ.
 *
 * @param narrowAt raw narrow edge r0, inches from the centre
 * @param stripHeight H, inches
 * @param wideTurning e_w: the seam across a pointed tip, or the turn-under of another
 */
export function finishedReach(
  narrowAt: Fraction,
  stripHeight: Fraction,
  wideTurning: Fraction,
): Fraction {
  return narrowAt.add(stripHeight).sub(wideTurning);
}
