import { Fraction } from 'fraction.js';

import { upToEighthYard } from '../units/up-to-eighth-yard';

/**
 * Cloth to buy for what is needed after washing: need/(1 − p), up to the next eighth of a yard.
 *
 * @param needIn length along the cloth, inches
 * @param shrinkPercent loss along the length when it is washed first, 0 ≤ p < 100
 * @returns yards
 * @example yardsToBuy(new Fraction(97), new Fraction(3)) // 23/8 (100 in)
 */
export function yardsToBuy(needIn: Fraction, shrinkPercent: Fraction): Fraction {
  return upToEighthYard(needIn.div(keptShare(shrinkPercent)));
}

/** Inches along the cloth that are left of bought yards after washing. */
export function inchesAfterWash(yards: Fraction, shrinkPercent: Fraction): Fraction {
  return yards.mul(36).mul(keptShare(shrinkPercent));
}

function keptShare(shrinkPercent: Fraction): Fraction {
  return new Fraction(1).sub(shrinkPercent.div(100));
}
