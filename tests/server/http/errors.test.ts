import express, { type RequestHandler } from 'express';
import request from 'supertest';
import { QueryFailedError } from 'typeorm';

import { handleError, methodNotAllowed, notFound } from '../../../server/http/errors';
import { ProblemError } from '../../../server/http/problems';
import { PROBLEMS, ProblemSchema, type ProblemCode } from '../../../sync/protocol/problem';

const failWith = (error: unknown) => {
  const fail: RequestHandler = () => {
    throw error;
  };
  return express().use(fail).use(handleError);
};
const pgError = (code: string) =>
  new QueryFailedError('SELECT 1', [], Object.assign(new Error('pg'), { code }));
const nodeError = (code: string) => Object.assign(new Error('net'), { code });

async function problemOf(error: unknown) {
  const { body, status, headers } = await request(failWith(error)).get('/');
  return { problem: ProblemSchema.parse(body), status, headers };
}

it.each(Object.keys(PROBLEMS) as ProblemCode[])(
  'answers %s with its status and title',
  async (code) => {
    const { problem, status, headers } = await problemOf(new ProblemError(code));
    expect(problem).toEqual({ type: `/problems/${code}`, code, ...PROBLEMS[code] });
    expect(status).toBe(PROBLEMS[code].status);
    expect(headers['content-type']).toBe('application/problem+json; charset=utf-8');
  },
);

it.each([
  ['a refused connection', nodeError('ECONNREFUSED')],
  [
    'refused connections of a name with two addresses',
    new AggregateError([nodeError('ECONNREFUSED')]),
  ],
  ['a database that shuts down', pgError('57P01')],
  ['a database that starts up', pgError('57P03')],
  ['a lost connection', pgError('08006')],
  ['a connection cut by the other end', new Error('Connection terminated unexpectedly')],
  ['a pool without a free connection', new Error('timeout exceeded when trying to connect')],
])('tells %s as the database being away, and when to come back', async (_name, error) => {
  const { problem, headers } = await problemOf(error);
  expect(problem.code).toBe('database-away');
  expect(headers['retry-after']).toBe('5');
});

it.each([
  ['a wrong query', pgError('42601')],
  ['a mistake of ours', new TypeError('x is not a function')],
  ['something thrown that is no error', 'text'],
])('tells nothing about %s', async (_name, error) => {
  const { problem } = await problemOf(error);
  expect(problem).toEqual({ type: '/problems/internal', code: 'internal', ...PROBLEMS.internal });
});

it('names the methods that an address takes', async () => {
  const app = express();
  app
    .route('/')
    .get((_request, response) => void response.send())
    .all(methodNotAllowed('GET', 'HEAD'));
  app.use(handleError);
  const { body, headers } = await request(app).delete('/').expect(405);
  expect(body.code).toBe('method-not-allowed');
  expect(headers['allow']).toBe('GET, HEAD');
});

it('answers an unknown address with not-found', async () => {
  const { body } = await request(express().use(notFound).use(handleError)).get('/gone').expect(404);
  expect(body.code).toBe('not-found');
});

it('closes the connection when an answer has begun, rather than mixing two', async () => {
  const app = express();
  app.get('/', (_request, response) => {
    response.setHeader('Content-Length', '100');
    response.write('half');
    throw new Error('late');
  });
  app.use(handleError);
  app.set('env', 'test'); // Express prints nothing then
  await expect(request(app).get('/')).rejects.toThrow(/aborted|hang up/);
});
