import { placeWedge } from './place-wedge';
import type { Point } from './points';
import type { RingShape } from './ring-shape';
import { finishedWedge } from './wedge-outlines';

/** The outer edge of the whole ring, clockwise from 12 o'clock, inches from its centre. */
export function ringOuterEdge(shape: RingShape): Point[] {
  const tip = finishedWedge(shape).slice(1, -1);
  return Array.from({ length: shape.wedges }, (_, index) => placeWedge(shape, index, tip)).flat();
}

/** A regular polygon around the hole, at `atIn` on the wedges' axes. */
export function holeEdge(shape: RingShape, atIn: number): Point[] {
  const half = atIn * Math.tan(shape.halfAngleRad);
  return Array.from({ length: shape.wedges }, (_, index) =>
    placeWedge(shape, index, [[atIn, -half]]),
  ).flat();
}

/** Shrinks an edge towards the centre so that its farthest point comes `byIn` nearer. */
export function drawIn(points: readonly Point[], byIn: number): Point[] {
  const farthest = Math.max(...points.map(([x, y]) => Math.hypot(x, y)));
  const share = farthest > 0 ? (farthest - byIn) / farthest : 1;
  return points.map(([x, y]) => [x * share, y * share]);
}
