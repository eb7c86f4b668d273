import { exampleProjects } from '../../shared/plan/example-projects';
import { makePlan } from '../../shared/plan/make-plan';
import { InvariantError } from '../../shared/result';
import type { SqlDatabase } from '../store/sql-database';
import { openDatabase } from '../store/sqlite/open-database';
import { createLocalClient } from './local-client';
import { newId } from './new-id';
import type { ProjectsClient } from './projects-client';

const FILE = 'matside.db';
let opened: Promise<SqlDatabase> | null = null;

/** SQLite's own generator: React Native has no web crypto. */
async function random16(): Promise<Uint8Array> {
  const db = await (opened ??= openDatabase(FILE));
  const [row] = await db.all<{ bytes: Uint8Array }>('SELECT randomblob(16) AS bytes');
  if (!row) throw new InvariantError('SQLite gave no random bytes');
  return row.bytes;
}

export const projects: ProjectsClient = createLocalClient({
  open: () => (opened = openDatabase(FILE)),
  tools: {
    nowMs: Date.now,
    random16,
    newIds: (count) =>
      Promise.all(Array.from({ length: count }, async () => newId(Date.now(), await random16()))),
    makePlan,
    exampleProjects,
  },
});
