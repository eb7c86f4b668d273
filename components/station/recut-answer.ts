import { replacementText } from '@/components/station/replacement-text';
import { wedgesLost } from '@/components/station/recut-lanes';
import type { StepReading } from '@/components/station/step-reading';
import { unitWord } from '@/components/steps/messages';
import { findReplacement } from '@/shared/cutting/find-replacement';

/** What the plan says after pieces were miscut or lost. */
export interface RecutAnswer {
  title: string;
  texts: string[];
  /** the wedges are cut at another step: the Table has a lane for them */
  atTable: boolean;
}

/**
 * Asks the plan whether the cloth still covers the target.
 *
 * @param after the step once the loss is on disk
 * @param pieces how many of the item were lost
 * @example { title: "99 good, 1 to recut", texts: ["No offcut is wide enough: …"] }
 */
export function recutAnswer(after: StepReading, item: string, pieces: number): RecutAnswer {
  const { plan, step, progress } = after;
  const wanted = new Map<string, number>();
  for (const letter of wedgesLost(item)) {
    wanted.set(letter, (wanted.get(letter) ?? 0) + pieces);
  }
  const cutHere = step.role === 'cut';
  const texts = [...wanted].map(([letter, count]) =>
    replacementText(plan, findReplacement(plan, letter, count)),
  );
  const good = `${progress.good} good`;
  const title = cutHere
    ? `${good}, ${pieces} to recut`
    : `${good}, ${pieces} ${unitWord(step.role, pieces)} to make again`;
  return { title, texts, atTable: texts.length > 0 && !cutHere };
}
