import { type Fraction } from 'fraction.js';

import type { FractionText } from '../model/length';
import type { Plan } from '../model/plan';
import { InvariantError } from '../result';
import { toFraction, toText } from '../units/fraction';
import { upToEighth } from '../units/up-to-eighth';
import { lastStripLeft } from './last-strip-left';
import { stripRun } from './strip-run';
import { stripsForCount } from './strips-for-count';
import { wedgePitch } from './wedge-pitch';
import { wedgesPerStrip } from './wedges-per-strip';
import { yardsToBuy } from './yards-to-buy';

/** Where wedges are recut from. Lengths in inches: `left` and `needed` along the strip. */
export type Replacement =
  | {
      from: 'offcut';
      letter: string;
      height: FractionText;
      left: FractionText;
      needed: FractionText;
    }
  /** another strip from the cloth bought: `spare` is there along the cloth, `needed` is taken */
  | { from: 'slack'; letter: string; spare: FractionText; needed: FractionText }
  | {
      from: 'buy';
      letter: string;
      yards: FractionText;
      widestLeft: FractionText;
      needed: FractionText;
    };

/**
 * Where the cloth for recut wedges comes from: the end of a strip that is tall and long enough (the
 * lowest, then the shortest), else another strip from the spare length, else more cloth.
 *
 * @param letter a fabric of the plan
 * @param pieces wedges to recut, ≥ 1
 * @throws InvariantError for a fabric that the plan does not have
 */
export function findReplacement(plan: Plan, letter: string, pieces: number): Replacement {
  const fabric = plan.fabrics.find((other) => other.letter === letter);
  if (!fabric) throw new InvariantError(`a plan without fabric ${letter}`);
  const { needed, perStrip } = runOf(plan, letter, pieces);
  const height = toFraction(plan.geometry.wedge.stripHeight);
  const usable = toFraction(plan.request.cloth.usableWidth);
  const ends = fabric.strips
    .filter((strip) => toFraction(strip.height).gte(height))
    .map((strip) => ({ height: strip.height, left: lastStripLeft(strip, usable) }));
  const [offcut] = ends
    .filter(({ left }) => left.gte(needed))
    .sort((a, b) => toFraction(a.height).compare(b.height) || a.left.compare(b.left));
  const text = toText(needed);
  if (offcut) {
    return { from: 'offcut', letter, ...offcut, left: toText(offcut.left), needed: text };
  }
  const along = height.mul(stripsForCount(pieces, perStrip));
  if (along.lte(fabric.spare)) {
    return { from: 'slack', letter, spare: fabric.spare, needed: toText(along) };
  }
  const yards = yardsToBuy(along, toFraction(plan.request.cloth.shrinkPercent));
  const widest = ends.reduce((most, { left }) => (left.gt(most) ? left : most), usable.mul(0));
  return { from: 'buy', letter, yards: toText(yards), widestLeft: toText(widest), needed: text };
}

function runOf(plan: Plan, letter: string, pieces: number): { needed: Fraction; perStrip: number } {
  const { cutNarrow, cutWide } = plan.geometry.wedge;
  const oneWay = plan.request.fabrics.some((fabric) => fabric.letter === letter && fabric.oneWay);
  const pitchIn = wedgePitch(cutNarrow.exact, cutWide.exact, oneWay);
  const usableIn = toFraction(plan.request.cloth.usableWidth).valueOf();
  return {
    needed: upToEighth(stripRun(pieces, cutWide.exact, pitchIn)),
    perStrip: wedgesPerStrip(usableIn, cutWide.exact, pitchIn),
  };
}
