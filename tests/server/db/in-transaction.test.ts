import { DEMO_PEOPLE, DEMO_SCOPES } from '../../../server/db/demo-people';
import { ScopeRight } from '../../../server/db/entities/scope-right';
import { SyncScope } from '../../../server/db/entities/sync-scope';
import { inTransaction } from '../../../server/db/in-transaction';
import { seed } from '../../../server/db/seed';
import { openTestDatabase, type TestDatabase } from '../../support/open-test-schema';

const find = (name: string) => {
  const person = DEMO_PEOPLE.find(({ displayName }) => displayName === name);
  if (!person) throw new Error(name);
  return person;
};
const maker = find('Wilmot Ferrand');
const helper = find('Jessa Tollan');
const shop = find('Ropewalk Cloth');
const stranger = find('Hester Voe');
const [shared, hidden] = DEMO_SCOPES.filter(({ kind }) => kind === 'project');
if (!shared || !hidden) throw new Error('the demo has no two projects');

let database: TestDatabase;
beforeAll(async () => {
  database = await openTestDatabase();
  await seed(database.owner);
});
afterAll(() => database?.close());

const as = <Value>(who: { id: string }, sql: string, params: unknown[] = []): Promise<Value> =>
  inTransaction(database.db, who.id, (manager) => manager.query(sql, params));
const idsOf = async (who: { id: string }) => {
  const rows = await as<{ id: string }[]>(who, 'SELECT id FROM sync_scope');
  return rows.map(({ id }) => id).sort();
};

it('shows a bare SELECT only the scopes in which the acting person has a right', async () => {
  const mine = (who: { id: string }) =>
    DEMO_SCOPES.filter((s) => s.owner.id === who.id || s.shared.some((x) => x.with.id === who.id))
      .map(({ id }) => id)
      .sort();
  for (const who of DEMO_PEOPLE) expect(await idsOf(who)).toEqual(mine(who));
  expect(await idsOf(maker)).toHaveLength(4);
  expect(await idsOf(helper)).toHaveLength(2);
});

it('shows nothing to a query that names nobody, even right after one that did', async () => {
  await idsOf(maker);
  for (const table of ['sync_scope', 'scope_right', 'app_user']) {
    expect(await database.db.query(`SELECT * FROM ${table}`)).toEqual([]);
  }
});

it('keeps the names apart when people act at the same time', async () => {
  const expected = await Promise.all(DEMO_PEOPLE.map(idsOf));
  for (let round = 0; round < 5; round += 1) {
    expect(await Promise.all(DEMO_PEOPLE.map(idsOf))).toEqual(expected);
  }
});

it('shows each person only their own account', async () => {
  expect(await as(stranger, 'SELECT email FROM app_user')).toEqual([{ email: stranger.email }]);
});

it('shows an owner every right in the scope, and others only their own', async () => {
  const sql = 'SELECT count(*)::int AS n FROM scope_right WHERE scope_id = $1';
  expect(await as(maker, sql, [shared.id])).toEqual([{ n: 3 }]);
  expect(await as(shop, sql, [shared.id])).toEqual([{ n: 1 }]);
  expect(await as(stranger, sql, [shared.id])).toEqual([{ n: 0 }]);
});

it('lets a writer move a scope on, and neither a reader nor a stranger', async () => {
  const sql = 'UPDATE sync_scope SET head = head + 1 WHERE id = $1 RETURNING head';
  expect(await as(helper, sql, [shared.id])).toEqual([[{ head: '1' }], 1]);
  expect(await as(shop, sql, [shared.id])).toEqual([[], 0]);
  expect(await as(stranger, sql, [shared.id])).toEqual([[], 0]);
  expect(await as(helper, sql, [hidden.id])).toEqual([[], 0]);
});

it('refuses a right that someone gives themselves in the scope of another', async () => {
  const rob = inTransaction(database.db, stranger.id, (manager) =>
    manager.insert(ScopeRight, { scopeId: hidden.id, userId: stranger.id, right: 'own' }),
  );
  await expect(rob).rejects.toThrow(/row-level security/);
  const promote = `UPDATE scope_right SET "right" = 'own' WHERE scope_id = $1`;
  expect(await as(helper, promote, [shared.id])).toEqual([[], 0]);
  const clear = 'DELETE FROM scope_right WHERE scope_id = $1';
  expect(await as(stranger, clear, [shared.id])).toEqual([[], 0]);
});

it('refuses a scope made in the name of another, and one taken over by a helper', async () => {
  const id = '019de000-0000-7000-8000-e00000000001';
  const forge = inTransaction(database.db, stranger.id, (manager) =>
    manager.insert(SyncScope, { id, kind: 'project', ownerId: maker.id }),
  );
  await expect(forge).rejects.toThrow(/row-level security/);
  const take = 'UPDATE sync_scope SET owner_id = $1 WHERE id = $2';
  await expect(as(helper, take, [helper.id, shared.id])).rejects.toThrow(/permission denied/);
});

it('lets nobody make themselves a teacher or an admin', async () => {
  const promote = as(stranger, `UPDATE app_user SET role = 'admin'`);
  await expect(promote).rejects.toThrow(/permission denied/);
  const id = '019de000-0000-7000-8000-e00000000003';
  const enter = (role: string) =>
    as({ id }, `INSERT INTO app_user VALUES ($1, 'new@example.org', 'New', $2)`, [id, role]);
  await expect(enter('admin')).rejects.toThrow(/row-level security/);
  await enter('member');
});

it('lets a person make a scope, share it and take it away again', async () => {
  const id = '019de000-0000-7000-8000-e00000000002';
  await inTransaction(database.db, stranger.id, async (manager) => {
    await manager.insert(SyncScope, { id, kind: 'project', ownerId: stranger.id });
    await manager.insert(ScopeRight, { scopeId: id, userId: stranger.id, right: 'own' });
    await manager.insert(ScopeRight, { scopeId: id, userId: helper.id, right: 'read' });
  });
  expect(await idsOf(helper)).toContain(id);
  await as(stranger, 'DELETE FROM sync_scope WHERE id = $1', [id]);
  expect(await idsOf(helper)).not.toContain(id);
});

it('undoes everything when the work fails', async () => {
  const failing = inTransaction(database.db, maker.id, async (manager) => {
    await manager.update(SyncScope, { id: hidden.id }, { generation: 9 });
    throw new Error('half way');
  });
  await expect(failing).rejects.toThrow('half way');
  const sql = 'SELECT generation FROM sync_scope WHERE id = $1';
  expect(await as(maker, sql, [hidden.id])).toEqual([{ generation: 1 }]);
});

it('gives the role of the server rows and nothing else', async () => {
  for (const sql of [
    'CREATE TABLE mine ()',
    'ALTER TABLE sync_scope DISABLE ROW LEVEL SECURITY',
    'DROP POLICY sync_scope_read ON sync_scope',
    'TRUNCATE scope_right',
    'SELECT * FROM migration',
  ]) {
    await expect(database.db.query(sql)).rejects.toThrow(/permission denied|must be owner/);
  }
});
