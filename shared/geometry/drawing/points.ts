import type { Point } from '../point';

// Points of a drawing: inches or pixels; y runs downwards once they are placed.
export type { Point };

export interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}

export const movePoints = (points: readonly Point[], byX: number, byY: number): Point[] =>
  points.map(([x, y]) => [x + byX, y + byY]);

/** Turns about the origin, clockwise on a screen. */
export function turnPoints(points: readonly Point[], angleRad: number): Point[] {
  const cos = Math.cos(angleRad);
  const sin = Math.sin(angleRad);
  return points.map(([x, y]) => [x * cos - y * sin, x * sin + y * cos]);
}

/** Mirrors left and right about a vertical line; the order keeps its sense along the outline. */
export const mirrorPoints = (points: readonly Point[], aboutX: number): Point[] =>
  points.map(([x, y]) => [2 * aboutX - x, y]);

/** The smallest box around points. */
export function boundsOf(points: readonly Point[]): Box {
  const xs = points.map(([x]) => x);
  const ys = points.map(([, y]) => y);
  const x = Math.min(...xs);
  const y = Math.min(...ys);
  return { x, y, width: Math.max(...xs) - x, height: Math.max(...ys) - y };
}

const figure = (value: number): string => String(Math.round(value * 100) / 100);

/** SVG path data through points, to a hundredth of a pixel. */
export function pathOf(points: readonly Point[], closed = true): string {
  const corners = points.map(([x, y]) => `${figure(x)} ${figure(y)}`);
  return `M${corners.join('L')}${closed ? 'Z' : ''}`;
}

/** Two places side by side: the left one takes `share` of the width. */
export function twoPanels(box: Box, share = 0.5): [Box, Box] {
  const left = box.width * share;
  return [
    { ...box, width: left },
    { ...box, x: box.x + left, width: box.width - left },
  ];
}
