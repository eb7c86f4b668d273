import { isFull } from '@/components/station/pick-lane';
import { countItem, itemKind, itemMadeWord } from '@/components/steps/item-words';
import type { PlanStep } from '@/shared/model/plan';
import type { LaneProgress, StepProgress } from '@/shared/model/tally';
import { unitWord } from '@/components/steps/messages';

/** More lanes than this are not named one by one. */
const NAMED_LANES = 3;
const NAMED_ITEMS = 2;

/**
 * What the pieces on hand allow at a step, in words; null when it starts from cloth or is done.
 *
 * @param lane the lane counted in now
 * @example "Enough for 20 pairs A+C and 19 D+E"
 */
export function enoughText(step: StepProgress, lane: LaneProgress | null): string | null {
  if (step.toGo === 0) return null;
  const open = step.lanes.filter((each) => !isFull(each) && each.possible !== null);
  if (open.length === 0) return null;
  const able = open.filter((each) => allowed(each) > 0);
  const [only] = able;
  if (!only) return waitingText(step);
  if (able.length === 1) return onHandText(only, step.lanes.length > 1);
  if (able.length > NAMED_LANES) return lane && !isFull(lane) ? onHandText(lane, true) : null;
  const parts = able.map((each, index) => {
    const count = allowed(each);
    return index === 0
      ? `${count} ${unitWord(step.role, count)} ${laneLetters(each)}`
      : `${count} ${laneLetters(each)}`;
  });
  return `Enough for ${joinWords(parts)}`;
}

/** "Waiting for 4 turned tips in A": what a step lacks. */
export function waitingText(step: StepProgress): string {
  const missing = missingItems(step);
  return missing === '' ? 'Nothing on hand yet' : `Waiting for ${missing}`;
}

/** "4 turned tips in A and 2 in …", by kind alone where more than two fabrics are short. */
function missingItems({ waitingFor }: StepProgress): string {
  const whole = waitingFor.map(({ item, missing }) => ({ item, count: Math.ceil(missing) }));
  if (whole.length <= NAMED_ITEMS) {
    return joinWords(whole.map(({ item, count }) => countItem(item, count)));
  }
  const kinds = new Map<string, number>();
  for (const { item, count } of whole) {
    kinds.set(itemKind(item), (kinds.get(itemKind(item)) ?? 0) + count);
  }
  return joinWords([...kinds].map(([kind, count]) => countItem(kind, count)));
}

/** "2 more than were cut. Count the piles again?"; null while the counts agree. */
export function outrunText(progress: StepProgress, step: PlanStep): string | null {
  if (progress.outrun <= 0) return null;
  const input = Object.keys(step.lanes[0]?.consumes ?? {}).find(
    (item) => itemKind(item) !== 'cloth',
  );
  const word = input === undefined ? 'made' : itemMadeWord(input);
  return `${progress.outrun} more than were ${word}. Count the piles again?`;
}

/** The letters of what a lane makes: "A+C". */
export function laneLetters(lane: LaneProgress): string {
  return lettersMade(lane.lane.makes);
}

/** The fabric letters of the items that a tap makes, in order: "A+C", "ABCDE" for a stack. */
export function lettersMade(makes: Record<string, number>): string {
  const letters = Object.keys(makes).map((item) => item.split(':')[1] ?? '');
  return letters.filter((each) => each !== '').join('');
}

/** "a, b and c". */
export function joinWords(parts: readonly string[]): string {
  if (parts.length < 2) return parts.join('');
  return `${parts.slice(0, -1).join(', ')} and ${parts.at(-1)}`;
}

function onHandText(lane: LaneProgress, named: boolean): string {
  const more = `Enough on hand for ${allowed(lane) * lane.perTap} more`;
  const letters = laneLetters(lane);
  return named && letters !== '' ? `${more} ${letters}` : more;
}

/** Taps that may follow now: what is on hand, at most what the lane still needs. */
function allowed(lane: LaneProgress): number {
  return Math.min(lane.possible ?? 0, Math.max(0, lane.lane.target - lane.done));
}
