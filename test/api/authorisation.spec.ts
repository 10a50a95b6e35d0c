import { ask, type Answered } from './support/ask';
import { addPerson, signIn, type Visitor } from './support/people';
import {
  permissions,
  policy,
  roles,
  type Permission,
  type Role,
} from '../../server/features/people/policy';
import { assertRoutes, type Route } from '../../server/middleware/route';
import { mintKey } from '../../server/features/keys/key-format';
import { createApp } from '../../server/app';
import type { ProblemCode } from '../../server/middleware/problem-codes';
import { fakeCheck } from './support/fake-check';
import { allScopes, startService, until, type TestService } from './support/service';

const site = 'https://tools.example';
const keys = {
  secret: {},
  page: { kind: 'page', scopes: ['checks', 'catalogue'], origins: [site] },
  pageElsewhere: { kind: 'page', origins: ['https://tools.example:8443'] },
  pageNowhere: { kind: 'page', origins: [] },
  cell: { kind: 'cell' },
  revoked: { revokedAt: new Date() },
  disabled: { clientDisabledAt: new Date() },
  expired: { expiresAt: new Date(Date.now() - 60_000) },
  checks: { scopes: ['checks'] },
  catalogue: { scopes: ['catalogue'] },
  admin: { scopes: ['admin'] },
} as const;
type Name = keyof typeof keys;

let service: TestService & { keys: Record<Name, string> };
beforeAll(async () => {
  service = await startService(keys);
});
afterAll(() => service.stop());

/** A path of the table with something in place of its parameters. */
const pathOf = ({ path }: Route): string => path.replace(/:\w+/g, 'fake');

const call = (route: Route, authorization?: string, origin?: string): Promise<Answered> =>
  ask(service.server, {
    method: route.method,
    path: pathOf(route),
    headers: {
      ...(authorization !== undefined && { Authorization: authorization }),
      ...(origin !== undefined && { Origin: origin }),
    },
    ...(route.method === 'post' && { body: {} }),
  });

const bearer = (key: string): string => `Bearer ${key}`;
const mistyped = (key: string): string => key.slice(0, -1) + (key.endsWith('a') ? 'b' : 'a');

/** Each way to be refused at the door: the key that is sent, from where, and the answer. */
const refusals: Readonly<
  Record<string, () => [key: string | undefined, origin: string | undefined, code: ProblemCode]>
> = {
  'no key': () => [undefined, undefined, 'key-required'],
  'another scheme': () => ['Basic dTpw', undefined, 'key-mistyped'],
  'a wrong key': () => [bearer(mintKey('secret').text), undefined, 'key-unknown'],
  'a mistyped key': () => [bearer(mistyped(service.keys.secret)), undefined, 'key-mistyped'],
  'a key with a space in it': () => [bearer(`${service.keys.secret} x`), undefined, 'key-mistyped'],
  'a revoked key': () => [bearer(service.keys.revoked), undefined, 'key-revoked'],
  'a key of a disabled client': () => [bearer(service.keys.disabled), undefined, 'key-revoked'],
  'an expired key': () => [bearer(service.keys.expired), undefined, 'key-expired'],
  'a secret key on a foreign page': () => [bearer(service.keys.secret), site, 'origin-not-allowed'],
  'a secret key on a sandboxed page': () => [
    bearer(service.keys.secret),
    'null',
    'origin-not-allowed',
  ],
};

const pageRefusals: Readonly<Record<string, () => [key: string, origin?: string]>> = {
  'a page key from no page': () => [service.keys.page],
  'a page key from another origin': () => [service.keys.page, 'https://tools.example.evil.example'],
  'a page key from another port': () => [service.keys.pageElsewhere, site],
  'a page key of no origin': () => [service.keys.pageNowhere, site],
};

const table = (): Route[] => service.routes.filter(({ policy }) => policy.kind === 'key');

