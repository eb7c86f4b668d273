import type { Plan } from '../../model/plan';

import { toInches } from './to-inches';

/** What the outlines of a ring are drawn from: inches from the plate's centre, and radians. */
export interface RingShape {
  wedges: number;
  /** half of a wedge's angle: π/n */
  halfAngleRad: number;
  seamIn: number;
  /** what a tip takes of the wide end: its seam, or what is turned under */
  tipTurnIn: number;
  /** the raw narrow and wide edges of a cut wedge */
  narrowIn: number;
  wideIn: number;
  /** the edge of the hole on a wedge's axis, an open hole turned under */
  holeIn: number;
  reachIn: number;
  tip: 'pointed' | 'rounded' | 'flat';
  /** where the tip leaves the side seam, on the axis; the reach itself for a flat tip */
  shoulderIn: number;
  /** finished radius of the centre circle; null for an open hole */
  circleIn: number | null;
}

/** The numbers of a plan that its drawings need. */
export function ringShape(plan: Plan): RingShape {
  const { request, geometry } = plan;
  const { tip } = request;
  const { wedge, ring, circle } = geometry;
  const narrowIn = toInches(wedge.rawNarrowAt);
  const reachIn = toInches(ring.reach);
  const turned = request.centre.shape === 'none' ? toInches(request.centre.turnUnder) : 0;
  return {
    wedges: request.wedges,
    halfAngleRad: Math.PI / request.wedges,
    seamIn: toInches(request.seam),
    tipTurnIn: toInches(tip.shape === 'pointed' ? tip.seam : tip.turnUnder),
    narrowIn,
    wideIn: toInches(wedge.rawWideAt),
    holeIn: narrowIn + turned,
    reachIn,
    tip: tip.shape,
    shoulderIn: ring.shoulderAt === null ? reachIn : toInches(ring.shoulderAt),
    circleIn: circle === null ? null : toInches(circle.finishedRadius),
  };
}
