import { layOutChain } from '../../../../shared/geometry/drawing/chain-layout';
import { cutRun } from '../../../../shared/geometry/drawing/cut-run';
import { foldSequence } from '../../../../shared/geometry/drawing/fold-sequence';
import { layOutJoin } from '../../../../shared/geometry/drawing/join-layout';
import type { Box, Point } from '../../../../shared/geometry/drawing/points';
import { pressView } from '../../../../shared/geometry/drawing/press-view';
import { ringShape } from '../../../../shared/geometry/drawing/ring-shape';
import { rulerAlong } from '../../../../shared/geometry/drawing/ruler';
import { cornersOf } from '../../../../shared/geometry/drawing/strip-layout';
import { tipView } from '../../../../shared/geometry/drawing/tip-view';
import { layOutTumbling } from '../../../../shared/geometry/drawing/tumbling-layout';
import { rawHalf, rawShoulder } from '../../../../shared/geometry/drawing/wedge-outlines';
import { ringPlan } from '../../../support/ring-plan';

const plan = ringPlan();
const shape = ringShape(plan);
const cos = Math.cos(Math.PI / 16);
const lengthOf = ([[x, y], [u, v]]: readonly [Point, Point]) => Math.hypot(u - x, v - y);

function expectInside(points: readonly Point[], { x, y, width, height }: Box) {
  for (const [px, py] of points) {
    expect(px).toBeGreaterThanOrEqual(x - 1e-6);
    expect(px).toBeLessThanOrEqual(x + width + 1e-6);
    expect(py).toBeGreaterThanOrEqual(y - 1e-6);
    expect(py).toBeLessThanOrEqual(y + height + 1e-6);
  }
}

describe('pairs in a chain', () => {
  const { fit, pairs, needle, threads } = layOutChain(shape, {
    x: 0,
    y: 0,
    width: 360,
    height: 260,
  });
  const home = pairs.findIndex(({ seam: [from, to] }) => from[0] < needle[0] && needle[0] < to[0]);

  it('lie with level seams, the raw ones as long as the wedge’s', () => {
    for (const { seam } of pairs) {
      expect(seam[0][1]).toBeCloseTo(seam[1][1], 9);
      expect(lengthOf(seam)).toBeCloseTo(((rawShoulder(shape) - 2) / cos) * fit.scale, 9);
    }
  });

  it('are sewn to the right of the needle, and still to sew on its left', () => {
    expect(home).toBeGreaterThan(0);
    expect(home).toBeLessThan(pairs.length - 1);
    expect(pairs[home]?.sewnFrom).toBeCloseTo(needle[0], 9);
    pairs.forEach(({ sewnFrom, seam: [from, to] }, index) => {
      if (index < home) expect(sewnFrom).toBe(to[0]);
      if (index > home) expect(sewnFrom).toBe(from[0]);
    });
  });

  it('hang together by the thread from each to the one before it', () => {
    expect(threads).toHaveLength(pairs.length - 1 - home);
    for (const [from, to] of threads) expect(to[0]).toBeGreaterThan(from[0]);
  });
});