describe('the route table', () => {
  it('has every route under /v1 behind a key or a session, but the contract and the sign-in', () => {
    const open = service.routes.filter(
      ({ path, policy }) => path.startsWith('/v1') && policy.kind === 'public',
    );
    const paths = [...new Set(open.map(({ path }) => path))];
    expect(paths.sort()).toEqual(['/v1/openapi.json', '/v1/session']);
  });

  it('does not start with a route without a policy', () => {
    const [first] = table();
    const naked = { ...first, policy: undefined } as unknown as Route;
    expect(() => assertRoutes([naked], [])).toThrow('has no policy');
    const nobody = { ...first, policy: { kind: 'key', scope: 'checks', keyKinds: [] } } as Route;
    expect(() => assertRoutes([nobody], [])).toThrow('has no policy');
  });

  it('does not start with a check that has no route, or a route that stands twice', () => {
    expect(() => assertRoutes(service.routes, ['fake', 'forgotten'])).toThrow('forgotten');
    expect(() => assertRoutes([...service.routes, ...service.routes], [])).toThrow('twice');
    const deps = { checks: [fakeCheck] } as unknown as Parameters<typeof createApp>[0];
    expect(() => createApp(deps, [])).toThrow('fake');
  });
});

describe('each route', () => {
  it.each(Object.keys(refusals))('refuses %s', async (name) => {
    for (const route of table()) {
      const [key, origin, code] = refusals[name]?.() ?? [];
      const { status, body, headers } = await call(route, key, origin);
      const at = `${route.method} ${route.path}`;
      expect([at, body.code]).toEqual([at, code]);
      expect(headers.ratelimit).toBeDefined();
      expect(headers['x-request-id']).toBe(body.requestId);
      if (code?.startsWith('key-')) {
        expect(status).toBe(401);
        expect(headers['www-authenticate']).toMatch(
          name === 'no key' ? /^Bearer realm="headtree"$/ : /error="invalid_token"/,
        );
      } else {
        expect(status).toBe(403);
      }
    }
  });

  it.each(Object.keys(pageRefusals))('refuses %s', async (name) => {
    for (const route of table()) {
      const [key = '', origin] = pageRefusals[name]?.() ?? [];
      const { status, body } = await call(route, bearer(key), origin);
      expect(status).toBe(403);
      const kinds = route.policy.kind === 'key' ? route.policy.keyKinds : [];
      expect(body.code).toBe(kinds.includes('page') ? 'origin-not-allowed' : 'key-kind');
    }
  });

  it('refuses a key of a kind it is not for', async () => {
    for (const route of table()) {
      const { status, body } = await call(route, bearer(service.keys.cell));
      expect([status, body.code]).toEqual([403, 'key-kind']);
    }
  });

  it('refuses a key that lacks its scope, and takes one that has it', async () => {
    for (const route of table()) {
      for (const scope of allScopes as ('checks' | 'catalogue' | 'admin')[]) {
        const { status, body } = await call(route, bearer(service.keys[scope]));
        const own = route.policy.kind === 'key' && route.policy.scope === scope;
        if (own) expect([200, 404, 422]).toContain(status);
        else expect([status, body.code]).toEqual([403, 'scope-missing']);
      }
    }
  });

  it('takes a good page key from its page, and a secret key from no page or our own', async () => {
    const own = service.url;
    for (const route of table()) {
      const taken = [await call(route, bearer(service.keys.secret))];
      taken.push(await call(route, bearer(service.keys.secret), own));
      if (route.policy.kind === 'key' && route.policy.keyKinds.includes('page'))
        taken.push(await call(route, bearer(service.keys.page), site));
      for (const { status } of taken) expect([200, 404, 422]).toContain(status);
    }
  });
});

/** Every route that people use, with the permission it asks for. */
const forPeople = (): [route: Route, permission: Permission][] =>
  service.routes.flatMap((route): [Route, Permission][] => {
    const { policy } = route;
    const permission = policy.kind === 'public' ? undefined : policy.permission;
    return permission === undefined ? [] : [[route, permission]];
  });

const changes = (route: Route): boolean => route.method !== 'get';

