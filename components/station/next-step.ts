import type { PlanStep } from '@/shared/model/plan';
import type { StepProgress } from '@/shared/model/tally';

/**
 * What comes after a step: the one that uses what it makes, else the next that can be done, else
 * the next that is not done; null at the end.
 *
 * @param steps the plan's steps, in the order of their progress
 */
export function nextStep(
  steps: readonly PlanStep[],
  progress: readonly StepProgress[],
  from: StepProgress,
): StepProgress | null {
  const made = new Set(itemsOf(steps, from.key, 'makes'));
  const later = progress.filter((step) => step.position > from.position && step.toGo > 0);
  const follows = later.find(({ key }) =>
    itemsOf(steps, key, 'consumes').some((item) => made.has(item)),
  );
  return follows ?? later.find((step) => step.ready > 0) ?? later[0] ?? null;
}

function itemsOf(steps: readonly PlanStep[], key: string, way: 'consumes' | 'makes'): string[] {
  const lanes = steps.find((step) => step.key === key)?.lanes ?? [];
  return lanes.flatMap((lane) => Object.keys(lane[way]));
}

/** The steps before and after at the same station. */
export function neighbours(
  steps: readonly StepProgress[],
  from: StepProgress,
): { before: StepProgress | null; after: StepProgress | null } {
  const here = steps.filter((step) => step.station === from.station);
  const at = here.findIndex((step) => step.key === from.key);
  return { before: here[at - 1] ?? null, after: here[at + 1] ?? null };
}
