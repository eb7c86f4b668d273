import { madePerTap } from './finish-steps';
import {
  addAmount,
  amountOf,
  eachAmount,
  type Amounts,
  type ItemAmounts,
  type LaneState,
  type StepState,
} from './read-items';

/**
 * Units that each step made beyond what its inputs allow, by step key. What was made and not lost
 * goes to the steps in their order of work, and within one to its lanes in order.
 */
export function countOutrun(
  states: readonly StepState[],
  { made, lost }: ItemAmounts,
): Map<string, number> {
  const pool: Amounts = new Map(made);
  for (const [item, pieces] of lost) addAmount(pool, item, pieces.neg());
  return new Map(
    states.map(({ step, lanes }) => [
      step.key,
      lanes.reduce((sum, state) => sum + shortTaps(state, pool) * madePerTap(state.lane), 0),
    ]),
  );
}

/** Taps of one lane that found no input; takes what the lane used out of the pool. */
function shortTaps({ lane, done }: LaneState, pool: Amounts): number {
  let most = 0;
  eachAmount(lane.consumes, (item, each) => {
    const used = each.mul(done);
    const there = amountOf(pool, item);
    const short = used.sub(there.lt(0) ? 0 : there);
    most = Math.max(most, short.div(each).ceil().valueOf());
    addAmount(pool, item, used.neg());
  });
  return Math.min(most, done);
}
