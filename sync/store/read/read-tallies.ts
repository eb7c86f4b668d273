import type { Tally, TallyKind } from '../../../shared/model/tally';
import { nameTally, shownTally } from '../../merge/tally';
import type { OwnAct, TallyRecord } from '../project-record';
import type { SqlDatabase } from '../sql-database';
import { findNewestActs } from './find-newest-act';

interface TallyRow {
  no: number;
  scope_id: string;
  step: string;
  lane: string;
  kind: TallyKind;
  tap_part: number;
  worked_ms: number;
  offset: number;
  set_session: string | null;
  set_seq: number | null;
  set_stamp_ms: number | null;
}
interface ProjectCounts {
  shown: Tally[];
  tallies: Map<string, TallyRecord>;
  newest: Map<string, OwnAct>;
  workedAtMs: number;
  lastStepKey: string;
}

/** Every count as it was kept with each act, and what undo would take back, by project. */
export async function readTallies(db: SqlDatabase): Promise<Map<string, ProjectCounts>> {
  const projects = new Map<string, ProjectCounts>();
  const rows = await db.all<TallyRow>(
    `SELECT key.no, key.scope_id, key.step, key.lane, key.kind, view.tap_part, view."offset", view.worked_ms,
      view.set_session, view.set_seq, view.set_stamp_ms
    FROM tally_key AS key JOIN view_tally AS view ON view.tally_no = key.no ORDER BY key.no`,
  );
  const acts = await findNewestActs(db);
  for (const row of rows) {
    const { step, lane, kind } = row;
    const tally = toRecord(row);
    const counts: ProjectCounts = projects.get(row.scope_id) ?? {
      shown: [],
      tallies: new Map(),
      newest: acts.get(row.scope_id) ?? new Map(),
      workedAtMs: 0,
      lastStepKey: step,
    };
    projects.set(row.scope_id, counts);
    counts.shown.push({ step, lane, kind, shown: shownTally(tally) });
    if (row.worked_ms > counts.workedAtMs) {
      counts.workedAtMs = row.worked_ms;
      counts.lastStepKey = step;
    }
    counts.tallies.set(nameTally({ step, lane, kind }), tally);
  }
  return projects;
}

function toRecord(row: TallyRow): TallyRecord {
  const { no, tap_part: tapPart, offset, set_session: session, set_seq: seq } = row;
  const stampMs = row.set_stamp_ms;
  const ruling =
    session !== null && seq !== null && stampMs !== null ? { session, seq, stampMs } : null;
  return { no, tapPart, offset, ruling };
}
