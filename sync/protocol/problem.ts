import { z } from 'zod';

import { PlanRefusalSchema } from '../../shared/model/plan';

/** Every problem the server answers with: its stable code, HTTP status and title. */
export const PROBLEMS = {
  'invalid-request': { status: 400, title: 'The request cannot be planned' },
  'invalid-json': { status: 400, title: 'The body is not JSON' },
  'bad-request': { status: 400, title: 'The request cannot be understood' },
  'not-found': { status: 404, title: 'There is nothing at this address' },
  'method-not-allowed': { status: 405, title: 'This address does not take that method' },
  'body-too-large': { status: 413, title: 'The body is too large' },
  'unsupported-media-type': { status: 415, title: 'The body must be application/json in UTF-8' },
  'too-many-requests': { status: 429, title: 'Too many requests, try again in a moment' },
  internal: { status: 500, title: 'Something went wrong on the server' },
  'database-away': { status: 503, title: 'The database cannot be reached, try again in a moment' },
} as const;
export type ProblemCode = keyof typeof PROBLEMS;

const codes = Object.keys(PROBLEMS) as [ProblemCode, ...ProblemCode[]];

/** A problem document (RFC 9457). `errors` is there when a plan is refused. */
export const ProblemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int().min(400).max(599),
  code: z.enum(codes),
  errors: z.array(PlanRefusalSchema).optional(),
});
export type Problem = z.output<typeof ProblemSchema>;

/** The media type of a problem document. */
export const PROBLEM_TYPE = 'application/problem+json';
