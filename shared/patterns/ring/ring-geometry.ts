import { Fraction } from 'fraction.js';

import { backgroundSquare } from '../../geometry/background-square';
import { centreCircle, type CentreCircle } from '../../geometry/centre-circle';
import { chordMargin } from '../../geometry/chord-margin';
import { cutHalfWidth } from '../../geometry/cut-half-width';
import { finishedReach } from '../../geometry/finished-reach';
import { holeCorner } from '../../geometry/hole-corner';
import { shoulder, type Shoulder } from '../../geometry/shoulder';
import type { PlanRequest } from '../../model/plan-request';
import { toFraction } from '../../units/fraction';

/** Sizes of a ring block that the plan, its checks and its warnings share. */
export interface RingGeometry {
  wedges: number;
  seam: Fraction;
  /** raw narrow edge r0, strip height H and turning at the wide end e_w, inches */
  narrowAt: Fraction;
  stripHeight: Fraction;
  wideTurning: Fraction;
  reach: Fraction;
  cutNarrowIn: number;
  cutWideIn: number;
  holeCornerIn: number;
  shoulder: Shoulder;
  circle: CentreCircle | null;
  margin: Fraction | number;
  background: { cut: Fraction; trim: Fraction };
}

/** Computes the sizes of a ring block. The request must keep the limits of its fields. */
export function ringGeometry(request: PlanRequest): RingGeometry {
  const { wedges, tip, centre } = request;
  const seam = toFraction(request.seam);
  const narrowAt = toFraction(request.narrowAt);
  const stripHeight = toFraction(request.stripHeight);
  const wideTurning = toFraction(tip.shape === 'pointed' ? tip.seam : tip.turnUnder);
  const reach = finishedReach(narrowAt, stripHeight, wideTurning);
  const cutHalf = (at: Fraction) => cutHalfWidth(at.valueOf(), wedges, seam.valueOf());
  const holeCornerIn = holeCorner(narrowAt.valueOf(), holeTurningIn(centre), wedges);
  const block = toFraction(request.block);
  return {
    wedges,
    seam,
    narrowAt,
    stripHeight,
    wideTurning,
    reach,
    cutNarrowIn: 2 * cutHalf(narrowAt),
    cutWideIn: 2 * cutHalf(narrowAt.add(stripHeight)),
    holeCornerIn,
    shoulder: shoulder(reach.valueOf(), wedges),
    circle: circleOf(centre, holeCornerIn),
    margin:
      tip.shape === 'flat'
        ? chordMargin(block.valueOf(), reach.valueOf(), wedges)
        : block.div(2).sub(reach),
    background: backgroundSquare(block, seam, toFraction(request.background.trimAllowance)),
  };
}

function holeTurningIn(centre: PlanRequest['centre']): number {
  return centre.shape === 'circle' ? 0 : toFraction(centre.turnUnder).valueOf();
}

function circleOf(centre: PlanRequest['centre'], holeCornerIn: number): CentreCircle | null {
  if (centre.shape === 'none') return null;
  const turning = centre.edge === 'turned' ? toFraction(centre.turning) : new Fraction(0);
  return centreCircle(holeCornerIn, toFraction(centre.overlap).valueOf(), turning.valueOf());
}
