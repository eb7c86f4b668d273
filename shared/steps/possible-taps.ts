import { amountOf, type Amounts, type LaneState } from './read-items';

/**
 * Whole taps of a lane that what is on hand allows: the least of on hand ÷ used, rounded down.
 *
 * @returns never below 0; null when the lane starts from cloth
 */
export function possibleTaps({ uses }: Pick<LaneState, 'uses'>, onHand: Amounts): number | null {
  if (uses.length === 0) return null;
  const taps = uses.map(([item, each]) => Math.floor(amountOf(onHand, item) / each));
  return Math.max(0, Math.min(...taps));
}
