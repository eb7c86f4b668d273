import type { PlanLane } from '../../model/plan';

const ITEM_LETTERS = /^[^:]*:(.+)$/;

/** The fabrics that a lane's items name, in ring order ("pair:A+C" → A, C); none: an empty list. */
export function laneLetters(lane: PlanLane | null): string[] {
  if (!lane) return [];
  const items = [...Object.keys(lane.makes), ...Object.keys(lane.consumes)];
  const named = items.flatMap((item) => ITEM_LETTERS.exec(item)?.[1]?.split('+') ?? []);
  return [...new Set(named)];
}
