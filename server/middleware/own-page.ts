import { timingSafeEqual } from 'node:crypto';
import type { Request } from 'express';
import type { SignedIn } from '../features/people/person';
import type { Call } from './call';
import { Problem } from './problem';

const reads = new Set(['GET', 'HEAD', 'OPTIONS']);

const same = (given: string, wanted: string): boolean => {
  const [a, b] = [Buffer.from(given), Buffer.from(wanted)];
  return a.length === b.length && timingSafeEqual(a, b);
};

const foreign = (detail: string): Problem => new Problem('origin-not-allowed', detail);

/** A change without a word of where it comes from is refused: every browser says it. */
export function assertOwnOrigin({ origin, ownOrigin }: Call): void {
  if (ownOrigin) return;
  throw foreign(
    origin === undefined
      ? 'The request does not say which page it comes from.'
      : 'A page of another site cannot use a session.',
  );
}

/**
 * A browser sends the session's cookie whoever makes it ask. So a session counts only from our own
 * pages, and changes nothing without the token that only they can read.
 */
export function assertOwnPage(request: Request, call: Call, { csrfToken }: SignedIn): void {
  const site = request.headers['sec-fetch-site'];
  if (reads.has(request.method)) {
    if (call.origin !== undefined) assertOwnOrigin(call);
    if (site === undefined || site === 'same-origin' || site === 'none') return;
    throw foreign('A page of another site cannot use a session.');
  }
  assertOwnOrigin(call);
  const token = request.headers['x-csrf-token'];
  if (typeof token === 'string' && same(token, csrfToken)) return;
  throw new Problem(
    'csrf-token-missing',
    token === undefined
      ? 'The header X-CSRF-Token is missing.'
      : 'The header X-CSRF-Token holds another session’s token.',
  );
}
