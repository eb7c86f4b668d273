import { Fraction } from 'fraction.js';

import { planFabric } from '../cutting/plan-fabric';
import { stripRun } from '../cutting/strip-run';
import { wedgePitch } from '../cutting/wedge-pitch';
import type { Plan, PlanFabric, PlanStack, PlanWarning } from '../model/plan';
import type { PlanRequest } from '../model/plan-request';
import { planGeometry } from '../patterns/ring/plan-geometry';
import { ringCutting, type RingCutting } from '../patterns/ring/ring-cutting';
import { ringGeometry, type RingGeometry } from '../patterns/ring/ring-geometry';
import { ringStrips } from '../patterns/ring/ring-strips';
import { InvariantError, type Result } from '../result';
import { planStacks } from '../stacks/plan-stacks';
import { cuttingSteps } from '../steps/cutting-steps';
import { finishSteps } from '../steps/finish-steps';
import { finishingSteps } from '../steps/finishing-steps';
import { joiningSteps } from '../steps/joining-steps';
import { tipSteps } from '../steps/tip-steps';
import { toFraction, toText } from '../units/fraction';
import { checkBuys } from './check-buys';
import { checkGeometry } from './check-geometry';
import { countStrips, warnOfNarrowCloth, warnOfShortEnds, warnOfSlack } from './cloth-warnings';
import { ENGINE_VERSION } from './engine-version';
import { parseRequest, type Refused } from './parse-request';
import {
  warnOfCap,
  warnOfDiagonals,
  warnOfExtras,
  warnOfOrder,
  warnOfShape,
} from './ring-warnings';

const CAUTIOUS_WIDTH = new Fraction(40);

/**
 * Plans ring blocks: every size exact, every step with its counts.
 *
 * @param request lengths in inches as exact fractions; checked here again
 * @returns the plan, the same for the same request everywhere; or every reason to refuse it
 */
export function makePlan(request: PlanRequest): Result<Plan, Refused> {
  const parsed = parseRequest(request);
  if (!parsed.ok) return parsed;
  const sizes = ringGeometry(parsed.value);
  const errors = checkGeometry(parsed.value, sizes);
  if (errors.length > 0) return { ok: false, kind: 'refused', errors };
  return planRing(parsed.value, sizes);
}

function planRing(request: PlanRequest, sizes: RingGeometry): Result<Plan, Refused> {
  const usableWidth = toFraction(request.cloth.usableWidth);
  const cutting = ringCutting(request, sizes, usableWidth);
  if (!cutting) throw new InvariantError('a checked wedge does not fit across the cloth');
  const fabrics = fabricsOf(request, sizes, cutting, usableWidth);
  const errors = checkBuys(request, fabrics);
  if (errors.length > 0) return { ok: false, kind: 'refused', errors };
  const geometry = planGeometry(request, sizes, cutting.order);
  const stacks = cutting.groups.flatMap((group) => planStacks(group, group.cut));
  const plan: Plan = {
    kind: 'plan',
    version: 1,
    engine: ENGINE_VERSION,
    request,
    geometry,
    fabrics,
    totals: totalsOf(fabrics, stacks),
    stacks,
    warnings: warningsOf(request, sizes, cutting, fabrics, stacks),
    steps: finishSteps([
      ...cuttingSteps(request, cutting.groups),
      ...tipSteps(request, cutting.letters),
      ...joiningSteps(request, cutting.letters),
      ...finishingSteps(request, geometry),
    ]),
  };
  return { ok: true, value: plan };
}

function fabricsOf(
  request: PlanRequest,
  sizes: RingGeometry,
  cutting: RingCutting,
  usableWidth: Fraction,
): PlanFabric[] {
  const shrinkPercent = toFraction(request.cloth.shrinkPercent);
  return request.fabrics
    .map((fabric) => ({
      fabric,
      strips: ringStrips(fabric, request, sizes, cutting, usableWidth),
    }))
    .filter(({ strips }) => strips.length > 0)
    .map(({ fabric, strips }) => planFabric(fabric, strips, shrinkPercent));
}

function totalsOf(fabrics: readonly PlanFabric[], stacks: readonly PlanStack[]): Plan['totals'] {
  const yards = fabrics.reduce((sum, { buyYards }) => sum.add(buyYards), new Fraction(0));
  return {
    strips: fabrics.reduce((sum, { strips }) => sum + countStrips(strips), 0),
    buyYards: toText(yards),
    wedges: stacks.reduce((sum, { pieces }) => sum + pieces, 0),
  };
}

function warningsOf(
  request: PlanRequest,
  sizes: RingGeometry,
  cutting: RingCutting,
  fabrics: readonly PlanFabric[],
  stacks: readonly PlanStack[],
): PlanWarning[] {
  const usableWidth = toFraction(request.cloth.usableWidth);
  return [
    ...warnOfSlack(fabrics),
    ...warnOfShortEnds(fabrics, usableWidth, (letter, wedges) =>
      wedgeRun(letter, wedges, sizes, cutting),
    ),
    ...warnOfNarrowCloth(fabrics, fabricsAtForty(request, sizes)),
    ...warnOfCap(request, stacks),
    ...warnOfOrder(cutting),
    ...warnOfExtras(request, cutting),
    ...warnOfDiagonals(request),
    ...warnOfShape(request, sizes),
  ];
}

function wedgeRun(
  letter: string,
  wedges: number,
  { cutNarrowIn, cutWideIn }: RingGeometry,
  { groups }: RingCutting,
): number {
  const oneWay = groups.some(
    (group) => group.oneWay && group.fabrics.some((fabric) => fabric.letter === letter),
  );
  return stripRun(wedges, cutWideIn, wedgePitch(cutNarrowIn, cutWideIn, oneWay));
}

/** The same fabrics on narrower cloth; none when the cloth is narrow already or 40 cannot do. */
function fabricsAtForty(request: PlanRequest, sizes: RingGeometry): PlanFabric[] {
  const { circle, background } = sizes;
  if (toFraction(request.cloth.usableWidth).lte(CAUTIOUS_WIDTH)) return [];
  if (background.cut.gt(CAUTIOUS_WIDTH) || circle?.square.gt(CAUTIOUS_WIDTH)) return [];
  const cutting = ringCutting(request, sizes, CAUTIOUS_WIDTH);
  return cutting ? fabricsOf(request, sizes, cutting, CAUTIOUS_WIDTH) : [];
}
