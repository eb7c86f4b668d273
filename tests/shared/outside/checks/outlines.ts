import * as fc from 'fast-check';

import { finishedHalfWidth } from '../../../../shared/geometry/finished-half-width';
import { offsetPolygon } from '../../../../shared/geometry/offset-polygon';
import type { Point } from '../../../../shared/geometry/point';
import { wedgeOutline } from '../../../../shared/geometry/wedge-outline';
import { defaultRequest } from '../../../../shared/plan/default-request';
import { clipperOffset, cornerAngle, farthestApart } from '../../support/clipper-offset';
import { choices, planOf } from '../../support/plans';
import type { Checks } from '../rows';

const NEAR_IN = 1e-4;
const SHARPEST = Math.PI / 12; // 15°: sharper corners are no patchwork

/** Finished between its seams, both ends a seam inside the raw ones. */
function finishedWedge(fromIn: number, toIn: number, wedges: number): Point[] {
  const near = finishedHalfWidth(fromIn, wedges);
  const far = finishedHalfWidth(toIn, wedges);
  return [
    [fromIn, -near],
    [toIn, -far],
    [toIn, far],
    [fromIn, near],
  ];
}

/** Convex polygons: corners on an ellipse, in order, none too near to the next or too sharp. */
const convexPolygons: fc.Arbitrary<Point[]> = fc
  .record({
    steps: fc.array(fc.double({ min: 0.3, max: 1, noNaN: true }), { minLength: 3, maxLength: 9 }),
    widthIn: fc.double({ min: 1, max: 8, noNaN: true }),
    heightIn: fc.double({ min: 1, max: 8, noNaN: true }),
    backwards: fc.boolean(),
  })
  .map(({ steps, widthIn, heightIn, backwards }) => {
    const sum = steps.reduce((total, step) => total + step, 0);
    let angle = 0;
    const corners = steps.map((step): Point => {
      angle += (step / sum) * 2 * Math.PI;
      return [widthIn * Math.cos(angle), heightIn * Math.sin(angle)];
    });
    return backwards ? corners.reverse() : corners;
  })
  .filter((corners) => corners.every((_, index) => cornerAngle(corners, index) > SHARPEST));

/** Wedges and other pieces against another implementation: clipper-lib 6.4.2. */
export const outlineChecks: Checks = {
  'ring.outline': () => {
    for (let n = 8; n <= 24; n += 1) {
      const outline = wedgeOutline(2, 7.5, n, 0.25);
      const theirs = clipperOffset(finishedWedge(2.25, 7.25, n), 0.25);
      expect(farthestApart(outline, theirs)).toBeLessThan(NEAR_IN);
      // and as a plan carries it
      const plan = planOf(
        defaultRequest(choices({ block: '16', wedges: n, narrowAt: '2', stripHeight: '11/2' })),
      );
      expect(farthestApart(plan.geometry.wedge.outline, theirs)).toBeLessThan(NEAR_IN);
    }
  },

  'ring.polygons': () => {
    fc.assert(
      fc.property(
        convexPolygons,
        fc.double({ min: 0.05, max: 0.75, noNaN: true }),
        (corners, allowanceIn) => {
          const ours = offsetPolygon(corners, allowanceIn);
          const theirs = clipperOffset(corners, allowanceIn);
          expect(farthestApart(ours, theirs)).toBeLessThan(NEAR_IN);
        },
      ),
      { numRuns: 300 },
    );
  },
};
