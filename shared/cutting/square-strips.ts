import { type Fraction } from 'fraction.js';

import type { PlanStrip } from '../model/plan';
import { toText } from '../units/fraction';
import { piecesPerStrip } from './pieces-per-strip';
import { stripsForCount } from './strips-for-count';

/**
 * Strips from which squares are cut, as backgrounds and circles are.
 *
 * @param side of one square, inches; at most the usable width
 * @param count squares
 */
export function squareStrips(
  purpose: PlanStrip['for'],
  side: Fraction,
  count: number,
  usableWidth: Fraction,
): PlanStrip {
  return {
    height: toText(side),
    count: stripsForCount(count, piecesPerStrip(usableWidth, side)),
    for: purpose,
    lengths: count,
    length: toText(side),
    each: 1,
  };
}
