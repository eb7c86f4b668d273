import { type Fraction } from 'fraction.js';

import { wedgeLengths, type WedgeLengths } from '../../cutting/wedge-lengths';
import { wedgePitch } from '../../cutting/wedge-pitch';
import type { PlanRequest } from '../../model/plan-request';
import { stackGroups, type StackGroup } from '../../stacks/stack-groups';
import { toFraction } from '../../units/fraction';
import { fabricOrder } from './fabric-order';
import type { RingGeometry } from './ring-geometry';
import { ringLetters } from './ring-letters';

export interface CutGroup extends StackGroup {
  cut: WedgeLengths;
}

export interface RingCutting {
  /** letters of one round, and of every wedge of one plate */
  order: string[];
  letters: string[];
  groups: CutGroup[];
}

/**
 * How the wedges are cut from their strips.
 *
 * @param usableWidth U, inches: an argument, so that another width can be asked about
 * @returns null when not one wedge fits across the cloth
 */
export function ringCutting(
  request: PlanRequest,
  geometry: RingGeometry,
  usableWidth: Fraction,
): RingCutting | null {
  const fabrics = request.fabrics.filter(({ role }) => role === 'wedge');
  const order = fabricOrder(fabrics, request.wedges);
  const letters = ringLetters(order, request.wedges);
  const { cutNarrowIn, cutWideIn } = geometry;
  const { layers, cap } = request.cutting;
  const groups: CutGroup[] = [];
  for (const group of stackGroups(fabrics, letters, layers ?? cap)) {
    const cut = wedgeLengths({
      blocks: request.blocks,
      perPlate: group.cutsPerPlate,
      usableWidth,
      squaringOff: toFraction(request.cutting.squaringOff),
      cutWideIn,
      pitchIn: wedgePitch(cutNarrowIn, cutWideIn, group.oneWay),
    });
    if (!cut) return null;
    groups.push({ ...group, cut });
  }
  return { order, letters, groups };
}
