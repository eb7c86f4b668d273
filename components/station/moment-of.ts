import type { ActDone } from '@/components/station/count-acts';
import { tapsPerStack } from '@/components/station/step-reading';
import type { Moment } from '@/components/station/use-feedback';

/** What an act was for the hand: a count, the end of a stack or of the step, or a step back. */
export function momentOf({ act, before, after, lane }: ActDone): Moment {
  if (act === 'undo' || act === 'lost' || act === 'unpick') return 'undo';
  if (after.progress.toGo === 0 && before.progress.toGo > 0) return 'stepDone';
  const perStack = tapsPerStack(after, lane);
  const own = after.progress.lanes.find((each) => each.lane.key === lane);
  return perStack !== null && own && own.done % perStack === 0 ? 'stackDone' : 'count';
}
