import type { PlanRequest } from '../model/plan-request';

export type BladeMm = PlanRequest['cutting']['bladeMm'];

const CAP_BY_BLADE: Record<BladeMm, number> = { 18: 1, 28: 2, 45: 4, 60: 6 };

/**
 * Layers that a blade cuts without slipping, cautiously; a maker may set her own cap.
 *
 * @param bladeMm diameter of the rotary blade, millimetres
 * @example defaultCap(60) // 6
 */
export function defaultCap(bladeMm: BladeMm): number {
  return CAP_BY_BLADE[bladeMm];
}
