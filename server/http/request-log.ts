import { randomUUID } from 'node:crypto';

import type { Request, RequestHandler } from 'express';
import { pino, type DestinationStream } from 'pino';
import { pinoHttp } from 'pino-http';

export interface RequestLogOptions {
  level: string;
  /** standard output when left out */
  destination?: DestinationStream;
}

// A message may quote what was sent (a value, a piece of the body), so only the kind of an error
// and the places in the code are kept.
function describeError(error: Error): object {
  const { name, stack = '' } = error;
  const code = 'code' in error ? error.code : undefined;
  const constraint = 'constraint' in error ? error.constraint : undefined;
  const places = stack.split('\n').filter((line) => line.startsWith('    at '));
  return { name, code, constraint, places };
}

// The pattern of the route and not the address itself, which may hold an id or a name. Routes are
// written in full, as a failed request has left the router that it was under.
function routeOf(request: Request): string | null {
  const path: unknown = request.route?.path;
  return typeof path === 'string' ? path : null;
}

const withRoute = (request: Request, _response: unknown, line: object) => ({
  ...line,
  route: routeOf(request),
});

/** One line a request, with an id that the answer carries too, and no personal data. */
export function requestLog({ level, destination }: RequestLogOptions): RequestHandler {
  const options = { level, base: null };
  return pinoHttp<Request>({
    logger: destination ? pino(options, destination) : pino(options),
    wrapSerializers: false,
    serializers: {
      req: ({ id, method }: Request) => ({ id, method }),
      res: ({ statusCode }: { statusCode: number }) => ({ status: statusCode }),
      err: describeError,
    },
    genReqId: (_request, response) => {
      const id = randomUUID();
      response.setHeader('X-Request-Id', id);
      return id;
    },
    // at the end, when the route is known
    customSuccessObject: withRoute,
    customErrorObject: (request, response, _error, line: object) =>
      withRoute(request, response, line),
    customLogLevel: (_request, response, error) => {
      return error || response.statusCode >= 500 ? 'error' : 'info';
    },
  });
}
