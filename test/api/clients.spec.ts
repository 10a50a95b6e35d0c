import { validateAnswer } from '../../server/middleware/validation';
import { keyPattern } from '../../server/features/keys/key-format';
import { ask, type Answered } from './support/ask';
import { addPerson, signIn, type Visitor } from './support/people';
import { startService, until, type TestService } from './support/service';

let service: TestService;
let admin: Visitor;
let adminId: string;
beforeAll(async () => {
  service = await startService({ other: {} });
  adminId = await addPerson(service, 'admin@firm.example', ['admin']);
  admin = await signIn(service, 'admin@firm.example');
});
afterAll(() => service.stop());

const post = (path: string, body: object): Promise<Answered> =>
  admin.ask({ method: 'post', path, body });
const patch = (path: string, body: object): Promise<Answered> =>
  admin.ask({ method: 'patch', path, body });

let count = 0;
/** Makes a client; gives the path of it. */
async function makeClient(more: object = {}): Promise<string> {
  const { status, body, headers } = await post('/v1/clients', { name: `Tool ${++count}`, ...more });
  expect([status, validateAnswer('ClientFacts', body)]).toEqual([201, []]);
  return headers.location ?? '';
}

interface Issued {
  readonly text: string;
  readonly selector: string;
  readonly answer: Answered;
}
async function issue(client: string, more: object = {}): Promise<Issued> {
  const answer = await post(`${client}/keys`, { kind: 'secret', label: 'a script', ...more });
  expect([answer.status, answer.body.errors]).toEqual([201, undefined]);
  expect(validateAnswer('IssuedKey', answer.body)).toEqual([]);
  const { key, text } = answer.body as { key: { selector: string }; text: string };
  return { text, selector: key.selector, answer };
}

const use = (key: string, origin?: string): Promise<Answered> =>
  ask(service.server, {
    path: '/v1/checks',
    key,
    ...(origin !== undefined && { headers: { Origin: origin } }),
  });

/** Until the notice of the change has come, which takes milliseconds. */
const answers = (key: string, status: number, origin?: string): Promise<void> =>
  until(async () => (await use(key, origin)).status === status, 2_000);

describe('a client', () => {
  it('is made, read, listed and changed', async () => {
    const path = await makeClient({ defaultProfile: 'uk-na', pins: ['uk-na@1'] });
    const { body } = await admin.ask({ path });
    expect(body).toMatchObject({ defaultProfile: 'uk-na', pins: ['uk-na@1'], liveKeys: 0 });
    const changed = await patch(path, { name: 'Renamed tool', defaultProfile: null, pins: [] });
    expect([changed.status, validateAnswer('ClientFacts', changed.body)]).toEqual([200, []]);
    expect(changed.body).toMatchObject({ name: 'Renamed tool', defaultProfile: null, pins: [] });
    const listed = await admin.ask({ path: '/v1/clients' });
    expect([listed.status, validateAnswer('ClientList', listed.body)]).toEqual([200, []]);
    expect(listed.body.items).toContainEqual(changed.body);
    const audit = await service.sql(
      `select actor, action, detail from audit_events where subject = $1 order by id`,
      [`client:${path.split('/').at(-1) ?? ''}`],
    );
    expect(audit).toMatchObject([
      { actor: `person:${adminId}`, action: 'client.made', detail: { defaultProfile: 'uk-na' } },
      { actor: `person:${adminId}`, action: 'client.changed', detail: { name: 'Renamed tool' } },
    ]);
  });

  it('is listed by name, page by page, while others come in between', async () => {
    for (const name of ['beam tool', 'Beam Tool 2', 'beam tool 3', 'Beam tool 4'])
      await makeClient({ name });
    const first = await admin.ask({ path: '/v1/clients?pageSize=2' });
    await makeClient({ name: 'A tool that comes first' });
    const seen = (first.body.items as { name: string }[]).map(({ name }) => name);
    let token = first.body.nextPageToken as string | null;
    while (token !== null) {
      const { body } = await admin.ask({ path: `/v1/clients?pageSize=2&pageToken=${token}` });
      seen.push(...(body.items as { name: string }[]).map(({ name }) => name));
      token = body.nextPageToken as string | null;
    }
    expect(new Set(seen).size).toBe(seen.length);
    expect(seen).not.toContain('A tool that comes first');
    expect(seen.map((name) => name.toLowerCase())).toEqual(
      seen.map((name) => name.toLowerCase()).sort(),
    );
    expect(seen).toEqual(expect.arrayContaining(['beam tool', 'Beam Tool 2', 'Beam tool 4']));
  });

  it('out of use opens with none of its keys, and gets no new one; in use again it does', async () => {
    const path = await makeClient();
    const { text } = await issue(path);
    await answers(text, 200);
    const disabled = await patch(path, { disabled: true });
    expect(disabled.body.disabledAt).not.toBeNull();
    await answers(text, 401);
    const refused = await post(`${path}/keys`, { kind: 'secret', label: 'another' });
    expect([refused.status, refused.body.code]).toEqual([409, 'client-disabled']);
    await patch(path, { disabled: false });
    await answers(text, 200);
  });

  it('409 for a name that is taken, whatever its capitals', async () => {
    await makeClient({ name: 'Waler book' });
    const made = await post('/v1/clients', { name: 'WALER BOOK' });
    expect([made.status, made.body.code]).toEqual([409, 'name-taken']);
    const changed = await patch(await makeClient(), { name: 'waler book' });
    expect([changed.status, changed.body.errors?.[0]?.pointer]).toEqual([409, '/name']);
  });

  it.each([
    [{}, '/name'],
    [{ name: ' ' }, '/name'],
    [{ name: 'x'.repeat(81) }, '/name'],
    [{ name: 'tool', defaultProfile: 'no-such' }, '/defaultProfile'],
    [{ name: 'tool', defaultProfile: 5 }, '/defaultProfile'],
    [{ name: 'tool', pins: ['uk-na'] }, '/pins/0'],
    [{ name: 'tool', pins: ['uk-na@99'] }, '/pins/0'],
    [{ name: 'tool', pins: ['uk-na@1', 'uk-na@2'] }, '/pins/1'],
    [{ name: 'tool', id: 'mine' }, '/id'],
  ])('422 for %j', async (body, pointer) => {
    const { status, body: problem } = await post('/v1/clients', body);
    expect(status).toBe(422);
    expect(problem.errors?.map((each) => each.pointer)).toContain(pointer);
    expect(validateAnswer('Problem', problem)).toEqual([]);
  });

  it('422 for a change of nothing', async () => {
    expect((await patch(await makeClient(), {})).status).toBe(422);
  });

  it.each(['5a17c0de-0001-4000-8000-00000000ffff', 'x', "'"])('404 for %s', async (id) => {
    const path = `/v1/clients/${encodeURIComponent(id)}`;
    for (const each of [
      await admin.ask({ path }),
      await patch(path, { name: 'n' }),
      await admin.ask({ path: `${path}/keys` }),
      await post(`${path}/keys`, { kind: 'secret', label: 'l' }),
    ])
      expect([each.status, each.body.code]).toEqual([404, 'not-found']);
  });
});

