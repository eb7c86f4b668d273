import type { TallyKey } from '../../../shared/model/tally';
import { setOffset, shownTally } from '../../merge/tally';
import type { ProjectRecord } from '../project-record';
import { sql } from '../sql-text';
import { writeAct, type Work } from '../work';
import { keepCount, openTally } from './keep-count';

/** Sets a count exactly, on top of the set that rules now; taps not seen here still count on it. */
export function setTally(work: Work, record: ProjectRecord, key: TallyKey, want: number): void {
  const tally = openTally(work, record, key);
  const { id } = record.view;
  const { step, lane, kind } = key;
  const offset = setOffset(want, tally.tapPart);
  const base = tally.ruling && { session: tally.ruling.session, seq: tally.ruling.seq };
  const written = writeAct(work, id, {
    kind: 'set',
    step,
    lane,
    tally: kind,
    want,
    offset,
    base,
  });
  const { ord, session, seq, stampMs } = written;
  const moved = want - shownTally(tally);
  work.statements.push(
    sql`INSERT INTO tap_set (ord, tally_no, scope_id, session, seq, stamp_ms, want, "offset",
        base_session, base_seq, moved)
      VALUES (${ord}, ${tally.no}, ${id}, ${session}, ${seq}, ${stampMs}, ${want}, ${offset},
        ${base?.session ?? null}, ${base?.seq ?? null}, ${moved})`,
  );
  const ruling = { session, seq, stampMs };
  const newest = { ord, session, seq, step, lane, kind, act: 'set', delta: moved } as const;
  keepCount(work, record, key, written, { ...tally, offset, ruling, newest });
}
