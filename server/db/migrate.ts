import { escapeIdentifier } from 'pg';

import { createDataSource } from './data-source';

export interface MigrateOptions {
  /** as the role that owns the tables */
  migrationUrl: string;
  /** as the role the server works with; the owner too where there is only one role */
  databaseUrl: string;
}

const roleOf = (url: string) => decodeURIComponent(new URL(url).username);

/**
 * Brings the schema up to date as its owner, and lets the server's role read and write rows but
 * nothing else: only a role that is not the owner is held back by row-level security. Columns that
 * an entity marks `update: false` stay as they were inserted.
 */
export async function migrate({ migrationUrl, databaseUrl }: MigrateOptions): Promise<void> {
  const owner = await createDataSource(migrationUrl).initialize();
  try {
    await owner.runMigrations();
    if (roleOf(databaseUrl) === roleOf(migrationUrl)) return;
    const role = escapeIdentifier(roleOf(databaseUrl));
    const [{ schema }] = await owner.query('SELECT current_schema() AS schema');
    await owner.query(`GRANT USAGE ON SCHEMA ${escapeIdentifier(schema)} TO ${role}`);
    for (const { tableName, columns } of owner.entityMetadatas) {
      const table = escapeIdentifier(tableName);
      const changing = columns.filter(({ isUpdate }) => isUpdate);
      const names = changing.map(({ databaseName }) => escapeIdentifier(databaseName)).join(', ');
      await owner.query(`GRANT SELECT, INSERT, DELETE, UPDATE (${names}) ON ${table} TO ${role}`);
    }
  } finally {
    await owner.destroy();
  }
}
