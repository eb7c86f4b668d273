import { madePerTap } from './finish-steps';
import {
  addAmount,
  amountOf,
  type Amounts,
  type ItemAmounts,
  type LaneState,
  type WorkState,
} from './read-items';

/**
 * Units that each step made beyond what its inputs allow, by step key. What was made and not lost
 * goes to the steps in their order of work, and within one to its lanes in order.
 */
export function countOutrun(
  { steps }: WorkState,
  { made, lost }: ItemAmounts,
): Map<string, number> {
  const pool: Amounts = new Map(made);
  for (const [item, parts] of lost) addAmount(pool, item, -parts);
  return new Map(
    steps.map(({ step, lanes }) => [
      step.key,
      lanes.reduce((sum, state) => sum + shortTaps(state, pool) * madePerTap(state.lane), 0),
    ]),
  );
}

/** Taps of one lane that found no input; takes what the lane used out of the pool. */
function shortTaps({ uses, done }: LaneState, pool: Amounts): number {
  let most = 0;
  for (const [item, each] of uses) {
    const short = each * done - Math.max(0, amountOf(pool, item));
    most = Math.max(most, Math.ceil(short / each));
    addAmount(pool, item, -each * done);
  }
  return most;
}
