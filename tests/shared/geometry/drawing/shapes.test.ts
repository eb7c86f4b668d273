import { circlePoints, ringPath } from '../../../../shared/geometry/drawing/circle-points';
import { circleSizes } from '../../../../shared/geometry/drawing/circle-sizes';
import {
  applyFit,
  fitInto,
  fitPoint,
  fitPoints,
  inset,
} from '../../../../shared/geometry/drawing/fit';
import { gridLines } from '../../../../shared/geometry/drawing/grid-lines';
import { laneLetters } from '../../../../shared/geometry/drawing/lane-letters';
import { letterAt, letterRoom } from '../../../../shared/geometry/drawing/place-wedge';
import {
  boundsOf,
  mirrorPoints,
  movePoints,
  pathOf,
  turnPoints,
  twoPanels,
  type Point,
} from '../../../../shared/geometry/drawing/points';
import { drawIn, holeEdge, ringOuterEdge } from '../../../../shared/geometry/drawing/ring-edges';
import {
  drawRing,
  ringExtent,
  ringLetterPx,
} from '../../../../shared/geometry/drawing/ring-drawing';
import { ringShape } from '../../../../shared/geometry/drawing/ring-shape';
import { halfOf, toInches } from '../../../../shared/geometry/drawing/to-inches';
import { ringPlan } from '../../../support/ring-plan';

const plan = ringPlan(); // 16 wedges, narrow edge at 2, strips of 5½, reach 7¼
const shape = ringShape(plan);
const distance = ([x, y]: Point): number => Math.hypot(x, y);

describe('points', () => {
  it('turn clockwise on a screen, whose y runs down', () => {
    const [[x, y] = [9, 9]] = turnPoints([[2, 0]], Math.PI / 2);
    expect([x, y]).toEqual([expect.closeTo(0, 12), expect.closeTo(2, 12)]);
    const [[u, v] = [9, 9]] = turnPoints([[0, 2]], Math.PI / 2);
    expect([u, v]).toEqual([expect.closeTo(-2, 12), expect.closeTo(0, 12)]);
  });

  it('move and mirror', () => {
    expect(movePoints([[1, 2]], 3, -1)).toEqual([[4, 1]]);
    expect(mirrorPoints([[3, 1]], 2)).toEqual([[1, 1]]);
  });

  it('have a smallest box around them, and a path through them', () => {
    const points: Point[] = [
      [1, 5],
      [4, 2.006],
    ];
    expect(boundsOf(points)).toEqual({ x: 1, y: 2.006, width: 3, height: 5 - 2.006 });
    expect(pathOf(points)).toBe('M1 5L4 2.01Z');
    expect(pathOf(points, false)).toBe('M1 5L4 2.01');
  });

  it('share a box between two places', () => {
    expect(twoPanels({ x: 10, y: 0, width: 100, height: 50 }, 0.3)).toEqual([
      { x: 10, y: 0, width: 30, height: 50 },
      { x: 40, y: 0, width: 70, height: 50 },
    ]);
  });

  it('of a circle all lie on it, clockwise from its right', () => {
    const points = circlePoints(3, 4, 2);
    for (const [x, y] of points) expect(Math.hypot(x - 3, y - 4)).toBeCloseTo(2, 12);
    expect(points[points.length / 4]).toEqual([expect.closeTo(3, 12), expect.closeTo(6, 12)]);
    expect(points[points.length / 2]?.[0]).toBeCloseTo(1, 12);
    expect(ringPath(0, 0, 5, 3)).toBe(
      'M-5 0a5 5 0 1 0 10 0a5 5 0 1 0 -10 0ZM-3 0a3 3 0 1 0 6 0a3 3 0 1 0 -6 0Z',
    );
  });
});

describe('a fit', () => {
  const box = { x: 10, y: 20, width: 40, height: 60 };

  it('is the largest in true proportion, centred', () => {
    const fit = fitInto({ x: 1, y: 2, width: 4, height: 2 }, box);
    expect(fit.scale).toBe(10);
    expect(fitPoint(fit, [3, 3])).toEqual([30, 50]);
    expect(fitInto({ x: 1, y: 2, width: 4, height: 2 }, box, 7).scale).toBe(7);
    expect(fitInto({ x: 0, y: 0, width: 1, height: 6 }, box).scale).toBe(10);
  });

  it('keeps points in their box', () => {
    const points: Point[] = [
      [0, 0],
      [8, 3],
    ];
    const placed = boundsOf(applyFit(fitPoints(points, box), points));
    expect(placed).toEqual({ x: 10, y: 42.5, width: 40, height: 15 });
  });

  it('can leave margins', () => {
    expect(inset(box, 1, 2, 3, 4)).toEqual({ x: 11, y: 22, width: 36, height: 54 });
    expect(inset(box, 30)).toMatchObject({ width: 1, height: 1 });
  });

  it('has inch lines through its origin, unless they would run together', () => {
    const room = { x: 0, y: 0, width: 100, height: 50 };
    const lines = gridLines(room, { scale: 10, dx: 3, dy: -26 });
    const upright = lines.filter(([[x], [u]]) => x === u).map(([[x]]) => x);
    const level = lines.filter(([[x], [u]]) => x !== u).map(([[, y]]) => y);
    expect(upright).toEqual([3, 13, 23, 33, 43, 53, 63, 73, 83, 93]);
    expect(level).toEqual([4, 14, 24, 34, 44]);
    expect(gridLines(room, { scale: 4, dx: 0, dy: 0 })).toEqual([]);
  });
});

