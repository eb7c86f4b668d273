import { connect, connectWhenBack } from '../../../server/db/connect';
import { createDataSource } from '../../../server/db/data-source';
import { createTestSchema } from '../../support/open-test-schema';
import { openTcpRelay, type TcpRelay } from '../../support/tcp-relay';

let relay: TcpRelay;
let urls: Awaited<ReturnType<typeof createTestSchema>>;
beforeAll(async () => {
  const direct = await createTestSchema();
  relay = await openTcpRelay(direct.databaseUrl);
  const { url } = relay;
  urls = { databaseUrl: url(direct.databaseUrl), migrationUrl: url(direct.migrationUrl) };
  await relay.cut();
});
afterAll(() => relay?.cut());

it('says that the database is away, and connects and migrates once it is back', async () => {
  const db = createDataSource(urls.databaseUrl);
  expect(await connect(db, urls)).toEqual({ ok: false, kind: 'database-away' });
  const waiting = connectWhenBack(db, urls, { everyMs: 20, signal: new AbortController().signal });
  await relay.restore();
  await waiting;
  expect(await db.query('SELECT count(*)::int AS n FROM sync_scope')).toEqual([{ n: 0 }]);
  await db.destroy();
});

it('gives up waiting when told to', async () => {
  await relay.cut();
  const db = createDataSource(urls.databaseUrl);
  const stopped = new AbortController();
  const waiting = connectWhenBack(db, urls, { everyMs: 10_000, signal: stopped.signal });
  stopped.abort();
  await waiting;
  expect(db.isInitialized).toBe(false);
  await relay.restore();
});

it('does not take a wrong password for a database that is away', async () => {
  const wrong = Object.assign(new URL(urls.databaseUrl), { password: 'wrong' }).href;
  const db = createDataSource(wrong);
  await expect(connect(db, { ...urls, databaseUrl: wrong })).rejects.toThrow(/password/);
});
