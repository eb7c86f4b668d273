import type { Backup } from '../backup';
import { SCHEMA_VERSION } from '../migrate';
import type { SqlDatabase } from '../sql-database';
import { readOperations } from './read-operations';

/** The store as one JSON document, readable by people and by `BackupSchema`. */
export async function saveCopy(db: SqlDatabase, savedAtMs: number): Promise<string> {
  const operations = await readOperations(db);
  const backup: Backup = {
    kind: 'backup',
    version: 1,
    savedAtMs,
    schema: SCHEMA_VERSION,
    operations,
  };
  return `${JSON.stringify(backup, null, 1)}\n`;
}
