import type { PlanStep } from '../model/plan';
import type { ExtraLane, LaneProgress, Progress, StepProgress, Tally } from '../model/tally';
import { countOutrun } from './count-outrun';
import { madePerTap } from './finish-steps';
import { possibleTaps } from './possible-taps';
import {
  amountOf,
  readItems,
  readWork,
  type Amounts,
  type ItemAmounts,
  type StepState,
  type WorkState,
} from './read-items';
import { readNeeds } from './read-needs';
import { readReady } from './read-ready';

/** All that the steps of one project share while they are read. */
interface Flow {
  parts: number;
  items: ItemAmounts;
  onHand: Amounts;
  extra: Amounts;
  outrun: ReadonlyMap<string, number>;
}

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
  const work = readWork(steps, extraLanes, tallies);
  const items = readItems(work, tallies);
  const { parts } = work;
  const onHand = readOnHand(work, items);
  const extra = readNeeds(work, items.lost);
  const flow: Flow = { parts, items, onHand, extra, outrun: countOutrun(work, items) };
  return {
    steps: work.steps.map((state) => readStep(state, flow)),
    items: [...onHand].map(([item, here]) => ({
      item,
      made: amountOf(items.made, item) / parts,
      lost: amountOf(items.lost, item) / parts,
      used: amountOf(items.used, item) / parts,
      onHand: here / parts,
    })),
  };
}

function readStep(state: StepState, flow: Flow): StepProgress {
  const { key, role, position, station, target, lanes: planned } = state.step;
  const products = new Set(planned.flatMap(({ makes }) => Object.keys(makes)));
  const total = (amounts: Amounts) =>
    [...products].reduce((sum, item) => sum + amountOf(amounts, item), 0) / flow.parts;
  const lanes = state.lanes.map((lane): LaneProgress => ({
    lane: lane.lane,
    extra: lane.extra,
    done: lane.done,
    possible: possibleTaps(lane, flow.onHand),
    perTap: madePerTap(lane.lane),
  }));
  const made = lanes.reduce((sum, { done, perTap }) => sum + done * perTap, 0);
  const lost = total(flow.items.lost);
  return {
    key,
    role,
    position,
    station,
    target: target + total(flow.extra),
    made,
    lost,
    good: Math.max(0, made - lost),
    ...readReady(state, flow.items, flow.onHand, flow.extra, flow.parts),
    outrun: flow.outrun.get(key) ?? 0,
    lanes,
  };
}

function readOnHand({ steps }: WorkState, { made, lost, used }: ItemAmounts): Amounts {
  const onHand: Amounts = new Map();
  for (const { makes } of steps.flatMap(({ lanes }) => lanes)) {
    for (const [item] of makes) {
      onHand.set(item, amountOf(made, item) - amountOf(lost, item) - amountOf(used, item));
    }
  }
  return onHand;
}
