import { DEMO_PEOPLE, DEMO_SCOPES } from '../../../server/db/demo-people';
import { seed } from '../../../server/db/seed';
import { openTestDatabase, type TestDatabase } from '../../support/open-test-schema';

let database: TestDatabase;
beforeAll(async () => {
  database = await openTestDatabase();
  await seed(database.owner);
});
afterAll(() => database?.close());

const contents = () =>
  Promise.all(
    ['app_user', 'sync_scope', 'scope_right'].map((table) =>
      database.owner.query(`SELECT * FROM ${table} ORDER BY 1, 2`),
    ),
  );

it('writes the guild: a maker, a helper, a teacher with a class of eight, and a shop', async () => {
  const pupils = await database.owner.query(
    `SELECT count(*)::int AS n FROM scope_right JOIN sync_scope ON sync_scope.id = scope_id
       JOIN app_user ON app_user.id = owner_id
       WHERE kind = 'class' AND "right" = 'read' AND role = 'teacher'`,
  );
  expect(pupils).toEqual([{ n: 8 }]);
  const projects = await database.owner.query(
    `SELECT display_name AS who, "right", count(*)::int AS n FROM scope_right
       JOIN sync_scope ON sync_scope.id = scope_id JOIN app_user ON app_user.id = user_id
       WHERE kind = 'project' GROUP BY 1, 2 ORDER BY n DESC, "right" DESC`,
  );
  expect(projects).toEqual([
    { who: 'Wilmot Ferrand', right: 'own', n: 3 },
    { who: 'Jessa Tollan', right: 'write', n: 1 },
    { who: 'Ropewalk Cloth', right: 'read', n: 1 },
  ]);
});

it('gives everyone a scope of their own, and every scope an owner who holds the right', async () => {
  const own = await database.owner.query(
    `SELECT count(DISTINCT owner_id)::int AS n FROM sync_scope WHERE kind = 'own'`,
  );
  expect(own).toEqual([{ n: DEMO_PEOPLE.length }]);
  const owned = await database.owner.query(
    `SELECT count(*)::int AS n FROM sync_scope JOIN scope_right
       ON scope_id = id AND user_id = owner_id AND "right" = 'own'`,
  );
  expect(owned).toEqual([{ n: DEMO_SCOPES.length }]);
});

it('uses addresses that reach nobody, and ids in the form the app makes', () => {
  for (const { email } of DEMO_PEOPLE) expect(email).toMatch(/^[a-z.]+@example\.org$/);
  for (const { id } of [...DEMO_PEOPLE, ...DEMO_SCOPES]) {
    expect(id).toMatch(/^[0-9a-f]{8}-[0-9a-f]{4}-7[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/);
  }
  const ids = [...DEMO_PEOPLE, ...DEMO_SCOPES].map(({ id }) => id);
  expect(new Set(ids).size).toBe(ids.length);
});

it('changes nothing the second time, not even what was changed since', async () => {
  const id = DEMO_PEOPLE[0]?.id;
  await database.owner.query(`UPDATE app_user SET display_name = 'Wil' WHERE id = $1`, [id]);
  const before = await contents();
  await seed(database.owner);
  expect(await contents()).toEqual(before);
  expect(JSON.stringify(before)).toContain('"Wil"');
});

it('takes an address once, in whatever case it is written', async () => {
  const again = database.owner.query(
    `INSERT INTO app_user VALUES ('019de000-0000-7000-8000-f00000000001',
       'WILMOT.Ferrand@Example.org', 'Another', 'member')`,
  );
  await expect(again).rejects.toThrow(/app_user_email_key/);
});

it.each([
  ['a role', `UPDATE app_user SET role = 'king'`, 'app_user_role_check'],
  ['a kind of scope', `UPDATE sync_scope SET kind = 'club'`, 'sync_scope_kind_check'],
  ['a right', `UPDATE scope_right SET "right" = 'lend'`, 'scope_right_right_check'],
  ['a cursor past the head', `UPDATE sync_scope SET min_cursor = 1`, 'sync_scope_cursor_check'],
])('refuses %s that nothing knows', async (_name, sql, constraint) => {
  await expect(database.owner.query(sql)).rejects.toThrow(constraint);
});
