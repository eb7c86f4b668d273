import { writeFlow } from '@/components/plan/step-flow';
import type { StepRole } from '@/shared/model/codes';
import { makePlan } from '@/shared/plan/make-plan';

import { ringRequest } from '../projects/fake-projects-client';

function flowOf(role: StepRole): string {
  const made = makePlan(ringRequest());
  const step = made.ok ? made.value.steps.find((candidate) => candidate.role === role) : undefined;
  if (!step) throw new Error(`no step ${role}`);
  return writeFlow(step);
}

it.each([
  ['strip', 'Cut from the cloth. Makes 1 strip each in A, B, C, D and E.'],
  ['cut', 'Uses 5 stacks in A+B+C+D+E. Makes 20 wedges each in A, B, C, D and E.'],
  ['pair', 'Uses 20 turned tips each in A, C, D and E. Makes 20 pairs in A+C and 20 pairs in D+E.'],
  [
    'quarter',
    'Uses 20 pairs in A+C, 20 pairs in D+E and 20 turned tips in B. Makes 20 quarters in A+C+B+D+E.',
  ],
  ['ring', 'Uses 10 halves. Makes 5 rings.'],
  [
    'applique',
    'Uses 5 pressed rings, 5 turned circles and 5 folded backgrounds. Makes 5 stitched plates.',
  ],
] as const)('says what the step %s uses and makes', (role, words) => {
  expect(flowOf(role)).toBe(words);
});
