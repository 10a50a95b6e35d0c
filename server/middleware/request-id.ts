import type { RequestHandler } from 'express';
import { Call } from './call';

/** Begins the call: every answer carries our id of it. */
export const requestId: RequestHandler = (request, response, next) => {
  const call = new Call(request);
  response.locals.call = call;
  response.setHeader('X-Request-Id', call.id);
  next();
};
