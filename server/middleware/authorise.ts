import type { Request, RequestHandler } from 'express';
import type { Key } from '../features/keys/key';
import type { KeyKind } from '../features/keys/key-format';
import type { SignedIn } from '../features/people/person';
import type { Permission } from '../features/people/policy';
import { challenge, keyProblem } from './bearer';
import { callOf, type Call } from './call';
import { assertOwnPage } from './own-page';
import { Problem } from './problem';
import type { Policy } from './route';

const kindNames: Readonly<Record<KeyKind, string>> = {
  secret: 'a secret key (htk_)',
  page: 'a page key (htp_)',
  cell: 'a cell key (htc_)',
};

function assertOrigin(key: Key, { origin, ownOrigin }: Call): void {
  if (key.kind === 'page') {
    if (origin !== undefined && key.origins.includes(origin)) return;
    throw new Problem(
      'origin-not-allowed',
      origin === undefined
        ? 'A page key is used from a page: the request names no Origin.'
        : 'The Origin of the page is not on the list of the key.',
    );
  }
  if (origin === undefined || ownOrigin) return;
  throw new Problem(
    'origin-not-allowed',
    'A key that is not a page key is refused from a page of another site.',
  );
}

function assertPerson(request: Request, call: Call, person: SignedIn, wanted: Permission): void {
  assertOwnPage(request, call, person);
  if (person.permissions.has(wanted)) return;
  throw new Problem('permission-missing', `None of your roles has the permission "${wanted}".`);
}

const signInProblem = (): Problem =>
  new Problem('sign-in-required', 'Nobody is signed in. A key does not do here.', {
    headers: { 'WWW-Authenticate': 'Cookie realm="headtree"' },
  });

/** For what people do at the console; no key does it. */
const authorisePerson =
  (permission: Permission): RequestHandler =>
  (request, response, next) => {
    const call = callOf(response);
    if (!call.person) throw signInProblem();
    assertPerson(request, call, call.person, permission);
    next();
  };

/** Holds the call to the route's policy: key, its kind, its origin, its scope; or the person. */
export function authorise(policy: Policy): RequestHandler {
  if (policy.kind === 'public') return (_request, _response, next) => next();
  if (policy.kind === 'session') return authorisePerson(policy.permission);
  const { scope, keyKinds, permission } = policy;
  return (request, response, next) => {
    const call = callOf(response);
    const { key, person } = call;
    if (person && permission !== undefined) {
      assertPerson(request, call, person, permission);
      next();
      return;
    }
    if (!key) throw keyProblem(call.refusedKey ?? 'key-required');
    if (!keyKinds.includes(key.kind)) {
      const wanted = keyKinds.map((kind) => kindNames[kind]).join(' or ');
      throw new Problem('key-kind', `This needs ${wanted}.`);
    }
    assertOrigin(key, call);
    if (!key.scopes.includes(scope))
      throw new Problem('scope-missing', `The key lacks the scope "${scope}".`, {
        headers: { 'WWW-Authenticate': challenge('scope-missing', scope) },
      });
    next();
  };
}