describe('each route that people use', () => {
  const visitors = new Map<Role, Visitor>();
  beforeAll(async () => {
    for (const role of roles) {
      const email = `${role}@firm.example`;
      await addPerson(service, email, [role]);
      visitors.set(role, await signIn(service, email));
    }
  });

  const visit = (visitor: Visitor, route: Route, headers = {}): Promise<Answered> =>
    visitor.ask({
      method: route.method,
      path: pathOf(route),
      headers,
      ...(changes(route) && { body: {} }),
    });

  it('has a permission that somebody has', () => {
    expect(forPeople().length).toBeGreaterThan(12);
    for (const [, permission] of forPeople()) expect(policy[permission].length).toBeGreaterThan(0);
    const asked = new Set(forPeople().map(([, permission]) => permission));
    expect([...asked].sort()).toEqual([...permissions].sort());
  });

  it.each([...roles])('takes and refuses the role %s by the table', async (role) => {
    const visitor = visitors.get(role);
    if (!visitor) throw new Error('Nobody has the role.');
    for (const [route, permission] of forPeople()) {
      const at = `${route.method} ${route.path}`;
      const { status, body } = await visit(visitor, route);
      const may = (policy[permission] as readonly Role[]).includes(role);
      if (may) expect([at, [200, 404, 422].includes(status)]).toEqual([at, true]);
      else expect([at, status, body.code]).toEqual([at, 403, 'permission-missing']);
    }
  });

  it('takes nobody from another page, and no change without the token', async () => {
    const visitor = visitors.get('admin');
    if (!visitor) throw new Error('There is no admin.');
    for (const [route] of forPeople()) {
      const at = `${route.method} ${route.path}`;
      for (const headers of [{ Origin: site }, { Origin: 'null' }]) {
        const { status, body } = await visit(visitor, route, headers);
        expect([at, status, body.code]).toEqual([at, 403, 'origin-not-allowed']);
      }
      const { status, body } = await visit(visitor, route, { 'X-CSRF-Token': 'x' });
      if (changes(route)) expect([at, status, body.code]).toEqual([at, 403, 'csrf-token-missing']);
      else expect(status).not.toBe(403);
    }
  });

  it('takes no key where it is for people alone', async () => {
    for (const [route] of forPeople()) {
      if (route.policy.kind !== 'session') continue;
      for (const key of [undefined, bearer(service.keys.secret), bearer(service.keys.admin)]) {
        const { status, body, headers } = await call(route, key);
        expect([status, body.code]).toEqual([401, 'sign-in-required']);
        expect(headers['www-authenticate']).toBe('Cookie realm="headtree"');
      }
    }
  });

  it('takes nobody whose roles were taken away, from the next request on', async () => {
    await addPerson(service, 'was-admin@firm.example', ['admin', 'engineer']);
    const visitor = await signIn(service, 'was-admin@firm.example');
    expect((await visitor.ask({ path: '/v1/clients' })).status).toBe(200);
    await service.sql(
      `update users set roles = '{engineer}' where email = 'was-admin@firm.example'`,
    );
    expect((await visitor.ask({ path: '/v1/clients' })).status).toBe(403);
    expect((await visitor.ask({ path: '/v1/checks' })).status).toBe(200);
  });
});

describe('a key', () => {
  it('counts in the header alone', async () => {
    const path = '/v1/checks/fake';
    const secret = service.keys.secret;
    const post = (query: string, body: object, key?: string): Promise<Answered> =>
      ask(service.server, { method: 'post', path: path + query, body, key });
    const inQuery = await post(`?access_token=${secret}`, { load: 1 });
    expect([inQuery.status, inQuery.body.code]).toEqual([401, 'key-required']);
    const inBody = await post('', { access_token: secret });
    expect([inBody.status, inBody.body.code]).toEqual([401, 'key-required']);
    const both = await post(`?access_token=${secret}`, { load: 1 }, secret);
    expect([both.status, both.body.code]).toEqual([422, 'query-not-valid']);
  });

  it('is looked up in memory alone while the listener is there', async () => {
    // A busy machine can lose the listener for a while; it comes back by itself.
    await until(async () => {
      const before = service.keyQueries();
      await ask(service.server, {
        method: 'post',
        path: '/v1/checks/fake',
        key: service.keys.secret,
        body: { load: 1 },
      });
      return service.keyQueries() === before;
    });
  });

  it('leaves nothing of its secret in the log or on standard output', async () => {
    const rows = JSON.stringify(await service.usage());
    for (const text of Object.values(service.keys)) {
      const secret = text.slice(17);
      expect(rows).not.toContain(secret);
      expect(service.printed()).not.toContain(secret);
    }
  });
});
