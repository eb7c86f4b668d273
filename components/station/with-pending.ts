import type { StepProgress } from '@/shared/model/tally';

/**
 * The progress as it will stand once the counts under way are kept, so that a quick tap is judged
 * by the taps before it. Shown numbers never come from here: they wait for the disk.
 *
 * @param pending taps under way by lane key
 */
export function withPending(
  step: StepProgress,
  pending: ReadonlyMap<string, number>,
): StepProgress {
  let adds = 0;
  const lanes = step.lanes.map((lane) => {
    const taps = pending.get(lane.lane.key) ?? 0;
    adds += taps * lane.perTap;
    return taps === 0 ? lane : { ...lane, done: lane.done + taps };
  });
  return { ...step, lanes, made: step.made + adds, good: step.good + adds };
}
