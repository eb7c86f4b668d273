import { Fraction } from 'fraction.js';

import { stripRun } from '../../../../shared/cutting/strip-run';
import { wedgePitch } from '../../../../shared/cutting/wedge-pitch';
import { joinedWidth } from '../../../../shared/finishing/joined-width';
import { cutHalfWidth } from '../../../../shared/geometry/cut-half-width';
import { tumblingPieces, tumblingRun } from '../../../../shared/geometry/drawing/tumbling';
import { halfAngle } from '../../../../shared/geometry/half-angle';
import { ringArea } from '../../../../shared/geometry/ring-area';
import { rowDrift } from '../../../../shared/geometry/row-drift';
import { shoulder } from '../../../../shared/geometry/shoulder';
import { tipFlap } from '../../../../shared/geometry/tip-flap';
import { defaultRequest, type RingChoices } from '../../../../shared/plan/default-request';
import { toText } from '../../../../shared/units/fraction';
import { choices, fabricsAToZ, planOf, refusalsOf } from '../../support/plans';
import type { Checks } from '../rows';

const MILLIONTH = 6;
const COUNTS = Array.from({ length: 56 }, (_, index) => index + 5);

const ask = (changes: Partial<RingChoices>) => defaultRequest(choices(changes));
const codesOf = (changes: Partial<RingChoices>) => refusalsOf(ask(changes)).map(({ code }) => code);
const warningsOf = (changes: Partial<RingChoices>) => planOf(ask(changes)).warnings;

function expectWidths(wedges: number, from: number, to: number, narrow: number, wide: number) {
  expect(2 * cutHalfWidth(from, wedges, 0.25)).toBeCloseTo(narrow, MILLIONTH);
  expect(2 * cutHalfWidth(to, wedges, 0.25)).toBeCloseTo(wide, MILLIONTH);
}

const shapeChecks: Checks = {
  'ring.widths-12': () => expectWidths(12, 1, 9, 1.053536, 5.340724),
  'ring.widths-20': () => expectWidths(20, 1.5, 6, 0.981386, 2.406846),
  'ring.widths-16': () => expectWidths(16, 2, 8, 1.305445, 3.692393),

  'ring.angles': () => {
    for (const n of COUNTS) {
      const { atIn, halfWidthIn } = shoulder(7, n);
      const finishedAngle = 2 * Math.atan2(halfWidthIn, atIn);
      expect((n * finishedAngle * 180) / Math.PI).toBeCloseTo(360, 9);
    }
  },

  'ring.flat-area': () => {
    for (const n of COUNTS) {
      const expected = n * Math.tan(Math.PI / n) * (7 ** 2 - 2 ** 2);
      expect(ringArea('flat', 2, 7, n)).toBeCloseTo(expected, 9);
    }
  },

  'ring.tip-area': () => {
    for (const n of COUNTS) {
      const tan = Math.tan(Math.PI / n);
      const x = 7 / (1 + tan);
      const trapezoid = tan * (x ** 2 - 2 ** 2);
      expect(ringArea('pointed', 2, 7, n)).toBeCloseTo(n * (trapezoid + (x * tan) ** 2), 9);
      const halfCircle = (Math.PI * (x * tan) ** 2) / 2;
      expect(ringArea('rounded', 2, 7, n)).toBeCloseTo(n * (trapezoid + halfCircle), 9);
    }
  },

  'ring.right-angle': () => {
    for (const n of COUNTS) {
      const { atIn, halfWidthIn } = shoulder(7, n);
      const foldAngle = Math.atan2(halfWidthIn, 7 - atIn);
      expect((2 * foldAngle * 180) / Math.PI).toBeCloseTo(90, 9);
    }
  },

  'ring.rounded': () => {
    for (const n of COUNTS) {
      const { atIn, halfWidthIn } = shoulder(7, n);
      expect(atIn + halfWidthIn).toBeCloseTo(7, 12);
    }
    const pointed = planOf(ask({ tip: 'pointed' })).geometry.ring.reach;
    expect(planOf(ask({ tip: 'rounded' })).geometry.ring.reach).toBe(pointed);
  },

  'ring.shoulders': () => {
    for (const n of COUNTS) {
      const { atIn, halfWidthIn, radiusIn } = shoulder(7, n);
      expect(radiusIn * Math.cos(halfAngle(n))).toBeCloseTo(atIn, 12);
      expect(radiusIn * Math.sin(halfAngle(n))).toBeCloseTo(halfWidthIn, 12);
    }
  },
};

