import { createHash } from 'node:crypto';

import { migrate, NewerSchemaError } from '../../../sync/store/migrate';
import { createProjects } from '../../../sync/store/migrations/001-projects';
import { keepNewestAct } from '../../../sync/store/migrations/002-newest-act';
import { openNodeDatabase } from '../../support/open-node-database';

const version = async (db: ReturnType<typeof openNodeDatabase>) =>
  (await db.all<{ user_version: number }>('PRAGMA user_version'))[0]?.user_version;

it('runs each migration once, in order, and goes on where it stopped', async () => {
  const db = openNodeDatabase(':memory:');
  const first = 'CREATE TABLE one (a)';
  await migrate(db, [first]);
  expect(await version(db)).toBe(1);
  await migrate(db, [first, 'ALTER TABLE one ADD COLUMN b']);
  expect(await version(db)).toBe(2);
  await db.exec('INSERT INTO one (a, b) VALUES (1, 2)');
  await db.close();
});

it('leaves nothing of a migration that fails', async () => {
  const db = openNodeDatabase(':memory:');
  await expect(migrate(db, ['CREATE TABLE one (a); nonsense'])).rejects.toThrow();
  expect(await version(db)).toBe(0);
  await migrate(db, ['CREATE TABLE one (a)']);
  await db.close();
});

it('refuses a schema that is ahead of it', async () => {
  const db = openNodeDatabase(':memory:');
  await migrate(db, ['CREATE TABLE one (a)', 'CREATE TABLE two (a)']);
  await expect(migrate(db, ['CREATE TABLE one (a)'])).rejects.toThrow(NewerSchemaError);
  await db.close();
});

// A database out there was made by these very words: a change is a new migration.
it.each([
  ['001', createProjects, 'd1979ee12b54d9d1'],
  ['002', keepNewestAct, '7cda82b1ae6c5621'],
])('never changes migration %s', (_no, text, hash) => {
  expect(createHash('sha256').update(text).digest('hex').slice(0, 16)).toBe(hash);
});
