import type { DataSource } from 'typeorm';

import { createDataSource } from '../../../server/db/data-source';
import { createTestSchema } from '../../support/open-test-schema';

/** Everything a migration may leave behind, as text. */
const EVERYTHING = `
  SELECT 'column' AS what, format('%s.%s %s', table_name, column_name, data_type) AS name
    FROM information_schema.columns WHERE table_schema = current_schema() AND table_name <> 'migration'
  UNION SELECT 'index', indexdef FROM pg_indexes WHERE schemaname = current_schema() AND tablename <> 'migration'
  UNION SELECT 'constraint', format('%s %s', conname, pg_get_constraintdef(oid))
    FROM pg_constraint WHERE connamespace = current_schema()::regnamespace AND conrelid <> 'migration'::regclass
  UNION SELECT 'policy', format('%s %s %s %s', policyname, cmd, qual, with_check)
    FROM pg_policies WHERE schemaname = current_schema()
  UNION SELECT 'secured', relname::text FROM pg_class
    WHERE relnamespace = current_schema()::regnamespace AND relrowsecurity
  UNION SELECT 'function', pg_get_functiondef(oid)
    FROM pg_proc WHERE pronamespace = current_schema()::regnamespace
  ORDER BY 1, 2`;

let db: DataSource;
beforeAll(async () => {
  const { migrationUrl } = await createTestSchema();
  db = await createDataSource(migrationUrl).initialize();
});
afterAll(() => db?.destroy());

const pending = async () => {
  const done: { name: string }[] = await db.query('SELECT name FROM migration');
  const names = done.map(({ name }) => name);
  return db.migrations.filter(({ name }) => !names.includes(name ?? ''));
};

it('takes each step up, down without a trace, and up again to the same', async () => {
  await db.runMigrations({ transaction: 'each' });
  const full = await db.query(EVERYTHING);
  const states: unknown[] = [full];
  for (let undone = 0; undone < db.migrations.length; undone += 1) {
    await db.undoLastMigration();
    states.unshift(await db.query(EVERYTHING));
  }
  expect(await pending()).toHaveLength(db.migrations.length);
  expect(states[0]).toEqual([]);

  for (const [index, migration] of db.migrations.entries()) {
    await runOne(index);
    expect({ after: migration.name, has: await db.query(EVERYTHING) }).toEqual({
      after: migration.name,
      has: states[index + 1],
    });
    await db.undoLastMigration();
    expect(await db.query(EVERYTHING)).toEqual(states[index]);
    await runOne(index);
  }
  expect(await db.query(EVERYTHING)).toEqual(full);
});

/** Runs the migration at `index` alone, as the migrations after it do not exist yet. */
async function runOne(index: number): Promise<void> {
  const all = db.migrations;
  Object.assign(db, { migrations: all.slice(0, index + 1) });
  try {
    await db.runMigrations({ transaction: 'each' });
  } finally {
    Object.assign(db, { migrations: all });
  }
}

it('leaves a schema that matches the entities, names of constraints included', async () => {
  await db.runMigrations();
  const drift = await db.driver.createSchemaBuilder().log();
  expect(drift.upQueries.map(({ query }) => query)).toEqual([]);
});

it('secures the rows of every table of the product', async () => {
  const tables = db.entityMetadatas.map(({ tableName }) => tableName).sort();
  const secured: { relname: string }[] = await db.query(
    `SELECT relname FROM pg_class WHERE relrowsecurity
       AND relnamespace = current_schema()::regnamespace ORDER BY relname`,
  );
  expect(secured.map(({ relname }) => relname)).toEqual(tables);
});
