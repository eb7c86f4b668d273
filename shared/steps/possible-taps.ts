import type { PlanLane } from '../model/plan';
import { amountOf, eachAmount, type Amounts } from './read-items';

/**
 * Whole taps of a lane that what is on hand allows: the least of on hand ÷ used, rounded down.
 *
 * @returns never below 0; null when the lane starts from cloth
 */
export function possibleTaps(lane: PlanLane, onHand: Amounts): number | null {
  let least: number | null = null;
  eachAmount(lane.consumes, (item, each) => {
    const taps = Math.max(0, amountOf(onHand, item).div(each).floor().valueOf());
    least = least === null ? taps : Math.min(least, taps);
  });
  return least;
}
