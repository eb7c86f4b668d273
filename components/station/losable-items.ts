import type { LosableItem } from '@/components/station/loss-dialog';
import type { PlanStep } from '@/shared/model/plan';
import type { Progress } from '@/shared/model/tally';

/** What a step makes, each with how many of it were made and not lost. */
export function losableItems(step: PlanStep, progress: Progress): LosableItem[] {
  const names = new Set(step.lanes.flatMap((lane) => Object.keys(lane.makes)));
  return [...names].map((item) => {
    const own = progress.items.find((each) => each.item === item);
    return { item, good: own ? Math.max(0, own.made - own.lost) : 0 };
  });
}
