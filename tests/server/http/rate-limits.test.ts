import express from 'express';
import request from 'supertest';

import { limitRate } from '../../../server/http/rate-limits';

const open = (perMinute: number, trustProxyHops = 0) =>
  express()
    .set('trust proxy', trustProxyHops)
    .use(limitRate(perMinute))
    .use((_request, response) => void response.send('served'));

it('serves as many requests as it is told, and refuses the next with the time to wait', async () => {
  const app = open(3);
  for (let n = 0; n < 3; n += 1) await request(app).get('/').expect(200);
  const { body, headers } = await request(app).get('/').expect(429);
  expect(body).toEqual({
    type: '/problems/too-many-requests',
    title: 'Too many requests, try again in a moment',
    status: 429,
    code: 'too-many-requests',
  });
  expect(headers['content-type']).toMatch(/^application\/problem\+json/);
  expect(Number(headers['retry-after'])).toBeGreaterThan(0);
  expect(Number(headers['retry-after'])).toBeLessThanOrEqual(60);
});

it('counts the people behind a proxy of ours each by themselves', async () => {
  const app = open(1, 1);
  const from = (address: string) => request(app).get('/').set('X-Forwarded-For', address);
  await from('192.0.2.1').expect(200);
  await from('192.0.2.2').expect(200);
  await from('192.0.2.1').expect(429);
});
