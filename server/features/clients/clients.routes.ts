import { Problem } from '../../middleware/problem';
import { list, ok, type Asked, type Route } from '../../middleware/route';
import { validateRequest } from '../../middleware/validation';
import type { SignedIn } from '../people/person';
import type { ClientKeyService } from './client-keys.service';
import type { ClientChange, ClientService } from './clients.service';
import type { KeyRequest } from './key-issue';

const shared = { rate: 'counted', logged: true } as const;
const session = <P extends string>(permission: P) => ({ kind: 'session', permission }) as const;
const pages = { pageSize: 'text', pageToken: 'text' } as const;

function personOf({ person }: Asked): SignedIn {
  if (!person) throw new Error('This route has no policy that wants a person.');
  return person;
}

function assertBody(schema: string, body: unknown): void {
  const errors = validateRequest(schema, body);
  if (errors.length > 0)
    throw new Problem('not-valid', 'Some of the body is not what the contract asks for.', {
      errors,
    });
}

/** What administrators do with the tools that call, and their keys. */
export const clientRoutes = (clients: ClientService, keys: ClientKeyService): Route[] => [
  {
    ...shared,
    method: 'get',
    path: '/v1/clients',
    policy: session('clients:read'),
    query: pages,
    handler: async ({ query }) => {
      const { items, nextPageToken } = await clients.list(query);
      return list(items, nextPageToken);
    },
  },
  {
    ...shared,
    method: 'post',
    path: '/v1/clients',
    policy: session('clients:write'),
    handler: async (asked) => {
      assertBody('ClientRequest', asked.body);
      const change = asked.body as ClientChange & { name: string };
      const body = await clients.make(change, personOf(asked));
      return { status: 201, body, headers: { Location: `/v1/clients/${body.id}` } };
    },
  },
  {
    ...shared,
    method: 'get',
    path: '/v1/clients/:id',
    policy: session('clients:read'),
    handler: async ({ params }) => ok(await clients.read(params.id ?? '')),
  },
  {
    ...shared,
    method: 'patch',
    path: '/v1/clients/:id',
    policy: session('clients:write'),
    handler: async (asked) => {
      assertBody('ClientChange', asked.body);
      const change = asked.body as ClientChange;
      return ok(await clients.change(asked.params.id ?? '', change, personOf(asked)));
    },
  },
  {
    ...shared,
    method: 'get',
    path: '/v1/clients/:id/keys',
    policy: session('keys:read'),
    query: pages,
    handler: async ({ params, query }) => {
      const { items, nextPageToken } = await keys.list(params.id ?? '', query);
      return list(items, nextPageToken);
    },
  },
  {
    ...shared,
    method: 'post',
    path: '/v1/clients/:id/keys',
    policy: session('keys:write'),
    handler: async (asked) => {
      assertBody('KeyRequest', asked.body);
      const request = asked.body as KeyRequest;
      const body = await keys.issue(asked.params.id ?? '', request, personOf(asked));
      return { status: 201, body, headers: { 'Cache-Control': 'no-store' } };
    },
  },
  {
    ...shared,
    method: 'post',
    path: '/v1/keys/:selector/revoke',
    policy: session('keys:write'),
    body: 'none',
    handler: async (asked) => ok(await keys.revoke(asked.params.selector ?? '', personOf(asked))),
  },
];
