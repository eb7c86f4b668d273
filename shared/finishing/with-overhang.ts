import { Fraction } from 'fraction.js';

import type { Size } from './size';

/** Usual overhangs on each side, inches; who quilts it may ask for others. */
export const BACKING_OVERHANG = new Fraction(4);
export const BATTING_OVERHANG = new Fraction(3);

/**
 * A backing or batting: larger than the quilt on every side.
 *
 * @param quilt size of the top, inches
 * @param overhang on each side, inches
 * Source: loghousequilting.com, service page (+4 and +3 on each side).
 */
export function withOverhang({ width, height }: Size, overhang: Fraction): Size {
  return { width: width.add(overhang.mul(2)), height: height.add(overhang.mul(2)) };
}