describe('a key', () => {
  it('is issued, told once, used, and refused within two seconds of its revocation', async () => {
    const path = await makeClient();
    const { text, selector, answer } = await issue(path, { scopes: ['catalogue'], rateLimit: 50 });
    expect(text).toMatch(keyPattern);
    expect(answer.headers['cache-control']).toBe('no-store');
    await answers(text, 200);
    const listed = await admin.ask({ path: `${path}/keys` });
    expect([listed.status, validateAnswer('KeyList', listed.body)]).toEqual([200, []]);
    expect(listed.body.items).toMatchObject([{ selector, state: 'live', scopes: ['catalogue'] }]);
    expect((await admin.ask({ path })).body.liveKeys).toBe(1);

    const revoked = await post(`/v1/keys/${selector}/revoke`, {});
    expect([revoked.status, validateAnswer('KeyFacts', revoked.body)]).toEqual([200, []]);
    expect(revoked.body.state).toBe('revoked');
    await answers(text, 401);
    expect((await use(text)).body.code).toBe('key-revoked');
    const again = await post(`/v1/keys/${selector}/revoke`, {});
    expect(again.body).toEqual(revoked.body);

    const audit = await service.sql<{ action: string; actor: string; detail: unknown }>(
      'select action, actor, detail from audit_events where subject = $1 order by id',
      [selector],
    );
    expect(audit.map(({ action }) => action)).toEqual(['key.issued', 'key.revoked']);
    expect(audit[0]).toMatchObject({ actor: `person:${adminId}`, detail: { label: 'a script' } });
  });

  it('of a page works from its origins, and from nowhere else', async () => {
    const origins = ['https://intranet.example', 'http://tools.example:8080'];
    const { text, answer } = await issue(await makeClient(), { kind: 'page', origins });
    expect(text.startsWith('htp_')).toBe(true);
    expect(answer.body.key).toMatchObject({ origins, scopes: ['checks', 'catalogue'] });
    for (const origin of origins) await answers(text, 200, origin);
    for (const origin of ['https://tools.example:8080', 'https://intranet.example.evil.example'])
      expect((await use(text, origin)).body.code).toBe('origin-not-allowed');
    expect((await use(text)).status).toBe(403);
  });

  it('expires when it was said to', async () => {
    const expiresAt = new Date(Date.now() + 1_500).toISOString();
    const { text, selector } = await issue(await makeClient(), { expiresAt });
    await answers(text, 200);
    await until(async () => (await use(text)).status === 401, 4_000);
    expect((await use(text)).body.code).toBe('key-expired');
    expect((await post(`/v1/keys/${selector}/revoke`, {})).status).toBe(200);
  });

  it('is limited to factor profiles', async () => {
    const { text } = await issue(await makeClient(), { profiles: ['uk-na'] });
    await answers(text, 200);
    const { body } = await ask(service.server, { path: '/v1/profiles', key: text });
    expect((body.items as { slug: string }[]).map(({ slug }) => slug)).toEqual(['uk-na']);
  });

  it('is listed newest first, page by page', async () => {
    const path = await makeClient();
    const selectors: string[] = [];
    for (let each = 0; each < 5; each++) selectors.unshift((await issue(path)).selector);
    const seen: string[] = [];
    let token: string | null = null;
    do {
      const query = token === null ? '' : `&pageToken=${token}`;
      const { body } = await admin.ask({ path: `${path}/keys?pageSize=2${query}` });
      seen.push(...(body.items as { selector: string }[]).map(({ selector }) => selector));
      token = body.nextPageToken as string | null;
    } while (token !== null);
    expect(seen).toEqual(selectors);
  });

  const page = { kind: 'page', label: 'a page', origins: ['https://intranet.example'] };
  const secret = { kind: 'secret', label: 'a script' };
  it.each([
    [{ label: 'no kind' }, '/kind'],
    [{ ...secret, kind: 'cell' }, '/kind'],
    [{ kind: 'secret' }, '/label'],
    [{ ...secret, origins: ['https://intranet.example'] }, '/origins'],
    [{ ...secret, scopes: [] }, '/scopes'],
    [{ ...secret, scopes: ['owner'] }, '/scopes/0'],
    [{ ...secret, profiles: [] }, '/profiles'],
    [{ ...secret, profiles: ['no-such'] }, '/profiles/0'],
    [{ ...secret, rateLimit: 0 }, '/rateLimit'],
    [{ ...secret, expiresAt: '2020-01-01T00:00:00Z' }, '/expiresAt'],
    [{ ...secret, expiresAt: '2099-13-01T00:00:00Z' }, '/expiresAt'],
    [{ ...secret, expiresAt: '2099-01-01' }, '/expiresAt'],
    [{ ...secret, text: 'htk_mine' }, '/text'],
    [{ ...page, scopes: ['checks', 'admin'] }, '/scopes/1'],
    [{ ...page, origins: [] }, '/origins'],
    [{ kind: 'page', label: 'a page' }, '/origins'],
    ...[
      '*',
      'null',
      'intranet.example',
      'https://*.example',
      'https://intranet.example/',
      'https://intranet.example/page',
      'https://Intranet.example',
      'https://intranet.example:443',
      'https://user@intranet.example',
      'ftp://intranet.example',
      'https://',
      'javascript:alert(1)',
    ].map((origin): [object, string] => [{ ...page, origins: [origin] }, '/origins/0']),
  ])('422 for %j', async (body, pointer) => {
    const { status, body: problem } = await post(`${await makeClient()}/keys`, body);
    expect(status).toBe(422);
    expect(problem.errors?.map((each) => each.pointer)).toContain(pointer);
    expect(validateAnswer('Problem', problem)).toEqual([]);
  });

  it('422 with the origin that was meant', async () => {
    const body = { ...page, origins: ['https://Intranet.example:443/page'] };
    const { body: problem } = await post(`${await makeClient()}/keys`, body);
    expect(problem.errors?.[0]?.fix).toBe('Did you mean "https://intranet.example"?');
  });

  it.each(['AAAAAAAAAAAA', 'x', '%00'])('404 for the selector %s', async (selector) => {
    const { status, body } = await post(`/v1/keys/${selector}/revoke`, {});
    expect([status, body.code]).toEqual([404, 'not-found']);
  });

  it('leaves its secret in no row, no log and no later answer', async () => {
    const path = await makeClient();
    const { text, selector } = await issue(path);
    await answers(text, 200);
    const later = [
      await admin.ask({ path: `${path}/keys` }),
      await admin.ask({ path }),
      await post(`/v1/keys/${selector}/revoke`, {}),
    ];
    const rows = await Promise.all(
      ['api_keys', 'clients', 'audit_events', 'usage_events', 'sessions', 'rate_counts'].map(
        (table) => service.sql(`select * from ${table}`),
      ),
    );
    const kept = [JSON.stringify(rows), service.printed(), ...later.map(({ text: each }) => each)];
    const secret = text.slice(17, 60);
    for (const each of kept) expect(each).not.toContain(secret);
    for (const { text: each } of later) expect(each).not.toMatch(/sha256/i);
  });
});