const limitChecks: Checks = {
  // shoulder (2 + H − ¼)/(1 + tan 9°) beyond 2 only from H = 0.567
  'ring.below-hole': () => {
    const short = { narrowAt: '2', centre: 'none' } as const;
    expect(codesOf({ ...short, stripHeight: '9/16' })).toContain('tip-below-hole');
    expect(codesOf({ ...short, stripHeight: '5/8' })).not.toContain('tip-below-hole');
  },

  // R = 3: 3 − (3·tan 36° + ¼/cos 36°) = 0.511
  'ring.flap': () => {
    expect(tipFlap(3, 5, 0.25)).toBeCloseTo(0.511, 3);
    const few = { wedges: 5, centre: 'none', narrowAt: '1', stripHeight: '9/4' } as const;
    expect(warningsOf({ ...few, fabrics: fabricsAToZ(5) }).map(({ code }) => code)).toContain(
      'flapBelowHole',
    );
    expect(warningsOf({}).map(({ code }) => code)).not.toContain('flapBelowHole');
  },

  'ring.flat-corners': () => {
    const { margin } = planOf(ask({ tip: 'flat', block: '16', stripHeight: '5' })).geometry.ring;
    // R = 2 + 5 − ¼
    expect(margin).toMatchObject({ exact: expect.closeTo(8 - 6.75 / Math.cos(Math.PI / 20), 8) });
  },

  // the circle's edge is at 2/cos 9° + ½ = 2.525, so H from 2.525·1.158 + ¼ − 2 = 1.175
  'ring.circle-over-tips': () => {
    expect(codesOf({ narrowAt: '2', stripHeight: '9/8' })).toContain('circle-over-tips');
    expect(codesOf({ narrowAt: '2', stripHeight: '5/4' })).not.toContain('circle-over-tips');
  },

  'ring.never-rounded': () => {
    const { wedge } = planOf(ask({})).geometry;
    for (const length of [wedge.cutNarrow, wedge.cutWide, wedge.pitch]) {
      expect(length.policy).toBe('template');
    }
    const turned = wedge.cutWide.exact - wedge.cutNarrow.exact;
    expect(turned).toBeCloseTo(2 * 4 * Math.tan(Math.PI / 20), 8); // H = 4: its angle is kept
  },
};

const stripAndOrderChecks: Checks = {
  'ring.tumbling-run': () => {
    const [narrowIn, wideIn] = [1.13977, 2.644423];
    const pitchIn = wedgePitch(narrowIn, wideIn, false);
    for (const count of [1, 2, 3, 4, 20, 21]) {
      const laid = tumblingPieces({
        narrowIn,
        wideIn,
        heightIn: 4,
        count,
        startIn: 0,
        oneWay: false,
      });
      expect(tumblingRun(laid)).toBeCloseTo(wideIn + (count - 1) * pitchIn, 9);
      expect(stripRun(count, wideIn, pitchIn)).toBeCloseTo(tumblingRun(laid), 9);
    }
  },

  'ring.one-way': () => {
    const pitchIn = wedgePitch(1.13977, 2.644423, true);
    for (const count of [1, 4, 15]) {
      expect(stripRun(count, 2.644423, pitchIn)).toBeCloseTo(count * 2.644423, 9);
    }
  },

  'ring.quarters': () => {
    for (const n of COUNTS) {
      const roles = planOf(ask({ wedges: n, block: '16' })).steps.map(({ role }) => role);
      // two wedges to a quarter are a pair already
      expect(roles.includes('quarter')).toBe(n % 4 === 0 && n > 8);
    }
  },

  // the axis of wedge j is at (2j + 1)θ from 12 o'clock
  'ring.diagonals': () => {
    for (const n of [8, 12, 16, 24, 28, 32]) {
      const axes = Array.from({ length: n }, (_, j) => (2 * j + 1) * (180 / n));
      const onDiagonals = axes.filter((axis) => Math.abs((axis % 90) - 45) < 1e-9).length;
      const fabrics = fabricsAToZ(4, 'A');
      expect(warningsOf({ wedges: n, block: '16', fabrics })).toContainEqual({
        code: 'dominantOffDiagonals',
        params: { fabric: 'A', axes: onDiagonals },
      });
      expect(onDiagonals).toBe((n / 4) % 2 === 1 ? 4 : 0);
    }
  },
};

const readChecks: Checks = {
  // nine pieces have 16 seam edges
  'ring.row-drift': () => expect(rowDrift(1 / 32, 9)).toBe(0.5),

  'ring.three-strips': () =>
    expect(toText(joinedWidth(3, new Fraction('5/2'), new Fraction('1/4')))).toBe('13/2'),

  'ring.wedge-of-20': () => {
    const difference = 2 * (cutHalfWidth(5.25, 20, 0.25) - cutHalfWidth(1, 20, 0.25));
    expect(difference).toBeCloseTo(1.346, 3);
    expect(2.375 - 1 - difference).toBeCloseTo(1 / 32, 2); // the printed widths
  },

  // 24 pieces, half of 1/16 on each edge
  'ring.seam-error': () => expect(rowDrift(1 / 32, 24)).toBe(1 + 7 / 16),
};

/** Rows of the ring, its limits and its order. */
export const ringChecks: Checks = {
  ...shapeChecks,
  ...limitChecks,
  ...stripAndOrderChecks,
  ...readChecks,
};
