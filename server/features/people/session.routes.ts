import { randomBytes } from 'node:crypto';
import { assertOwnPage, assertOwnOrigin } from '../../middleware/own-page';
import { Problem } from '../../middleware/problem';
import { addressOf } from '../../middleware/rate-limit';
import type { Answer, Route } from '../../middleware/route';
import type { SessionCookie } from '../../middleware/session';
import { validateRequest } from '../../middleware/validation';
import { audit, personActor } from '../audit/audit';
import type { SignedIn } from './person';
import { permissionsOf } from './policy';
import type { Authenticate } from './sign-in';

const fresh = { 'Cache-Control': 'no-store' };

function stateOf(person: SignedIn | undefined): Answer {
  if (!person)
    return {
      status: 200,
      body: { person: null, permissions: [], csrfToken: null },
      headers: fresh,
    };
  const { id, email, name, roles, csrfToken } = person;
  const body = { person: { id, email, name, roles }, permissions: permissionsOf(roles), csrfToken };
  return { status: 200, body, headers: fresh };
}

const shared = { path: '/v1/session', policy: { kind: 'public' }, rate: 'counted' } as const;

/** Who is signed in; signing in and out. */
export const sessionRoutes = (authenticate: Authenticate, cookie: SessionCookie): Route[] => [
  { ...shared, method: 'get', logged: false, handler: ({ person }) => stateOf(person) },
  {
    ...shared,
    method: 'post',
    logged: true,
    handler: async ({ request, call, body }) => {
      assertOwnOrigin(call);
      const errors = validateRequest('SessionRequest', body);
      if (errors.length > 0)
        throw new Problem('not-valid', 'Email and password are needed.', { errors });
      const person = await authenticate(request, addressOf(request));
      const csrfToken = randomBytes(32).toString('base64url');
      await cookie.open(request, person.id, csrfToken);
      // From here on the call is theirs, in the log too.
      const permissions = new Set(permissionsOf(person.roles));
      call.person = { ...person, permissions, csrfToken };
      return stateOf(call.person);
    },
  },
  {
    ...shared,
    method: 'delete',
    logged: true,
    handler: async ({ request, call, person }) => {
      if (person) {
        assertOwnPage(request, call, person);
        const actor = personActor(person);
        await audit({ actor, action: 'session.closed', subject: actor });
      }
      await cookie.close(request);
      return { status: 204, body: '', headers: { ...fresh, 'Set-Cookie': cookie.cleared } };
    },
  },
];
