import type { Request, RequestHandler } from 'express';
import { Passport } from 'passport';
import { Strategy, type VerifyFunction } from 'passport-http-bearer';
import type { Finding, KeyCache } from '../features/keys/key-cache';
import { callOf, type Call } from './call';
import { awayProblem, Problem } from './problem';
import { problemKinds, type ProblemCode } from './problem-codes';

/** Takes the key from the Authorization header alone: never from the query or the body. */
class HeaderStrategy extends Strategy<VerifyFunction> {
  override authenticate(request: Request): void {
    super.authenticate({ headers: request.headers } as unknown as Request);
  }
}

/** RFC 6750: no error code where no key was sent. */
export function challenge(code: ProblemCode, scope?: string): string {
  const parts = ['realm="headtree"'];
  if (scope !== undefined) parts.push(`scope="${scope}"`);
  if (code !== 'key-required') {
    parts.push(`error="${code === 'scope-missing' ? 'insufficient_scope' : 'invalid_token'}"`);
    parts.push(`error_description="${problemKinds[code].title}"`);
  }
  return `Bearer ${parts.join(', ')}`;
}

export const keyProblem = (code: ProblemCode): Problem =>
  new Problem(code, `${problemKinds[code].title}. ${problemKinds[code].remedy}`, {
    headers: { 'WWW-Authenticate': challenge(code) },
  });

function note(call: Call, finding: Finding): void {
  if ('key' in finding) {
    call.key = finding.key;
    call.keySelector = finding.key.selector;
  } else {
    call.refusedKey = finding.refused;
    call.keySelector = finding.selector;
    call.formerKey = finding.owner;
  }
}

/**
 * Finds out whose call it is; refuses nobody yet, so that a refused call is counted and logged like
 * any other.
 */
export function bearer(keys: Pick<KeyCache, 'find'>): RequestHandler {
  const passport = new Passport();
  passport.use(
    new HeaderStrategy((token, done) => {
      keys.find(token).then(
        (finding) => done(null, finding),
        (error: unknown) => done(awayProblem('database-unavailable', error)),
      );
    }),
  );
  return (request, response, next) => {
    const call = callOf(response);
    const authenticate = passport.authenticate(
      'bearer',
      { session: false },
      (error: unknown, finding: Finding | false | undefined) => {
        if (error) {
          next(error);
          return;
        }
        if (finding) note(call, finding);
        else if (request.headers.authorization !== undefined) call.refusedKey = 'key-mistyped';
        next();
      },
    ) as RequestHandler;
    authenticate(request, response, next);
  };
}
