import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

import { BackupSchema } from '../../../sync/store/backup';
import type { Command } from '../../../sync/store/command';
import { NewerSchemaError, SCHEMA_VERSION } from '../../../sync/store/migrate';
import { openStore, type Store } from '../../../sync/store/open-store';
import type { SqlDatabase } from '../../../sync/store/sql-database';
import { openNodeDatabase } from '../../support/open-node-database';
import { CUT, cutKey, handRequest, handTools, otherPairKey, PAIR, pairKey } from './hand-plan';

jest.setTimeout(30_000);
const folder = mkdtempSync(path.join(tmpdir(), 'store-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const places = [
  ['in memory', () => ':memory:'],
  ['in a file', (serial: number) => path.join(folder, `${serial}.db`)],
] as const;

describe.each(places)('a store %s', (_place, fileOf) => {
  let serial = 0;
  let requests = 0;
  let db: SqlDatabase;
  let store: Store;
  const now = { value: 1_000_000 };

  beforeEach(async () => {
    serial += 1;
    now.value = 1_000_000;
    db = openNodeDatabase(fileOf(serial));
    store = await openStore(db, handTools(now));
    await act({ do: 'create', id: 'p1', name: 'Plate', note: '', request: handRequest });
  });
  afterEach(() => store.close());

  const act = (command: Command) => store.perform(`request ${(requests += 1)}`, command);
  const project = () => store.projects().find(({ id }) => id === 'p1');
  const shown = (key: { step: string; lane: string; kind: string }) =>
    project()?.tallies.find(
      ({ step, lane, kind }) => step === key.step && lane === key.lane && kind === key.kind,
    )?.shown ?? 0;
  const tap = (key = cutKey as Parameters<typeof shown>[0], delta = 1) =>
    act({ do: 'tap', id: 'p1', key: key as typeof cutKey, delta });

  it('keeps a new project with its request, steps and lanes', () => {
    expect(project()).toMatchObject({ name: 'Plate', workedAtMs: null, engine: '1.0.0' });
    expect(project()?.request).toEqual(handRequest);
    expect(project()?.steps.map(({ key, lanes }) => [key, lanes.length])).toEqual([
      [CUT, 1],
      [PAIR, 2],
    ]);
  });

  it('refuses a request that cannot be planned, and writes nothing', async () => {
    const request = { ...handRequest, wedges: 4 };
    const { answer } = await act({ do: 'create', id: 'p2', name: 'No', note: '', request });
    expect(answer).toEqual({ ok: false, kind: 'failed', detail: 'below-least' });
    expect(store.projects()).toHaveLength(1);
  });

  it('counts taps lane by lane, and remembers where work was done', async () => {
    now.value = 2_000_000;
    await tap();
    await tap();
    await tap(pairKey);
    expect([shown(cutKey), shown(pairKey), shown(otherPairKey)]).toEqual([2, 1, 0]);
    expect(project()).toMatchObject({ lastStepKey: PAIR, workedAtMs: 2_000_002 });
  });

  it('sends a tap to other tabs as one count, one undoable act and one place', async () => {
    const { changes } = await tap();
    expect(changes).toHaveLength(1);
    expect(changes[0]).toMatchObject({
      kind: 'counts',
      tallies: [{ ...cutKey, shown: 1 }],
      lastStepKey: CUT,
    });
  });

  it('takes no more than is shown away, so that the next tap is seen', async () => {
    await tap();
    await tap(cutKey, -5);
    expect(shown(cutKey)).toBe(0);
    await tap();
    expect(shown(cutKey)).toBe(1);
    expect((await tap(pairKey, -1)).changes).toEqual([]);
    await tap(pairKey);
    expect(shown(pairKey)).toBe(1);
  });

  it('walks back over its own taps and sets, step by step', async () => {
    await tap();
    await tap(pairKey);
    await act({ do: 'set', id: 'p1', key: cutKey, want: 9 });
    await tap();
    const undo = (steps: string[]) => act({ do: 'undo', id: 'p1', steps });
    expect(shown(cutKey)).toBe(10);
    await undo([CUT]);
    expect(shown(cutKey)).toBe(9);
    expect(project()?.undoable.find(({ step }) => step === CUT)).toMatchObject({
      act: 'set',
      delta: 8,
    });
    await undo([CUT, PAIR]);
    expect([shown(cutKey), shown(pairKey)]).toEqual([1, 1]);
    await undo([CUT, PAIR]);
    expect([shown(cutKey), shown(pairKey)]).toEqual([1, 0]);
    await undo([CUT, PAIR]);
    expect([shown(cutKey), shown(pairKey)]).toEqual([0, 0]);
    expect(project()?.undoable).toEqual([]);
    expect((await undo([CUT, PAIR])).changes).toEqual([]);
  });

  it('lets the set before rule again when the last one is undone', async () => {
    await act({ do: 'set', id: 'p1', key: cutKey, want: 5 });
    await tap();
    await act({ do: 'set', id: 'p1', key: cutKey, want: 2 });
    await act({ do: 'undo', id: 'p1', steps: [CUT] });
    expect(shown(cutKey)).toBe(6);
  });

  it('counts lost pieces by their item', async () => {
    const lost = { step: CUT, lane: 'wedge:D', kind: 'lost' } as const;
    await act({ do: 'tap', id: 'p1', key: lost, delta: 1 });
    expect(shown(lost)).toBe(1);
    await act({ do: 'undo', id: 'p1', steps: [CUT] });
    expect(shown(lost)).toBe(0);
  });

  it('renames, bins and brings back a project whole', async () => {
    await tap();
    await act({ do: 'rename', id: 'p1', name: "Ann's plate; DROP TABLE tap" });
    await act({ do: 'remove', id: 'p1' });
    expect(store.projects()).toEqual([]);
    await act({ do: 'restore', id: 'p1' });
    expect(project()?.name).toBe("Ann's plate; DROP TABLE tap");
    expect(shown(cutKey)).toBe(1);
  });

  it('shows a name at once as it will be read later, whatever was typed', async () => {
    await act({ do: 'rename', id: 'p1', name: 'a\u0000b\uD800' });
    expect(project()?.name).toBe('a\uFFFDb\uFFFD');
  });

  it('opens a lane for recutting, once', async () => {
    const lane = { step: CUT, key: 'D1', target: 1, consumes: {}, makes: { 'wedge:D': 1 } };
    await act({ do: 'addLane', id: 'p1', lane });
    await act({ do: 'addLane', id: 'p1', lane });
    expect(project()?.extraLanes).toEqual([lane]);
  });

  it('does a request once, however often it is sent', async () => {
    const command: Command = { do: 'tap', id: 'p1', key: cutKey, delta: 1 };
    const first = await store.perform('again', command);
    const second = await store.perform('again', command);
    expect(shown(cutKey)).toBe(1);
    expect(second).toEqual({ answer: first.answer, changes: [] });
  });

  it('opens the example once, and takes it away for good', async () => {
    await act({ do: 'openExample' });
    await act({ do: 'openExample' });
    expect(store.projects().map(({ name }) => name)).toEqual([
      'Harbour Lights',
      'Pier Runner',
      'Plate',
    ]);
    expect(store.projects()[0]?.tallies).toEqual([{ ...cutKey, shown: 6 }]);
    await act({ do: 'removeExample' });
    expect(store.projects().map(({ id }) => id)).toEqual(['p1']);
    for (const table of ['outbox', 'tap_set', 'step', 'lane', 'tally_key', 'view_tally']) {
      const column = table === 'view_tally' ? "'p1'" : 'scope_id';
      const scopes = await db.all<{ id: string }>(`SELECT DISTINCT ${column} AS id FROM ${table}`);
      expect(scopes.filter(({ id }) => id !== 'p1')).toEqual([]);
    }
  });

  it('saves a copy that holds every operation', async () => {
    await tap();
    await act({ do: 'undo', id: 'p1', steps: [CUT] });
    const { answer } = await act({ do: 'saveCopy' });
    const copy = BackupSchema.parse(JSON.parse((answer.ok && answer.text) || 'null'));
    expect(copy.operations.map(({ act: { kind } }) => kind)).toEqual(['project', 'tap', 'undo']);
    expect(new Set(copy.operations.map(({ session }) => session)).size).toBe(1);
    expect(copy.operations.map(({ seq }) => seq)).toEqual([1, 2, 3]);
  });

  it('tells of a project that it does not hold', async () => {
    const { answer } = await act({ do: 'remove', id: 'elsewhere' });
    expect(answer).toEqual({ ok: false, kind: 'failed', detail: 'no such project' });
  });
});

describe('a store opened again', () => {
  const file = path.join(folder, 'again.db');
  const command: Command = { do: 'tap', id: 'p1', key: cutKey, delta: 1 };

  it('shows what it showed, and goes on in a new session', async () => {
    const first = await openStore(openNodeDatabase(file), handTools());
    await first.perform('a', {
      do: 'create',
      id: 'p1',
      name: 'P',
      note: 'n',
      request: handRequest,
    });
    await first.perform('b', command);
    await first.perform('c', { do: 'set', id: 'p1', key: pairKey, want: 3 });
    const before = first.projects();
    await first.close();

    const db = openNodeDatabase(file);
    const second = await openStore(db, handTools({ value: 5 })); // a clock that went back
    expect(second.projects()).toEqual(before);
    await second.perform('b', command);
    await second.perform('d', command);
    expect(second.projects()[0]?.tallies[0]?.shown).toBe(2);
    const rows = await db.all<{ session: string; seq: number; time_ms: number }>(
      'SELECT session, seq, time_ms FROM outbox ORDER BY ord',
    );
    expect(rows.map(({ seq }) => seq)).toEqual([1, 2, 3, 1]);
    expect(new Set(rows.map(({ session }) => session)).size).toBe(2);
    expect(rows.map(({ time_ms }) => time_ms)).toEqual([1000000, 1000001, 1000002, 1000003]);
    await second.perform('e', { do: 'undo', id: 'p1', steps: [CUT] });
    await second.perform('f', { do: 'undo', id: 'p1', steps: [CUT] });
    expect(second.projects()[0]?.tallies[0]?.shown).toBe(0);
    await second.close();
  });

  it('refuses a database that a newer build wrote, and leaves it as it is', async () => {
    const db = openNodeDatabase(file);
    await db.exec(`PRAGMA user_version = ${SCHEMA_VERSION + 1}`);
    await expect(openStore(db, handTools())).rejects.toThrow(NewerSchemaError);
    expect(await db.all('PRAGMA user_version')).toEqual([{ user_version: SCHEMA_VERSION + 1 }]);
    await db.close();
  });
});
