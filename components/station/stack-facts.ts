import type { StepReading } from '@/components/station/step-reading';
import { tapsPerStack } from '@/components/station/step-reading';
import type { LaneProgress } from '@/shared/model/tally';

/** "5 layers: one cut = 5 pieces" and "Stack 3 of 5" of a cutting lane; none for other steps. */
export function stackFacts(reading: StepReading, lane: LaneProgress | null): string[] {
  if (reading.step.role !== 'cut' || lane === null) return [];
  const layers = lane.perTap;
  const many = (count: number, word: string) => `${count} ${word}${count === 1 ? '' : 's'}`;
  const cut = `${many(layers, 'layer')}: one cut = ${many(layers, 'piece')}`;
  const perStack = tapsPerStack(reading, lane.lane.key);
  if (perStack === null) return [cut];
  const stacks = Math.ceil(lane.lane.target / perStack);
  const current = Math.min(stacks, Math.floor(lane.done / perStack) + 1);
  return [cut, `Stack ${current} of ${stacks}`];
}
