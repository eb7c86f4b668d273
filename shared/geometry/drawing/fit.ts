import { boundsOf, type Box, type Point } from './points';

/** From inches to pixels: scale, then move. */
export interface Fit {
  scale: number;
  dx: number;
  dy: number;
}

/** The largest fit of `what` (inches) centred in `box` (pixels), in true proportion. */
export function fitInto(what: Box, box: Box, mostScale = Infinity): Fit {
  const scale = Math.max(
    0.1,
    Math.min(box.width / what.width, box.height / what.height, mostScale),
  );
  return {
    scale,
    dx: box.x + box.width / 2 - (what.x + what.width / 2) * scale,
    dy: box.y + box.height / 2 - (what.y + what.height / 2) * scale,
  };
}

/** Fits the bounds of points. */
export const fitPoints = (points: readonly Point[], box: Box, mostScale?: number): Fit =>
  fitInto(boundsOf(points), box, mostScale);

export const fitPoint = (fit: Fit, [x, y]: Point): Point => [
  x * fit.scale + fit.dx,
  y * fit.scale + fit.dy,
];

export const applyFit = (fit: Fit, points: readonly Point[]): Point[] =>
  points.map((point) => fitPoint(fit, point));

/** The box left when a margin is taken from each side; never smaller than 1 pixel. */
export function inset(box: Box, left: number, top = left, right = left, bottom = top): Box {
  return {
    x: box.x + left,
    y: box.y + top,
    width: Math.max(1, box.width - left - right),
    height: Math.max(1, box.height - top - bottom),
  };
}
