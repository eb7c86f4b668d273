import { setTimeout as sleep } from 'node:timers/promises';

import type { DataSource } from 'typeorm';

import type { Result } from '../../shared/result';

import { isDatabaseAway } from './database-away';
import { migrate, type MigrateOptions } from './migrate';

/**
 * Migrates and connects once.
 *
 * @returns a failure when PostgreSQL cannot be reached
 * @throws what a migration or a wrong password throws: waiting would not help
 */
export async function connect(
  db: DataSource,
  urls: MigrateOptions,
): Promise<Result<true, { kind: 'database-away' }>> {
  try {
    await migrate(urls);
    await db.initialize();
    return { ok: true, value: true };
  } catch (error) {
    if (isDatabaseAway(error)) return { ok: false, kind: 'database-away' };
    throw error;
  }
}

/** Tries `connect` again and again until PostgreSQL is there or `signal` ends the wait. */
export async function connectWhenBack(
  db: DataSource,
  urls: MigrateOptions,
  { everyMs, signal }: { everyMs: number; signal: AbortSignal },
): Promise<void> {
  while (!signal.aborted) {
    await sleep(everyMs, undefined, { signal }).catch(() => undefined);
    if (signal.aborted || (await connect(db, urls)).ok) return;
  }
}
