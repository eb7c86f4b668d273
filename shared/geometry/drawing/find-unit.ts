import type { Plan, PlanLane } from '../../model/plan';
import { ringLetters } from '../../patterns/ring/ring-letters';
import { ringUnits, type RingUnit } from '../../patterns/ring/ring-units';

/** The fabric of every wedge of a plan's ring, clockwise from 12 o'clock. */
export const plateLetters = (plan: Plan): string[] =>
  ringLetters(plan.geometry.ring.order, plan.request.wedges);

/** The ring as a tree of the units it is sewn from. */
export const plateUnits = (plan: Plan): RingUnit => ringUnits(plateLetters(plan));

const branches = (unit: RingUnit): RingUnit[] => [unit, ...unit.parts.flatMap(branches)];

/**
 * The unit that a lane makes: the one with its fabrics ("pair:A+C"), else the first of its kind.
 *
 * @returns null when the ring has no unit of that kind
 */
export function findUnit(
  plan: Plan,
  kind: RingUnit['kind'],
  lane: PlanLane | null,
): RingUnit | null {
  const alike = branches(plateUnits(plan)).filter((unit) => unit.kind === kind);
  const names = Object.keys(lane?.makes ?? {}).map((item) => item.slice(item.indexOf(':') + 1));
  const named = alike.find((unit) => names.includes(unit.letters.join('+')));
  return named ?? alike[0] ?? null;
}
