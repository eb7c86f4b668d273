import type { DataSource } from 'typeorm';

import { DEMO_PEOPLE, DEMO_SCOPES } from './demo-people';
import { AppUser } from './entities/app-user';
import { ScopeRight } from './entities/scope-right';
import { SyncScope } from './entities/sync-scope';

/**
 * Writes the demo's people, scopes and rights where they are missing; what is there stays as it is.
 *
 * @param owner connected as the tables' owner, whom row-level security does not hold back
 */
export async function seed(owner: DataSource): Promise<void> {
  const scopes = DEMO_SCOPES.map(({ id, kind, owner: { id: ownerId } }) => ({ id, kind, ownerId }));
  const rights = DEMO_SCOPES.flatMap((scope) => [
    { scopeId: scope.id, userId: scope.owner.id, right: 'own' as const },
    ...scope.shared.map((share) => {
      return { scopeId: scope.id, userId: share.with.id, right: share.right };
    }),
  ]);
  await owner.transaction(async (manager) => {
    const people = DEMO_PEOPLE.map((person) => ({ ...person }));
    await manager.createQueryBuilder().insert().into(AppUser).values(people).orIgnore().execute();
    await manager.createQueryBuilder().insert().into(SyncScope).values(scopes).orIgnore().execute();
    await manager
      .createQueryBuilder()
      .insert()
      .into(ScopeRight)
      .values(rights)
      .orIgnore()
      .execute();
  });
}
