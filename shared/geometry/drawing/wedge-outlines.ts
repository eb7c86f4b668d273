import { cutHalfWidth } from '../cut-half-width';
import { finishedHalfWidth } from '../finished-half-width';
import { turnPoints, type Point } from './points';
import type { RingShape } from './ring-shape';

// Outlines of one wedge: x from the plate's centre along its axis, y across, inches.
// Source of every formula: the ring of n wedges, half-angle θ = π/n.

const ARC_STEPS = 24;

/** Half of the width between the side seams at x. */
export const finishedHalf = (shape: RingShape, x: number): number =>
  finishedHalfWidth(x, shape.wedges);

/** Half of the width between the raw sides at x. */
export const rawHalf = (shape: RingShape, x: number): number =>
  cutHalfWidth(x, shape.wedges, shape.seamIn);

/** Where the 45° fold of a pointed tip meets the raw side: (R − a/cos θ) / (1 + tan θ). */
export function rawShoulder(shape: RingShape): number {
  const theta = shape.halfAngleRad;
  return (shape.reachIn - shape.seamIn / Math.cos(theta)) / (1 + Math.tan(theta));
}

const trapezoid = (nearX: number, nearHalf: number, farX: number, farHalf: number): Point[] => [
  [nearX, -nearHalf],
  [farX, -farHalf],
  [farX, farHalf],
  [nearX, nearHalf],
];

/** The wedge as cut: raw on all four edges. */
export const cutWedge = (shape: RingShape): Point[] =>
  trapezoid(
    shape.narrowIn,
    rawHalf(shape, shape.narrowIn),
    shape.wideIn,
    rawHalf(shape, shape.wideIn),
  );

/** Points of an arc about (x, 0), from −90° to 90°, both ends in. */
export function halfCircle(centreX: number, radiusIn: number): Point[] {
  return Array.from({ length: ARC_STEPS + 1 }, (_, i): Point => {
    const angle = -Math.PI / 2 + (Math.PI * i) / ARC_STEPS;
    return [centreX + radiusIn * Math.cos(angle), radiusIn * Math.sin(angle)];
  });
}

/** The outer edge between the two shoulders, from −y to +y. */
function tipEdge(shape: RingShape): Point[] {
  const half = finishedHalf(shape, shape.shoulderIn);
  if (shape.tip === 'rounded') return halfCircle(shape.shoulderIn, half);
  const shoulders: [Point, Point] = [
    [shape.shoulderIn, -half],
    [shape.shoulderIn, half],
  ];
  return shape.tip === 'flat' ? shoulders : [shoulders[0], [shape.reachIn, 0], shoulders[1]];
}

/** The wedge as it shows in the ring: side seams, finished tip, inner edge. */
export function finishedWedge(shape: RingShape): Point[] {
  const inner = finishedHalf(shape, shape.holeIn);
  return [[shape.holeIn, -inner], ...tipEdge(shape), [shape.holeIn, inner]];
}

/**
 * The wedge with its tip made and its sides still raw where they are named: `before` is the
 * side towards 12 o'clock (−y), `after` the next one clockwise.
 */
export function preparedWedge(shape: RingShape, before = true, after = true): Point[] {
  const side = (x: number, raw: boolean) => (raw ? rawHalf(shape, x) : finishedHalf(shape, x));
  const inner = shape.narrowIn;
  const outer = (raw: boolean) =>
    shape.tip === 'pointed' && raw ? rawShoulder(shape) : shape.shoulderIn;
  return [
    [inner, -side(inner, before)],
    [outer(before), -side(outer(before), before)],
    ...(shape.tip === 'pointed' ? [[shape.reachIn, 0] as const] : tipEdge(shape)),
    [outer(after), side(outer(after), after)],
    [inner, side(inner, after)],
  ];
}

/** The cut wedge folded along its axis, right sides together, up to a wide end at x. */
export const foldedWedge = (shape: RingShape, endIn: number): Point[] => [
  [shape.narrowIn, 0],
  [endIn, 0],
  [endIn, -rawHalf(shape, endIn)],
  [shape.narrowIn, -rawHalf(shape, shape.narrowIn)],
];

/**
 * The flap at the back of a pointed tip, once turned: the wide end folded at 45°, so that the
 * sewn line lies on the axis, down to R − (R·tan θ + a/cos θ).
 */
export function tipFlap(shape: RingShape): Point[] {
  const shoulder = rawShoulder(shape);
  const half = rawHalf(shape, shoulder);
  return [
    [shape.reachIn, 0],
    [shoulder, half],
    [shape.reachIn - rawHalf(shape, shape.reachIn), 0],
    [shoulder, -half],
  ];
}

/** The strip of cloth beside a side seam, from the raw narrow edge to the shoulder. */
export function seamAllowance(shape: RingShape, side: 1 | -1): Point[] {
  const near = shape.narrowIn;
  const far = shape.tip === 'pointed' ? rawShoulder(shape) : shape.shoulderIn;
  return [
    [near, side * finishedHalf(shape, near)],
    [shape.shoulderIn, side * finishedHalf(shape, shape.shoulderIn)],
    [far, side * rawHalf(shape, far)],
    [near, side * rawHalf(shape, near)],
  ];
}

/** The inner edge of what a rounded or flat tip turns under, as the back shows it. */
export function templateEdge(shape: RingShape): Point[] {
  const half = finishedHalf(shape, shape.shoulderIn);
  if (shape.tip === 'rounded') {
    return halfCircle(shape.shoulderIn, Math.max(half * 0.2, half - shape.tipTurnIn));
  }
  const inner = shape.reachIn - shape.tipTurnIn;
  const wide = rawHalf(shape, inner);
  return [
    [inner, -wide],
    [inner, wide],
  ];
}

/** The cloth turned to the back along a rounded or flat tip; its right side shows there. */
export function turnedBand(shape: RingShape): Point[] {
  const outer = preparedWedge(shape).slice(1, -1);
  return [...outer, ...templateEdge(shape).reverse()];
}

/** A wedge's outline turned so that its raw side `after` lies level below, its seam on y = 0. */
export const levelWedge = (shape: RingShape): Point[] =>
  turnPoints(preparedWedge(shape), -shape.halfAngleRad);
