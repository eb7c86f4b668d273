import type { PlanStep } from '../../../shared/model/plan';
import { CAUTIONS, MISTAKES, STEP_ROLES } from '../../../shared/model/codes';
import { defaultRequest, type RingChoices } from '../../../shared/plan/default-request';
import { choices, planOf } from '../support/plans';

const stepsOf = (changes: Partial<RingChoices>) => planOf(defaultRequest(choices(changes))).steps;
const rolesOf = (changes: Partial<RingChoices>) => stepsOf(changes).map(({ role }) => role);
const find = (steps: readonly PlanStep[], role: string) => steps.find((step) => step.role === role);

describe('the steps of a ring', () => {
  it('leave out the tips when they are flat, and join the wedges as they were cut', () => {
    const steps = stepsOf({ tip: 'flat' });
    expect(steps.map(({ role }) => role).filter((role) => role.startsWith('tip'))).toEqual([]);
    expect(find(steps, 'pair')?.lanes[0]?.consumes).toEqual({ 'wedge:A': 1, 'wedge:B': 1 });
    expect(find(steps, 'pair')?.key).toBe('pair|wedge 20 3/2 4 1/4 flat 1/4|wedge');
  });

  it('only turn a rounded tip, straight after cutting', () => {
    const steps = stepsOf({ tip: 'rounded' });
    expect(steps.map(({ role }) => role).filter((role) => role.startsWith('tip'))).toEqual([
      'tip-turn',
    ]);
    expect(find(steps, 'tip-turn')?.lanes[0]).toMatchObject({
      consumes: { 'wedge:A': 1 },
      makes: { 'tip:A': 1 },
    });
  });

  it('stay-stitch an open centre at 2 mm, with no circle', () => {
    const steps = stepsOf({ centre: 'none' });
    expect(steps.map(({ role }) => role)).not.toContain('circle-cut');
    expect(find(steps, 'stay-stitch')).toMatchObject({
      station: 'machine',
      settings: { stitchMm: '2', needle: '80/12' },
    });
    expect(find(steps, 'applique')?.lanes[0]?.consumes).toEqual({
      'ring-stayed': 1,
      'background-folded': 1,
    });
  });

  it('stitch by machine at 1.8 mm around the circle, or by hand in a chair', () => {
    expect(find(stepsOf({}), 'applique')).toMatchObject({
      station: 'machine',
      settings: { stitchMm: '9/5' },
    });
    expect(find(stepsOf({ applique: 'hand' }), 'applique')).toMatchObject({
      station: 'chair',
      settings: null,
      cautions: ['handNeedle'],
    });
  });

  it('make halves without quarters when the wedges do not come in fours', () => {
    expect(rolesOf({ wedges: 18 })).not.toContain('quarter');
    const [first] = find(stepsOf({ wedges: 18 }), 'half')?.lanes ?? [];
    expect(first?.makes).toEqual({ 'half:A+B+C+D+E+A+B+C+D': 1 });
    expect(rolesOf({ wedges: 20 })).toContain('quarter');
  });

  it('fuse a circle instead of turning its edge when asked', () => {
    const steps = stepsOf({ circleEdge: 'fused' });
    expect(find(steps, 'circle-turn')?.title.params).toEqual({ edge: 'fused' });
    // twice 1.518698 + ½, no turning: 4.037395
    expect(find(steps, 'circle-cut')?.key).toBe('circle-cut|circle 33/8 fused|circle');
  });

  it('press open unless one side is asked for', () => {
    expect(find(stepsOf({}), 'ring-press')?.title.params).toEqual({ press: 'open' });
    expect(find(stepsOf({ press: 'side' }), 'ring-press')?.title.params).toEqual({ press: 'side' });
  });

  it('use every role and no more than two cautions a step', () => {
    const steps = [...stepsOf({}), ...stepsOf({ centre: 'none', applique: 'hand' })];
    expect(new Set(steps.map(({ role }) => role))).toEqual(new Set(STEP_ROLES));
    expect(new Set(steps.flatMap(({ cautions }) => cautions))).toEqual(new Set(CAUTIONS));
    expect(new Set(steps.flatMap(({ mistakes }) => mistakes))).toEqual(new Set(MISTAKES));
    for (const { cautions } of steps) expect(cautions.length).toBeLessThanOrEqual(2);
  });
});
