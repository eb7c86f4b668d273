import { gzipSync } from 'node:zlib';

import express from 'express';
import request from 'supertest';

import { handleError } from '../../../server/http/errors';
import { jsonBody } from '../../../server/http/json-body';

const MOST = 64;
const app = express()
  .post('/', ...jsonBody(MOST), (received, response) => void response.json({ got: received.body }))
  .use(handleError);
const post = () => request(app).post('/');
const textOf = (bytes: number) => JSON.stringify('x'.repeat(bytes - 2));

it.each([['{"a":1}'], ['[1]'], ['"text"'], ['0'], ['null'], ['false']])(
  'reads %s',
  async (text) => {
    const { body } = await post().type('application/json').send(text).expect(200);
    expect(body).toEqual({ got: JSON.parse(text) });
  },
);

it('takes application/json with a UTF-8 charset', () =>
  post().set('Content-Type', 'application/json; charset=utf-8').send('{}').expect(200));

it.each([
  ['text/plain'],
  ['application/x-www-form-urlencoded'],
  ['application/problem+json'],
  ['application/json; charset=latin1'],
])('refuses %s', async (type) => {
  const { body } = await post().set('Content-Type', type).send('{}').expect(415);
  expect(body.code).toBe('unsupported-media-type');
});

it('refuses a body that names no type', async () => {
  const { body } = await post().set('Content-Type', '').send('{}').expect(415);
  expect(body.code).toBe('unsupported-media-type');
});

it.each([['{'], ['{"a":1,}'], ["{'a':1}"], ['NaN'], ['{}{}']])('refuses %s', async (text) => {
  const { body } = await post().type('application/json').send(text).expect(400);
  // word for word: nothing that was sent is sent back
  expect(body).toEqual({
    type: '/problems/invalid-json',
    title: 'The body is not JSON',
    status: 400,
    code: 'invalid-json',
  });
});

it('refuses a body that is empty, and a request without one', async () => {
  const empty = await post().type('application/json').expect(400);
  expect(empty.body.code).toBe('invalid-json');
  const none = await post().type('application/json').unset('Content-Length').expect(400);
  expect(none.body.code).toBe('invalid-json');
});

it('takes a body of exactly the limit and refuses one byte more', async () => {
  await post().type('application/json').send(textOf(MOST)).expect(200);
  const { body } = await post()
    .type('application/json')
    .send(textOf(MOST + 1))
    .expect(413);
  expect(body.code).toBe('body-too-large');
});

it('measures a packed body unpacked', async () => {
  const packed = gzipSync(textOf(10_000));
  expect(packed.length).toBeLessThan(MOST);
  const { body } = await post()
    .set('Content-Type', 'application/json')
    .set('Content-Encoding', 'gzip')
    .serialize((value: unknown) => value as string)
    .send(packed)
    .expect(413);
  expect(body.code).toBe('body-too-large');
});
