import * as fc from 'fast-check';

import { placeWedge } from '../../../../shared/geometry/drawing/place-wedge';
import { boundsOf, type Point } from '../../../../shared/geometry/drawing/points';
import type { RingShape } from '../../../../shared/geometry/drawing/ring-shape';
import {
  cutWedge,
  finishedWedge,
  levelWedge,
  preparedWedge,
  rawHalf,
  rawShoulder,
  seamAllowance,
  tipFlap,
} from '../../../../shared/geometry/drawing/wedge-outlines';

/** The worked example: 14 in block, 20 wedges, r0 2, H 4¾, seams ¼. Its figures are derived there. */
const shapeOf = (tip: RingShape['tip'], wedges = 20, reachIn = 6.5): RingShape => ({
  wedges,
  halfAngleRad: Math.PI / wedges,
  seamIn: 0.25,
  tipTurnIn: 0.25,
  narrowIn: 2,
  wideIn: reachIn + 0.25,
  holeIn: 2,
  reachIn,
  tip,
  shoulderIn: tip === 'flat' ? reachIn : reachIn / (1 + Math.tan(Math.PI / wedges)),
  circleIn: 2.52493,
});

const areaOf = (points: readonly Point[]): number =>
  Math.abs(
    points.reduce((sum, [x, y], i) => {
      const [nextX, nextY] = points[(i + 1) % points.length] ?? [0, 0];
      return sum + x * nextY - nextX * y;
    }, 0),
  ) / 2;

const distance = ([x, y]: Point): number => Math.hypot(x, y);

describe('cutWedge', () => {
  it('is as wide at both ends as the worked example says', () => {
    const [near, far, ,] = cutWedge(shapeOf('pointed'));
    expect(-2 * (near?.[1] ?? 0)).toBeCloseTo(1.13977, 6);
    expect(-2 * (far?.[1] ?? 0)).toBeCloseTo(2.644423, 6);
  });
});

describe('finishedWedge', () => {
  it('covers the ring area of the worked example with 20 pointed wedges', () => {
    expect(20 * areaOf(finishedWedge(shapeOf('pointed')))).toBeCloseTo(102.865027, 5);
  });

  it('covers a regular polygon ring with flat wedges', () => {
    const tan = Math.tan(Math.PI / 20);
    expect(20 * areaOf(finishedWedge(shapeOf('flat')))).toBeCloseTo(
      20 * tan * (6.5 ** 2 - 2 ** 2),
      9,
    );
  });

  it('covers a half circle at a rounded tip, to a hundredth of its area', () => {
    const shape = shapeOf('rounded');
    const tan = Math.tan(Math.PI / 20);
    const radius = shape.shoulderIn * tan;
    const exact = tan * (shape.shoulderIn ** 2 - 4) + (Math.PI / 2) * radius ** 2;
    expect(areaOf(finishedWedge(shape)) / exact).toBeCloseTo(1, 2);
  });

  it('has a tip of every shape at the reach on the axis', () => {
    for (const tip of ['pointed', 'rounded', 'flat'] as const) {
      const outline = finishedWedge(shapeOf(tip));
      expect(Math.max(...outline.map(([x]) => x))).toBeCloseTo(6.5, 9);
    }
  });

  it('makes a right angle at a pointed tip for every ring', () => {
    fc.assert(
      fc.property(fc.integer({ min: 5, max: 60 }), (wedges) => {
        const [, before, tip, after] = finishedWedge(shapeOf('pointed', wedges));
        const one = [(before?.[0] ?? 0) - (tip?.[0] ?? 0), (before?.[1] ?? 0) - (tip?.[1] ?? 0)];
        const two = [(after?.[0] ?? 0) - (tip?.[0] ?? 0), (after?.[1] ?? 0) - (tip?.[1] ?? 0)];
        expect((one[0] ?? 0) * (two[0] ?? 0) + (one[1] ?? 0) * (two[1] ?? 0)).toBeCloseTo(0, 9);
      }),
    );
  });
});

describe('placeWedge', () => {
  it('lets the shoulders of neighbours meet, at the radius of the worked example', () => {
    const shape = shapeOf('pointed');
    const first = placeWedge(shape, 0, finishedWedge(shape));
    const second = placeWedge(shape, 1, finishedWedge(shape));
    const after = first.at(-2) ?? [0, 0];
    const before = second[1] ?? [9, 9];
    expect(after[0]).toBeCloseTo(before[0], 9);
    expect(after[1]).toBeCloseTo(before[1], 9);
    expect(distance(after)).toBeCloseTo(5.681208, 6);
  });

  it('starts at 12 o’clock and goes clockwise, with edges on the axes', () => {
    const shape = shapeOf('pointed');
    const first = placeWedge(shape, 0, finishedWedge(shape));
    expect(first[0]?.[0]).toBeCloseTo(0, 9);
    expect(first[0]?.[1]).toBeLessThan(0);
    const fifth = placeWedge(shape, 5, finishedWedge(shape));
    expect(fifth[0]?.[1]).toBeCloseTo(0, 9);
    expect(fifth[0]?.[0]).toBeGreaterThan(0);
  });

  it('touches the next wedge for any ring and tip', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 5, max: 60 }),
        fc.constantFrom('pointed' as const, 'rounded' as const, 'flat' as const),
        (wedges, tip) => {
          const shape = shapeOf(tip, wedges);
          const last = placeWedge(shape, wedges - 1, finishedWedge(shape));
          const first = placeWedge(shape, 0, finishedWedge(shape));
          expect(last.at(-2)?.[0]).toBeCloseTo(first[1]?.[0] ?? 9, 9);
          expect(last.at(-2)?.[1]).toBeCloseTo(first[1]?.[1] ?? 9, 9);
        },
      ),
    );
  });
});

describe('preparedWedge', () => {
  it('is as wide at its folded end as the worked example says', () => {
    const shape = shapeOf('pointed');
    expect(2 * rawHalf(shape, rawShoulder(shape))).toBeCloseTo(2.21449, 5);
    expect(boundsOf(preparedWedge(shape)).height).toBeCloseTo(2.21449, 5);
  });

  it('keeps the finished side where it is joined already', () => {
    const outline = preparedWedge(shapeOf('pointed'), false, true);
    expect(outline[1]?.[0]).toBeCloseTo(5.611263, 6);
    expect(outline.at(-2)?.[0]).toBeLessThan(5.611263);
  });
});

describe('tipFlap', () => {
  it('reaches down the axis by half the raw width at the reach', () => {
    const shape = shapeOf('pointed');
    expect(tipFlap(shape)[2]?.[0]).toBeCloseTo(
      6.5 - (2.058998 / 2 + 0.25 / Math.cos(Math.PI / 20)),
      6,
    );
  });
});

describe('levelWedge', () => {
  it('lays the raw edge level, a seam allowance below the seam on y = 0', () => {
    const outline = levelWedge(shapeOf('pointed'));
    const lowest = outline.map(([, y]) => y).sort((a, b) => b - a);
    expect(lowest[0]).toBeCloseTo(0.25, 9);
    expect(lowest[1]).toBeCloseTo(0.25, 9);
  });
});

describe('seamAllowance', () => {
  it('is a seam allowance wide beside the side seam', () => {
    const shape = shapeOf('pointed');
    const [seamAt, , , rawAt] = seamAllowance(shape, 1);
    const wide = ((rawAt?.[1] ?? 0) - (seamAt?.[1] ?? 0)) * Math.cos(shape.halfAngleRad);
    expect(wide).toBeCloseTo(0.25, 9);
  });
});
