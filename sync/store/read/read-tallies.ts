import type { Tally, TallyKind } from '../../../shared/model/tally';
import { nameTally, shownTally } from '../../merge/tally';
import { newestOf, toUndoable, type OwnAct, type TallyRecord } from '../project-record';
import type { UndoableAct } from '../../client/projects-client';
import type { SqlDatabase } from '../sql-database';

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
  act: OwnAct['act'] | null;
  act_ord: number | null;
  act_session: string | null;
  act_seq: number | null;
  act_delta: number | null;
}
interface ProjectCounts {
  shown: Tally[];
  tallies: Map<string, TallyRecord>;
  undoable: UndoableAct[];
  workedAtMs: number;
  lastStepKey: string;
}

const SELECT = `
  SELECT key.no, key.scope_id, key.step, key.lane, key.kind, view.tap_part, view."offset",
    view.worked_ms, view.set_session, view.set_seq, view.set_stamp_ms,
    IIF(tap.ord IS NULL, IIF(own_set.ord IS NULL, NULL, 'set'), 'tap') AS act,
    view.newest_ord AS act_ord,
    COALESCE(tap.session, own_set.session) AS act_session,
    COALESCE(tap.seq, own_set.seq) AS act_seq,
    COALESCE(tap.delta, own_set.moved) AS act_delta
  FROM view_tally AS view JOIN tally_key AS key ON key.no = view.tally_no
    LEFT JOIN tap ON tap.ord = view.newest_ord
    LEFT JOIN tap_set AS own_set ON own_set.ord = view.newest_ord
  ORDER BY key.no`;

/** Every count as it was kept with each act, and what undo would take back, by project. */
export async function readTallies(db: SqlDatabase): Promise<Map<string, ProjectCounts>> {
  const projects = new Map<string, ProjectCounts>();
  for (const row of await db.all<TallyRow>(SELECT)) {
    const { step, lane, kind } = row;
    const tally = toRecord(row);
    const counts: ProjectCounts = projects.get(row.scope_id) ?? {
      shown: [],
      tallies: new Map(),
      undoable: [],
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
  for (const counts of projects.values()) counts.undoable = findUndoable(counts);
  return projects;
}

function findUndoable({ shown, tallies }: ProjectCounts): UndoableAct[] {
  const steps = new Set(shown.map(({ step }) => step));
  const newest = [...steps].flatMap((step) => newestOf(tallies, step) ?? []);
  return newest.map(toUndoable);
}

function toRecord(row: TallyRow): TallyRecord {
  const { no, tap_part: tapPart, offset, set_session: session, set_seq: seq } = row;
  const stampMs = row.set_stamp_ms;
  const ruling =
    session !== null && seq !== null && stampMs !== null ? { session, seq, stampMs } : null;
  return { no, tapPart, offset, ruling, newest: toOwnAct(row) };
}

function toOwnAct(row: TallyRow): OwnAct | null {
  const { step, lane, kind, act, act_ord: ord, act_session: session } = row;
  const { act_seq: seq, act_delta: delta } = row;
  if (act === null || ord === null || session === null || seq === null || delta === null) {
    return null;
  }
  return { step, lane, kind, act, ord, session, seq, delta };
}
