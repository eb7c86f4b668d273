import { byNewestWork } from '../project-change';
import type { ProjectRecord } from '../project-record';
import type { SqlDatabase } from '../sql-database';
import type { StoreState } from '../work';
import { readProjects } from './read-projects';

const LAST = `
  SELECT
    MAX(COALESCE((SELECT MAX(ord) FROM outbox), 0), COALESCE((SELECT MAX(ord) FROM tap), 0),
      COALESCE((SELECT MAX(ord) FROM tap_set), 0)) AS ord,
    COALESCE((SELECT MAX(no) FROM tally_key), 0) AS no,
    COALESCE((SELECT time_ms FROM outbox ORDER BY ord DESC LIMIT 1), 0) AS time_ms`;

/** The memory of a database just opened; its session is minted at the first write. */
export async function loadState(db: SqlDatabase): Promise<StoreState> {
  const [[last], records] = await Promise.all([
    db.all<{ ord: number; no: number; time_ms: number }>(LAST),
    readProjects(db),
  ]);
  return {
    records: new Map(records.map((record) => [record.view.id, record])),
    session: null,
    seqs: new Map(),
    lastOrd: last?.ord ?? 0,
    lastTallyNo: last?.no ?? 0,
    lastTimeMs: last?.time_ms ?? 0,
  };
}

/** What screens see: the projects that are not in the bin, newest work first. */
export const viewsOf = (records: Iterable<ProjectRecord>) =>
  [...records]
    .filter(({ deleted }) => !deleted)
    .map(({ view }) => view)
    .sort(byNewestWork);
