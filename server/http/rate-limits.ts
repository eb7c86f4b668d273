import type { RequestHandler } from 'express';
import { rateLimit } from 'express-rate-limit';

import { sendProblem } from './problems';

/** At most `perMinute` requests a minute from one address, else a problem with Retry-After. */
export function limitRate(perMinute: number): RequestHandler {
  return rateLimit({
    windowMs: 60_000,
    limit: perMinute,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    handler: (_request, response) => sendProblem(response, 'too-many-requests'),
  });
}
