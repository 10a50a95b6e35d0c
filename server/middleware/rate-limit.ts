import type { Request, RequestHandler, Response } from 'express';
import { ipKeyGenerator, rateLimit as expressRateLimit } from 'express-rate-limit';
import type { Logger } from 'pino';
import { callOf } from './call';
import { awayProblem, Problem } from './problem';
import { RateStore, type RateCounts } from './rate-store';

/** Calls a minute where a key has no number of its own. */
export const limits = { key: 6_000, pageAddress: 600, person: 1_200, address: 120 } as const;
export type Limits = Readonly<Record<keyof typeof limits, number>>;

/** IPv6 callers own whole networks of addresses: one network counts as one address. */
export const addressOf = (request: Request): string => ipKeyGenerator(request.ip ?? '0.0.0.0');

interface Limiter {
  readonly name: string;
  readonly limit: number | ((request: Request, response: Response) => number);
  readonly subject: (request: Request, response: Response) => string;
}

/** The field that the limiter has just written says when the window ends; Retry-After agrees. */
function refusal(name: string, response: Response): Problem {
  const fields = [response.getHeader('RateLimit') ?? ''].flat().map(String);
  const own = fields.join(', ').split(`"${name}"`)[1] ?? '';
  const seconds = /; t=(\d+)/.exec(own)?.[1] ?? '60';
  return new Problem(
    'rate-limited',
    `The limit "${name}" is used up; it begins anew in ${seconds} s.`,
    { headers: { 'Retry-After': seconds } },
  );
}

/**
 * Limits per key; for page keys per address too; per person who is signed in; per address for
 * whoever is neither. An answer that nothing has changed costs nothing.
 */
export function rateLimit(counts: RateCounts, logger: Logger, limit: Limits): RequestHandler {
  const limiter = ({ name, limit: most, subject }: Limiter): RequestHandler =>
    expressRateLimit({
      windowMs: 60_000,
      limit: most,
      identifier: name,
      keyGenerator: subject,
      standardHeaders: 'draft-8',
      legacyHeaders: false,
      store: new RateStore(name, counts),
      logger: {
        error: (error) => logger.error(messageOf(error)),
        warn: (error) => logger.warn(messageOf(error)),
      },
      validate: { xForwardedForHeader: false, forwardedHeader: false, ip: false },
      skipSuccessfulRequests: true,
      requestWasSuccessful: (_request, { statusCode }) => statusCode === 304,
      handler: (_request, response, next) => next(refusal(name, response)),
    });
  const perKey = limiter({
    name: 'key',
    limit: (_request, response) => callOf(response).key?.rateLimit ?? limit.key,
    subject: (_request, response) => callOf(response).key?.id ?? '',
  });
  const perPageAddress = limiter({
    name: 'page-address',
    limit: limit.pageAddress,
    subject: (request) => addressOf(request),
  });
  const perPerson = limiter({
    name: 'person',
    limit: limit.person,
    subject: (_request, response) => callOf(response).person?.id ?? '',
  });
  const perAddress = limiter({
    name: 'address',
    limit: limit.address,
    subject: (request) => addressOf(request),
  });
  return (request, response, next) => {
    const go = (error?: unknown): void => {
      if (error === undefined || error instanceof Problem) next(error);
      else next(awayProblem('database-unavailable', error));
    };
    const { key, person } = callOf(response);
    if (person && !key) return void perPerson(request, response, go);
    if (!key) return void perAddress(request, response, go);
    if (key.kind !== 'page') return void perKey(request, response, go);
    const thenAddress = (error?: unknown): void => {
      if (error === undefined) void perPageAddress(request, response, go);
      else go(error);
    };
    void perKey(request, response, thenAddress);
  };
}

const messageOf = (error: unknown): string => (error instanceof Error ? error.message : 'unknown');
