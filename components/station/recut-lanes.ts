import { itemKind, itemLetters } from '@/components/steps/item-words';
import type { Plan } from '@/shared/model/plan';
import type { ExtraLane } from '@/shared/model/tally';
import { recutLane } from '@/shared/steps/recut-lane';

/** Items that are made of wedges and whose name says of which fabrics. */
const OF_WEDGES = ['wedge', 'tip-sewn', 'tip-trimmed', 'tip', 'pair', 'quarter', 'half'];

/** Fabric letters of the wedges that a lost item takes with it, once each wedge. */
export function wedgesLost(item: string): string[] {
  if (!OF_WEDGES.includes(itemKind(item))) return [];
  return itemLetters(item)
    .split('+')
    .filter((letter) => letter !== '');
}

/**
 * The lanes that make lost wedges again, one a fabric. A lane never changes once it is opened, so a
 * later loss in the same fabric opens the next one.
 *
 * @param open extra lanes of the project so far
 */
export function recutLanes(
  plan: Plan,
  open: readonly ExtraLane[],
  item: string,
  pieces: number,
): ExtraLane[] {
  const wanted = new Map<string, number>();
  for (const letter of wedgesLost(item)) {
    wanted.set(letter, (wanted.get(letter) ?? 0) + pieces);
  }
  return [...wanted].map(([letter, count]) => {
    const lane = recutLane(plan, letter, count);
    const taken = open.filter(({ step, key }) => step === lane.step && isOf(key, lane.key)).length;
    return taken === 0 ? lane : { ...lane, key: `${lane.key} ${taken + 1}` };
  });
}

/** "D1", "D1 2", "D1 3": the lanes opened for one fabric, one after the other. */
function isOf(key: string, first: string): boolean {
  return key === first || key.startsWith(`${first} `);
}
