import type { TallyKey } from '../../../shared/model/tally';
import { nameTally, shownTally } from '../../merge/tally';
import type { ProjectRecord } from '../project-record';
import { sql } from '../sql-text';
import { writeAct, type Work } from '../work';
import { keepCount, openTally } from './keep-count';

const NOTHING = { tapPart: 0, offset: 0 };

/**
 * Counts `delta` taps. A negative one takes away no more than is shown, so that the next tap is
 * seen at once; nothing is written when nothing would change.
 */
export function tapTally(work: Work, record: ProjectRecord, key: TallyKey, wanted: number): void {
  const before = record.tallies.get(nameTally(key)) ?? NOTHING;
  const delta = wanted < 0 ? Math.max(wanted, -shownTally(before)) : wanted;
  if (delta === 0) return;
  const tally = openTally(work, record, key);
  const { id } = record.view;
  const { step, lane, kind } = key;
  const written = writeAct(work, id, { kind: 'tap', step, lane, tally: kind, delta });
  const { ord, session, seq } = written;
  work.statements.push(
    sql`INSERT INTO tap (ord, tally_no, scope_id, session, seq, delta)
      VALUES (${ord}, ${tally.no}, ${id}, ${session}, ${seq}, ${delta})`,
  );
  const newest = { ord, session, seq, step, lane, kind, act: 'tap', delta } as const;
  keepCount(work, record, key, written, { ...tally, tapPart: tally.tapPart + delta, newest });
}
