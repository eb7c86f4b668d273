// How much is done, not how long it takes: the same on a machine under load.
import { mkdtempSync, rmSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

import { openStore } from '../../../sync/store/open-store';
import type { SqlDatabase, SqlValue } from '../../../sync/store/sql-database';
import { openNodeDatabase } from '../../support/open-node-database';
import { CUT, cutKey, handRequest, handTools, otherPairKey, PAIR, pairKey } from './hand-plan';

jest.setTimeout(60_000);
const folder = mkdtempSync(path.join(tmpdir(), 'work-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

interface Counted extends SqlDatabase {
  rows: number;
  queries: string[];
  execs: string[];
}

function count(db: SqlDatabase): Counted {
  const counted: Counted = {
    ...db,
    rows: 0,
    queries: [],
    execs: [],
    exec(sql) {
      counted.execs.push(sql);
      return db.exec(sql);
    },
    async all<Row extends object>(sql: string, params?: readonly SqlValue[]) {
      counted.queries.push(sql);
      const rows = await db.all<Row>(sql, params);
      counted.rows += rows.length;
      return rows;
    },
  };
  return counted;
}

/** A file of one project with this many taps in it, some of them undone. */
async function fill(file: string, taps: number): Promise<void> {
  const db = openNodeDatabase(file);
  await db.exec('PRAGMA synchronous = OFF'); // only here: many commits, and nothing to lose
  const store = await openStore(db, handTools());
  await store.perform(null, { do: 'create', id: 'p1', name: 'P', note: '', request: handRequest });
  const keys = [cutKey, pairKey, otherPairKey];
  for (let turn = 0; turn < taps; turn += 1) {
    const key = keys[turn % 3] ?? cutKey;
    await store.perform(`request ${turn}`, { do: 'tap', id: 'p1', key, delta: 1 });
    if (turn % 10 === 9) await store.perform(null, { do: 'undo', id: 'p1', steps: [CUT, PAIR] });
  }
  await store.close();
}

const LARGE = ['tap', 'tap_set', 'tap_undo', 'outbox', 'request', 'own'];

/** The large tables that SQLite would walk through from end to end. */
async function findWalks(db: SqlDatabase, query: string): Promise<string[]> {
  const plan = await db.all<{ detail: string }>(`EXPLAIN QUERY PLAN ${query}`);
  return plan
    .map(({ detail }) => detail)
    .filter((detail) => LARGE.some((table) => new RegExp(`^SCAN ${table}\\b`).test(detail)));
}

describe('opening', () => {
  const open = async (taps: number) => {
    const file = path.join(folder, `${taps}.db`);
    await fill(file, taps);
    const db = count(openNodeDatabase(file));
    const store = await openStore(db, handTools());
    return { db, store };
  };

  it('reads as many rows with a thousand taps as with thirty', async () => {
    const [few, many] = [await open(30), await open(1000)];
    expect(many.db.rows).toBe(few.db.rows);
    expect(many.db.queries).toEqual(few.db.queries);
    expect(many.db.execs).toEqual([]);
    expect(many.db.queries.length).toBeLessThanOrEqual(8);
    await Promise.all([few.store.close(), many.store.close()]);
  });

  it('walks through no table that grows with the taps', async () => {
    const { db, store } = await open(60);
    const asked = db.queries.filter((query) => !query.startsWith('PRAGMA'));
    const walks = await Promise.all(asked.map((query) => findWalks(db, query)));
    // the newest act's time: from the end, one row
    expect(walks.flat().filter((walk) => walk !== 'SCAN outbox')).toEqual([]);
    expect(asked.join().match(/time_ms FROM outbox ORDER BY ord DESC LIMIT 1/g)).toHaveLength(1);
    expect(await findWalks(db, 'SELECT delta FROM tap')).toEqual(['SCAN tap']);
    await store.close();
  });
});

describe('a tap among thousands', () => {
  it('is one message of a few statements, and reads nothing', async () => {
    const file = path.join(folder, 'tap.db');
    await fill(file, 300);
    const db = count(openNodeDatabase(file));
    const store = await openStore(db, handTools());
    await store.perform('first', { do: 'tap', id: 'p1', key: cutKey, delta: 1 });
    Object.assign(db, { rows: 0, queries: [], execs: [] });
    const own = await store.perform(null, { do: 'tap', id: 'p1', key: cutKey, delta: 1 });
    await store.perform('from another tab', { do: 'tap', id: 'p1', key: cutKey, delta: 1 });
    expect(db.queries).toEqual([]);
    expect(db.execs.map((text) => text.split(';\n').length)).toEqual([5, 7]); // BEGIN and COMMIT too
    expect(JSON.stringify(own.changes).length).toBeLessThan(450);
    await store.close();
  });

  it('writes as many pages after hundreds of taps as after ten', async () => {
    const file = path.join(folder, 'pages.db');
    const db = openNodeDatabase(file);
    await db.exec('PRAGMA wal_autocheckpoint = 0');
    expect(await db.all('PRAGMA journal_mode')).toEqual([{ journal_mode: 'wal' }]);
    const store = await openStore(db, handTools());
    const id = 'p1';
    await store.perform(null, { do: 'create', id, name: 'P', note: '', request: handRequest });
    const tapTimes = async (times: number) => {
      const before = statSync(`${file}-wal`).size;
      for (let turn = 0; turn < times; turn += 1) {
        await store.perform(null, { do: 'tap', id, key: cutKey, delta: 1 });
      }
      return (statSync(`${file}-wal`).size - before) / 4120 / times; // a page and its frame's header
    };
    expect(await tapTimes(10)).toBeLessThanOrEqual(7);
    await tapTimes(500);
    expect(await tapTimes(50)).toBeLessThanOrEqual(7);
    await store.close();
  });
});

describe('undo', () => {
  it('reads one act of one count, however many there are', async () => {
    const file = path.join(folder, 'undo.db');
    await fill(file, 300);
    const db = count(openNodeDatabase(file));
    const store = await openStore(db, handTools());
    Object.assign(db, { rows: 0, queries: [] });
    await store.perform(null, { do: 'undo', id: 'p1', steps: [CUT] });
    expect(db.queries).toHaveLength(1);
    expect(db.rows).toBe(1);
    expect(await findWalks(db, db.queries[0] ?? '')).toEqual([]);
    await store.close();
  });
});
