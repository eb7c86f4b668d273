import { Fraction } from 'fraction.js';

import { halfAngle } from '../geometry/half-angle';
import type { PlanRefusal } from '../model/plan';
import type { PlanRequest } from '../model/plan-request';
import type { RingGeometry } from '../patterns/ring/ring-geometry';
import { downToEighth } from '../units/down-to-eighth';
import { toFraction, toText } from '../units/fraction';
import { upToEighth } from '../units/up-to-eighth';
import { refuse } from './refuse';

/** Refuses a ring whose lengths, each fine by itself, make no plate together. */
export function checkGeometry(request: PlanRequest, geometry: RingGeometry): PlanRefusal[] {
  return [
    ...checkCentre(request, geometry),
    ...checkMargin(request, geometry),
    ...checkCloth(request, geometry),
  ];
}

/** The tips begin at the shoulder (a flat tip ends at the reach): hole and circle stay below it. */
function checkCentre({ tip }: PlanRequest, geometry: RingGeometry): PlanRefusal[] {
  const { circle, narrowAt, wideTurning, reach, shoulder, wedges } = geometry;
  const tipBeginsIn = tip.shape === 'flat' ? reach.valueOf() : shoulder.atIn;
  const perInch = tip.shape === 'flat' ? 1 : 1 + Math.tan(halfAngle(wedges));
  const leastFor = (radiusIn: number) =>
    toText(above(radiusIn * perInch + wideTurning.valueOf() - narrowAt.valueOf()));
  if (circle && circle.finishedRadiusIn >= tipBeginsIn) {
    const least = leastFor(circle.finishedRadiusIn);
    return [refuse('/stripHeight', 'circle-over-tips', { least })];
  }
  if (tipBeginsIn > narrowAt.valueOf()) return [];
  return [refuse('/stripHeight', 'tip-below-hole', { least: leastFor(narrowAt.valueOf()) })];
}

function checkMargin(request: PlanRequest, geometry: RingGeometry): PlanRefusal[] {
  const { margin, narrowAt, wideTurning, wedges } = geometry;
  if (margin.valueOf() >= 0) return [];
  const flatShare = request.tip.shape === 'flat' ? Math.cos(halfAngle(wedges)) : 1;
  const halfBlock = toFraction(request.block).div(2);
  const mostReach = flatShare === 1 ? halfBlock : new Fraction(halfBlock.valueOf() * flatShare);
  const most = downToEighth(mostReach.add(wideTurning).sub(narrowAt));
  // no strip height helps when the narrow edge itself lies out there
  if (most.lte(wideTurning)) {
    const mostNarrow = downToEighth(mostReach.sub('1/8'));
    return [refuse('/narrowAt', 'above-most', { most: toText(mostNarrow) })];
  }
  return [refuse('/stripHeight', 'margin-negative', { most: toText(most) })];
}

function checkCloth(request: PlanRequest, geometry: RingGeometry): PlanRefusal[] {
  const usable = toFraction(request.cloth.usableWidth);
  const { circle, background, cutWideIn } = geometry;
  const pointer = '/cloth/usableWidth';
  const refusals: PlanRefusal[] = [];
  if (usable.valueOf() < cutWideIn) {
    refusals.push(refuse(pointer, 'strip-too-narrow', { least: toText(upToEighth(cutWideIn)) }));
  }
  if (usable.lt(background.cut)) {
    const least = toText(upToEighth(background.cut));
    refusals.push(refuse(pointer, 'background-wider-than-cloth', { least }));
  }
  if (circle && usable.lt(circle.square)) {
    const least = toText(circle.square);
    refusals.push(refuse(pointer, 'circle-wider-than-cloth', { least }));
  }
  return refusals;
}

/** The next eighth above, also of a value that is one. */
function above(exactIn: number): Fraction {
  const up = upToEighth(exactIn);
  return up.valueOf() - exactIn < 1e-9 ? up.add('1/8') : up;
}
