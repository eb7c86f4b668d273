import { describeStep } from '@/components/diagrams/describe-step';
import { STEP_ROLES, type StepRole } from '@/shared/model/codes';
import { fabricsFor, ringPlan } from '../../support/ring-plan';

/** Sentence of the first lane of a step of the 16 in plate. */
function sentence(role: StepRole, done = 0, plan = ringPlan()): string {
  const step = plan.steps.find((each) => each.role === role);
  if (!step) throw new Error(`no ${role}`);
  return describeStep(plan, step, step.lanes[0] ?? null, done);
}

const SENTENCES: [StepRole, string][] = [
  ['strip', 'A strip of A, 5½ in high, across the 42 in of the cloth.'],
  ['length', 'A strip of A, 5½ in high. A length of 12 in from it.'],
  ['stack', '4 layers, lightest on top: A, B, C, D.'],
  [
    'cut',
    'A length of 12 in, 5½ in high. 4 wedges, every other one turned, 1.31 in narrow and 3.49',
  ],
  ['tip-sew', '¼ in from its edge, from the fold to the open edges.'],
  ['tip-trim', 'Trim its allowance from ¼ in to ⅛ in'],
  ['tip-turn', 'pressed to a square corner'],
  ['pair', 'Pairs in a chain, B on top of A, right sides together.'],
  ['quarter', 'A quarter from A B, then C D, clockwise. One seam, ¼ in'],
  ['half', 'A half from A B C D, then A B C D, clockwise.'],
  ['ring', 'The ring from A B C D A B C D, then A B C D A B C D, clockwise. 2 seams'],
  ['ring-press', 'Both seam allowances are pressed open'],
  ['circle-cut', 'A circle 5⅝ in across, drawn on a 6 in square.'],
  ['circle-turn', 'turned ¼ in to the back over a template: 5.08 in across.'],
  ['background-cut', 'A square of Z, 17½ in each way'],
  ['background-fold', 'The 17½ in background folded in half'],
  ['applique', 'four of its seams on the fold lines'],
  ['block-trim', '16½ in: 8¼ in each way from its centre.'],
];

describe('describeStep', () => {
  it.each(SENTENCES)('says what %s shows, with the plan’s own numbers', (role, words) => {
    expect(sentence(role)).toContain(words);
  });

  it('says how far the stack is cut, and what is next', () => {
    expect(sentence('cut', 2)).toContain('2 cut, next is 3.');
    expect(sentence('cut', 4)).toContain('All 4 cut.');
  });

  it('says where an open hole is stitched', () => {
    expect(sentence('stay-stitch', 0, ringPlan({ centre: 'none' }))).toBe(
      'A line of stitches around the open hole, on the ¼ in that is turned under.',
    );
  });

  it('says which way a seam is pressed to one side', () => {
    expect(sentence('ring-press', 0, ringPlan({ press: 'side' }))).toContain('toward B');
  });

  it('counts the seams of a half with a single wedge', () => {
    const plan = ringPlan({ wedges: 18, fabrics: fabricsFor(3) });
    expect(sentence('half', 0, plan)).toContain('4 seams');
    expect(sentence('applique', 0, plan)).toContain('its first seam on a fold line');
  });

  it('has a sentence for every role', () => {
    const said = new Set<string>(SENTENCES.map(([role]) => role));
    expect(STEP_ROLES.filter((role) => !said.has(role))).toEqual(['stay-stitch']);
  });
});
