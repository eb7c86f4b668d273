import Fraction from 'fraction.js';

import type { PlanLane } from '../model/plan';
import type { StepProgress } from '../model/tally';
import { possibleTaps } from './possible-taps';
import {
  addAmount,
  amountOf,
  eachAmount,
  type Amounts,
  type ItemAmounts,
  type StepState,
} from './read-items';

/**
 * What a step still has to make, how much of it what is on hand allows, and what it waits for when
 * that is nothing. Lanes that share an input get it in their order; wedges to recut come from cloth.
 *
 * @param extra what must be made beyond the plan, by item
 */
export function readReady(
  { step, lanes }: StepState,
  items: ItemAmounts,
  onHand: Amounts,
  extra: Amounts,
): Pick<StepProgress, 'toGo' | 'ready' | 'waitingFor'> {
  const needs = stillNeeded(step.lanes, items.made, extra);
  const toGo = sum(needs);
  const stock: Amounts = new Map(onHand);
  const left: Amounts = new Map(needs);
  for (const { lane } of lanes) {
    const wanted = tapsFor(lane, left);
    const taps = Math.min(wanted, possibleTaps(lane, stock) ?? wanted);
    eachAmount(lane.consumes, (item, each) => addAmount(stock, item, each.mul(-taps)));
    eachAmount(lane.makes, (item, each) => takeFrom(left, item, each.mul(taps)));
  }
  if (step.role === 'cut') for (const [item, pieces] of extra) takeFrom(left, item, pieces);
  const ready = toGo - sum(left);
  const waitingFor = ready === 0 && toGo > 0 ? missingItems(step.lanes, needs, onHand) : [];
  return { toGo, ready, waitingFor };
}

function stillNeeded(lanes: readonly PlanLane[], made: Amounts, extra: Amounts): Amounts {
  const needs: Amounts = new Map();
  for (const lane of lanes) {
    eachAmount(lane.makes, (item, each) => addAmount(needs, item, each.mul(lane.target)));
  }
  for (const [item, planned] of needs) {
    const needed = planned.add(amountOf(extra, item)).sub(amountOf(made, item));
    needs.set(item, needed.lt(0) ? new Fraction(0) : needed);
  }
  return needs;
}

function tapsFor(lane: PlanLane, needs: Amounts): number {
  let taps = 0;
  eachAmount(lane.makes, (item, each) => {
    taps = Math.max(taps, amountOf(needs, item).div(each).ceil().valueOf());
  });
  return taps;
}

function takeFrom(amounts: Amounts, item: string, amount: Fraction): void {
  if (!amounts.has(item)) return;
  const left = amountOf(amounts, item).sub(amount);
  amounts.set(item, left.lt(0) ? new Fraction(0) : left);
}

/** The inputs of which not even one tap's worth is there, for all that is still to make. */
function missingItems(
  lanes: readonly PlanLane[],
  needs: Amounts,
  onHand: Amounts,
): StepProgress['waitingFor'] {
  const wanted: Amounts = new Map();
  const short = new Set<string>();
  for (const lane of lanes) {
    const taps = tapsFor(lane, needs);
    eachAmount(lane.consumes, (item, each) => {
      addAmount(wanted, item, each.mul(taps));
      if (taps > 0 && amountOf(onHand, item).lt(each)) short.add(item);
    });
  }
  return [...short].map((item) => {
    const here = amountOf(onHand, item);
    const missing = amountOf(wanted, item).sub(here.lt(0) ? 0 : here);
    return { item, missing: missing.ceil().valueOf() };
  });
}

function sum(amounts: Amounts): number {
  return [...amounts.values()].reduce((total, amount) => total + amount.valueOf(), 0);
}
