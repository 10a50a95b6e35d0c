import { validateAnswer } from '../../server/middleware/validation';
import { hashPassword } from '../../server/features/people/password';
import { ask, type Answered } from './support/ask';
import { addPerson, cookieOf, password, signIn, trySignIn } from './support/people';
import { startService, type TestService } from './support/service';

const freely = { address: 1_000, account: 1_000, accountAnywhere: 1_000 };
const limits = { ...freely };
let service: TestService & { keys: Record<'good', string> };
let lead: string;
beforeAll(async () => {
  service = await startService(
    { good: {} },
    {
      attemptLimits: limits,
      limits: { key: 1_000, pageAddress: 1_000, person: 1_000, address: 1_000 },
    },
  );
  lead = await addPerson(service, 'lead@firm.example', ['lead']);
});
afterAll(() => service.stop());

const whoAmI = (cookie?: string, headers: Record<string, string> = {}): Promise<Answered> =>
  ask(service.server, {
    path: '/v1/session',
    headers: { ...(cookie !== undefined && { Cookie: cookie }), ...headers },
  });

interface Audited {
  readonly actor: string;
  readonly subject: string;
  readonly detail: unknown;
}
const audited = (action: string, subject: string): Promise<Audited[]> =>
  service.sql<Audited>(
    'select actor, subject, detail from audit_events where action = $1 and subject = $2 order by id',
    [action, subject],
  );

describe('200', () => {
  it('says that nobody is signed in, and makes no session of it', async () => {
    const answer = await whoAmI();
    expect(answer.status).toBe(200);
    expect(answer.body).toEqual({ person: null, permissions: [], csrfToken: null });
    expect(answer.headers['set-cookie']).toBeUndefined();
    expect(await service.sql('select 1 from sessions')).toEqual([]);
  });

  it('signs in, whatever the capitals, with a cookie that no script and no other site has', async () => {
    const answer = await trySignIn(service, ' Lead@Firm.example ');
    expect([answer.status, validateAnswer('SessionState', answer.body)]).toEqual([200, []]);
    expect(answer.body.person).toEqual({
      id: lead,
      email: 'lead@firm.example',
      name: 'Person lead@firm.example',
      roles: ['lead'],
    });
    expect(answer.body.permissions).toContain('usage:read');
    expect(answer.body.permissions).not.toContain('keys:write');
    const cookie = String(answer.headers['set-cookie']);
    expect(cookie).toMatch(
      /^headtree=s%3A[\w%.-]+; Path=\/; Expires=[^;]+; HttpOnly; SameSite=Lax$/,
    );
    expect(answer.headers['cache-control']).toBe('no-store');
    expect(await service.usage('id = $1', [answer.headers['x-request-id']])).toMatchObject([
      { person_id: lead, route: '/v1/session', http_status: 200 },
    ]);
    const again = await whoAmI(cookieOf(answer));
    expect(again.body).toEqual(answer.body);
    // The idle time begins anew with each request.
    expect(cookieOf(again)).toBe(cookieOf(answer));
    const [row] = await service.sql<{ last_sign_in: Date | null }>(
      'select last_sign_in from users where id = $1',
      [lead],
    );
    expect(row?.last_sign_in).not.toBeNull();
    expect(await audited('session.opened', `person:${lead}`)).toMatchObject([
      { actor: `person:${lead}`, detail: { address: '127.0.0.1' } },
    ]);
  });

  it('gives the session a new id at the sign-in', async () => {
    const first = await trySignIn(service, 'lead@firm.example');
    const before = cookieOf(first);
    const second = await trySignIn(service, 'lead@firm.example', password, { Cookie: before });
    expect(cookieOf(second)).not.toBe(before);
    expect(second.body.csrfToken).not.toBe(first.body.csrfToken);
    expect((await whoAmI(before)).body.person).toBeNull();
  });

  it('takes no cookie that it has not signed', async () => {
    const { cookie } = await signIn(service, 'lead@firm.example');
    const [row] = await service.sql<{ sid: string }>('select sid from sessions limit 1');
    for (const forged of [`headtree=${row?.sid ?? ''}`, `${cookie}x`, 'headtree=s%3A.x'])
      expect((await whoAmI(forged)).body.person).toBeNull();
  });

  it('beside a key it is the key that calls', async () => {
    const { cookie } = await signIn(service, 'lead@firm.example');
    const { status, headers } = await ask(service.server, {
      path: '/v1/checks',
      key: service.keys.good,
      headers: { Cookie: cookie },
    });
    expect(status).toBe(200);
    const rows = await service.usage('id = $1', [headers['x-request-id']]);
    expect(rows).toMatchObject([{ person_id: null }]);
    expect(rows[0]?.key_id).not.toBeNull();
  });
});

