import { joinWords, laneLetters } from '@/components/station/enough-text';
import { countItem, itemKind } from '@/components/steps/item-words';
import { madeWord, unitWord } from '@/components/steps/messages';
import type { LaneProgress, StepProgress } from '@/shared/model/tally';

const MOST_NAMED_LANES = 3;

/** Taps that a lane can take now: what is left of it, and no more than what is on hand allows. */
export function countOpenTaps({ lane, done, possible }: LaneProgress): number {
  const left = Math.max(0, lane.target - done);
  return possible === null ? left : Math.min(left, Math.max(0, possible));
}

export function isReady(step: StepProgress): boolean {
  return step.toGo > 0 && step.ready > 0;
}

/** The number at the right of a row: cuts at a cut, else units; "12 cuts", "7 pairs". */
export function readyNumber(step: StepProgress): { count: number; word: string } {
  if (step.role !== 'cut') return { count: step.ready, word: unitWord(step.role, step.ready) };
  const cuts = step.lanes.reduce((sum, lane) => sum + countOpenTaps(lane), 0);
  return { count: cuts, word: cuts === 1 ? 'cut' : 'cuts' };
}

/** "40 of 100 pieces cut" */
export function countLine({ role, good, target, lost }: StepProgress): string {
  const planned = Math.max(0, target - lost);
  return `${good} of ${planned} ${unitWord(role, planned)} ${madeWord(role)}`;
}

/** "Enough for 20 pairs A+C and 19 D+E": by lane while the lanes are few, else all together. */
function enoughLine(step: StepProgress): string {
  const more = step.good > 0 ? ' more' : '';
  const lanes = step.lanes
    .map((lane) => ({ units: countOpenTaps(lane) * lane.perTap, letters: laneLetters(lane) }))
    .filter(({ units }) => units > 0);
  const few = step.lanes.length > 1 && lanes.length <= MOST_NAMED_LANES;
  if (!few || lanes.some(({ letters }) => letters === '')) {
    return `Enough for ${step.ready}${more} ${unitWord(step.role, step.ready)}`;
  }
  const [first, ...rest] = lanes.map(({ units, letters }, at) =>
    at === 0 ? `${units}${more} ${unitWord(step.role, units)} ${letters}` : `${units} ${letters}`,
  );
  return `Enough for ${joinWords([first ?? '', ...rest])}`;
}

/** "Waiting for 48 turned tips and 5 circles": fabrics of one kind together. */
function waitingLine({ waitingFor }: StepProgress): string {
  const kinds = new Map<string, StepProgress['waitingFor']>();
  for (const each of waitingFor) {
    const kind = itemKind(each.item);
    kinds.set(kind, [...(kinds.get(kind) ?? []), each]);
  }
  const words = [...kinds].map(([kind, items]) => {
    const missing = items.reduce((sum, item) => sum + Math.ceil(item.missing), 0);
    return countItem(items.length === 1 ? (items[0]?.item ?? kind) : kind, missing);
  });
  return words.length > 0 ? `Waiting for ${joinWords(words)}` : 'Nothing on hand yet';
}

/** One line on where a step stands: what is done, what can be done now, or what it waits for. */
export function stepLine(step: StepProgress): string {
  if (step.toGo === 0) return `All ${countLine(step).replace(/^\d+ of /, '')}`;
  if (!isReady(step)) return waitingLine(step);
  const fromCloth = step.lanes.every(({ possible }) => possible === null);
  return fromCloth || step.role === 'cut' ? countLine(step) : enoughLine(step);
}

/** The step to carry on with: the last one worked at, the first that is ready, or the next. */
export function pickCurrentStep(
  steps: readonly StepProgress[],
  lastKey: string | null,
): StepProgress | null {
  const last = steps.find(({ key }) => key === lastKey);
  if (last && isReady(last)) return last;
  return steps.find(isReady) ?? steps.find(({ toGo }) => toGo > 0) ?? null;
}

/** "3 of 18 steps done" */
export function stepsLine(steps: readonly StepProgress[]): string {
  const done = steps.filter(({ toGo }) => toGo === 0).length;
  return done === steps.length ? 'All steps done' : `${done} of ${steps.length} steps done`;
}
