import { turnPoints, type Point } from './points';
import type { RingShape } from './ring-shape';
import { finishedHalf } from './wedge-outlines';

/** The angle of a wedge's axis, clockwise from 12 o'clock: its edges fall on the axes. */
export const wedgeAngle = (shape: RingShape, index: number): number =>
  (2 * index + 1) * shape.halfAngleRad;

/** Turns an outline (x along the axis) so that its axis lies `angleRad` clockwise of 12. */
export const placeAtAngle = (points: readonly Point[], angleRad: number): Point[] =>
  turnPoints(points, angleRad - Math.PI / 2);

/** Places an outline as the ring's wedge `index`, about the plate's centre, y downwards. */
export const placeWedge = (shape: RingShape, index: number, points: readonly Point[]): Point[] =>
  placeAtAngle(points, wedgeAngle(shape, index));

/** Where the letter of a wedge stands, on its axis: near the widest part. */
export function letterAt(shape: RingShape): Point {
  const inner = Math.max(shape.holeIn, shape.circleIn ?? 0);
  const outer = (shape.shoulderIn + shape.reachIn) / 2;
  return [inner + (outer - inner) * 0.7, 0];
}

/** The widest letter that a wedge has room for, in inches. */
export const letterRoom = (shape: RingShape): number => finishedHalf(shape, letterAt(shape)[0]) * 2;
