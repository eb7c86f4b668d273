import type { OwnAct } from '../project-record';
import type { SqlDatabase } from '../sql-database';

interface ActRow extends OwnAct {
  scope_id: string;
}

// One look-up in an index a count: how many taps there are, or were undone before, is of no account.
const newestOf = (table: 'tap' | 'tap_set', act: OwnAct['act'], delta: string) => `
  SELECT key.scope_id, act.ord, act.session, act.seq, act.${delta} AS delta, key.step, key.lane,
    key.kind, '${act}' AS act
  FROM tally_key AS key JOIN ${table} AS act ON act.ord = (
    SELECT own.ord FROM ${table} AS own
    WHERE own.tally_no = key.no AND own.ord < ?1
      AND own.session IN (SELECT id FROM sync_session)
      AND NOT EXISTS (SELECT 1 FROM tap_undo AS undo WHERE undo.scope_id = own.scope_id
        AND undo.target_session = own.session AND undo.target_seq = own.seq)
    ORDER BY own.ord DESC LIMIT 1)`;
const NEWEST_TAPS = newestOf('tap', 'tap', 'delta');
const NEWEST_SETS = newestOf('tap_set', 'set', 'moved');

const findActs = (db: SqlDatabase, where: string, params: (string | number)[]) =>
  db.all<ActRow>(`${NEWEST_TAPS} ${where} UNION ALL ${NEWEST_SETS} ${where} ORDER BY ord`, params);

const toOwnAct = ({ scope_id: _scope, ...act }: ActRow): OwnAct => act;

/** This device's newest act of a step that stands, older than `beforeOrd`. */
export async function findNewestAct(
  db: SqlDatabase,
  scope: string,
  step: string,
  beforeOrd: number,
): Promise<OwnAct | null> {
  const where = 'WHERE key.scope_id = ?2 AND key.step = ?3';
  const act = (await findActs(db, where, [beforeOrd, scope, step])).at(-1);
  return act ? toOwnAct(act) : null;
}

/** The same for every step of every project: by project, then by step. */
export async function findNewestActs(db: SqlDatabase): Promise<Map<string, Map<string, OwnAct>>> {
  const found = new Map<string, Map<string, OwnAct>>();
  for (const act of await findActs(db, '', [Number.MAX_SAFE_INTEGER])) {
    const steps = found.get(act.scope_id) ?? new Map<string, OwnAct>();
    found.set(act.scope_id, steps.set(act.step, toOwnAct(act)));
  }
  return found;
}
