import { nextTimeMs } from '../engine/clock';
import type { Stamped } from '../merge/identity';
import type { Act } from '../merge/operation';
import type { ProjectChange } from './project-change';
import type { ProjectRecord } from './project-record';
import { sql } from './sql-text';

/** The leader's memory of one opened database. Replaced after each commit, never changed. */
export interface StoreState {
  records: ReadonlyMap<string, ProjectRecord>;
  /** minted at the first write after opening */
  session: string | null;
  /** the last seq given in this session, by scope */
  seqs: ReadonlyMap<string, number>;
  lastOrd: number;
  lastTallyNo: number;
  lastTimeMs: number;
}

/** A transaction being put together: statements, and the memory to adopt once it is on disk. */
export interface Work {
  readonly nowMs: number;
  readonly session: string;
  readonly statements: string[];
  readonly changes: ProjectChange[];
  readonly records: Map<string, ProjectRecord>;
  readonly seqs: Map<string, number>;
  lastOrd: number;
  lastTallyNo: number;
  lastTimeMs: number;
}

export interface WrittenAct extends Stamped {
  ord: number;
}

/** Begins a transaction; a session that was not used before is written with it. */
export function beginWork(state: StoreState, session: string, nowMs: number): Work {
  const fresh = sql`INSERT INTO sync_session (id, opened_ms) VALUES (${session}, ${nowMs})`;
  return {
    nowMs,
    session,
    statements: state.session === null ? [fresh] : [],
    changes: [],
    records: new Map(state.records),
    seqs: new Map(state.seqs),
    lastOrd: state.lastOrd,
    lastTallyNo: state.lastTallyNo,
    lastTimeMs: state.lastTimeMs,
  };
}

/** Gives an act its identity and time, and puts it into the outbox. */
export function writeAct(work: Work, scope: string, act: Act): WrittenAct {
  const seq = (work.seqs.get(scope) ?? 0) + 1;
  work.seqs.set(scope, seq);
  work.lastOrd += 1;
  work.lastTimeMs = nextTimeMs(work.lastTimeMs, work.nowMs);
  const { kind, ...payload } = act;
  work.statements.push(
    sql`INSERT INTO outbox (ord, scope_id, session, seq, time_ms, kind, payload)
      VALUES (${work.lastOrd}, ${scope}, ${work.session}, ${seq}, ${work.lastTimeMs}, ${kind},
        ${JSON.stringify(payload)})`,
  );
  return { ord: work.lastOrd, session: work.session, seq, stampMs: work.lastTimeMs };
}
