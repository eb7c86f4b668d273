import type { TallyKind } from '../../../shared/model/tally';
import type { OwnAct } from '../project-record';
import type { SqlDatabase } from '../sql-database';

interface ActRow {
  scope_id: string;
  ord: number;
  session: string;
  seq: number;
  step: string;
  lane: string;
  kind: TallyKind;
  delta: number;
}

// One look-up in an index a count: how many taps there are, or were undone before, is of no account.
const newestOf = (table: 'tap' | 'tap_set', delta: string, where: string) => `
  SELECT key.scope_id, act.ord, act.session, act.seq, act.${delta} AS delta, key.step, key.lane,
    key.kind
  FROM tally_key AS key JOIN ${table} AS act ON act.ord = (
    SELECT own.ord FROM ${table} AS own
    WHERE own.tally_no = key.no AND own.ord < ?
      AND own.session IN (SELECT id FROM sync_session)
      AND NOT EXISTS (SELECT 1 FROM tap_undo AS undo WHERE undo.scope_id = own.scope_id
        AND undo.target_session = own.session AND undo.target_seq = own.seq)
    ORDER BY own.ord DESC LIMIT 1)
  ${where} ORDER BY act.ord`;

async function findActs(
  db: SqlDatabase,
  where: string,
  params: (string | number)[],
): Promise<(OwnAct & { scope_id: string })[]> {
  const taps = await db.all<ActRow>(newestOf('tap', 'delta', where), params);
  const sets = await db.all<ActRow>(newestOf('tap_set', 'moved', where), params);
  return [
    ...taps.map((row) => ({ ...row, act: 'tap' as const })),
    ...sets.map((row) => ({ ...row, act: 'set' as const })),
  ].sort((a, b) => a.ord - b.ord);
}

const toOwnAct = ({ scope_id: _scope, ...act }: OwnAct & { scope_id: string }): OwnAct => act;

/** This device's newest act of a step that stands, older than `beforeOrd`. */
export async function findNewestAct(
  db: SqlDatabase,
  scope: string,
  step: string,
  beforeOrd: number,
): Promise<OwnAct | null> {
  const where = 'WHERE key.scope_id = ? AND key.step = ?';
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
