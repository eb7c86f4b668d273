import type { Plan } from '../../model/plan';

import { plateLetters } from './find-unit';
import { applyFit, fitPoint, type Fit } from './fit';
import { letterAt, letterRoom, placeWedge } from './place-wedge';
import type { Point } from './points';
import type { RingShape } from './ring-shape';
import { finishedWedge } from './wedge-outlines';

export interface DrawnWedge {
  letter: string;
  points: Point[];
  letterAt: Point;
}

const MOST_LETTER_PX = 17;
const LETTER_SHARE = 0.66; // of the wedge's width: a capital with air on both sides

/** Size of the letters in a ring, pixels: what the wedges have room for. */
export const ringLetterPx = (shape: RingShape, scale: number): number =>
  Math.min(MOST_LETTER_PX, letterRoom(shape) * scale * LETTER_SHARE);

/** Every wedge of the ring, clockwise from 12 o'clock, in pixels; the fit's origin is the centre. */
export function drawRing(plan: Plan, shape: RingShape, fit: Fit): DrawnWedge[] {
  const outline = finishedWedge(shape);
  return plateLetters(plan).map((letter, index) => {
    const [at] = placeWedge(shape, index, [letterAt(shape)]);
    return {
      letter,
      points: applyFit(fit, placeWedge(shape, index, outline)),
      letterAt: fitPoint(fit, at ?? [0, 0]),
    };
  });
}

/** The farthest point of the finished ring from its centre, inches: a flat tip's corners. */
export const ringExtent = (shape: RingShape): number =>
  shape.tip === 'flat' ? shape.reachIn / Math.cos(shape.halfAngleRad) : shape.reachIn;
