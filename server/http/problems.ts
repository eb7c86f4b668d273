import type { Response } from 'express';

import {
  PROBLEMS,
  PROBLEM_TYPE,
  type Problem,
  type ProblemCode,
} from '../../sync/protocol/problem';

/** Thrown where a request ends in a problem; the error handler answers with it. */
export class ProblemError extends Error {
  override name = 'ProblemError';

  constructor(
    readonly code: ProblemCode,
    readonly errors?: NonNullable<Problem['errors']>,
  ) {
    super(code);
  }
}

/** Answers with a problem document (RFC 9457); its members stand in the order of the schema. */
export function sendProblem(
  response: Response,
  code: ProblemCode,
  errors?: NonNullable<Problem['errors']>,
): void {
  const { status, title } = PROBLEMS[code];
  const type = `/problems/${code}`;
  const problem: Problem = { type, title, status, code, ...(errors && { errors }) };
  response.status(status).type(PROBLEM_TYPE).send(JSON.stringify(problem));
}
