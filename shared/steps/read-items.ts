import Fraction from 'fraction.js';

import type { PlanLane, PlanStep } from '../model/plan';
import type { ExtraLane, Tally } from '../model/tally';

/** Whole counts as they are, parts of a thing as exact fractions. */
export type Amounts = Map<string, Fraction>;

export interface LaneState {
  lane: PlanLane;
  extra: boolean;
  done: number;
}

export interface StepState {
  step: PlanStep;
  lanes: LaneState[];
}

export interface ItemAmounts {
  made: Amounts;
  used: Amounts;
  lost: Amounts;
}

const NONE = new Fraction(0);

export function amountOf(amounts: Amounts, item: string): Fraction {
  return amounts.get(item) ?? NONE;
}

export function addAmount(amounts: Amounts, item: string, amount: Fraction): void {
  amounts.set(item, amountOf(amounts, item).add(amount));
}

/** Every step's lanes, extra ones last, with the taps that stand: done − unpicked. */
export function readLanes(
  steps: readonly PlanStep[],
  extraLanes: readonly ExtraLane[],
  tallies: readonly Tally[],
): StepState[] {
  const shown = new Map(tallies.map((tally) => [tallyId(tally), tally.shown]));
  return steps.map((step) => {
    const countOf = (lane: string, kind: Tally['kind']) =>
      shown.get(tallyId({ step: step.key, lane, kind })) ?? 0;
    const stateOf = (lane: PlanLane, extra: boolean): LaneState => ({
      lane,
      extra,
      done: Math.max(0, countOf(lane.key, 'done') - countOf(lane.key, 'unpicked')),
    });
    const own = extraLanes.filter((lane) => lane.step === step.key);
    return {
      step,
      lanes: [
        ...step.lanes.map((lane) => stateOf(lane, false)),
        ...own.map((lane) => stateOf(lane, true)),
      ],
    };
  });
}

/** What was made, used and lost of every item; unpicking has given its inputs back. */
export function readItems(states: readonly StepState[], tallies: readonly Tally[]): ItemAmounts {
  const items: ItemAmounts = { made: new Map(), used: new Map(), lost: new Map() };
  for (const { lane, done } of states.flatMap(({ lanes }) => lanes)) {
    eachAmount(lane.consumes, (item, each) => addAmount(items.used, item, each.mul(done)));
    eachAmount(lane.makes, (item, each) => addAmount(items.made, item, each.mul(done)));
  }
  for (const { lane, kind, shown } of tallies) {
    if (kind === 'lost') addAmount(items.lost, lane, new Fraction(shown));
  }
  return items;
}

export function eachAmount(
  amounts: PlanLane['consumes'],
  visit: (item: string, each: Fraction) => void,
): void {
  for (const [item, each] of Object.entries(amounts)) visit(item, new Fraction(each));
}

function tallyId({ step, lane, kind }: Pick<Tally, 'step' | 'lane' | 'kind'>): string {
  return JSON.stringify([step, lane, kind]);
}
