import { type Fraction } from 'fraction.js';

import type { Size } from './size';

/** Cut sizes of four borders, inches; `raw` is the quilt's size with all of them on. */
export interface BorderLengths {
  cutWidth: Fraction;
  sides: Fraction;
  topAndBottom: Fraction;
  raw: Size;
}

/**
 * Cut lengths of four straight borders with butted corners: sides first, as long as the raw top
 * measured through its centre; then top and bottom, measured again with the sides on.
 *
 * @param top raw size measured through its centre, seam allowances included, inches
 * @param finishedWidth of the border, inches
 * @param seam allowance a, inches
 * Source: common practice.
 */
export function borderLengths(top: Size, finishedWidth: Fraction, seam: Fraction): BorderLengths {
  const cutWidth = finishedWidth.add(seam.mul(2));
  const width = withBoth(top.width, cutWidth, seam);
  return {
    cutWidth,
    sides: top.height,
    topAndBottom: width,
    raw: { width, height: withBoth(top.height, cutWidth, seam) },
  };
}

/** A border joined to both ends: each join takes a seam from both pieces. */
function withBoth(length: Fraction, cutWidth: Fraction, seam: Fraction): Fraction {
  return length.add(cutWidth.mul(2)).sub(seam.mul(4));
}
