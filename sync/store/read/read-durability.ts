import type { SqlDatabase } from '../sql-database';

/** Journal mode, locking mode and synchronous level, as SQLite reports them. */
export async function readDurability(db: SqlDatabase): Promise<string> {
  const names = ['journal_mode', 'locking_mode', 'synchronous'];
  const rows = await Promise.all(names.map((name) => db.all<object>(`PRAGMA ${name}`)));
  return rows.map(([row]) => String(Object.values(row ?? {})[0])).join(' ');
}
