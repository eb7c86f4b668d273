import type { Plan, PlanLane } from '../../model/plan';

import { findUnit } from './find-unit';
import { applyFit, fitPoint, fitPoints, type Fit } from './fit';
import { letterAt, placeAtAngle } from './place-wedge';
import type { Box, Point } from './points';
import { ringLetterPx, type DrawnWedge } from './ring-drawing';
import type { RingShape } from './ring-shape';
import { preparedWedge } from './wedge-outlines';

export interface JoinLayout {
  fit: Fit;
  wedges: DrawnWedge[];
  letterPx: number;
  /** seams to sew now, from the hole to the shoulders */
  seams: Point[][];
  /** the letters of each unit that is joined here */
  parts: string[][];
}

/**
 * The units of a quarter, half or ring side by side, in their places, the whole symmetrical about
 * 12 o'clock (a ring starts there). Its open ends keep their raw seam allowance.
 *
 * @returns null when the ring has no unit of that kind
 */
export function layOutJoin(
  plan: Plan,
  shape: RingShape,
  kind: 'quarter' | 'half' | 'ring',
  lane: PlanLane | null,
  box: Box,
): JoinLayout | null {
  const unit = findUnit(plan, kind, lane);
  if (!unit) return null;
  const count = unit.letters.length;
  const closed = kind === 'ring';
  const start = closed ? 0 : -count * shape.halfAngleRad;
  const angleOf = (index: number) => start + (2 * index + 1) * shape.halfAngleRad;
  const outlines = unit.letters.map((_, index) =>
    placeAtAngle(
      preparedWedge(shape, !closed && index === 0, !closed && index === count - 1),
      angleOf(index),
    ),
  );
  const fit = fitPoints(outlines.flat(), box);
  const wedges = unit.letters.map((letter, index) => ({
    letter,
    points: applyFit(fit, outlines[index] ?? []),
    letterAt: fitPoint(fit, placeAtAngle([letterAt(shape)], angleOf(index))[0] ?? [0, 0]),
  }));
  const parts = unit.parts.map((part) => part.letters);
  return {
    fit,
    wedges,
    letterPx: ringLetterPx(shape, fit.scale),
    parts,
    seams: boundaries(parts, closed).map((index) =>
      applyFit(fit, sideRay(shape, start + 2 * index * shape.halfAngleRad)),
    ),
  };
}

/** Indexes of the wedges that a seam to sew lies before. */
function boundaries(parts: string[][], closed: boolean): number[] {
  let index = 0;
  const starts = parts.map((part) => {
    const start = index;
    index += part.length;
    return start;
  });
  return closed ? starts : starts.slice(1);
}

/** A side seam, from the raw narrow edge to the shoulders, at an angle from 12 o'clock. */
function sideRay(shape: RingShape, angleRad: number): Point[] {
  const cos = Math.cos(shape.halfAngleRad);
  const ray: Point[] = [
    [shape.narrowIn / cos, 0],
    [shape.shoulderIn / cos, 0],
  ];
  return placeAtAngle(ray, angleRad);
}
