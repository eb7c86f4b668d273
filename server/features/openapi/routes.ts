import { Router } from 'express';

import { methodNotAllowed } from '../../http/errors';

import { makeOpenApiDocument } from './document';

export function openApiRoutes(): Router {
  const text = JSON.stringify(makeOpenApiDocument());
  const router = Router();
  router
    .route('/api/openapi.json')
    .get((_request, response) => {
      response.type('application/json').send(text);
    })
    .all(methodNotAllowed('GET', 'HEAD'));
  return router;
}
