import {
  cautionText,
  laneName,
  madeWord,
  mistakeText,
  stepTitle,
  stepWhy,
  unitWord,
} from '@/components/steps/messages';
import { pieceSizes } from '@/components/steps/piece-sizes';
import { stepFacts, stitchText } from '@/components/steps/step-facts';
import { countItem } from '@/components/steps/item-words';
import { CAUTIONS, MISTAKES, STEP_ROLES, type StepRole } from '@/shared/model/codes';
import type { Plan, PlanStep } from '@/shared/model/plan';
import type { RingChoices } from '@/shared/plan/default-request';
import { makePlan } from '@/shared/plan/make-plan';
import { formatFraction } from '@/shared/units/format-fraction';

import { ringRequest } from '../projects/fake-projects-client';

function planOf(choices: Partial<RingChoices> = {}): Plan {
  const made = makePlan(ringRequest(choices));
  if (!made.ok) throw new Error('refused');
  return made.value;
}

const PLANS = [
  planOf(),
  planOf({ tip: 'rounded', applique: 'hand', press: 'side' }),
  planOf({ tip: 'flat', centre: 'none' }),
  planOf({ circleEdge: 'fused' }),
];
const STEPS = PLANS.flatMap((plan) => plan.steps.map((step) => ({ plan, step })));

function stepOf(role: StepRole, plan: Plan = planOf()): PlanStep {
  const step = plan.steps.find((each) => each.role === role);
  if (!step) throw new Error(`no ${role}`);
  return step;
}

it('has a title, a reason and words for every role', () => {
  expect(new Set(STEPS.map(({ step }) => step.role))).toEqual(new Set(STEP_ROLES));
  for (const { plan, step } of STEPS) {
    expect(stepTitle(step)).toMatch(/^[A-Z].{8,}/);
    expect(stepWhy(step, plan).length).toBeGreaterThan(40);
    expect(`${unitWord(step.role, 1)} ${madeWord(step.role)}`).toMatch(/^\w+ [\w-]+$/);
  }
});

it('writes no gap where a value belongs', () => {
  for (const { plan, step } of STEPS) {
    const words = [stepTitle(step), stepWhy(step, plan), ...stepFacts(step)].join(' ');
    expect(words).not.toMatch(/undefined|NaN|null|Infinity| {2}/);
  }
});

it('shows every size and number that a step carries, in its title, reason or chips', () => {
  for (const { plan, step } of STEPS) {
    const words = [stepTitle(step), stepWhy(step, plan), ...stepFacts(step)].join(' ');
    for (const [name, value] of Object.entries(step.title.params)) {
      const isLength = typeof value === 'string' && /^\d/.test(value);
      const shown = isLength ? formatFraction(value) : String(value);
      if (isLength || typeof value === 'number') {
        expect(`${step.role} ${name}: ${words}`).toContain(shown);
      }
    }
  }
});

it('changes its words with the shape, the pressing and the hand that a step names', () => {
  expect(stepTitle(stepOf('tip-turn'))).toBe('Turn the tips and press them');
  expect(stepTitle(stepOf('tip-turn', PLANS[1]))).toBe('Turn the tips over a template');
  expect(stepTitle(stepOf('ring-press'))).toBe('Press the ring seams open');
  expect(stepTitle(stepOf('ring-press', PLANS[1]))).toBe('Press the ring seams to one side');
  expect(stepTitle(stepOf('applique'))).toBe('Stitch ring and circle to the background');
  expect(stepTitle(stepOf('applique', PLANS[1]))).toContain(', by hand');
  expect(stepTitle(stepOf('applique', PLANS[2]))).toBe('Stitch ring to the background');
  expect(stepTitle(stepOf('circle-turn', PLANS[3]))).toBe('Back the circle with fusible web');
});

it('speaks with real sizes', () => {
  expect(stepTitle(stepOf('cut'))).toBe('Cut 4 wedges from each stack');
  expect(stepTitle(stepOf('strip'))).toBe('Cut strips 4 in tall');
  expect(stepTitle(stepOf('tip-trim'))).toBe('Trim the tip seam to ⅛ in');
  expect(stepWhy(stepOf('cut'), planOf())).toContain('0.98 in at the narrow edge and 2.25 in');
  expect(pieceSizes('wedge:A', planOf()).cut).toBe('0.98 to 2.25 in wide, 4 in high');
});

it('has a text for every caution and every mistake', () => {
  for (const code of CAUTIONS) expect(cautionText(code)).toMatch(/^[A-Z].*\.$/);
  for (const code of MISTAKES) expect(mistakeText(code)).toMatch(/^[A-Z].*\.$/);
});

it('names a lane by its fabrics', () => {
  const cut = stepOf('cut');
  const pair = stepOf('pair');
  const [stack] = cut.lanes;
  const [first] = pair.lanes;
  if (!stack || !first) throw new Error('no lanes');
  expect(laneName(cut, stack)).toBe('Stack A B C D E');
  expect(laneName(cut, { ...stack, makes: { 'wedge:D': 1 } })).toBe('D, 1 layer');
  expect(laneName(pair, first)).toBe('Pair A+C');
});

it('counts items in words', () => {
  expect(countItem('tip:A', 4)).toBe('4 turned tips in A');
  expect(countItem('half', 1)).toBe('1 half');
  for (const { step } of STEPS) {
    for (const lane of step.lanes) {
      for (const item of [...Object.keys(lane.consumes), ...Object.keys(lane.makes)]) {
        expect(countItem(item, 2)).not.toContain('×');
      }
    }
  }
});

it('writes a stitch in millimetres and stitches an inch', () => {
  expect(stitchText('21/10')).toBe('2.1 mm (12 per inch)');
  expect(stitchText('9/5')).toBe('1.8 mm (14 per inch)');
  expect(stitchText('2')).toBe('2.0 mm (13 per inch)');
});
