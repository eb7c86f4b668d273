import type { PlanLane } from '../model/plan';
import type { PlanRequest } from '../model/plan-request';
import { ringUnits, type RingUnit } from '../patterns/ring/ring-units';
import { unitItem, unitName } from '../patterns/ring/unit-item';
import { tippedName } from './piece-name';
import { lane, NEEDLE, PIECING_MM, type StepDraft } from './step-draft';

/**
 * From tips to the pressed ring: pairs, quarters, halves, ring. Alike units share a lane.
 *
 * @param letters the fabric of every wedge of one plate, clockwise from 12 o'clock
 */
export function joiningSteps(request: PlanRequest, letters: readonly string[]): StepDraft[] {
  const ring = ringUnits(letters);
  const single = request.tip.shape === 'flat' ? 'wedge' : 'tip';
  const nameOf = (unit: RingUnit) => unitItem(unit, ring, single);
  const { seam, blocks } = request;
  const settings = { stitchMm: PIECING_MM, needle: NEEDLE, seam };
  const base = { piece: tippedName(request), fabricRole: 'wedge' } as const;
  const sewn = (['pair', 'quarter', 'half', 'ring'] as const).flatMap((role): StepDraft[] => {
    const lanes = unitLanes(unitsOfKind(ring, role), nameOf, blocks);
    return lanes.length === 0 ? [] : [{ ...base, role, params: { seam }, lanes, settings }];
  });
  const pressed: StepDraft = {
    ...base,
    role: 'ring-press',
    params: { press: request.press },
    lanes: [lane('ring-pressed', blocks, { ring: 1 }, 'ring-pressed')],
  };
  return [...sewn, pressed];
}

function unitsOfKind(unit: RingUnit, kind: RingUnit['kind']): RingUnit[] {
  if (unit.kind === kind) return [unit];
  return unit.parts.flatMap((part) => unitsOfKind(part, kind));
}

function unitLanes(
  units: readonly RingUnit[],
  nameOf: (unit: RingUnit) => string,
  blocks: number,
): PlanLane[] {
  const lanes = new Map<string, PlanLane>();
  for (const unit of units) {
    const made = nameOf(unit);
    const known = lanes.get(made);
    const key = made.includes(':') ? unitName(unit) : made;
    const target = (known?.target ?? 0) + blocks;
    lanes.set(
      made,
      known ? { ...known, target } : lane(key, target, countParts(unit, nameOf), made),
    );
  }
  return [...lanes.values()];
}

function countParts(unit: RingUnit, nameOf: (unit: RingUnit) => string): Record<string, number> {
  const counts: Record<string, number> = {};
  for (const part of unit.parts) {
    const item = nameOf(part);
    counts[item] = (counts[item] ?? 0) + 1;
  }
  return counts;
}
