import { ActSchema, type Operation } from '../../merge/operation';
import type { SqlDatabase } from '../sql-database';

interface OutboxRow {
  scope_id: string;
  session: string;
  seq: number;
  time_ms: number;
  kind: string;
  payload: string;
}

/** Every operation held, in the order written. */
export async function readOperations(db: SqlDatabase): Promise<Operation[]> {
  const rows = await db.all<OutboxRow>(
    'SELECT scope_id, session, seq, time_ms, kind, payload FROM outbox ORDER BY ord',
  );
  return rows.map((row) => ({
    scope: row.scope_id,
    session: row.session,
    seq: row.seq,
    timeMs: row.time_ms,
    act: ActSchema.parse({ kind: row.kind, ...JSON.parse(row.payload) }),
  }));
}
