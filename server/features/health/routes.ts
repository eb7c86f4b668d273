import { Router } from 'express';
import type { DataSource } from 'typeorm';

import { version } from '../../../package.json';
import type { Health } from '../../../sync/protocol/health';
import { methodNotAllowed } from '../../http/errors';

/** Answers only when the database does; the error handler turns its absence into a 503. */
export function healthRoutes(db: DataSource): Router {
  const router = Router();
  router
    .route('/api/health')
    .get(async (_request, response) => {
      await db.query('SELECT 1');
      response.json({ status: 'ok', version } satisfies Health);
    })
    .all(methodNotAllowed('GET', 'HEAD'));
  return router;
}
