import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

import type { Express } from 'express';
import request from 'supertest';

import { makeOpenApiDocument } from '../../server/features/openapi/document';
import { HealthSchema } from '../../sync/protocol/health';
import { openTestDatabase, type TestDatabase } from '../support/open-test-schema';
import { createTestApp } from '../support/test-app';

const webDist = mkdtempSync(path.join(tmpdir(), 'dist-'));
mkdirSync(path.join(webDist, 'js'));
writeFileSync(path.join(webDist, 'index.html'), '<p>page</p>');
writeFileSync(path.join(webDist, 'js', 'entry.js'), 'run()');

let database: TestDatabase;
let app: Express;
beforeAll(async () => {
  database = await openTestDatabase();
  app = createTestApp(database.db, { webDist });
});
afterAll(async () => {
  await database?.close();
  rmSync(webDist, { recursive: true, force: true });
});

it('says that it is well, and which version it is', async () => {
  const { body } = await request(app).get('/api/health').expect(200);
  expect(HealthSchema.parse(body)).toEqual({ status: 'ok', version: '0.1.0' });
});

it('serves the OpenAPI document that it is written by', async () => {
  const { body, headers } = await request(app).get('/api/openapi.json').expect(200);
  expect(headers['content-type']).toMatch(/^application\/json/);
  expect(body).toEqual(JSON.parse(JSON.stringify(makeOpenApiDocument())));
});

it.each([
  ['GET', '/api/health'],
  ['GET', '/api/nowhere'],
  ['GET', '/projects/new'],
  ['GET', '/js/entry.js'],
  ['GET', '/js/gone.js'],
])('secures the answer to %s %s, and tells no maker of it', async (_method, address) => {
  const { headers } = await request(app).get(address).set('Accept', 'text/html');
  expect(headers['content-security-policy']).toContain("default-src 'self'");
  expect(headers['x-content-type-options']).toBe('nosniff');
  expect(headers).not.toHaveProperty('cross-origin-embedder-policy');
  expect(headers).not.toHaveProperty('x-powered-by');
});

it('keeps nothing of the API in any cache, and names each request', async () => {
  for (const address of ['/api/health', '/api/nowhere', '/api/openapi.json']) {
    const { headers } = await request(app).get(address);
    expect(headers['cache-control']).toBe('no-store');
    expect(headers['x-request-id']).toMatch(/^[0-9a-f-]{36}$/);
  }
});

it.each(['/', '/projects', '/projects/new', '/projects/1/table?step=cut', '/me/safety'])(
  'answers the deep link %s with the page',
  async (address) => {
    const { text } = await request(app).get(address).set('Accept', 'text/html').expect(200);
    expect(text).toBe('<p>page</p>');
  },
);

it.each(['/api', '/api/', '/api/nowhere', '/api/v1/nowhere', '/js/gone.js', '/../package.json'])(
  'answers %s with a problem and never with the page',
  async (address) => {
    const { body, headers } = await request(app).get(address).set('Accept', 'text/html');
    expect(body).toMatchObject({ status: 404, code: 'not-found' });
    expect(headers['content-type']).toMatch(/^application\/problem\+json/);
  },
);

it.each([
  ['delete', '/api/health', 'GET, HEAD'],
  ['post', '/api/openapi.json', 'GET, HEAD'],
  ['get', '/api/v1/plans', 'POST'],
  ['put', '/api/v1/plans', 'POST'],
  ['post', '/projects/new', 'GET, HEAD'],
  ['delete', '/js/entry.js', 'GET, HEAD'],
] as const)('refuses to %s %s and names the methods it takes', async (method, address, allowed) => {
  const { body, headers } = await request(app)[method](address).expect(405);
  expect(body.code).toBe('method-not-allowed');
  expect(headers['allow']).toBe(allowed);
});

it('answers an address that is no text with a problem', async () => {
  const { body } = await request(app).get('/api/%E0%A4%A').expect(404);
  expect(body.code).toBe('not-found');
});

it('limits the API as a whole, and leaves the files of the app alone', async () => {
  const limited = createTestApp(database.db, { webDist, apiPerMinute: 2 });
  await request(limited).get('/api/health').expect(200);
  await request(limited).get('/api/openapi.json').expect(200);
  const { headers, body } = await request(limited).get('/api/health').expect(429);
  expect(body.code).toBe('too-many-requests');
  expect(Number(headers['retry-after'])).toBeGreaterThan(0);
  await request(limited).get('/js/entry.js').expect(200);
});

it('logs the API and not the files, each line without the address of anyone', async () => {
  const lines: string[] = [];
  const logDestination = { write: (line: string) => void lines.push(line) };
  const logged = createTestApp(database.db, { webDist, logLevel: 'info', logDestination });
  await request(logged).get('/js/entry.js').expect(200);
  expect(lines).toEqual([]);
  await request(logged).get('/api/health?who=anna@example.org').expect(200);
  await request(logged).post('/api/v1/plans').send({ note: 'anna@example.org' }).expect(400);
  expect(lines.map((line) => JSON.parse(line).route)).toEqual(['/api/health', '/api/v1/plans']);
  expect(lines.join('')).not.toMatch(/anna|127\.0\.0\.1|::1|user-agent/i);
});
