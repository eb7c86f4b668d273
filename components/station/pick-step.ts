import type { Station } from '@/shared/model/codes';
import type { StepProgress } from '@/shared/model/tally';

/**
 * The step that a station opens at: the one asked for, else the first with something ready, else
 * the first not done, else the last.
 */
export function pickStep(
  steps: readonly StepProgress[],
  station: Station,
  role: string | undefined,
): StepProgress | null {
  const here = steps.filter((step) => step.station === station);
  const asked = here.find((step) => step.role === role);
  return (
    asked ??
    here.find((step) => step.toGo > 0 && step.ready > 0) ??
    here.find((step) => step.toGo > 0) ??
    here.at(-1) ??
    null
  );
}

/** What is ready at each station, for the switcher: units over all steps of the station. */
export function countReady(steps: readonly StepProgress[]): Partial<Record<Station, number>> {
  const ready: Partial<Record<Station, number>> = {};
  for (const step of steps) {
    if (step.toGo > 0 && step.ready > 0) {
      ready[step.station] = (ready[step.station] ?? 0) + step.ready;
    }
  }
  return ready;
}
