import type { Plan } from '@/shared/model/plan';
import type { Progress } from '@/shared/model/tally';
import { makePlan } from '@/shared/plan/make-plan';
import { InvariantError } from '@/shared/result';
import { readProgress } from '@/shared/steps/read-progress';
import type { ProjectView } from '@/sync/client/projects-client';

export interface ProjectReading {
  project: ProjectView;
  plan: Plan;
  progress: Progress;
}

const plans = new Map<string, { request: string; plan: Plan }>();
const readings = new WeakMap<ProjectView, ProjectReading>();

/** Making a plan takes longer than a tap may, and a request does not change, so it is made once. */
function planOf(project: ProjectView): Plan {
  const request = JSON.stringify(project.request);
  const known = plans.get(project.id);
  if (known?.request === request) return known.plan;
  const made = makePlan(project.request);
  if (!made.ok) throw new InvariantError('a kept project cannot be planned');
  plans.set(project.id, { request, plan: made.value });
  return made.value;
}

/**
 * A project with its plan and its progress. The steps are the project's frozen rows: what was
 * counted stays counted against the plan it was made with.
 *
 * @throws InvariantError when the kept request cannot be planned
 */
export function readProject(project: ProjectView): ProjectReading {
  const known = readings.get(project);
  if (known) return known;
  const reading = {
    project,
    plan: { ...planOf(project), steps: project.steps },
    progress: readProgress(project.steps, project.extraLanes, project.tallies),
  };
  readings.set(project, reading);
  return reading;
}
