import type { TallyKey } from '../../../shared/model/tally';
import type { OwnAct } from '../project-record';
import type { SqlDatabase } from '../sql-database';

const newestOf = (table: 'tap' | 'tap_set', act: OwnAct['act'], delta: string) => `
  SELECT * FROM (
    SELECT own.ord, own.session, own.seq, own.${delta} AS delta, '${act}' AS act
    FROM ${table} AS own
    WHERE own.tally_no = ?1 AND own.ord < ?2
      AND own.session IN (SELECT id FROM sync_session)
      AND NOT EXISTS (SELECT 1 FROM tap_undo AS undo WHERE undo.scope_id = own.scope_id
        AND undo.target_session = own.session AND undo.target_seq = own.seq)
    ORDER BY own.ord DESC LIMIT 1)`;
const NEWEST = `${newestOf('tap', 'tap', 'delta')} UNION ALL ${newestOf('tap_set', 'set', 'moved')}
  ORDER BY ord DESC LIMIT 1`;

/** This device's newest act of a count that stands, older than `beforeOrd`. */
export async function findNewestAct(
  db: SqlDatabase,
  tallyNo: number,
  { step, lane, kind }: TallyKey,
  beforeOrd: number,
): Promise<OwnAct | null> {
  const [act] = await db.all<Omit<OwnAct, keyof TallyKey>>(NEWEST, [tallyNo, beforeOrd]);
  return act ? { ...act, step, lane, kind } : null;
}
