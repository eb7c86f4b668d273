import { isReady } from '@/components/projects/progress-texts';
import type { ProjectReading } from '@/components/projects/read-project';
import { type Station, STATIONS } from '@/shared/model/codes';
import type { StepProgress } from '@/shared/model/tally';

export interface StationRow {
  station: Station;
  state: 'ready' | 'waiting' | 'done';
  reading: ProjectReading;
  step: StepProgress;
  /** it is not the carry-on project's, so the row names the project */
  other: boolean;
  /** further projects with something ready at this station */
  moreProjects: number;
}

function findReady({ project, progress }: ProjectReading, station: Station): StepProgress | null {
  const here = progress.steps.filter((step) => step.station === station && isReady(step));
  return here.find(({ key }) => key === project.lastStepKey) ?? here[0] ?? null;
}

function findNext({ progress }: ProjectReading, station: Station): StepProgress | null {
  const here = progress.steps.filter((step) => step.station === station);
  return here.find(({ toGo }) => toGo > 0) ?? here[here.length - 1] ?? null;
}

/**
 * One row a station: the carry-on project's when something is ready there, else the latest other
 * project's; where nothing is ready, what the carry-on project waits for. Stations without steps
 * have no row.
 *
 * @param readings newest work first, the carry-on project among them
 */
export function listStationRows(
  readings: readonly ProjectReading[],
  carryOn: ProjectReading,
): StationRow[] {
  const ordered = [carryOn, ...readings.filter((reading) => reading !== carryOn)];
  return STATIONS.flatMap((station): StationRow[] => {
    const ready = ordered.flatMap((reading) => {
      const step = findReady(reading, station);
      return step ? [{ reading, step }] : [];
    });
    const first = ready[0];
    if (first) {
      const other = first.reading !== carryOn;
      return [{ station, state: 'ready', ...first, other, moreProjects: ready.length - 1 }];
    }
    const next = ordered.flatMap((reading) => {
      const step = findNext(reading, station);
      return step ? [{ reading, step }] : [];
    });
    const shown = next.find(({ step }) => step.toGo > 0) ?? next[0];
    if (!shown) return [];
    const state = shown.step.toGo > 0 ? 'waiting' : 'done';
    return [{ station, state, ...shown, other: shown.reading !== carryOn, moreProjects: 0 }];
  });
}
