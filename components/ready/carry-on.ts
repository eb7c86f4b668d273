import { pickCurrentStep } from '@/components/projects/progress-texts';
import type { ProjectReading } from '@/components/projects/read-project';
import type { StepProgress } from '@/shared/model/tally';

export interface CarryOn {
  reading: ProjectReading;
  /** null when every step of it is done */
  step: StepProgress | null;
}

/**
 * The project to carry on with: the one worked at last, unless it is finished and another is not.
 *
 * @param readings newest work first
 */
export function chooseCarryOn(readings: readonly ProjectReading[]): CarryOn | null {
  const all = readings.map((reading) => ({
    reading,
    step: pickCurrentStep(reading.progress.steps, reading.project.lastStepKey),
  }));
  return all.find(({ step }) => step !== null) ?? all[0] ?? null;
}