describe('204', () => {
  it('signs out: the session is gone, not only its cookie', async () => {
    const visitor = await signIn(service, 'lead@firm.example');
    const out = await visitor.ask({ method: 'delete', path: '/v1/session' });
    expect([out.status, out.text]).toEqual([204, '']);
    expect(String(out.headers['set-cookie'])).toMatch(
      /^headtree=; Path=\/; Expires=Thu, 01 Jan 1970/,
    );
    expect((await whoAmI(visitor.cookie)).body.person).toBeNull();
    expect((await audited('session.closed', `person:${lead}`)).length).toBe(1);
    const again = await visitor.ask({ method: 'delete', path: '/v1/session' });
    expect(again.status).toBe(204);
  });
});

describe('401', () => {
  it('answers an unknown person and a wrong password alike', async () => {
    const hash = hashPassword(password);
    const known = await addPerson(service, 'slow@firm.example', ['engineer'], hash);
    const bodies = new Set<string>();
    for (let round = 0; round < 4; round++) {
      for (const [email, given] of [
        ['slow@firm.example', 'wrong'],
        [`nobody${round}@firm.example`, 'wrong'],
        ['slow@firm.example', 'ü'.repeat(60)],
      ] as const) {
        const { status, body, headers } = await trySignIn(service, email, given);
        expect(status).toBe(401);
        expect(headers['www-authenticate']).toBe('Cookie realm="headtree"');
        expect(headers['set-cookie']).toBeUndefined();
        bodies.add(JSON.stringify({ ...body, requestId: '' }));
      }
    }
    expect(bodies.size).toBe(1);
    expect((await audited('session.refused', `person:${known}`)).length).toBe(8);
    expect((await audited('session.refused', 'nobody')).length).toBe(4);
  });

  it('for who is out of use, with the right password; and what they had open is gone', async () => {
    const id = await addPerson(service, 'left@firm.example', ['admin']);
    const { cookie } = await signIn(service, 'left@firm.example');
    expect((await whoAmI(cookie)).body.person).not.toBeNull();
    await service.sql('update users set disabled_at = now() where id = $1', [id]);
    expect(await service.sql('select 1 from sessions where person_id = $1', [id])).toEqual([]);
    expect((await whoAmI(cookie)).body.person).toBeNull();
    const { status, body } = await trySignIn(service, 'left@firm.example');
    expect([status, body.code]).toEqual([401, 'sign-in-refused']);
    expect(await audited('session.refused', `person:${id}`)).toMatchObject([
      { detail: { disabled: true } },
    ]);
  });

  it('after a new password for whoever was in with the old one', async () => {
    const id = await addPerson(service, 'changed@firm.example', ['engineer']);
    const { cookie } = await signIn(service, 'changed@firm.example');
    await service.sql('update users set password_hash = $2 where id = $1', [
      id,
      hashPassword('another one altogether', 4),
    ]);
    expect((await whoAmI(cookie)).body.person).toBeNull();
    expect((await trySignIn(service, 'changed@firm.example')).status).toBe(401);
  });

  it('a week after the sign-in, however busy the session is', async () => {
    await addPerson(service, 'busy@firm.example', ['engineer']);
    const { cookie } = await signIn(service, 'busy@firm.example');
    await service.sql(
      `update sessions set sess = jsonb_set(sess, '{signedInAt}', '1000')
        where person_id = (select id from users where email = 'busy@firm.example')`,
    );
    expect((await whoAmI(cookie)).body.person).toBeNull();
  });
});

describe('403', () => {
  const origins: [name: string, headers: Record<string, string>][] = [
    ['another site', { Origin: 'https://evil.example' }],
    ['a site that begins like ours', { Origin: 'http://127.0.0.1:1.evil.example' }],
    ['a sandboxed page', { Origin: 'null' }],
  ];
  it.each(origins)('for a sign-in from %s', async (_name, headers) => {
    const answer = await trySignIn(service, 'lead@firm.example', password, headers);
    expect([answer.status, answer.body.code]).toEqual([403, 'origin-not-allowed']);
    expect(answer.headers['set-cookie']).toBeUndefined();
  });

  it.each(origins)('for what a session asks from %s', async (_name, headers) => {
    const visitor = await signIn(service, 'lead@firm.example');
    for (const method of ['get', 'post'] as const) {
      const path = method === 'get' ? '/v1/checks' : '/v1/checks/fake';
      const body = method === 'post' ? { profile: 'uk-na', load: 1 } : undefined;
      const answer = await visitor.ask({ method, path, headers, ...(body && { body }) });
      expect([answer.status, answer.body.code]).toEqual([403, 'origin-not-allowed']);
    }
    const out = await visitor.ask({ method: 'delete', path: '/v1/session', headers });
    expect(out.status).toBe(403);
    expect((await whoAmI(visitor.cookie)).body.person).not.toBeNull();
  });

  it('for a change without a word of where it comes from, or without the token', async () => {
    const { cookie, csrfToken } = await signIn(service, 'lead@firm.example');
    const other = await signIn(service, 'lead@firm.example');
    const own = { Origin: service.url, Host: new URL(service.url).host };
    const post = async (headers: Record<string, string>): Promise<[number, unknown]> => {
      const { status, body } = await ask(service.server, {
        method: 'post',
        path: '/v1/checks/fake',
        headers: { Cookie: cookie, ...headers },
        body: { profile: 'uk-na', load: 1 },
      });
      return [status, body.code];
    };
    expect(await post({ 'X-CSRF-Token': csrfToken })).toEqual([403, 'origin-not-allowed']);
    expect(await post(own)).toEqual([403, 'csrf-token-missing']);
    const theirs = { ...own, 'X-CSRF-Token': other.csrfToken };
    expect(await post(theirs)).toEqual([403, 'csrf-token-missing']);
    expect(await post({ ...own, 'X-CSRF-Token': csrfToken })).toEqual([200, undefined]);
    // A browser says it in this way too.
    const fetched = { 'Sec-Fetch-Site': 'same-origin', Host: own.Host, 'X-CSRF-Token': csrfToken };
    expect(await post(fetched)).toEqual([200, undefined]);
  });
});

