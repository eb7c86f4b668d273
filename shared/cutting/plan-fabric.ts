import { Fraction } from 'fraction.js';

import type { PlanFabric, PlanStrip } from '../model/plan';
import type { RequestFabric } from '../model/plan-request';
import { toFraction, toText } from '../units/fraction';
import { inchesAfterWash, yardsToBuy } from './yards-to-buy';

/**
 * Cloth of one fabric: what its strips need along the cloth, what is bought, what is over.
 *
 * @param fabric its `buyYards` wins when the maker took an offer to buy more
 * @param shrinkPercent loss along the length when it is washed first
 */
export function planFabric(
  fabric: RequestFabric,
  strips: PlanStrip[],
  shrinkPercent: Fraction,
): PlanFabric {
  const needs = lengthOfStrips(strips);
  const buy = fabric.buyYards ? toFraction(fabric.buyYards) : yardsToBuy(needs, shrinkPercent);
  return {
    letter: fabric.letter,
    strips,
    needs: toText(needs),
    buyYards: toText(buy),
    spare: toText(inchesAfterWash(buy, shrinkPercent).sub(needs)),
  };
}

/** Inches along the cloth that strips take. */
function lengthOfStrips(strips: readonly PlanStrip[]): Fraction {
  return strips.reduce(
    (sum, { height, count }) => sum.add(toFraction(height).mul(count)),
    new Fraction(0),
  );
}
