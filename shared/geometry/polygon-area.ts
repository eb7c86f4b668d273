import type { Point } from './point';

/**
 * Signed area of a simple polygon, positive when its corners run anticlockwise (y up).
 *
 * @param corners at least three, in order
 * Source: the shoelace formula.
 */
export function polygonArea(corners: readonly Point[]): number {
  return (
    corners.reduce((sum, [x, y], index) => {
      const [nextX, nextY] = corners[(index + 1) % corners.length] ?? [x, y];
      return sum + x * nextY - nextX * y;
    }, 0) / 2
  );
}
