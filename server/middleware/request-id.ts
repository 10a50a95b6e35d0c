import type { RequestHandler } from 'express';
import { Call, callOf } from './call';

/** Under /v1 every refusal has its row in the log, whatever route it fails to find. */
export const underVersion: RequestHandler = (_request, response, next) => {
  callOf(response).logged = 'refused';
  // An answer is of its key; what may be kept says so itself.
  response.setHeader('Cache-Control', 'no-store');
  next();
};

/** Begins the call: every answer carries our id of it. */
export const requestId: RequestHandler = (request, response, next) => {
  const call = new Call(request);
  response.locals.call = call;
  response.setHeader('X-Request-Id', call.id);
  next();
};
