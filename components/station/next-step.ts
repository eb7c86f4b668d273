import type { StepProgress } from '@/shared/model/tally';

/** The next step of the plan that is not done, or null at the end. */
export function nextStep(steps: readonly StepProgress[], from: StepProgress): StepProgress | null {
  const later = steps.filter((step) => step.position > from.position && step.toGo > 0);
  return later.find((step) => step.ready > 0) ?? later[0] ?? null;
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