describe('lengths and letters of a plan', () => {
  it('are plain inches for drawing', () => {
    expect(toInches('11/2')).toBe(5.5);
    expect(toInches({ exact: 1.25, policy: 'template' })).toBe(1.25);
    expect(halfOf('33/2')).toBe('33/4');
  });

  it('of the circle are its cut, square and finished sizes', () => {
    expect(circleSizes(plan)).toEqual({
      letter: 'A',
      cut: '45/8',
      cutIn: 5.625,
      square: '6',
      squareIn: 6,
      finishedIn: 2.539182316,
      turningIn: 0.25,
    });
    expect(circleSizes(ringPlan({ circleEdge: 'fused' }))?.turningIn).toBe(0);
    expect(circleSizes(ringPlan({ centre: 'none' }))).toBeNull();
  });

  it('of a lane are those its items name, in ring order', () => {
    const lane = { key: 'A+C', target: 4, consumes: { 'tip:A': 1 }, makes: { 'pair:A+C': 1 } };
    expect(laneLetters(lane)).toEqual(['A', 'C']);
    expect(
      laneLetters({ key: 'ring', target: 1, consumes: { half: 2 }, makes: { ring: 1 } }),
    ).toEqual([]);
    expect(laneLetters(null)).toEqual([]);
  });
});

describe('the shape of a ring', () => {
  it('is the plan’s', () => {
    expect(shape).toMatchObject({
      wedges: 16,
      seamIn: 0.25,
      tipTurnIn: 0.25,
      narrowIn: 2,
      wideIn: 7.5,
      holeIn: 2,
      reachIn: 7.25,
      shoulderIn: 6.047147562,
      circleIn: 2.539182316,
    });
    expect(shape.halfAngleRad).toBeCloseTo(Math.PI / 16, 12);
  });

  it('of an open centre has its edge turned under, and no circle', () => {
    expect(ringShape(ringPlan({ centre: 'none' }))).toMatchObject({ holeIn: 2.25, circleIn: null });
  });

  it('of flat tips has its shoulders at the reach', () => {
    expect(ringShape(ringPlan({ tip: 'flat' })).shoulderIn).toBe(7.25);
  });

  it('has an outer edge of tips and shoulders', () => {
    const edge = ringOuterEdge(shape);
    expect(edge).toHaveLength(48);
    expect(Math.max(...edge.map(distance))).toBeCloseTo(7.25, 9);
    expect(Math.min(...edge.map(distance))).toBeCloseTo(6.165618187, 8); // the shoulders' radius
  });

  it('has a regular polygon for a hole, whose corners are the plan’s', () => {
    const edge = holeEdge(shape, shape.holeIn);
    expect(edge).toHaveLength(16);
    for (const corner of edge) expect(distance(corner)).toBeCloseTo(2.039182316, 8);
  });

  it('draws an edge in by what its farthest point gives', () => {
    const edge = drawIn(ringOuterEdge(shape), 0.5);
    expect(Math.max(...edge.map(distance))).toBeCloseTo(6.75, 9);
    expect(drawIn([[0, 0]], 1)).toEqual([[0, 0]]);
  });

  it('reaches farthest at its tips, or at a flat ring’s corners', () => {
    expect(ringExtent(shape)).toBe(7.25);
    const flat = ringShape(ringPlan({ tip: 'flat' }));
    expect(ringExtent(flat)).toBeCloseTo(Math.max(...ringOuterEdge(flat).map(distance)), 9);
  });

  it('has room for its letters between the circle and the tips', () => {
    const [x, y] = letterAt(shape);
    expect(y).toBe(0);
    expect(x).toBeGreaterThan(2.539182316);
    expect(x).toBeLessThan(7.25);
    expect(letterRoom(shape)).toBeCloseTo(2 * x * Math.tan(Math.PI / 16), 9);
    expect(ringLetterPx(shape, 1)).toBeCloseTo(letterRoom(shape) * 0.66, 9);
    expect(ringLetterPx(shape, 100)).toBe(17);
  });

  it('is drawn clockwise from 12 o’clock', () => {
    const drawn = drawRing(plan, shape, { scale: 10, dx: 100, dy: 100 });
    expect(drawn.map(({ letter }) => letter).join('')).toBe('ABCDABCDABCDABCD');
    drawn.forEach(({ letterAt: [x, y] }, index) => {
      const clockwise = Math.atan2(x - 100, 100 - y);
      const expected = ((2 * index + 1) * Math.PI) / 16;
      expect(Math.cos(clockwise - expected)).toBeCloseTo(1, 9);
    });
    const outline = drawn[0]?.points ?? [];
    const reachPx = outline.map(([x, y]) => Math.hypot(x - 100, y - 100));
    expect(Math.max(...reachPx)).toBeCloseTo(72.5, 9);
  });
});
