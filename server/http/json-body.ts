import express, { type RequestHandler } from 'express';

import { ProblemError } from './problems';

const takeOnlyJson: RequestHandler = (request, _response, next) => {
  const type = request.headers['content-type'];
  // `is` gives null, not false, when there is no body: that is told later
  if (type === undefined || request.is('application/json') === false) {
    throw new ProblemError('unsupported-media-type');
  }
  next();
};

// express.json would make {} of a body that is there and empty
function refuseEmpty(_request: unknown, _response: unknown, body: Buffer): void {
  if (body.length === 0) throw new ProblemError('invalid-json');
}

const refuseNone: RequestHandler = (request, _response, next) => {
  if (request.body === undefined) throw new ProblemError('invalid-json');
  next();
};

/** Reads a JSON body of any kind of value, at most `mostBytes` long once unpacked. */
export function jsonBody(mostBytes: number): RequestHandler[] {
  const parse = express.json({
    limit: mostBytes,
    strict: false,
    type: 'application/json',
    verify: refuseEmpty,
  });
  return [takeOnlyJson, parse, refuseNone];
}
