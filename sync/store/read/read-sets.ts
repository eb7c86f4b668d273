import { nameIdentity } from '../../merge/identity';
import type { BasedWrite } from '../../merge/ruling';
import type { SqlDatabase } from '../sql-database';

interface SetRow {
  session: string;
  seq: number;
  stamp_ms: number;
  offset: number;
  base_session: string | null;
  base_seq: number | null;
  undone: number;
}

/** Every set of one count, and the names of those that were undone. */
export async function readSets(
  db: SqlDatabase,
  tallyNo: number,
): Promise<{ sets: (BasedWrite & { offset: number })[]; undone: Set<string> }> {
  const rows = await db.all<SetRow>(
    `SELECT s.session, s.seq, s.stamp_ms, s."offset", s.base_session, s.base_seq,
      EXISTS (SELECT 1 FROM tap_undo AS undo WHERE undo.scope_id = s.scope_id
        AND undo.target_session = s.session AND undo.target_seq = s.seq) AS undone
    FROM tap_set AS s WHERE s.tally_no = ?`,
    [tallyNo],
  );
  return {
    sets: rows.map((row) => ({
      session: row.session,
      seq: row.seq,
      stampMs: row.stamp_ms,
      offset: row.offset,
      base: toBase(row),
    })),
    undone: new Set(rows.filter(({ undone }) => undone === 1).map(nameIdentity)),
  };
}

export const toBase = (row: { base_session: string | null; base_seq: number | null }) =>
  row.base_session !== null && row.base_seq !== null
    ? { session: row.base_session, seq: row.base_seq }
    : null;
