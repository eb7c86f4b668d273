import type { Describe } from '@/components/diagrams/describe';
import { describeCutting } from '@/components/diagrams/describe-cutting';
import { describeFinishing } from '@/components/diagrams/describe-finishing';
import { describeJoining } from '@/components/diagrams/describe-joining';
import type { StepRole } from '@/shared/model/codes';
import type { Plan, PlanLane, PlanStep } from '@/shared/model/plan';

const DESCRIBE: Record<StepRole, Describe> = {
  ...describeCutting,
  ...describeJoining,
  ...describeFinishing,
};

/**
 * The diagram of a step in words, with the plan's own numbers.
 *
 * @param lane the lane that is counted; null: the step as a whole
 * @param done taps done in that lane
 */
export function describeStep(
  plan: Plan,
  step: PlanStep,
  lane: PlanLane | null,
  done: number,
): string {
  return DESCRIBE[step.role](plan, lane, Math.max(0, done), step);
}
