import { Fraction } from 'fraction.js';

import { halfAngle } from '../geometry/half-angle';
import type { FractionText } from '../model/length';
import type { PlanRequest, RequestFabric } from '../model/plan-request';
import { defaultCap, type BladeMm } from '../stacks/default-cap';
import { downToEighth } from '../units/down-to-eighth';
import { toFraction, toText } from '../units/fraction';

/** What a maker chooses; all that is left out gets its default. Lengths in inches. */
export interface RingChoices {
  block: FractionText;
  blocks: number;
  wedges: number;
  tip: PlanRequest['tip']['shape'];
  centre: PlanRequest['centre']['shape'];
  fabrics: RequestFabric[];
  stripHeight?: FractionText | undefined;
  narrowAt?: FractionText | undefined;
  seam?: FractionText | undefined;
  /** the seam across a pointed tip, or the turn-under of another */
  tipTurning?: FractionText | undefined;
  /** turn-under of an open centre */
  holeTurnUnder?: FractionText | undefined;
  circleFabric?: string | undefined;
  circleOverlap?: FractionText | undefined;
  circleEdge?: 'turned' | 'fused' | undefined;
  circleTurning?: FractionText | undefined;
  trimAllowance?: FractionText | undefined;
  usableWidth?: FractionText | undefined;
  shrinkPercent?: FractionText | undefined;
  bladeMm?: BladeMm | undefined;
  /** the maker's own cap; the blade's cautious one when left out */
  cap?: number | undefined;
  layers?: number | undefined;
  squaringOff?: FractionText | undefined;
  press?: PlanRequest['press'] | undefined;
  applique?: PlanRequest['applique'] | undefined;
}

const QUARTER_INCH = '1/4';
const MARGIN = '3/4';
const NARROW_LEAST = '1/8';

/**
 * Writes a whole request, every default in it. The request may still be one that is refused.
 *
 * @param choices `block` must be a fraction's text
 */
export function defaultRequest(choices: RingChoices): PlanRequest {
  const { block, blocks, wedges, fabrics, layers, bladeMm = 45 } = choices;
  const tipTurning = choices.tipTurning ?? QUARTER_INCH;
  const narrowAt = choices.narrowAt ?? toText(defaultNarrowAt(block));
  return {
    kind: 'planRequest',
    version: 1,
    family: 'ring',
    blocks,
    block,
    wedges,
    seam: choices.seam ?? QUARTER_INCH,
    tip:
      choices.tip === 'pointed'
        ? { shape: 'pointed', seam: tipTurning }
        : { shape: choices.tip, turnUnder: tipTurning },
    narrowAt,
    stripHeight: choices.stripHeight ?? toText(defaultStripHeight(choices, tipTurning, narrowAt)),
    centre: defaultCentre(choices),
    background: {
      fabric: fabrics.find(({ role }) => role === 'background')?.letter ?? '',
      trimAllowance: choices.trimAllowance ?? '1',
    },
    press: choices.press ?? 'open',
    applique: choices.applique ?? 'machine',
    cloth: {
      usableWidth: choices.usableWidth ?? '42',
      shrinkPercent: choices.shrinkPercent ?? '0',
    },
    cutting: {
      stacking: 'oneOfEach',
      bladeMm,
      cap: choices.cap ?? defaultCap(bladeMm),
      ...(layers === undefined ? {} : { layers }),
      squaringOff: choices.squaringOff ?? '1/2',
    },
    fabrics,
  };
}

function defaultNarrowAt(block: FractionText): Fraction {
  const eighthOfBlock = toFraction(block).div(8);
  return eighthOfBlock.lt(NARROW_LEAST) ? toFraction(NARROW_LEAST) : eighthOfBlock;
}

/**
 * H = B/2 − margin + e_w − r0, so that the ring reaches to the margin. The corners of a few flat
 * wedges would then stand over the block's side: those get the tallest strip that stays inside.
 */
function defaultStripHeight(
  { block, tip, wedges }: RingChoices,
  tipTurning: FractionText,
  narrowAt: FractionText,
): Fraction {
  const halfBlock = toFraction(block).div(2);
  const raise = toFraction(tipTurning).sub(narrowAt);
  const usual = halfBlock.sub(MARGIN).add(raise);
  if (tip !== 'flat' || wedges < 3) return usual;
  const farthest = new Fraction(halfBlock.valueOf() * Math.cos(halfAngle(wedges)));
  const tallest = downToEighth(farthest.add(raise));
  return tallest.lt(usual) ? tallest : usual;
}

function defaultCentre(choices: RingChoices): PlanRequest['centre'] {
  if (choices.centre === 'none') {
    return { shape: 'none', turnUnder: choices.holeTurnUnder ?? QUARTER_INCH };
  }
  const wedgeFabrics = choices.fabrics.filter(({ role }) => role === 'wedge');
  const fabric = wedgeFabrics.find(({ dominant }) => dominant) ?? wedgeFabrics[0];
  return {
    shape: 'circle',
    fabric: choices.circleFabric ?? fabric?.letter ?? '',
    overlap: choices.circleOverlap ?? '1/2',
    edge: choices.circleEdge ?? 'turned',
    turning: choices.circleTurning ?? QUARTER_INCH,
  };
}
