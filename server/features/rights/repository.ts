import type { EntityManager } from 'typeorm';

import { ScopeRight, type Right } from '../../db/entities/scope-right';

/** A person's right in a scope, `null` for none. */
export async function findRight(
  manager: EntityManager,
  userId: string,
  scopeId: string,
): Promise<Right | null> {
  const row = await manager.findOneBy(ScopeRight, { userId, scopeId });
  return row?.right ?? null;
}