describe('units joined', () => {
  const box = { x: 10, y: 20, width: 300, height: 200 };

  it('lie symmetrically about 12 o’clock', () => {
    const joined = layOutJoin(plan, shape, 'quarter', null, box);
    const [first, second, third, fourth] = joined?.wedges ?? [];
    expect(joined?.wedges.map(({ letter }) => letter)).toEqual(['A', 'B', 'C', 'D']);
    for (const [left, right] of [
      [first, fourth],
      [second, third],
    ]) {
      expect((left?.letterAt[0] ?? 0) + (right?.letterAt[0] ?? 0)).toBeCloseTo(2 * 160, 6);
      expect(left?.letterAt[1]).toBeCloseTo(right?.letterAt[1] ?? 0, 6);
    }
    expect(first?.letterAt[0]).toBeLessThan(second?.letterAt[0] ?? 0);
    expectInside(joined?.wedges.flatMap(({ points }) => points) ?? [], box);
  });

  it('of a quarter have one seam to sew, from the hole to the shoulders, upright', () => {
    const joined = layOutJoin(plan, shape, 'quarter', null, box);
    expect(joined?.parts).toEqual([
      ['A', 'B'],
      ['C', 'D'],
    ]);
    expect(joined?.seams).toHaveLength(1);
    const [from = [0, 0], to = [0, 0]] = joined?.seams[0] ?? [];
    expect(from[0]).toBeCloseTo(to[0], 6);
    expect(lengthOf([from, to])).toBeCloseTo(
      ((shape.shoulderIn - 2) / cos) * (joined?.fit.scale ?? 0),
      6,
    );
  });

  it('of a ring have two, at 12 and at 6 o’clock', () => {
    const joined = layOutJoin(plan, shape, 'ring', null, box);
    const [twelve, six] = joined?.seams ?? [];
    const { dx = 0, dy = 0 } = joined?.fit ?? {};
    expect(joined?.seams).toHaveLength(2);
    expect(twelve?.[1]?.[0]).toBeCloseTo(dx, 6);
    expect(twelve?.[1]?.[1]).toBeLessThan(dy);
    expect(six?.[1]?.[0]).toBeCloseTo(dx, 6);
    expect(six?.[1]?.[1]).toBeGreaterThan(dy);
  });

  it('are none where the ring has no such unit', () => {
    const eighteen = ringPlan({ wedges: 18 });
    expect(layOutJoin(eighteen, ringShape(eighteen), 'quarter', null, box)).toBeNull();
  });
});

describe('a seam pressed open', () => {
  const view = pressView(shape);

  it('runs upright from the narrow edge to the shoulders', () => {
    expect(view.seam[0]).toEqual([0, expect.closeTo(-2 / cos, 9)]);
    expect(view.seam[1]).toEqual([0, expect.closeTo(-6.165618187, 8)]);
  });

  it('has an allowance of ¼ folded over on each side', () => {
    const right = view.overRight.map(([x]) => x);
    expect(Math.min(...right)).toBeCloseTo(0, 9);
    expect(Math.max(...right)).toBeCloseTo(0.25, 9);
    const left = view.overLeft.map(([x]) => x);
    expect(Math.max(...left)).toBeCloseTo(0, 9);
    expect(Math.min(...left)).toBeCloseTo(-0.25, 9);
  });

  it('shows the two wedges as wide as they are', () => {
    const xs = [...view.left, ...view.right].map(([x]) => x);
    expect(view.view.x).toBeCloseTo(Math.min(...xs), 9);
    expect(view.view.width).toBeCloseTo(Math.max(...xs) - Math.min(...xs), 9);
  });
});

describe('the view of a tip', () => {
  it('is as wide as the wedge at its shoulder, from the tip down past the flap', () => {
    const { x, y, width, height } = tipView(shape);
    expect(x).toBeCloseTo(-width / 2, 12);
    expect(width).toBeCloseTo(2 * rawHalf(shape, shape.shoulderIn), 12);
    expect(y).toBe(-7.25);
    expect(height).toBeGreaterThan(rawHalf(shape, shape.reachIn));
    expect(height).toBeLessThanOrEqual(5.25);
  });
});

