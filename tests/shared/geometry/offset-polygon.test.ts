import { halfAngle } from '../../../shared/geometry/half-angle';
import { offsetPolygon } from '../../../shared/geometry/offset-polygon';
import type { Point } from '../../../shared/geometry/point';
import { polygonArea } from '../../../shared/geometry/polygon-area';
import { wedgeOutline } from '../../../shared/geometry/wedge-outline';
import { InvariantError } from '../../../shared/result';
import { clipperOffset, farthestApart } from '../support/clipper-offset';

function expectSameCorners(ours: readonly Point[], theirs: readonly Point[]): void {
  expect(theirs).toHaveLength(ours.length);
  expect(farthestApart(ours, theirs)).toBeLessThan(1e-4);
}

const square: Point[] = [
  [0, 0],
  [3, 0],
  [3, 3],
  [0, 3],
];

describe('offsetPolygon', () => {
  it('agrees with clipper-lib on squares, triangles, diamonds and hexagons', () => {
    const pieces: Point[][] = [
      square,
      [
        [0, 0],
        [3, 0],
        [0, 3],
      ],
      [
        [0, 0],
        [2, 0],
        [2 + Math.SQRT2, Math.SQRT2],
        [Math.SQRT2, Math.SQRT2],
      ],
      Array.from({ length: 6 }, (_, k): Point => [
        Math.cos((k * Math.PI) / 3),
        Math.sin((k * Math.PI) / 3),
      ]),
    ];
    for (const piece of pieces) {
      expectSameCorners(offsetPolygon(piece, 0.25), clipperOffset(piece, 0.25));
    }
  });

  it('makes a 3-inch half-square triangle from a 3⅞ square', () => {
    // "Allowing for Seam Allowances", docslib.org document 4718373
    const raw = offsetPolygon(
      [
        [0, 0],
        [3, 0],
        [0, 3],
      ],
      0.25,
    );
    const legIn = Math.max(...raw.map(([x]) => x)) - Math.min(...raw.map(([x]) => x));
    expect(legIn).toBeCloseTo(3.853553, 6); // 3 + ¼(2 + √2), ⅞ in the trade
    expect(Math.ceil(legIn * 8) / 8).toBe(3.875);
  });

  it('keeps the order of the corners, either way round', () => {
    const [first] = offsetPolygon(square, 0.25);
    expect(first?.map((value) => value.toFixed(6))).toEqual(['-0.250000', '-0.250000']);
    const [back] = offsetPolygon([...square].reverse(), 0.25);
    expect(back?.map((value) => value.toFixed(6))).toEqual(['-0.250000', '3.250000']);
  });

  it('gives each edge its own allowance', () => {
    expect(polygonArea(offsetPolygon(square, [0, 0.25, 0, 0.25]))).toBeCloseTo(3 * 3.5, 12);
  });

  it('refuses what is no piece', () => {
    expect(() =>
      offsetPolygon(
        [
          [0, 0],
          [1, 0],
        ],
        0.25,
      ),
    ).toThrow(InvariantError);
    expect(() =>
      offsetPolygon(
        [
          [0, 0],
          [1, 0],
          [2, 0],
          [0, 3],
        ],
        0.25,
      ),
    ).toThrow(InvariantError);
  });
});

describe('wedgeOutline', () => {
  const counts = Array.from({ length: 17 }, (_, index) => index + 8);

  it.each(counts)('of one of %i wedges agrees with clipper-lib’s mitre offset', (n) => {
    // finished between its seams, open at both ends: the raw ends lie a seam farther out
    const finishedHalf = (x: number) => x * Math.tan(halfAngle(n));
    const finished: Point[] = [
      [2.25, -finishedHalf(2.25)],
      [7.25, -finishedHalf(7.25)],
      [7.25, finishedHalf(7.25)],
      [2.25, finishedHalf(2.25)],
    ];
    const outline = wedgeOutline(2, 7.5, n, 0.25);
    expectSameCorners(outline, clipperOffset(finished, 0.25));
    expectSameCorners(outline, offsetPolygon(finished, 0.25));
  });
});
