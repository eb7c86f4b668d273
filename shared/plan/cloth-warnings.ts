import { type Fraction } from 'fraction.js';

import { piecesPerStrip } from '../cutting/pieces-per-strip';
import type { PlanFabric, PlanStrip, PlanWarning } from '../model/plan';
import { toFraction, toText } from '../units/fraction';
import { keepNineDecimals } from '../units/keep-nine-decimals';

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

/**
 * Warns when less than an inch of a strip stays after its last piece.
 *
 * @param wedgeRunIn length under the wedges of one whole, uncut strip of a fabric, inches
 */
export function warnOfShortEnds(
  fabrics: readonly PlanFabric[],
  usableWidth: Fraction,
  wedgeRunIn: (letter: string, wedges: number) => number,
): PlanWarning[] {
  return fabrics.flatMap(({ letter: fabric, strips }): PlanWarning[] => {
    const ends = strips.map((strip): string | number => {
      const whole = strip.for === 'wedge' && usableWidth.equals(strip.length);
      return whole
        ? keepNineDecimals(usableWidth.valueOf() - wedgeRunIn(fabric, strip.each))
        : toText(fullestStripLeft(strip, usableWidth));
    });
    const left = ends.reduce((least, end) => (inchesOf(end) < inchesOf(least) ? end : least), 1);
    return inchesOf(left) < 1 ? [{ code: 'stripEndShort', params: { fabric, left } }] : [];
  });
}

/**
 * Warns when cloth of only 40 usable inches would need another strip.
 *
 * @param atForty the same fabrics planned at 40; empty when they cannot be
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

function inchesOf(left: string | number): number {
  return typeof left === 'number' ? left : toFraction(left).valueOf();
}

function nextEighth(yards: Fraction): string {
  return toText(yards.mul(8).floor().add(1).div(8));
}
