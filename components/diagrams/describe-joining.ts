import type { Describe } from '@/components/diagrams/describe';
import { findUnit, plateLetters } from '@/shared/geometry/drawing/find-unit';
import { laneLetters } from '@/shared/geometry/drawing/lane-letters';
import { halfOf } from '@/shared/geometry/drawing/to-inches';
import type { StepRole } from '@/shared/model/codes';
import type { Plan } from '@/shared/model/plan';
import { formatInches } from '@/shared/units/format-fraction';

type JoiningRole = Extract<
  StepRole,
  'tip-sew' | 'tip-trim' | 'tip-turn' | 'pair' | 'quarter' | 'half' | 'ring' | 'ring-press'
>;

const tipTurning = ({ request: { tip } }: Plan) =>
  tip.shape === 'pointed' ? tip.seam : tip.turnUnder;

const tipSew: Describe = (plan) =>
  `A wedge folded along its middle, right sides together. The seam runs across the wide end, ${formatInches(tipTurning(plan))} from its edge, from the fold to the open edges.`;

const tipTrim: Describe = (plan, _lane, _done, step) => {
  const { trimmed } = step.title.params;
  const to = typeof trimmed === 'string' ? trimmed : halfOf(tipTurning(plan));
  return `The seam across the wide end is sewn. Trim its allowance from ${formatInches(tipTurning(plan))} to ${formatInches(to)}, clear of the stitches.`;
};

const tipTurn: Describe = (plan) => {
  if (plan.request.tip.shape === 'pointed') {
    return 'The tip turned and pressed to a square corner. At the back its seam lies on the middle of the wedge.';
  }
  const round = plan.request.tip.shape === 'rounded' ? 'round' : 'straight';
  return `The wide end turned under ${formatInches(tipTurning(plan))} over a template, a ${round} edge.`;
};

const pair: Describe = (plan, lane) => {
  const named = laneLetters(lane);
  const [first, second] = named.length > 1 ? named : (findUnit(plan, 'pair', lane)?.letters ?? []);
  const [below, top] = [first ?? '', second ?? first ?? ''];
  return `Pairs in a chain, ${top} on top of ${below}, right sides together. The seam is ${formatInches(plan.request.seam)} from the edge, wide end first.`;
};

const joined =
  (kind: 'quarter' | 'half' | 'ring', name: string): Describe =>
  (plan, lane) => {
    const unit = findUnit(plan, kind, lane);
    const parts = unit?.parts ?? [];
    const seams = kind === 'ring' ? parts.length : parts.length - 1;
    const list = parts.map((part) =>
      part.letters.length > 8 ? `${part.letters.length} wedges` : part.letters.join(' '),
    );
    return `${name} from ${list.join(', then ')}, clockwise. ${seams === 1 ? 'One seam' : `${seams} seams`}, ${formatInches(plan.request.seam)} from the edge; the shoulders meet.`;
  };

const ringPress: Describe = (plan) => {
  const [first, second] = plateLetters(plan);
  if (plan.request.press === 'open') {
    return `${first} and ${second} from the back. Both seam allowances are pressed open, one to each side.`;
  }
  return `${first} and ${second} from the back. Both seam allowances lie to one side, clockwise from the front, toward ${second}.`;
};

/** What is sewn and pressed on the way to the ring, in words. */
export const describeJoining: Record<JoiningRole, Describe> = {
  'tip-sew': tipSew,
  'tip-trim': tipTrim,
  'tip-turn': tipTurn,
  pair,
  quarter: joined('quarter', 'A quarter'),
  half: joined('half', 'A half'),
  ring: joined('ring', 'The ring'),
  'ring-press': ringPress,
};
