import Fraction from 'fraction.js';

import type { PlanStep } from '../model/plan';
import { addAmount, amountOf, eachAmount, type Amounts } from './read-items';

/**
 * How many of each item must be made beyond the plan, because some were lost: here, or farther on,
 * where remaking takes new inputs. What the plan makes to spare is used up first. Wedges are recut
 * from cloth, so a lost wedge asks for no new stack.
 *
 * @param steps in their order of work
 * @param lost lost pieces by item
 */
export function readNeeds(steps: readonly PlanStep[], lost: Amounts): Amounts {
  const spare = plannedSpare(steps);
  const askedFor: Amounts = new Map(lost);
  const extra: Amounts = new Map();
  for (const step of [...steps].reverse()) {
    for (const lane of step.lanes) {
      const taps = eachMade(lane.makes).reduce((most, [item, perTap]) => {
        const asked = amountOf(askedFor, item);
        const needed = asked.sub(amountOf(spare, item)).ceil();
        if (extra.has(item) || needed.lte(0)) return most;
        extra.set(item, needed);
        return Math.max(most, Math.ceil(needed.valueOf() / perTap));
      }, 0);
      if (taps === 0 || step.role === 'cut') continue;
      eachAmount(lane.consumes, (item, each) => addAmount(askedFor, item, each.mul(taps)));
    }
  }
  return extra;
}

/** Made to spare by the plan: wedges cut with a round and not sewn, the rest of a strip. */
function plannedSpare(steps: readonly PlanStep[]): Amounts {
  const spare: Amounts = new Map();
  const used = new Set<string>();
  for (const { lanes } of steps) {
    for (const { target, consumes, makes } of lanes) {
      for (const [item, perTap] of eachMade(makes)) {
        addAmount(spare, item, new Fraction(target * perTap));
      }
      eachAmount(consumes, (item, each) => {
        used.add(item);
        addAmount(spare, item, each.mul(-target));
      });
    }
  }
  for (const item of spare.keys()) if (!used.has(item)) spare.delete(item); // the finished blocks
  return spare;
}

function eachMade(makes: PlanStep['lanes'][number]['makes']): [string, number][] {
  return Object.entries(makes);
}
