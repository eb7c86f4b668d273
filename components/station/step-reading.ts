import { readProject } from '@/components/projects/read-project';
import { projects } from '@/sync/client/projects';
import type { ProjectView } from '@/sync/client/projects-client';
import type { Plan, PlanStep } from '@/shared/model/plan';
import type { StepProgress, TallyKey } from '@/shared/model/tally';

/** One step of a project as it stands on disk now. */
export interface StepReading {
  project: ProjectView;
  plan: Plan;
  step: PlanStep;
  progress: StepProgress;
}

/** Reads a step from the store itself: the page's own render may be a tap behind. */
export function readStep(projectId: string, stepKey: string): StepReading | null {
  const project = projects.snapshot().projects.find(({ id }) => id === projectId);
  return project ? stepOf(project, stepKey) : null;
}

export function stepOf(project: ProjectView, stepKey: string): StepReading | null {
  const { plan, progress } = readProject(project);
  const step = project.steps.find(({ key }) => key === stepKey);
  const own = progress.steps.find(({ key }) => key === stepKey);
  return step && own ? { project, plan, step, progress: own } : null;
}

/** The count of a key as shown; keys never counted are 0. */
export function shownCount(project: ProjectView, key: TallyKey): number {
  const tally = project.tallies.find(
    ({ step, lane, kind }) => step === key.step && lane === key.lane && kind === key.kind,
  );
  return tally?.shown ?? 0;
}

/** Taps of one full stack of a cutting step, null where no stacks are cut. */
export function tapsPerStack({ plan, step }: StepReading, laneKey: string): number | null {
  if (step.role !== 'cut') return null;
  const lane = step.lanes.find(({ key }) => key === laneKey);
  if (!lane) return null; // a recut lane has no stacks of its own
  const letters = Object.keys(lane.makes).map((item) => item.split(':')[1]);
  const stack = plan.stacks.find(({ layers }) => layers.every((each) => letters.includes(each)));
  return stack?.cutsEach ?? null;
}
