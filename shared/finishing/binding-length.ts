import { type Fraction } from 'fraction.js';

import type { Size } from './size';

const CORNERS_AND_CLOSING = 10;

/**
 * Length of binding around a quilt, with enough for its corners and for closing it.
 *
 * @returns inches: 2(W + H) + 10
 * Source: common practice.
 */
export function bindingLength({ width, height }: Size): Fraction {
  return width.add(height).mul(2).add(CORNERS_AND_CLOSING);
}
