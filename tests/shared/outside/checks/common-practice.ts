import { wedgesPerStrip } from '../../../../shared/cutting/wedges-per-strip';
import { placeAtAngle, wedgeAngle } from '../../../../shared/geometry/drawing/place-wedge';
import { ringShape } from '../../../../shared/geometry/drawing/ring-shape';
import { halfAngle } from '../../../../shared/geometry/half-angle';
import type { StepRole } from '../../../../shared/model/codes';
import type { Plan } from '../../../../shared/model/plan';
import { ringLetters } from '../../../../shared/patterns/ring/ring-letters';
import { ringUnits } from '../../../../shared/patterns/ring/ring-units';
import { defaultRequest, type RingChoices } from '../../../../shared/plan/default-request';
import { choices, fabricsAToZ, planOf } from '../../support/plans';
import type { Checks } from '../rows';

/** 12-inch plate of 20: r0 = (4½/2 − ¾)·cos 9° = 1.4815, so that the drawn circle is its cut edge. */
function plateOf12(changes: Partial<RingChoices> = {}): Plan {
  const sizes = { block: '12', narrowAt: '2963/2000', stripHeight: '17/4', trimAllowance: '1/2' };
  return planOf(defaultRequest(choices({ ...sizes, ...changes })));
}

/** 18-inch plate of 20: r0 = (6½/2 − ¾)·cos 9° = 2.4692. */
function plateOf18(): Plan {
  const sizes = { block: '18', narrowAt: '6173/2500', stripHeight: '6', trimAllowance: '1/2' };
  return planOf(defaultRequest(choices(sizes)));
}

const stepOf = (plan: Plan, role: StepRole) => plan.steps.find((step) => step.role === role);
const lettersOf = (plan: Plan) => ringLetters(plan.geometry.ring.order, plan.request.wedges);

const plateChecks: Checks = {
  'practice.plate-12': () => {
    const { circle, ring, wedge, background } = plateOf12().geometry;
    expect((4.5 / 2 - 0.75) * Math.cos(halfAngle(20))).toBeCloseTo(1.4815, 4);
    expect(circle?.cutDiameter).toMatchObject({ cut: '9/2', exact: expect.closeTo(4.5, 3) });
    expect(wedge.stripHeight).toBe('17/4');
    expect(ring.reach).toBe('10963/2000'); // 5.4815
    expect(background).toEqual({ cut: '13', trim: '25/2' });
  },

  'practice.plate-18': () => {
    const { circle, ring, wedge } = plateOf18().geometry;
    expect((6.5 / 2 - 0.75) * Math.cos(halfAngle(20))).toBeCloseTo(2.4692, 4);
    expect(circle?.cutDiameter).toMatchObject({ cut: '13/2', exact: expect.closeTo(6.5, 3) });
    expect(wedge.stripHeight).toBe('6');
    expect(ring.reach).toBe('5137/625'); // 8.2192
  },

  'practice.five-fabrics': () => {
    const plan = plateOf12();
    const letters = lettersOf(plan);
    for (const letter of ['A', 'B', 'C', 'D', 'E']) {
      expect(letters.filter((other) => other === letter)).toHaveLength(4);
    }
    expect(plan.stacks.map(({ cutsEach }) => cutsEach)).toEqual([4, 4]);
    expect(plan.totals.wedges).toBe(20);
  },

  'practice.piece': () => {
    const { cutWide, pitch } = plateOf12().geometry.wedge;
    expect(wedgesPerStrip(9.5, cutWide.exact, pitch.exact)).toBeGreaterThanOrEqual(4);
  },
};

const sewingChecks: Checks = {
  'practice.tip-trim': () => {
    expect(stepOf(plateOf12(), 'tip-sew')?.settings).toMatchObject({ seam: '1/4' });
    expect(stepOf(plateOf12(), 'tip-trim')?.title.params).toEqual({ trimmed: '1/8' });
  },

  'practice.circle-stitch': () =>
    expect(stepOf(plateOf12(), 'applique')?.settings?.stitchMm).toBe('9/5'),

  'practice.stay-stitch': () => {
    const open = plateOf12({ centre: 'none' });
    expect(stepOf(open, 'stay-stitch')?.settings?.stitchMm).toBe('2');
    const at = (role: StepRole) => stepOf(open, role)?.position ?? 0;
    expect(at('stay-stitch')).toBeLessThan(at('applique'));
  },

  'practice.dominant': () => {
    const plan = plateOf12({ fabrics: fabricsAToZ(5, 'B') });
    const shape = ringShape(plan);
    const angles = lettersOf(plan).flatMap((letter, index) =>
      letter === 'B' ? [(wedgeAngle(shape, index) * 180) / Math.PI] : [],
    );
    expect(angles).toEqual([45, 135, 225, 315].map((angle) => expect.closeTo(angle, 9)));
    // a point up the axis of the first is drawn as far right as up
    const [[x, y] = [0, 0]] = placeAtAngle([[5, 0]], wedgeAngle(shape, 2));
    expect(x).toBeCloseTo(-y, 9);
    expect(x).toBeGreaterThan(0);
  },

  'practice.quarter-seams': () => {
    const plan = plateOf12();
    const shape = ringShape(plan);
    const quarters = ringUnits(lettersOf(plan)).parts.flatMap(({ parts }) => parts);
    expect(quarters.map(({ kind }) => kind)).toEqual(Array(4).fill('quarter'));
    let first = 0;
    const seams = quarters.map(({ letters }) => {
      const angle = wedgeAngle(shape, first) - halfAngle(20);
      first += letters.length;
      return (angle * 180) / Math.PI;
    });
    expect(seams).toEqual([0, 90, 180, 270].map((angle) => expect.closeTo(angle, 9)));
    expect(stepOf(plan, 'background-fold')).toBeDefined();
  },

  'practice.press-open': () => {
    expect(plateOf12().request.press).toBe('open');
    expect(stepOf(plateOf12(), 'ring-press')?.title.params).toEqual({ press: 'open' });
  },
};

/** What makers do, with no source: sizes of two plates, and how they are sewn. */
export const practiceChecks: Checks = { ...plateChecks, ...sewingChecks };
