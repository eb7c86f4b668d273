import { findRuling, type BasedWrite } from '../../merge/ruling';
import { nameIdentity } from '../../merge/identity';
import { newestOf, type OwnAct, type ProjectRecord, type TallyRecord } from '../project-record';
import { findNewestAct } from '../read/find-newest-act';
import { readSets } from '../read/read-sets';
import type { SqlDatabase } from '../sql-database';
import { sql } from '../sql-text';
import { writeAct, type Work } from '../work';
import { keepCount, openTally } from './keep-count';

/** Takes back this device's newest act among the steps named; without one, nothing is written. */
export async function undoNewest(
  db: SqlDatabase,
  work: Work,
  record: ProjectRecord,
  steps: readonly string[],
): Promise<void> {
  const target = steps
    .flatMap((step) => newestOf(record.tallies, step) ?? [])
    .reduce<OwnAct | null>((best, act) => (best && best.ord > act.ord ? best : act), null);
  if (!target) return;
  const { id } = record.view;
  const { step, lane, kind } = target;
  const before = openTally(work, record, target);
  const after = await countWithout(db, before, target);
  const delta = target.act === 'tap' ? -target.delta : 0;
  const { session, seq } = target;
  const act = { kind: 'undo', step, lane, tally: kind, target: { session, seq }, delta } as const;
  const written = writeAct(work, id, act);
  work.statements.push(
    sql`INSERT INTO tap_undo
      (scope_id, target_session, target_seq, session, seq, tally_no, delta)
      VALUES (${id}, ${session}, ${seq}, ${written.session}, ${written.seq}, ${before.no}, ${delta})`,
  );
  const key = { step, lane, kind };
  const newest = await findNewestAct(db, before.no, key, target.ord);
  keepCount(work, record, key, written, { ...after, newest });
}

async function countWithout(
  db: SqlDatabase,
  tally: TallyRecord,
  target: OwnAct,
): Promise<TallyRecord> {
  if (target.act === 'tap') return { ...tally, tapPart: tally.tapPart - target.delta };
  const { sets, undone } = await readSets(db, tally.no);
  const ruling = findRuling(sets, undone.add(nameIdentity(target)));
  return { ...tally, ruling: ruling && toStamped(ruling), offset: ruling?.offset ?? 0 };
}

const toStamped = ({ session, seq, stampMs }: BasedWrite) => ({ session, seq, stampMs });