describe('a square folded in quarters', () => {
  const box = { x: 5, y: 10, width: 600, height: 200 };
  const { states, arrows, side } = foldSequence(box);

  it('is halved twice, then opened out again', () => {
    expect(states.map(({ cloth }) => [cloth.width / side, cloth.height / side])).toEqual([
      [1, 1],
      [0.5, 1],
      [0.5, 0.5],
      [1, 1],
    ]);
    expect(states.map(({ whole }) => whole)).toEqual([true, false, false, true]);
    expectInside(
      states.flatMap(({ cloth }) => cornersOf(cloth)),
      box,
    );
  });

  it('has its folds on its edges', () => {
    for (const { cloth, folds } of states) {
      for (const end of folds.flat()) {
        const gaps = cornersOf(cloth).map((corner) => lengthOf([corner, end]));
        expect(Math.min(...gaps)).toBeCloseTo(0, 9);
      }
    }
    expect(states.map(({ folds }) => folds.length)).toEqual([0, 1, 2, 0]);
  });

  it('keeps creases through its centre', () => {
    const opened = states[3];
    const centre = (opened?.cloth.x ?? 0) + side / 2;
    const [upright, level] = opened?.creases ?? [];
    expect(upright?.map(([x]) => x)).toEqual([centre, centre]);
    expect(level?.[0][1]).toBeCloseTo((opened?.cloth.y ?? 0) + side / 2, 9);
  });

  it('points from each state to the next', () => {
    arrows.forEach(([from, to], index) => {
      const before = states[index]?.cloth;
      expect(from[0]).toBeGreaterThan((before?.x ?? 0) + (before?.width ?? 0));
      expect(to[0]).toBeGreaterThan(from[0]);
      expect(to[0]).toBeLessThan(states[index + 1]?.cloth.x ?? 0);
    });
  });
});

describe('a ruler', () => {
  const cut: [Point, Point] = [
    [50, 100],
    [50, 0],
  ];

  it('lies along the cut on the side that is kept, with an end over', () => {
    expect(rulerAlong(cut, 100, 40, 1).outline).toEqual([
      [50, 110],
      [50, -10],
      [90, -10],
      [90, 110],
    ]);
    expect(rulerAlong(cut, 100, 40, -1).outline[2]).toEqual([10, -10]);
  });

  it('has quarter-inch ticks, longer at the half and the inch', () => {
    const { ticks } = rulerAlong(cut, 100, 40, 1);
    expect(ticks.map(lengthOf)).toEqual([4, 7, 4, 11]);
    expect(ticks.map(([[, y]]) => y)).toEqual([15, 40, 65, 90]);
  });

  it('leaves out ticks that would run together', () => {
    const gapOf = (scale: number) => {
      const [one, two] = rulerAlong(cut, scale, 40, 1).ticks.map(([[, y]]) => y);
      return (two ?? 0) - (one ?? 0);
    };
    expect([gapOf(16), gapOf(8), gapOf(4)]).toEqual([4, 4, 4]); // a quarter, a half, an inch
  });
});

describe('a stack under the ruler', () => {
  const lane = plan.steps.find(({ role }) => role === 'cut')?.lanes[0] ?? null;
  const run = cutRun(plan, lane, 1);
  const box = { x: 0, y: 0, width: 390, height: 300 };
  const right = layOutTumbling(run, box, false);
  const left = layOutTumbling(run, box, true);

  it('marks what is cut, the next cut and what is left', () => {
    expect(right.pieces.map(({ state }) => state)).toEqual(['done', 'next', 'later', 'later']);
  });

  it('lies whole on its cloth, in true proportion', () => {
    expectInside(
      right.pieces.flatMap(({ outline }) => outline),
      right.cloth,
    );
    expect(right.cloth.height / right.cloth.width).toBeCloseTo(run.heightIn / run.lengthIn, 9);
  });

  it('is cut away from the maker', () => {
    for (const { cut } of right.pieces) expect(cut[0][1]).toBeGreaterThan(cut[1][1]);
  });

  it('is mirrored for a left hand', () => {
    const middle = right.clip.x + right.clip.width / 2;
    right.pieces.forEach(({ middle: [x, y] }, index) => {
      expect(left.pieces[index]?.middle[0]).toBeCloseTo(2 * middle - x, 9);
      expect(left.pieces[index]?.middle[1]).toBeCloseTo(y, 9);
    });
  });

  it('shows its layers inside its place', () => {
    expectInside(cornersOf(right.rows), box);
    expectInside(cornersOf(layOutTumbling(run, { ...box, height: 500 }, false).rows), {
      ...box,
      height: 500,
    });
  });
});
