import { type Fraction } from 'fraction.js';

import { joinWords } from '@/components/station/enough-text';
import { countItem, itemKind, itemLetters } from '@/components/steps/item-words';
import type { PlanStep } from '@/shared/model/plan';
import { formatFraction } from '@/shared/units/format-fraction';
import { toFraction, toText } from '@/shared/units/fraction';

const MOST_NAMED = 2;

type Amounts = Map<string, Fraction>;

function add(amounts: Amounts, item: string, amount: Fraction): void {
  amounts.set(item, amounts.get(item)?.add(amount) ?? amount);
}

function writeAmount([item, amount]: [string, Fraction]): string {
  const whole = amount.d === 1n;
  const words = countItem(item, whole ? amount.valueOf() : 2);
  return whole ? words : words.replace(/^2/, formatFraction(toText(amount)));
}

/** Items of one kind: by their letters while they are few or alike, else all together. */
function writeKind(kind: string, items: readonly [string, Fraction][]): string[] {
  const [first, ...rest] = items;
  if (!first) return [];
  if (items.length <= MOST_NAMED) return items.map(writeAmount);
  if (rest.every(([, amount]) => amount.equals(first[1]))) {
    const letters = joinWords(items.map(([item]) => itemLetters(item)));
    return [`${writeAmount([kind, first[1]])} each in ${letters}`];
  }
  return [writeAmount([kind, rest.reduce((sum, [, amount]) => sum.add(amount), first[1])])];
}

function writeAmounts(amounts: Amounts): string {
  const kinds = new Map<string, [string, Fraction][]>();
  for (const entry of amounts) {
    const kind = itemKind(entry[0]);
    kinds.set(kind, [...(kinds.get(kind) ?? []), entry]);
  }
  return joinWords([...kinds].flatMap(([kind, items]) => writeKind(kind, items)));
}

/** "Uses 40 turned tips. Makes 20 pairs in A+C and 20 pairs in D+E." for a whole step. */
export function writeFlow(step: PlanStep): string {
  const uses: Amounts = new Map();
  const makes: Amounts = new Map();
  for (const lane of step.lanes) {
    for (const [item, each] of Object.entries(lane.consumes)) {
      add(uses, item, toFraction(String(each)).mul(lane.target));
    }
    for (const [item, each] of Object.entries(lane.makes)) {
      add(makes, item, toFraction(String(each)).mul(lane.target));
    }
  }
  const from = uses.size === 0 ? 'Cut from the cloth' : `Uses ${writeAmounts(uses)}`;
  return `${from}. Makes ${writeAmounts(makes)}.`;
}
