import type { Express } from 'express';
import request from 'supertest';

import { PlanSchema } from '../../../shared/model/plan';
import { planJson } from '../../../shared/plan/canonical-json';
import { makePlan } from '../../../shared/plan/make-plan';
import { parseRequest } from '../../../shared/plan/parse-request';
import { ProblemSchema } from '../../../sync/protocol/problem';
// worked out by hand from the formulas of the ring, not by the engine
import example from '../../fixtures/plate-of-sixteen.json';
import { openTestDatabase, type TestDatabase } from '../../support/open-test-schema';
import { createTestApp } from '../../support/test-app';

let database: TestDatabase;
let app: Express;
beforeAll(async () => {
  database = await openTestDatabase();
  app = createTestApp(database.db);
});
afterAll(() => database?.close());

const post = (body: unknown) =>
  request(app).post('/api/v1/plans').type('application/json').send(JSON.stringify(body));

/** The example's request with the value at a JSON pointer replaced, or taken out. */
function withValue(pointer: string, value: unknown): unknown {
  const changed: unknown = structuredClone(example.request);
  const parts = pointer.split('/').slice(1);
  const last = String(parts.pop());
  const place = parts.reduce((at, part) => (at as Record<string, unknown>)[part], changed);
  const members = place as Record<string, unknown>;
  if (value === undefined) delete members[last];
  else members[last] = value;
  return changed;
}

it('plans the plate of sixteen, to the byte', async () => {
  const { text, headers } = await post(example.request).expect(200);
  expect(headers['content-type']).toBe('application/json; charset=utf-8');
  const { steps, ...before } = example.plan;
  const opening = `${JSON.stringify(before).slice(0, -1)},"steps":[`;
  expect(text.slice(0, opening.length)).toBe(opening);
  for (const step of steps) expect(text).toContain(JSON.stringify(step));
  expect(text).toMatch(/\}\]\}$/);
});

it('gives every step of the plate in the order of work, with its target', async () => {
  const { body } = await post(example.request).expect(200);
  const steps = PlanSchema.parse(body).steps.map(({ role, station, target, lanes }) =>
    [role, station, target, lanes.map((lane) => lane.target).join('+')].join(' '),
  );
  expect(steps).toEqual([
    'strip table 4 1+1+1+1',
    'length table 4 1+1+1+1',
    'stack table 1 1',
    'cut table 16 4',
    'tip-sew machine 16 4+4+4+4',
    'tip-trim table 16 4+4+4+4',
    'tip-turn iron 16 4+4+4+4',
    'pair machine 8 4+4',
    'quarter machine 4 4',
    'half machine 2 2',
    'ring machine 1 1',
    'ring-press iron 1 1',
    'circle-cut table 1 1',
    'circle-turn iron 1 1',
    'background-cut table 1 1',
    'background-fold iron 1 1',
    'applique machine 1 1',
    'block-trim table 1 1',
  ]);
});

it.each([
  ['as it is', example.request],
  ['with five blocks', withValue('/blocks', 5)],
  ['with twenty wedges', withValue('/wedges', 20)],
  ['with a length not in lowest terms', withValue('/stripHeight', '22/4')],
])('answers with the text the app computes by itself, %s', async (_name, body) => {
  const parsed = parseRequest(body);
  if (!parsed.ok) throw new Error('refused');
  const plan = makePlan(parsed.value);
  if (!plan.ok) throw new Error('refused');
  const { text } = await post(body).expect(200);
  expect(text).toBe(planJson(plan.value));
});

it('answers the same request with the same bytes, however its keys are ordered', async () => {
  const shuffled = Object.fromEntries(Object.entries(example.request).reverse());
  const [first, second] = [await post(example.request), await post(shuffled)];
  expect(second.text).toBe(first.text);
});

it('refuses a circle that would cover the tips, word for word', async () => {
  const { text, headers } = await post(withValue('/stripHeight', '5/4')).expect(400);
  expect(headers['content-type']).toBe('application/problem+json; charset=utf-8');
  expect(text).toBe(
    '{"type":"/problems/invalid-request","title":"The request cannot be planned","status":400,' +
      '"code":"invalid-request","errors":[{"pointer":"/stripHeight","code":"circle-over-tips",' +
      '"params":{"least":"11/8"}}]}',
  );
});

