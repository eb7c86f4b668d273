import { z } from 'zod';

import type { StepRole } from '@/shared/model/codes';

/** Away from the Table this long, the next cut begins with the check again. */
export const AWAY_MS = 30 * 60 * 1000;

const CUTTING_ROLES: readonly StepRole[] = [
  'strip',
  'length',
  'cut',
  'circle-cut',
  'background-cut',
  'tip-trim',
  'block-trim',
];

/** A cutting visit: how it was opened, and when she was last seen cutting. */
export const CuttingVisitSchema = z.object({
  opened: z.enum(['checked', 'skipped']),
  adult: z.boolean(), // the adult's line was ticked
  lastSeenAtMs: z.number(),
});
export type CuttingVisit = z.output<typeof CuttingVisitSchema>;

export function isCutting(role: StepRole): boolean {
  return CUTTING_ROLES.includes(role);
}

/**
 * Whether the check opens now: at the first cut, after 30 minutes away, when the clock ran
 * backwards past the visit, and when someone under 18 cuts and no adult was named.
 */
export function needsCheck(visit: CuttingVisit | null, under18: boolean, nowMs: number): boolean {
  if (visit === null) return true;
  const awayMs = nowMs - visit.lastSeenAtMs;
  if (awayMs >= AWAY_MS || awayMs < -AWAY_MS) return true;
  return under18 && !visit.adult;
}

/** A skip is one tap, for this visit only; with someone under 18 cutting there is none. */
export function canSkip(under18: boolean): boolean {
  return !under18;
}
