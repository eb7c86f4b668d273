import type { z } from 'zod';

import type { PlanRefusal } from '../model/plan';
import { PlanRequestSchema, type PlanRequest } from '../model/plan-request';
import type { Result } from '../result';
import { checkLimits } from './check-limits';
import { normaliseRequest } from './normalise-request';
import { refuse } from './refuse';

export interface Refused {
  kind: 'refused';
  errors: PlanRefusal[];
}

/**
 * Reads a request: its shape first, then the limits of every field.
 *
 * @param json anything, from a form, a file or the wire
 * @returns the request with every length in lowest terms, or every reason to refuse it
 */
export function parseRequest(json: unknown): Result<PlanRequest, Refused> {
  const shaped = PlanRequestSchema.safeParse(json);
  if (!shaped.success) {
    return { ok: false, kind: 'refused', errors: shaped.error.issues.map(refuseShape) };
  }
  const errors = checkLimits(shaped.data);
  if (errors.length > 0) return { ok: false, kind: 'refused', errors };
  return { ok: true, value: normaliseRequest(shaped.data) };
}

function refuseShape(issue: z.core.$ZodIssue): PlanRefusal {
  const pointer = issue.path.map((part) => `/${escapePointer(String(part))}`).join('');
  const pattern = issue.code === 'invalid_format' ? issue.pattern : undefined;
  return refuse(pointer, isLengthPattern(pattern) ? 'not-a-length' : 'not-a-request');
}

/** Only lengths have a pattern that admits a fraction bar. */
function isLengthPattern(pattern: string | undefined): boolean {
  return pattern?.includes('/[1-9]') || pattern?.includes('\\/[1-9]') || false;
}

/** RFC 6901, section 3. */
function escapePointer(part: string): string {
  return part.replace(/~/g, '~0').replace(/\//g, '~1');
}
