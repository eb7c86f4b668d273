import type { Plan } from '../model/plan';
import type { ExtraLane } from '../model/tally';
import { InvariantError } from '../result';

/**
 * A lane for recutting wedges of one fabric, straight from its cloth: one layer, one wedge a tap.
 *
 * @param plan its `cut` step gets the lane
 * @param letter the fabric's letter
 * @param pieces wedges to recut, ≥ 1
 * @throws InvariantError when the plan cuts no wedges
 * @example recutLane(plan, 'D', 1).key // "D1"
 */
export function recutLane(plan: Plan, letter: string, pieces: number): ExtraLane {
  const cut = plan.steps.find(({ role }) => role === 'cut');
  if (!cut) throw new InvariantError('a ring plan without a cut step');
  const key = `${letter}1`;
  // a stack of this fabric alone has that key already
  const taken = cut.lanes.some((lane) => lane.key === key);
  return {
    step: cut.key,
    key: taken ? `${key} again` : key,
    target: pieces,
    consumes: {},
    makes: { [`wedge:${letter}`]: 1 },
  };
}
