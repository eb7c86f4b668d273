import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { connect } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';

import { readConfig } from '../../server/config';
import { startServer, type RunningServer } from '../../server/start-server';
import { ProblemSchema } from '../../sync/protocol/problem';
import { createTestSchema } from '../support/open-test-schema';
import { openTcpRelay, type TcpRelay } from '../support/tcp-relay';

const WEB_DIST = mkdtempSync(path.join(tmpdir(), 'dist-'));
writeFileSync(path.join(WEB_DIST, 'index.html'), '<p>page</p>');

jest.setTimeout(20_000); // one test waits for the server's own next try

let relay: TcpRelay;
let env: NodeJS.ProcessEnv;
const running: RunningServer[] = [];
beforeAll(async () => {
  const urls = await createTestSchema();
  relay = await openTcpRelay(urls.databaseUrl);
  env = {
    DATABASE_URL: relay.url(urls.databaseUrl),
    MIGRATION_DATABASE_URL: relay.url(urls.migrationUrl),
    PORT: '0',
    LOG_LEVEL: 'silent',
    WEB_DIST,
  };
});
afterEach(() => Promise.all(running.splice(0).map((server) => server.stop())));
afterAll(async () => {
  await relay?.cut();
  rmSync(WEB_DIST, { recursive: true, force: true });
});

async function start(more: NodeJS.ProcessEnv = {}): Promise<RunningServer> {
  const server = await startServer(readConfig({ ...env, ...more }));
  running.push(server);
  return server;
}
const page = ({ url }: RunningServer) => fetch(`${url}/me`, { headers: { Accept: 'text/html' } });
const plan = ({ url }: RunningServer) =>
  fetch(`${url}/api/v1/plans`, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json' },
    body: '{}',
  });
const health = async ({ url }: RunningServer) => (await fetch(`${url}/api/health`)).status;

it('migrates an empty database and serves', async () => {
  const server = await start();
  expect(server.connected).toBe(true);
  expect(await health(server)).toBe(200);
});

it('serves the app and its plans while PostgreSQL is away, and is well when it is back', async () => {
  const server = await start();
  await relay.cut();
  const away = await fetch(`${server.url}/api/health`);
  expect(away.status).toBe(503);
  expect(away.headers.get('retry-after')).toBe('5');
  expect(ProblemSchema.parse(await away.json())).toMatchObject({ code: 'database-away' });
  expect(await (await page(server)).text()).toBe('<p>page</p>');
  expect(ProblemSchema.parse(await (await plan(server)).json()).code).toBe('invalid-request');
  await relay.restore();
  expect(await health(server)).toBe(200);
});

it('starts without PostgreSQL, and connects by itself when it is there', async () => {
  await relay.cut();
  const server = await start();
  expect(server.connected).toBe(false);
  expect(await health(server)).toBe(503);
  expect((await page(server)).status).toBe(200);
  await relay.restore();
  for (let tries = 0; (await health(server)) !== 200 && tries < 100; tries += 1) {
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  expect(await health(server)).toBe(200);
});

it('stops while it still waits for PostgreSQL', async () => {
  await relay.cut();
  const server = await startServer(readConfig(env));
  await server.stop();
  await expect(page(server)).rejects.toThrow('fetch failed');
  await relay.restore();
});

it('lets a request under way end before it stops, and takes no new one', async () => {
  const server = await startServer(readConfig(env));
  const body = '{}';
  const socket = connect(Number(new URL(server.url).port), '127.0.0.1');
  const answer = new Promise<string>((resolve) => {
    let text = '';
    socket.on('data', (part) => (text += String(part))).on('close', () => resolve(text));
  });
  const head = ['POST /api/v1/plans HTTP/1.1', 'Host: x', 'Content-Type: application/json'];
  socket.write(`${[...head, `Content-Length: ${body.length}`].join('\r\n')}\r\n\r\n{`);
  await new Promise((resolve) => setTimeout(resolve, 100));
  const stopped = server.stop();
  await expect(page(server)).rejects.toThrow('fetch failed');
  socket.write('}');
  expect(await answer).toMatch(/^HTTP\/1\.1 400 .*invalid-request/s);
  await stopped;
});

it('names the port when it is taken', async () => {
  const { port } = new URL((await start()).url);
  await expect(startServer(readConfig({ ...env, PORT: port }))).rejects.toThrow(
    expect.objectContaining({ code: 'EADDRINUSE', port: Number(port) }),
  );
});

it('says where the web build should be when there is none', async () => {
  const missing = path.join(WEB_DIST, 'gone');
  await expect(startServer(readConfig({ ...env, WEB_DIST: missing }))).rejects.toThrow(missing);
});
