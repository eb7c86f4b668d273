import { InvariantError } from '../result';
import type { Point } from './point';
import { polygonArea } from './polygon-area';

/**
 * The raw outline of a piece: every finished edge moved outward by its own allowance, corners
 * mitred. For the convex pieces of patchwork, with no two edges running on in one line.
 *
 * @param corners finished corners in order, either way round, inches
 * @param allowancesIn one for all edges, or one each; edge i runs from corner i to corner i + 1
 * @returns the raw corners in the same order
 * @throws InvariantError for fewer than three corners, or edges in one line
 * Source: intersection of the moved edges; checked against clipper-lib's mitre offset.
 */
export function offsetPolygon(
  corners: readonly Point[],
  allowancesIn: number | readonly number[],
): Point[] {
  if (corners.length < 3) throw new InvariantError('a piece has three corners or more');
  const outward = polygonArea(corners) > 0 ? 1 : -1;
  const edges = corners.map((corner, index) => {
    const allowance = typeof allowancesIn === 'number' ? allowancesIn : (allowancesIn[index] ?? 0);
    return moveEdge(corner, cornerAt(corners, index + 1), outward * allowance);
  });
  return edges.map((edge, index) => meet(edges.at(index - 1) ?? edge, edge));
}

interface Line {
  through: Point;
  along: Point;
}

function cornerAt(corners: readonly Point[], index: number): Point {
  return corners[index % corners.length] ?? [0, 0];
}

function moveEdge(from: Point, to: Point, byIn: number): Line {
  const along: Point = [to[0] - from[0], to[1] - from[1]];
  const length = Math.hypot(...along);
  const across: Point = [along[1] / length, -along[0] / length];
  return { through: [from[0] + byIn * across[0], from[1] + byIn * across[1]], along };
}

function meet(a: Line, b: Line): Point {
  const cross = a.along[0] * b.along[1] - a.along[1] * b.along[0];
  if (Math.abs(cross) < 1e-12) throw new InvariantError('two edges of a piece lie in one line');
  const dx = b.through[0] - a.through[0];
  const dy = b.through[1] - a.through[1];
  const t = (dx * b.along[1] - dy * b.along[0]) / cross;
  return [a.through[0] + t * a.along[0], a.through[1] + t * a.along[1]];
}
