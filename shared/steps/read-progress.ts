import type { PlanStep } from '../model/plan';
import type {
  ExtraLane,
  ItemProgress,
  LaneProgress,
  Progress,
  StepProgress,
  Tally,
} from '../model/tally';
import { madePerTap } from './finish-steps';
import { countOutrun } from './count-outrun';
import { possibleTaps } from './possible-taps';
import {
  amountOf,
  readItems,
  readLanes,
  type Amounts,
  type ItemAmounts,
  type StepState,
} from './read-items';
import { readNeeds } from './read-needs';
import { readReady } from './read-ready';

/**
 * How far a project is: what every step has made and may make now, and what is on hand.
 *
 * @param steps the project's steps, in their order of work
 * @param extraLanes lanes opened later, for recutting
 * @param tallies counts as shown; those of unknown steps or lanes count for nothing but losses
 */
export function readProgress(
  steps: readonly PlanStep[],
  extraLanes: readonly ExtraLane[],
  tallies: readonly Tally[],
): Progress {
  const states = readLanes(steps, extraLanes, tallies);
  const items = readItems(states, tallies);
  const onHand = readOnHand(states, items);
  const extra = readNeeds(steps, items.lost);
  const outrun = countOutrun(states, items);
  return {
    steps: states.map((state) => readStep(state, items, onHand, extra, outrun)),
    items: [...onHand.keys()].map((item) => readItem(item, items, onHand)),
  };
}

function readStep(
  state: StepState,
  items: ItemAmounts,
  onHand: Amounts,
  extra: Amounts,
  outrun: ReadonlyMap<string, number>,
): StepProgress {
  const { key, role, position, station, target, lanes: planned } = state.step;
  const products = new Set(planned.flatMap(({ makes }) => Object.keys(makes)));
  const total = (amounts: Amounts) =>
    [...products].reduce((sum, item) => sum + amountOf(amounts, item).valueOf(), 0);
  const lanes = state.lanes.map(({ lane, extra: opened, done }): LaneProgress => ({
    lane,
    extra: opened,
    done,
    possible: possibleTaps(lane, onHand),
    perTap: madePerTap(lane),
  }));
  const made = lanes.reduce((sum, { done, perTap }) => sum + done * perTap, 0);
  const lost = total(items.lost);
  return {
    key,
    role,
    position,
    station,
    target: target + total(extra),
    made,
    lost,
    good: Math.max(0, made - lost),
    ...readReady(state, items, onHand, extra),
    outrun: outrun.get(key) ?? 0,
    lanes,
  };
}

function readOnHand(states: readonly StepState[], items: ItemAmounts): Amounts {
  const lanes = states.flatMap((state) => state.lanes);
  const names = new Set(lanes.flatMap(({ lane }) => Object.keys(lane.makes)));
  return new Map(
    [...names].map((item) => [
      item,
      amountOf(items.made, item).sub(amountOf(items.lost, item)).sub(amountOf(items.used, item)),
    ]),
  );
}

function readItem(item: string, items: ItemAmounts, onHand: Amounts): ItemProgress {
  return {
    item,
    made: amountOf(items.made, item).valueOf(),
    lost: amountOf(items.lost, item).valueOf(),
    used: amountOf(items.used, item).valueOf(),
    onHand: amountOf(onHand, item).valueOf(),
  };
}
