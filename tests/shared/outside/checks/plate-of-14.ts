import { stripRun } from '../../../../shared/cutting/strip-run';
import { wedgesPerStrip } from '../../../../shared/cutting/wedges-per-strip';
import { finishedHalfWidth } from '../../../../shared/geometry/finished-half-width';
import { foldedRawWidth } from '../../../../shared/geometry/folded-raw-width';
import { halfAngle } from '../../../../shared/geometry/half-angle';
import { ringArea } from '../../../../shared/geometry/ring-area';
import { seamDrift } from '../../../../shared/geometry/seam-drift';
import { shoulder } from '../../../../shared/geometry/shoulder';
import type { Plan } from '../../../../shared/model/plan';
import { defaultRequest, type RingChoices } from '../../../../shared/plan/default-request';
import { toFraction } from '../../../../shared/units/fraction';
import { choices, planOf } from '../../support/plans';
import type { Checks } from '../rows';

const MILLIONTH = 6;

function plate(changes: Partial<RingChoices> = {}): Plan {
  const base = { block: '14', wedges: 20, narrowAt: '2', stripHeight: '19/4', ...changes };
  return planOf(defaultRequest(choices(base)));
}

const reachIn = () => toFraction(plate().geometry.ring.reach).valueOf();

/** The worked example of the ring: every figure typed from it, ours from the plan where it has it. */
export const plateChecks: Checks = {
  'plate14.angle': () => expect((halfAngle(20) * 180) / Math.PI).toBeCloseTo(9, 12),

  'plate14.widths': () => {
    const { cutNarrow, cutWide } = plate().geometry.wedge;
    expect(cutNarrow.exact).toBeCloseTo(1.13977, MILLIONTH);
    expect(cutWide.exact).toBeCloseTo(2.644423, MILLIONTH);
    expect(cutWide.exact - cutNarrow.exact).toBeCloseTo(1.504652, MILLIONTH);
  },

  'plate14.pitch': () =>
    expect(plate().geometry.wedge.pitch.exact).toBeCloseTo(1.892096, MILLIONTH),

  'plate14.strip-of-42': () => {
    expect(plate().geometry.wedge.perStrip).toBe(21);
    expect(plate().geometry.wedge.stripLeft.exact).toBeCloseTo(1.513649, MILLIONTH);
  },

  'plate14.strip-of-40': () => {
    const { perStrip, stripLeft, cutWide, pitch } = plate({ usableWidth: '40' }).geometry.wedge;
    expect(perStrip).toBe(20);
    expect(stripLeft.exact).toBeCloseTo(1.405746, MILLIONTH);
    expect(wedgesPerStrip(40, cutWide.exact, pitch.exact)).toBe(20);
    expect(40 - stripRun(20, cutWide.exact, pitch.exact)).toBeCloseTo(1.405746, MILLIONTH);
  },

  'plate14.one-strip': () => {
    const fabrics = choices().fabrics.filter(({ letter }) => letter === 'A' || letter === 'F');
    for (const usableWidth of ['42', '40']) {
      const [cloth] = plate({ fabrics, usableWidth }).fabrics;
      expect(cloth?.strips.find((strip) => strip.for === 'wedge')?.count).toBe(1);
    }
  },

  'plate14.reach': () => expect(plate().geometry.ring.reach).toBe('13/2'),

  'plate14.seam-line': () =>
    expect(2 * finishedHalfWidth(reachIn(), 20)).toBeCloseTo(2.058998, MILLIONTH),

  'plate14.shoulder': () => {
    expect(plate().geometry.ring.shoulderAt?.exact).toBeCloseTo(5.611263, MILLIONTH);
    expect(shoulder(reachIn(), 20).belowTipIn).toBeCloseTo(0.888737, MILLIONTH);
  },

  'plate14.shoulder-radius': () =>
    expect(plate().geometry.ring.shoulderRadius?.exact).toBeCloseTo(5.681208, MILLIONTH),

  'plate14.folded-width': () =>
    expect(foldedRawWidth(reachIn(), 20, 0.25)).toBeCloseTo(2.21449, MILLIONTH),

  'plate14.hole-and-circle': () => {
    const { ring, circle } = plate().geometry;
    expect(ring.holeCorner.exact).toBeCloseTo(2.02493, MILLIONTH);
    expect(circle?.finishedRadius.exact).toBeCloseTo(2.52493, MILLIONTH);
  },

  'plate14.margin': () => {
    const { margin, marginSeamsOnFolds } = plate().geometry.ring;
    expect(margin).toBe('1/2');
    expect(marginSeamsOnFolds?.exact).toBeCloseTo(0.580026, MILLIONTH);
  },

  'plate14.area': () =>
    expect(ringArea('pointed', 2, reachIn(), 20)).toBeCloseTo(102.865027, MILLIONTH),

  // trimmed from the centre, half of it each way
  'plate14.background': () => {
    expect(plate().geometry.background).toEqual({ cut: '31/2', trim: '29/2' });
    const trimmed = plate().steps.find(({ role }) => role === 'block-trim');
    expect(trimmed?.title.params).toEqual({ trim: '29/2', fromCentre: '29/4' });
  },

  'plate14.drift': () => expect(seamDrift(1 / 32, 20)).toBeCloseTo(0.199764, MILLIONTH),
};
