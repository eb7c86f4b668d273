import { type Fraction } from 'fraction.js';

import { joinWords } from '@/components/station/enough-text';
import { countItem, itemKind } from '@/components/steps/item-words';
import type { PlanStep } from '@/shared/model/plan';
import { formatFraction } from '@/shared/units/format-fraction';
import { toFraction, toText } from '@/shared/units/fraction';

const MOST_NAMED = 4;

type Amounts = Map<string, Fraction>;

function add(amounts: Amounts, item: string, amount: Fraction): void {
  amounts.set(item, amounts.get(item)?.add(amount) ?? amount);
}

function writeAmount([item, amount]: [string, Fraction]): string {
  const whole = amount.d === 1n;
  const words = countItem(item, whole ? amount.valueOf() : 2);
  return whole ? words : words.replace(/^2/, formatFraction(toText(amount)));
}

/** Few items by their letters, many by their kind. */
function writeAmounts(amounts: Amounts): string {
  if (amounts.size <= MOST_NAMED) return joinWords([...amounts].map(writeAmount));
  const kinds: Amounts = new Map();
  for (const [item, amount] of amounts) add(kinds, itemKind(item), amount);
  return joinWords([...kinds].map(writeAmount));
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
