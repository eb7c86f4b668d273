import type { TallyKey } from '../../../shared/model/tally';
import { nameTally, shownTally } from '../../merge/tally';
import { withCounts, type ProjectChange } from '../project-change';
import { newestOf, toUndoable, type ProjectRecord, type TallyRecord } from '../project-record';
import { sql } from '../sql-text';
import type { Work, WrittenAct } from '../work';

/** The count's row, opened at its first act. */
export function openTally(work: Work, record: ProjectRecord, key: TallyKey): TallyRecord {
  const known = record.tallies.get(nameTally(key));
  if (known) return known;
  work.lastTallyNo += 1;
  work.statements.push(
    sql`INSERT INTO tally_key (no, scope_id, step, lane, kind)
      VALUES (${work.lastTallyNo}, ${record.view.id}, ${key.step}, ${key.lane}, ${key.kind})`,
  );
  return { no: work.lastTallyNo, tapPart: 0, offset: 0, ruling: null, newest: null };
}

/** Writes a changed count and when it was worked at, which tells the project's last place of work. */
export function keepCount(
  work: Work,
  record: ProjectRecord,
  key: TallyKey,
  written: WrittenAct,
  tally: TallyRecord,
): void {
  const { id } = record.view;
  const { no, tapPart, offset, ruling, newest } = tally;
  work.statements.push(
    sql`INSERT OR REPLACE INTO view_tally
      (tally_no, tap_part, "offset", worked_ms, set_session, set_seq, set_stamp_ms,
        newest_ord)
      VALUES (${no}, ${tapPart}, ${offset}, ${written.stampMs}, ${ruling?.session ?? null},
        ${ruling?.seq ?? null}, ${ruling?.stampMs ?? null}, ${newest?.ord ?? null})`,
  );
  const { step, lane, kind } = key;
  const tallies = new Map(record.tallies).set(nameTally(key), tally);
  const act = newestOf(tallies, step);
  const change: ProjectChange = {
    kind: 'counts',
    id,
    tallies: [{ step, lane, kind, shown: shownTally(tally) }],
    undoable: [{ step, act: act && toUndoable(act) }],
    workedAtMs: written.stampMs,
    lastStepKey: step,
  };
  work.records.set(id, {
    ...record,
    view: withCounts(record.view, change),
    tallies,
  });
  if (!record.deleted) work.changes.push(change);
}
