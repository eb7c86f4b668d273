import { Router } from 'express';

import { methodNotAllowed } from '../../http/errors';
import { jsonBody } from '../../http/json-body';
import { ProblemError } from '../../http/problems';
import { limitRate } from '../../http/rate-limits';

import { planText } from './service';

/** The largest request that is read, in bytes. */
const MOST_REQUEST_BYTES = 32 * 1024;

/** Open to everyone, needs no database, and therefore has a limit of its own. */
export function plansRoutes(perMinute: number): Router {
  const router = Router();
  router
    .route('/api/v1/plans')
    .post(limitRate(perMinute), ...jsonBody(MOST_REQUEST_BYTES), (request, response) => {
      const plan = planText(request.body);
      if (!plan.ok) throw new ProblemError('invalid-request', plan.errors);
      response.type('application/json').send(plan.value);
    })
    .all(methodNotAllowed('POST'));
  return router;
}
