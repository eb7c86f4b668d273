import type { LaneProgress, StepProgress } from '@/shared/model/tally';

/** Whether a lane has all its taps. */
export function isFull(lane: LaneProgress): boolean {
  return lane.done >= lane.lane.target;
}

/**
 * The lane to count in: the one in hand until it is full, then the next one not full, those with
 * something on hand first. A full step stays at the lane in hand.
 *
 * @param inHand key of the lane counted in last, or null at the start
 */
export function pickLane(step: StepProgress, inHand: string | null): LaneProgress | null {
  const current = step.lanes.find((lane) => lane.lane.key === inHand);
  if (current && !isFull(current)) return current;
  const open = step.lanes.filter((lane) => !isFull(lane));
  const ready = open.find((lane) => lane.possible === null || lane.possible > 0);
  return ready ?? open[0] ?? current ?? step.lanes[0] ?? null;
}
