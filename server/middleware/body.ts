import express, { type ErrorRequestHandler, type RequestHandler } from 'express';
import { inspect } from './inspect';
import { Problem } from './problem';

const limit = 1024 * 1024;
const parse = express.json({ limit, strict: false, type: ['json', '+json'] }) as RequestHandler;

const notJson = (detail: string, cause?: unknown): Problem =>
  new Problem('not-json', detail, { cause });

const refuseType = (): Problem =>
  new Problem('media-type', 'Send the body as application/json in UTF-8.');

/** JSON between systems is UTF-8 (RFC 8259); the parser would take any of its relatives. */
const isUtf8 = (contentType = ''): boolean => {
  const charset = /;\s*charset\s*=\s*"?([^\s";]*)/i.exec(contentType)?.[1];
  return charset === undefined || charset.toLowerCase() === 'utf-8';
};

/** Reads a JSON body, after the key was held good: nobody else makes us read a megabyte. */
const read: RequestHandler = (request, response, next) => {
  const { headers } = request;
  const length = headers['content-length'];
  if (headers['transfer-encoding'] === undefined && (length === undefined || length === '0'))
    throw notJson('There is no body.');
  if (!request.is(['json', '+json']) || !isUtf8(headers['content-type'])) throw refuseType();
  parse(request, response, next);
};

const notReadable = 'The body cannot be read as JSON.';

function problemOf(error: unknown): unknown {
  if (!(error instanceof Error)) return error;
  const { type, status } = error as Error & { type?: unknown; status?: unknown };
  if (type === 'entity.too.large') return new Problem('too-large', 'The body has more than 1 MB.');
  if (status === 415) return refuseType();
  return status === 400 ? notJson(notReadable, error) : error;
}

/** The parser's own words may hold parts of the body: ours go out instead. */
const explain: ErrorRequestHandler = (error: unknown, _request, _response, next) => {
  next(problemOf(error));
};

const look: RequestHandler = (request, _response, next) => {
  const errors = inspect(request.body);
  if (errors.length > 0)
    throw new Problem('not-valid', 'Some of the body cannot be taken.', { errors });
  next();
};

export const jsonBody: readonly (RequestHandler | ErrorRequestHandler)[] = [read, explain, look];
