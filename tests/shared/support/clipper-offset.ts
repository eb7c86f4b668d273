import ClipperLib from 'clipper-lib';

import type { Point } from '../../../shared/geometry/point';

const SCALE = 1e7;

/** The outside reference: clipper-lib's mitre offset, its limit raised for the sharpest corner. */
export function clipperOffset(corners: readonly Point[], allowanceIn: number): Point[] {
  const offset = new ClipperLib.ClipperOffset(mitreLimit(corners), 1);
  const path = corners.map(([x, y]) => ({ X: Math.round(x * SCALE), Y: Math.round(y * SCALE) }));
  offset.AddPath(path, ClipperLib.JoinType.jtMiter, ClipperLib.EndType.etClosedPolygon);
  const solution = new ClipperLib.Paths();
  offset.Execute(solution, allowanceIn * SCALE);
  return (solution[0] ?? []).map(({ X, Y }) => [X / SCALE, Y / SCALE]);
}

/** 1/sin(half the sharpest corner), a little more: the default 2 squares off corners under 60°. */
function mitreLimit(corners: readonly Point[]): number {
  const sharpest = Math.min(...corners.map((_, index) => cornerAngle(corners, index)));
  return 1.001 / Math.sin(sharpest / 2);
}

export function cornerAngle(corners: readonly Point[], index: number): number {
  const [x, y] = corners[index] ?? [0, 0];
  const [beforeX, beforeY] = corners.at(index - 1) ?? [0, 0];
  const [afterX, afterY] = corners[(index + 1) % corners.length] ?? [0, 0];
  const turn = Math.atan2(beforeY - y, beforeX - x) - Math.atan2(afterY - y, afterX - x);
  const angle = Math.abs(turn) % (2 * Math.PI);
  return Math.min(angle, 2 * Math.PI - angle);
}

/** The farthest that a corner of ours lies from the nearest of theirs; ∞ for another count. */
export function farthestApart(ours: readonly Point[], theirs: readonly Point[]): number {
  if (ours.length !== theirs.length) return Infinity;
  return Math.max(
    ...ours.map(([x, y]) => Math.min(...theirs.map(([u, v]) => Math.hypot(x - u, y - v)))),
  );
}
