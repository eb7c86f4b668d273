import type { RingUnit } from './ring-units';

/**
 * The item that a unit counts as: "tip:A" (a wedge for a flat tip), "pair:A+B", "quarter:…". Halves
 * that are all alike need no fabrics in their name; nor does the ring.
 *
 * @param ring the whole ring's unit, which tells whether its halves are alike
 */
export function unitItem(unit: RingUnit, ring: RingUnit, tip: 'tip' | 'wedge'): string {
  if (unit.kind === 'ring') return 'ring';
  if (unit.kind === 'half' && halvesAlike(ring)) return 'half';
  return `${unit.kind === 'single' ? tip : unit.kind}:${unitName(unit)}`;
}

/** Fabrics of a unit in ring order. @example "A+C" */
export function unitName(unit: RingUnit): string {
  return unit.letters.join('+');
}

function halvesAlike(ring: RingUnit): boolean {
  return new Set(ring.parts.map(unitName)).size === 1;
}
