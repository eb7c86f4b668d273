import { type Fraction } from 'fraction.js';

import type { PlanStrip } from '../model/plan';
import { toFraction } from '../units/fraction';
import { piecesPerStrip } from './pieces-per-strip';

/**
 * What is left of the last strip after its pieces; it is the emptiest, so the offcut worth keeping.
 *
 * @param usable usable width of the cloth, inches
 * @returns inches along the strip
 */
export function lastStripLeft({ count, lengths, length }: PlanStrip, usable: Fraction): Fraction {
  const before = (count - 1) * piecesPerStrip(usable, toFraction(length));
  return usable.sub(toFraction(length).mul(Math.max(0, lengths - before)));
}