describe('422', () => {
  it.each([
    ['{}', '/email'],
    ['{"email":"lead@firm.example"}', '/password'],
    ['{"email":"lead@firm.example","password":"x","remember":true}', '/remember'],
    ['{"email":["lead@firm.example"],"password":"x"}', '/email'],
    ['{"email":"no email","password":"x"}', '/email'],
    ['{"email":"lead@firm.example","password":{"$ne":""}}', '/password'],
  ])('for %s', async (body, pointer) => {
    const { status, body: problem } = await ask(service.server, {
      method: 'post',
      path: '/v1/session',
      headers: { Origin: service.url, Host: new URL(service.url).host },
      body,
    });
    expect(status).toBe(422);
    expect(problem.errors?.map((each) => each.pointer)).toContain(pointer);
  });
});

describe('429', () => {
  const wrong = async (email: string): Promise<number> =>
    (await trySignIn(service, email, 'wrong')).status;
  const tries = async (email: string, count: number): Promise<number[]> =>
    (await Promise.all(Array.from({ length: count }, () => wrong(email)))).sort();

  afterEach(() => Object.assign(limits, freely));

  it('after the failures that one address has at one account, known or not', async () => {
    await addPerson(service, 'tried@firm.example', ['lead']);
    limits.account = 3;
    for (const email of ['tried@firm.example', 'untried@firm.example']) {
      expect(await tries(email, 5)).toEqual([401, 401, 401, 429, 429]);
      const last = await trySignIn(service, email);
      expect([last.status, last.body.code]).toEqual([429, 'rate-limited']);
      expect(Number(last.headers['retry-after'])).toBeGreaterThan(0);
      expect(Number(last.headers['retry-after'])).toBeLessThanOrEqual(900);
    }
  });

  it('after the failures that one account has, wherever they come from', async () => {
    limits.accountAnywhere = 2;
    expect(await tries('somebody@firm.example', 3)).toEqual([401, 401, 429]);
  });

  it('never after sign-ins that went well', async () => {
    await addPerson(service, 'often@firm.example', ['engineer']);
    limits.account = 2;
    for (let round = 0; round < 4; round++)
      expect((await trySignIn(service, 'often@firm.example')).status).toBe(200);
  });

  it('after the failures that one address has', async () => {
    await service.sql(`delete from rate_counts where policy = 'sign-in-address'`);
    limits.address = 2;
    expect(await wrong('first@firm.example')).toBe(401);
    expect(await wrong('second@firm.example')).toBe(401);
    expect(await wrong('third@firm.example')).toBe(429);
    await service.sql(`delete from rate_counts where policy = 'sign-in-address'`);
  });
});

describe('what is kept', () => {
  it('holds no password, no token of a session in the log, nothing typed by mistake', async () => {
    const { cookie, csrfToken } = await signIn(service, 'lead@firm.example');
    await trySignIn(service, 'typed-secret@firm.example', 'typed-password');
    const usage = JSON.stringify(await service.usage());
    const audit = JSON.stringify(await service.sql('select * from audit_events'));
    const counts = JSON.stringify(await service.sql('select * from rate_counts'));
    const kept = [usage, audit, counts, service.printed()].join('\n');
    const value = decodeURIComponent(cookie.split('=')[1] ?? '');
    for (const secret of [password, 'typed-', csrfToken, value, value.split('.')[1] ?? ''])
      expect(kept).not.toContain(secret);
    const sessions = JSON.stringify(await service.sql('select * from sessions'));
    expect(sessions).not.toContain(value.split('.')[1]);
    expect(sessions).not.toContain(password);
  });

  it('names the person in the log of what they asked', async () => {
    const visitor = await signIn(service, 'lead@firm.example');
    const { status, headers } = await visitor.ask({
      method: 'post',
      path: '/v1/checks/fake',
      body: { profile: 'uk-na', load: 0.5 },
    });
    expect(status).toBe(200);
    expect(headers['ratelimit-policy']).toMatch(/^"person"/);
    expect(await service.usage('id = $1', [headers['x-request-id']])).toMatchObject([
      { person_id: lead, key_id: null, client_id: null, check_id: 'fake', answer: 'pass' },
    ]);
  });
});
