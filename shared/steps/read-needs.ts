import { addAmount, amountOf, type Amounts, type WorkState } from './read-items';

/**
 * How many of each item must be made beyond the plan, because some were lost: here, or farther on,
 * where remaking takes new inputs. What the plan makes to spare is used up first. Wedges are recut
 * from cloth, so a lost wedge asks for no new stack.
 *
 * @param work its steps in their order of work
 * @param lost lost pieces by item, in parts
 * @returns whole pieces by item, in parts
 */
export function readNeeds({ steps, parts }: WorkState, lost: Amounts): Amounts {
  const extra: Amounts = new Map();
  if (lost.size === 0) return extra;
  const spare = plannedSpare({ steps, parts });
  const askedFor: Amounts = new Map(lost);
  for (const { step, lanes } of [...steps].reverse()) {
    for (const { makes, uses } of lanes.filter((lane) => !lane.extra)) {
      let taps = 0;
      for (const [item, each] of makes) {
        const asked = amountOf(askedFor, item) - amountOf(spare, item);
        if (extra.has(item) || asked <= 0) continue;
        extra.set(item, Math.ceil(asked / parts) * parts);
        taps = Math.max(taps, Math.ceil(asked / each));
      }
      if (taps === 0 || step.role === 'cut') continue;
      for (const [item, each] of uses) addAmount(askedFor, item, each * taps);
    }
  }
  return extra;
}

/** Made to spare by the plan: wedges cut with a round and not sewn, the rest of a strip. */
function plannedSpare({ steps }: WorkState): Amounts {
  const spare: Amounts = new Map();
  const used = new Set<string>();
  for (const { lane, extra, makes, uses } of steps.flatMap(({ lanes }) => lanes)) {
    if (extra) continue;
    for (const [item, each] of makes) addAmount(spare, item, each * lane.target);
    for (const [item, each] of uses) {
      used.add(item);
      addAmount(spare, item, -each * lane.target);
    }
  }
  for (const item of [...spare.keys()]) if (!used.has(item)) spare.delete(item); // finished blocks
  return spare;
}
