import type { Tally } from '../../shared/model/tally';
import type { ProjectView, UndoableAct } from '../client/projects-client';

/** What a committed act changed, small enough to send to every tab after each tap. */
export type ProjectChange =
  | {
      kind: 'counts';
      id: string;
      tallies: readonly Tally[];
      /** the step's newest act that can be undone, null when none is left */
      undoable: readonly { step: string; act: UndoableAct | null }[];
      workedAtMs: number;
      lastStepKey: string;
    }
  | { kind: 'project'; project: ProjectView }
  | { kind: 'gone'; id: string };

/** New projects with the changes in; whatever did not change stays the same object. */
export function applyChanges(
  projects: readonly ProjectView[],
  changes: readonly ProjectChange[],
): readonly ProjectView[] {
  if (changes.length === 0) return projects;
  const byId = new Map(projects.map((project) => [project.id, project]));
  for (const change of changes) {
    if (change.kind === 'gone') byId.delete(change.id);
    else if (change.kind === 'project') byId.set(change.project.id, change.project);
    else {
      const project = byId.get(change.id);
      if (project) byId.set(change.id, withCounts(project, change));
    }
  }
  return [...byId.values()].sort(byNewestWork);
}

export const byNewestWork = (a: ProjectView, b: ProjectView) =>
  lastTouched(b) - lastTouched(a) || (a.id < b.id ? 1 : -1);

const lastTouched = (project: ProjectView) =>
  Math.max(project.workedAtMs ?? 0, project.createdAtMs);

/** A project with changed counts in; the project given is left as it is. */
export function withCounts(
  project: ProjectView,
  change: Extract<ProjectChange, { kind: 'counts' }>,
): ProjectView {
  const steps = new Set(change.undoable.map(({ step }) => step));
  const kept = project.undoable.filter(({ step }) => !steps.has(step));
  const added = change.undoable.flatMap(({ act }) => (act ? [act] : []));
  return {
    ...project,
    tallies: change.tallies.reduce(putTally, project.tallies),
    undoable: [...kept, ...added],
    workedAtMs: change.workedAtMs,
    lastStepKey: change.lastStepKey,
  };
}

function putTally(tallies: Tally[], tally: Tally): Tally[] {
  const place = tallies.findIndex(
    ({ step, lane, kind }) => step === tally.step && lane === tally.lane && kind === tally.kind,
  );
  return place === -1 ? [...tallies, tally] : tallies.with(place, tally);
}
