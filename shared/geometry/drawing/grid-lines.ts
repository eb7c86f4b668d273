import type { Fit } from './fit';
import type { Box, Point } from './points';

const LEAST_PITCH_PX = 5;

/** Lines one inch apart through a fit's origin, across a box. */
export function gridLines(box: Box, fit: Fit): [Point, Point][] {
  const pitch = fit.scale;
  if (pitch < LEAST_PITCH_PX) return [];
  const right = box.x + box.width;
  const bottom = box.y + box.height;
  const lines: [Point, Point][] = [];
  for (let x = firstAfter(box.x, fit.dx, pitch); x <= right; x += pitch) {
    lines.push([
      [x, box.y],
      [x, bottom],
    ]);
  }
  for (let y = firstAfter(box.y, fit.dy, pitch); y <= bottom; y += pitch) {
    lines.push([
      [box.x, y],
      [right, y],
    ]);
  }
  return lines;
}

const firstAfter = (edge: number, origin: number, pitch: number): number =>
  origin + Math.ceil((edge - origin) / pitch) * pitch;
