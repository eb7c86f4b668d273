import type { Stamped } from '../../merge/identity';
import { FIELDS, type FieldName } from '../../merge/operation';
import { findRuling, type BasedWrite } from '../../merge/ruling';
import type { SqlDatabase } from '../sql-database';
import { toBase } from './read-sets';

interface FieldRow {
  scope_id: string;
  session: string;
  seq: number;
  field: string;
  value: string;
  stamp_ms: number;
  base_session: string | null;
  base_seq: number | null;
}
interface FieldWrite extends BasedWrite {
  value: string;
}
interface ProjectFields {
  values: Record<FieldName, string>;
  bases: Record<FieldName, Stamped>;
}

/** The ruling value of each field, and the write it came with, by project. */
export async function readFields(db: SqlDatabase): Promise<Map<string, ProjectFields>> {
  const writes = new Map<string, FieldWrite[]>();
  for (const row of await db.all<FieldRow>('SELECT * FROM field_write')) {
    const name = nameField(row.scope_id, row.field);
    const { session, seq, value } = row;
    const write = { session, seq, value, stampMs: row.stamp_ms, base: toBase(row) };
    writes.set(name, [...(writes.get(name) ?? []), write]);
  }
  const scopes = new Set([...writes.keys()].map((name) => name.slice(0, name.indexOf('\t'))));
  return new Map(
    [...scopes].flatMap((scope) => {
      const [name, note] = FIELDS.map((f) => findRuling(writes.get(nameField(scope, f)) ?? []));
      if (!name || !note) return [];
      const values = { name: name.value, note: note.value };
      return [[scope, { values, bases: { name, note } }] as const];
    }),
  );
}

const nameField = (scope: string, field: string) => `${scope}\t${field}`;
