import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

import type { ProjectsClient } from '../../../sync/client/projects-client';
import { createTabClient } from '../../../sync/client/tabs/create-tab-client';
import { SCHEMA_VERSION } from '../../../sync/store/migrate';
import { openNodeDatabase } from '../../support/open-node-database';
import { CUT, cutKey, handRequest } from '../store/hand-plan';
import { openFakeBrowser, type FakeBrowser, type FakeTab } from './fake-tabs';

jest.setTimeout(30_000);
const folder = mkdtempSync(path.join(tmpdir(), 'tabs-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

let serial = 0;
let browser: FakeBrowser;
let tabs: FakeTab[] = [];
let file = '';
beforeEach(() => {
  serial += 1;
  file = path.join(folder, `${serial}.db`);
  browser = openFakeBrowser(file);
  tabs = [];
});
afterEach(() => tabs.forEach((tab) => tab.kill()));

async function open(): Promise<{ tab: FakeTab; client: ProjectsClient }> {
  const tab = browser.openTab();
  tabs.push(tab);
  const client = createTabClient(tab.env);
  await client.start();
  return { tab, client };
}

async function newProject(client: ProjectsClient): Promise<string> {
  const made = await client.create({ name: 'Plate', request: handRequest });
  if (!made.ok) throw new Error(made.kind);
  return made.project.id;
}

const countOf = (client: ProjectsClient) => client.snapshot().projects[0]?.tallies[0]?.shown ?? 0;
const until = async (holds: () => boolean) => {
  for (let turn = 0; turn < 500 && !holds(); turn += 1) {
    await new Promise((resolve) => setTimeout(resolve, 2));
  }
  expect(holds()).toBe(true);
};

it('makes the first tab the leader and the second its follower', async () => {
  const one = await open();
  const two = await open();
  expect(one.client.snapshot().status).toMatchObject({ phase: 'ready', role: 'leader' });
  expect(two.client.snapshot().status).toMatchObject({
    phase: 'ready',
    role: 'follower',
    storage: 'private',
  });
});

it('shows the same in every tab, whichever counts', async () => {
  const [one, two, three] = [await open(), await open(), await open()];
  const id = await newProject(two.client);
  await two.client.tap(id, cutKey, 1);
  await one.client.tap(id, cutKey, 1);
  const third = await three.client.tap(id, cutKey, 1);
  expect(third.ok && third.project.tallies).toEqual([{ ...cutKey, shown: 3 }]);
  await until(() => [one, two, three].every(({ client }) => countOf(client) === 3));
  expect(two.client.snapshot().projects).toEqual(one.client.snapshot().projects);
  expect(three.client.snapshot().projects).toEqual(one.client.snapshot().projects);
});

it('sends other tabs a small patch after a tap, not the project', async () => {
  const one = await open();
  await open();
  const id = await newProject(one.client);
  await one.client.tap(id, cutKey, 1);
  const last = browser.sent.filter(({ kind }) => kind === 'changed').at(-1);
  expect(JSON.stringify(last).length).toBeLessThan(600);
});

it('replaces what changed and keeps the rest the same object', async () => {
  const { client } = await open();
  const id = await newProject(client);
  const other = await client.create({ name: 'Other', request: handRequest });
  const before = client.snapshot();
  await client.tap(id, cutKey, 1);
  const after = client.snapshot();
  const find = (snapshot: typeof before, name: string) =>
    snapshot.projects.find((project) => project.name === name);
  expect(other.ok).toBe(true);
  expect(after).not.toBe(before);
  expect(find(after, 'Plate')).not.toBe(find(before, 'Plate'));
  expect(find(before, 'Plate')?.tallies).toEqual([]);
  expect(find(after, 'Other')).toBe(find(before, 'Other'));
});

it('makes a follower the leader when the leader goes, and loses no tap', async () => {
  const one = await open();
  const two = await open();
  const id = await newProject(one.client);
  const taps = Array.from({ length: 20 }, () => two.client.tap(id, cutKey, 1));
  await until(() => countOf(two.client) > 3);
  one.tab.kill();
  const results = await Promise.all(taps);
  expect(results.every(({ ok }) => ok)).toBe(true);
  expect(two.client.snapshot().status.role).toBe('leader');
  expect(countOf(two.client)).toBe(20);
});

it('does a command once that was sent again because its answer was lost', async () => {
  const one = await open();
  const two = await open();
  const id = await newProject(one.client);
  two.tab.freeze(true); // the answer does not come through
  const tap = two.client.tap(id, cutKey, 1);
  await until(() => countOf(one.client) === 1);
  one.tab.kill();
  two.tab.freeze(false);
  expect((await tap).ok).toBe(true);
  expect(countOf(two.client)).toBe(1);
  await two.client.undo(id, [CUT]);
  expect(countOf(two.client)).toBe(0);
});

it('says that the store is open elsewhere when no leader answers, and does nothing later', async () => {
  const one = await open();
  const two = await open();
  const id = await newProject(one.client);
  one.tab.freeze(true);
  const tap = two.client.tap(id, cutKey, 1);
  await until(() => browser.sent.at(-1)?.kind === 'request');
  browser.pass(5000);
  expect(await tap).toEqual({ ok: false, kind: 'open-elsewhere' });
  one.tab.freeze(false);
  await one.client.durability(); // after whatever it would have done
  expect(countOf(one.client)).toBe(0);
});

it('fails to start beside a leader that does not answer, and starts once that one is gone', async () => {
  const one = await open();
  one.tab.freeze(true);
  const opening = open();
  browser.pass(6000);
  const two = await opening;
  expect(two.client.snapshot().status).toMatchObject({
    phase: 'failed',
    failure: { kind: 'open-elsewhere' },
  });
  one.tab.kill();
  await two.client.start();
  expect(two.client.snapshot().status).toMatchObject({ phase: 'ready', role: 'leader' });
});

it('never opens a database that a newer build wrote', async () => {
  const db = openNodeDatabase(file);
  await db.exec(`PRAGMA user_version = ${SCHEMA_VERSION + 1}`);
  await db.close();
  const { client } = await open();
  expect(client.snapshot().status.failure).toEqual({ kind: 'newer-schema' });
  expect(await client.openExample()).toEqual({ ok: false, kind: 'newer-schema' });
});

it('starts when asked again after an opening that failed, with no tab closed', async () => {
  browser.failOpening();
  const { client } = await open();
  expect(client.snapshot().status).toMatchObject({
    phase: 'failed',
    failure: { kind: 'failed', detail: 'unable to open database file' },
  });
  await client.start();
  expect(client.snapshot().status).toMatchObject({ phase: 'ready', role: 'leader', failure: null });
});

it('waits for its own slow opening, and blames no other tab for it', async () => {
  const { env } = browser.openTab();
  let goOn = (): void => undefined;
  const slow = new Promise<void>((resolve) => (goOn = resolve));
  const openDatabase: typeof env.openDatabase = (...given) =>
    slow.then(() => env.openDatabase(...given));
  const client = createTabClient({ ...env, openDatabase });
  const starting = client.start();
  browser.pass(6000);
  expect(client.snapshot().status).toMatchObject({ phase: 'starting', failure: null });
  goOn();
  await starting;
  expect(client.snapshot().status).toMatchObject({ phase: 'ready', role: 'leader' });
});

it('gives the lock to the next tab when its own opening fails', async () => {
  browser.failOpening();
  const [failed, other] = [await open(), await open()];
  expect(other.client.snapshot().status).toMatchObject({ phase: 'ready', role: 'leader' });
  await failed.client.start();
  expect(failed.client.snapshot().status).toMatchObject({ phase: 'ready', role: 'follower' });
});

it.each([
  ['a newer one', SCHEMA_VERSION + 1, 'newer-schema'],
  ['an older one', SCHEMA_VERSION - 1, 'open-elsewhere'],
] as const)('shows nothing of a leader whose schema is %s', async (_which, schema, kind) => {
  const one = await open();
  const two = await open();
  const id = await newProject(two.client);
  const other = { build: 'other', schema, storage: 'private', persisted: null } as const;
  one.tab.env
    .openChannel(() => undefined)
    .send({ kind: 'welcome', begins: false, revision: 9, projects: [], ...other });
  await until(() => two.client.snapshot().status.phase === 'failed');
  expect(two.client.snapshot().status.failure).toEqual({ kind });
  expect(await two.client.tap(id, cutKey, 1)).toEqual({ ok: false, kind });
});

it('tells that the storage is full, keeps what was there, and goes on when there is room', async () => {
  const { client } = await open();
  const id = await newProject(client);
  await client.tap(id, cutKey, 1);
  browser.fill(true);
  expect(await client.tap(id, cutKey, 1)).toEqual({ ok: false, kind: 'storage-full' });
  expect(client.snapshot().status).toMatchObject({
    phase: 'ready',
    failure: { kind: 'storage-full' },
  });
  expect(countOf(client)).toBe(1);
  browser.fill(false);
  await client.tap(id, cutKey, 1);
  expect(countOf(client)).toBe(2);
  expect(client.snapshot().status.failure).toBeNull();
});

it('asks the browser to keep the data after the first real work, not for the example', async () => {
  const one = await open();
  const two = await open();
  await one.client.openExample();
  expect(one.client.snapshot().status.persisted).toBeNull();
  await newProject(two.client);
  await until(() => two.client.snapshot().status.persisted === true);
});
