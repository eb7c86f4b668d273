import type { StepProgress } from '../model/tally';
import { possibleTaps } from './possible-taps';
import {
  addAmount,
  amountOf,
  type Amounts,
  type ItemAmounts,
  type LaneState,
  type StepState,
} from './read-items';

/**
 * What a step still has to make, how much of it what is on hand allows, and what it waits for when
 * that is nothing. Lanes that share an input get it in their order; wedges to recut come from cloth.
 *
 * @param extra what must be made beyond the plan, by item
 * @param parts parts of one piece, in which all amounts count
 */
export function readReady(
  { step, lanes }: StepState,
  items: ItemAmounts,
  onHand: Amounts,
  extra: Amounts,
  parts: number,
): Pick<StepProgress, 'toGo' | 'ready' | 'waitingFor'> {
  const planned = lanes.filter((lane) => !lane.extra);
  const needs = stillNeeded(planned, items.made, extra);
  const stock: Amounts = new Map(onHand);
  const left: Amounts = new Map(needs);
  for (const lane of lanes) {
    const wanted = tapsFor(lane, left);
    const taps = Math.min(wanted, possibleTaps(lane, stock) ?? wanted);
    for (const [item, each] of lane.uses) addAmount(stock, item, -each * taps);
    for (const [item, each] of lane.makes) takeFrom(left, item, each * taps);
  }
  if (step.role === 'cut') for (const [item, pieces] of extra) takeFrom(left, item, pieces);
  const toGo = sum(needs) / parts;
  const ready = toGo - sum(left) / parts;
  const waitingFor = ready === 0 && toGo > 0 ? missingItems(planned, needs, onHand, parts) : [];
  return { toGo, ready, waitingFor };
}

function stillNeeded(lanes: readonly LaneState[], made: Amounts, extra: Amounts): Amounts {
  const needs: Amounts = new Map();
  for (const { lane, makes } of lanes) {
    for (const [item, each] of makes) addAmount(needs, item, each * lane.target);
  }
  for (const [item, planned] of needs) {
    needs.set(item, Math.max(0, planned + amountOf(extra, item) - amountOf(made, item)));
  }
  return needs;
}

function tapsFor({ makes }: LaneState, needs: Amounts): number {
  return Math.max(0, ...makes.map(([item, each]) => Math.ceil(amountOf(needs, item) / each)));
}

function takeFrom(amounts: Amounts, item: string, parts: number): void {
  if (amounts.has(item)) amounts.set(item, Math.max(0, amountOf(amounts, item) - parts));
}

/** The inputs of which not even one tap's worth is there, for all that is still to make. */
function missingItems(
  lanes: readonly LaneState[],
  needs: Amounts,
  onHand: Amounts,
  parts: number,
): StepProgress['waitingFor'] {
  const wanted: Amounts = new Map();
  const short = new Set<string>();
  for (const lane of lanes) {
    const taps = tapsFor(lane, needs);
    for (const [item, each] of lane.uses) {
      addAmount(wanted, item, each * taps);
      if (taps > 0 && amountOf(onHand, item) < each) short.add(item);
    }
  }
  return [...short].map((item) => {
    const missing = amountOf(wanted, item) - Math.max(0, amountOf(onHand, item));
    return { item, missing: Math.ceil(missing / parts) };
  });
}

function sum(amounts: Amounts): number {
  return [...amounts.values()].reduce((total, amount) => total + amount, 0);
}
