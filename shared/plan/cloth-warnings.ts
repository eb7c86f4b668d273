import Fraction from 'fraction.js';

import { piecesPerStrip } from '../cutting/pieces-per-strip';
import type { PlanFabric, PlanStrip, PlanWarning } from '../model/plan';
import { toFraction, toText } from '../units/fraction';

/** Warns when the cloth bought leaves nothing, or under an inch, and offers the next ⅛ yard. */
export function warnOfSlack(fabrics: readonly PlanFabric[]): PlanWarning[] {
  return fabrics.flatMap(({ letter: fabric, needs, buyYards, spare }): PlanWarning[] => {
    const offerYards = nextEighth(toFraction(buyYards));
    if (toFraction(spare).equals(0)) {
      return [{ code: 'noSlack', params: { fabric, needs, buyYards, offerYards } }];
    }
    if (toFraction(spare).gte(1)) return [];
    return [{ code: 'littleSlack', params: { fabric, spare, offerYards } }];
  });
}

/** Warns when less than an inch of a strip stays after its last piece. */
export function warnOfShortEnds(
  fabrics: readonly PlanFabric[],
  usableWidth: Fraction,
): PlanWarning[] {
  return fabrics.flatMap(({ letter: fabric, strips }): PlanWarning[] => {
    const shortest = strips
      .filter(({ length }) => toFraction(length).lt(usableWidth)) // a whole strip has no end
      .map((strip) => fullestStripLeft(strip, usableWidth))
      .reduce((least, left) => (left.lt(least) ? left : least), new Fraction(1));
    if (shortest.gte(1)) return [];
    return [{ code: 'stripEndShort', params: { fabric, left: toText(shortest) } }];
  });
}

/**
 * Warns when cloth of only 40 usable inches would need another strip.
 *
 * @param atForty the same fabrics planned at 40; null when they cannot be
 */
export function warnOfNarrowCloth(
  fabrics: readonly PlanFabric[],
  atForty: readonly PlanFabric[],
): PlanWarning[] {
  return fabrics.flatMap(({ letter: fabric, strips }): PlanWarning[] => {
    const needed = countStrips(strips);
    const narrow = atForty.find(({ letter }) => letter === fabric);
    const neededAtForty = narrow ? countStrips(narrow.strips) : needed;
    if (neededAtForty <= needed) return [];
    const params = { fabric, strips: needed, atForty: neededAtForty };
    return [{ code: 'anotherStripAt40', params }];
  });
}

export function countStrips(strips: readonly PlanStrip[]): number {
  return strips.reduce((sum, { count }) => sum + count, 0);
}

function fullestStripLeft({ length, lengths }: PlanStrip, usableWidth: Fraction): Fraction {
  const pieces = Math.min(lengths, piecesPerStrip(usableWidth, toFraction(length)));
  return usableWidth.sub(toFraction(length).mul(pieces));
}

function nextEighth(yards: Fraction): string {
  return toText(yards.mul(8).floor().add(1).div(8));
}
