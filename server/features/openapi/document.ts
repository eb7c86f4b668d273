import { OpenAPIRegistry, OpenApiGeneratorV31 } from '@asteasolutions/zod-to-openapi';
import { z } from 'zod';

import { version } from '../../../package.json';
import { PlanSchema } from '../../../shared/model/plan';
import { PlanRequestSchema } from '../../../shared/model/plan-request';
import { HealthSchema } from '../../../sync/protocol/health';
import {
  PROBLEMS,
  PROBLEM_TYPE,
  ProblemSchema,
  type ProblemCode,
} from '../../../sync/protocol/problem';

const Health = HealthSchema.meta({ id: 'Health' });
const Problem = ProblemSchema.meta({ id: 'Problem' });
const PlanRequest = PlanRequestSchema.meta({ id: 'PlanRequest' });
const Plan = PlanSchema.meta({ id: 'Plan' });

const json = (schema: z.ZodType, description: string) => ({
  description,
  content: { 'application/json': { schema } },
});

/** The problem responses of a path: one for each status, whose description names the codes. */
function problems(...codes: readonly ProblemCode[]) {
  const byStatus: Record<string, ReturnType<typeof problem>> = {};
  for (const code of codes) {
    const { status, title } = PROBLEMS[code];
    const before = byStatus[status]?.description;
    byStatus[status] = problem(`${before ? `${before} · ` : ''}${title} (\`${code}\`)`);
  }
  return byStatus;
}
const problem = (description: string) => ({
  description,
  content: { [PROBLEM_TYPE]: { schema: Problem } },
});

/** The OpenAPI 3.1 document, made from the schemas that both ends parse with. */
export function makeOpenApiDocument() {
  const registry = new OpenAPIRegistry();
  registry.registerPath({
    method: 'get',
    path: '/api/health',
    operationId: 'readHealth',
    summary: 'Whether the server and its database are well',
    responses: {
      200: json(Health, 'Both are well'),
      ...problems('too-many-requests', 'database-away'),
    },
  });
  registry.registerPath({
    method: 'get',
    path: '/api/openapi.json',
    operationId: 'readOpenApi',
    summary: 'This document',
    responses: {
      200: json(z.record(z.string(), z.unknown()), 'OpenAPI 3.1'),
      ...problems('too-many-requests'),
    },
  });
  registry.registerPath({
    method: 'post',
    path: '/api/v1/plans',
    operationId: 'makePlan',
    summary: 'The whole plan of a block, from its request',
    description:
      'Needs no account and keeps nothing. The same request gives the same plan, byte for byte, ' +
      'as in the app. At most 32 KiB.',
    request: { body: { required: true, content: { 'application/json': { schema: PlanRequest } } } },
    responses: {
      200: json(Plan, 'The plan'),
      ...problems(
        'invalid-request',
        'invalid-json',
        'bad-request',
        'body-too-large',
        'unsupported-media-type',
        'too-many-requests',
        'internal',
      ),
    },
  });
  return new OpenApiGeneratorV31(registry.definitions).generateDocument({
    openapi: '3.1.0',
    info: { title: 'Matside', version, description: 'Exact plans for quilt blocks.' },
    servers: [{ url: '/' }],
  });
}
