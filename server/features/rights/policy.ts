import type { Right } from '../../db/entities/scope-right';

/** What people do in a scope. */
export const ACTS = ['read', 'write', 'share', 'delete'] as const;
export type Act = (typeof ACTS)[number];

const ALLOWED: Record<Right, readonly Act[]> = {
  read: ['read'],
  write: ['read', 'write'],
  own: ['read', 'write', 'share', 'delete'],
};

/** The one place that says which right allows which act; `null` is no right at all. */
export function allows(right: Right | null, act: Act): boolean {
  return right !== null && ALLOWED[right].includes(act);
}
