import type { Point } from './points';

const STEPS = 72;

/** Points around a circle, clockwise from its right. */
export const circlePoints = (x: number, y: number, radius: number): Point[] =>
  Array.from({ length: STEPS }, (_, i): Point => {
    const angle = (2 * Math.PI * i) / STEPS;
    return [x + radius * Math.cos(angle), y + radius * Math.sin(angle)];
  });

/** SVG path of the band between two circles, to fill by the even-odd rule. */
export function ringPath(x: number, y: number, outer: number, inner: number): string {
  const circle = (r: number) =>
    `M${x - r} ${y}a${r} ${r} 0 1 0 ${2 * r} 0a${r} ${r} 0 1 0 ${-2 * r} 0Z`;
  return circle(outer) + circle(inner);
}