it.each([
  ['/block', undefined, 'not-a-request'],
  ['/block', 16, 'not-a-request'],
  ['/block', 'sixteen', 'not-a-length'],
  ['/block', '0', 'not-positive'],
  ['/block', '3', 'below-least'],
  ['/block', '61', 'above-most'],
  ['/seam', '-1/4', 'not-positive'],
  ['/seam', '1/0', 'not-a-length'],
  ['/seam', '9'.repeat(30_000), 'not-a-length'],
  ['/wedges', 4, 'below-least'],
  ['/wedges', 61, 'above-most'],
  ['/wedges', 16.5, 'not-a-request'],
  ['/blocks', 201, 'above-most'],
  ['/narrowAt', '1/16', 'narrow-edge-crossed'],
  ['/stripHeight', '13/2', 'margin-negative'],
  ['/tip/shape', 'round', 'not-a-request'],
  ['/centre/fabric', 'Z', 'unknown-fabric'],
  ['/background/fabric', 'A', 'wrong-role'],
  ['/cloth/usableWidth', '17', 'background-wider-than-cloth'],
  ['/cloth/shrinkPercent', '50', 'shrink-too-large'],
  ['/cutting/bladeMm', 44, 'not-a-request'],
  ['/cutting/cap', 0, 'not-positive'],
  ['/fabrics', [], 'too-few-fabrics'],
  ['/fabrics/1/letter', 'A', 'letter-twice'],
  ['/fabrics/1/buyYards', '1/8', 'buys-too-little'],
  ['/fabrics/0/colour', 'red', 'not-a-request'],
  ['/family', 'grid', 'not-a-request'],
  ['/version', 2, 'not-a-request'],
])('refuses at %s the value %j as %s', async (pointer, value, code) => {
  const { body } = await post(withValue(pointer, value)).expect(400);
  const problem = ProblemSchema.parse(body);
  expect(problem).toMatchObject({ code: 'invalid-request', type: '/problems/invalid-request' });
  expect(problem.errors).toContainEqual(expect.objectContaining({ pointer, code }));
});

it('tells every field that is wrong at once', async () => {
  const { body } = await post({ ...example.request, block: '0', wedges: 4 }).expect(400);
  const errors = ProblemSchema.parse(body).errors?.map(({ pointer, code }) => `${pointer} ${code}`);
  expect(errors?.sort()).toEqual(['/block not-positive', '/wedges below-least']);
});

it.each([[null], [[]], ['text'], [7], [{}]])('refuses %j, which is no request', async (body) => {
  const problem = ProblemSchema.parse((await post(body).expect(400)).body);
  expect(problem.errors?.[0]?.code).toBe('not-a-request');
});

it('refuses a field that it does not know', async () => {
  const { body } = await post({ ...example.request, extra: 1 }).expect(400);
  expect(body.errors).toEqual([{ pointer: '', code: 'not-a-request', params: {} }]);
});

it('reads 32 KiB and refuses a byte more', async () => {
  const text = JSON.stringify(example.request);
  const send = (bytes: number) =>
    request(app).post('/api/v1/plans').type('application/json').send(text.padEnd(bytes));
  await send(32 * 1024).expect(200);
  const { body } = await send(32 * 1024 + 1).expect(413);
  expect(body.code).toBe('body-too-large');
});

it('refuses what is not JSON, by its type or by its text', async () => {
  const plain = request(app).post('/api/v1/plans').type('text/plain');
  expect((await plain.send('{}').expect(415)).body.code).toBe('unsupported-media-type');
  const broken = request(app).post('/api/v1/plans').type('application/json');
  expect((await broken.send('{"kind":').expect(400)).body.code).toBe('invalid-json');
});

it('has a limit of its own, and says when to come back', async () => {
  const limited = createTestApp(database.db, { plansPerMinute: 2 });
  const ask = () => request(limited).post('/api/v1/plans').send(example.request);
  await ask().expect(200);
  await ask().expect(200);
  const { body, headers } = await ask().expect(429);
  expect(ProblemSchema.parse(body).code).toBe('too-many-requests');
  expect(Number(headers['retry-after'])).toBeGreaterThan(0);
  await request(limited).get('/api/health').expect(200);
});
