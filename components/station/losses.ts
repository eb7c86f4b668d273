import { shownCount } from '@/components/station/step-reading';
import type { StepReading } from '@/components/station/step-reading';
import type { IconName } from '@/components/ui/icon';

export interface LossControl {
  kind: 'loss' | 'unpick';
  word: string;
  icon: IconName;
  count: number;
}

/** The third control: Miscut at the Table, Unpick at the Machine, Lost elsewhere. */
export function lossControl({ project, step, progress }: StepReading): LossControl {
  if (step.station === 'machine') {
    const count = progress.lanes.reduce(
      (sum, { lane }) =>
        sum + shownCount(project, { step: step.key, lane: lane.key, kind: 'unpicked' }),
      0,
    );
    return { kind: 'unpick', word: 'Unpick', icon: 'undo', count };
  }
  const word = step.station === 'table' ? 'Miscut' : 'Lost';
  return { kind: 'loss', word, icon: 'scissors', count: progress.lost };
}
