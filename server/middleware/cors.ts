import type { RequestHandler } from 'express';
import type { KeyCache } from '../features/keys/key-cache';
import { callOf } from './call';

const exposed = 'X-Request-Id, RateLimit, RateLimit-Policy, Retry-After, ETag, Location';
const sendable = 'Authorization, Content-Type, Idempotency-Key, If-None-Match, X-Request-Id';

/**
 * Lets pages read answers, errors too, from any origin that a live page key lists. Which key may be
 * used from which origin is decided later, with the key at hand: a preflight carries none.
 */
export const cors =
  (keys: Pick<KeyCache, 'allowsOrigin'>): RequestHandler =>
  (request, response, next) => {
    response.vary('Origin');
    const { origin } = callOf(response);
    const allowed = origin !== undefined && keys.allowsOrigin(origin);
    if (allowed) {
      response.setHeader('Access-Control-Allow-Origin', origin);
      response.setHeader('Access-Control-Expose-Headers', exposed);
    }
    if (request.method !== 'OPTIONS') {
      next();
      return;
    }
    if (allowed) {
      response.setHeader('Access-Control-Allow-Methods', 'GET, POST');
      response.setHeader('Access-Control-Allow-Headers', sendable);
      response.setHeader('Access-Control-Max-Age', '600');
    }
    response.status(204).end();
  };
