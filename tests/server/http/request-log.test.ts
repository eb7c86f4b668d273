import express from 'express';
import request from 'supertest';

import { handleError } from '../../../server/http/errors';
import { requestLog } from '../../../server/http/request-log';

const SECRET = 'anna@example.org';

function openApp() {
  const lines: string[] = [];
  const app = express().use(
    '/api',
    requestLog({ level: 'info', destination: { write: (line) => void lines.push(line) } }),
  );
  app.use('/api', express.json());
  app.get('/api/people/:name', (_request, response) => void response.send('ok'));
  app.post('/api/fail', () => {
    const error = new Error(`duplicate key: (email)=(${SECRET})`);
    throw Object.assign(error, { code: '23505', constraint: 'email_key', detail: SECRET });
  });
  app.use(handleError);
  return { app, lines, parsed: () => lines.map((line) => JSON.parse(line)) };
}

it('writes the method, the pattern of the route, the status and the time taken', async () => {
  const { app, lines, parsed } = openApp();
  const { headers } = await request(app).get('/api/people/wilmot').expect(200);
  expect(parsed()).toHaveLength(1);
  expect(lines[0]?.match(/"route"/g)).toHaveLength(1);
  expect(parsed()[0]).toMatchObject({
    req: { id: headers['x-request-id'], method: 'GET' },
    res: { status: 200 },
    route: '/api/people/:name',
    responseTime: expect.any(Number),
  });
});

it('gives each request an id of its own, whatever the client calls itself', async () => {
  const { app } = openApp();
  const idOf = async () =>
    (await request(app).get('/api/people/x').set('X-Request-Id', SECRET)).headers['x-request-id'];
  const ids = [await idOf(), await idOf()];
  expect(new Set(ids).size).toBe(2);
  ids.forEach((id) => expect(id).toMatch(/^[0-9a-f-]{36}$/));
});

it('keeps nothing of a person: no address, name, query, cookie, key or body', async () => {
  const { app, lines, parsed } = openApp();
  await request(app)
    .get(`/api/people/${SECRET}?q=${SECRET}`)
    .set('Authorization', `Bearer ${SECRET}`)
    .set('Cookie', `session=${SECRET}`)
    .set('User-Agent', SECRET)
    .set('X-Forwarded-For', '192.0.2.77');
  await request(app).get(`/api/unknown/${SECRET}`).expect(404);
  await request(app).post('/api/fail').send({ email: SECRET }).expect(500);
  await request(app).post('/api/fail').type('json').send(`{"email": ${SECRET}`).expect(400);
  const all = lines.join('');
  expect(parsed().length).toBeGreaterThanOrEqual(4);
  expect(all).not.toMatch(/anna|example\.org|192\.0\.2|127\.0\.0\.1|::1/);
});

it('says where in the code a failure came from, and its code, at the level of errors', async () => {
  const { app, parsed } = openApp();
  await request(app).post('/api/fail').send({}).expect(500);
  const failure = parsed().find(({ msg }) => msg === 'the request failed');
  expect(failure).toMatchObject({
    level: 50,
    err: { name: 'Error', code: '23505', constraint: 'email_key' },
  });
  expect(failure.err.places[0]).toMatch(/request-log\.test\.ts/);
});
