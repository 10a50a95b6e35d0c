import { ask, type Answered } from './support/ask';
import { startService, until, type TestService } from './support/service';

const site = 'https://tools.example';
const other = 'https://other.example:8443';
let service: TestService & { keys: Record<'page' | 'other' | 'gone' | 'soon', string> };
beforeAll(async () => {
  service = await startService({
    page: { kind: 'page', scopes: ['checks', 'catalogue'], origins: [site] },
    other: { kind: 'page', origins: [other] },
    gone: { kind: 'page', origins: ['https://gone.example'], revokedAt: new Date() },
    soon: {
      kind: 'page',
      origins: ['https://soon.example'],
      expiresAt: new Date(Date.now() + 1_500),
    },
  });
});
afterAll(() => service.stop());

const path = '/v1/checks/fake';
const preflight = (origin: string): Promise<Answered> =>
  ask(service.server, {
    method: 'options',
    path,
    headers: {
      Origin: origin,
      'Access-Control-Request-Method': 'POST',
      'Access-Control-Request-Headers': 'authorization, content-type',
    },
  });

describe('204', () => {
  it.each([site, other])('lets the page %s of a live page key ask', async (origin) => {
    const { status, headers } = await preflight(origin);
    expect(status).toBe(204);
    expect(headers['access-control-allow-origin']).toBe(origin);
    expect(headers['access-control-allow-methods']).toContain('POST');
    expect(headers['access-control-allow-headers']).toMatch(/Authorization, Content-Type/);
    expect(headers.vary).toMatch(/Origin/);
  });

  it.each([
    'https://gone.example',
    'https://tools.example:8443',
    'http://tools.example',
    'https://a.tools.example',
    'https://TOOLS.example',
    'null',
  ])('says nothing to %s', async (origin) => {
    const { status, headers } = await preflight(origin);
    expect(status).toBe(204);
    expect(headers['access-control-allow-origin']).toBeUndefined();
    expect(headers.vary).toMatch(/Origin/);
  });

  it('ends with the key', async () => {
    await until(
      async () =>
        (await preflight('https://soon.example')).headers['access-control-allow-origin'] ===
        undefined,
    );
  });
});

const post = (key: keyof typeof service.keys, body: object): Promise<Answered> =>
  ask(service.server, {
    method: 'post',
    path,
    key: service.keys[key],
    headers: { Origin: site },
    body,
  });

describe('any answer to an allowed page', () => {
  it.each([
    ['200', 'page', { profile: 'uk-na', load: 1 }],
    ['422', 'page', { load: 'x' }],
    ['403', 'other', { load: 1 }],
    ['401', 'gone', { load: 1 }],
  ] as const)('of status %s can be read there', async (status, key, body) => {
    const answer = await post(key, body);
    expect(String(answer.status)).toBe(status);
    expect(answer.headers['access-control-allow-origin']).toBe(site);
    expect(answer.headers.vary).toMatch(/Origin/);
    for (const name of ['X-Request-Id', 'RateLimit', 'RateLimit-Policy', 'Retry-After', 'ETag'])
      expect(answer.headers['access-control-expose-headers']).toContain(name);
    expect(answer.headers['access-control-allow-credentials']).toBeUndefined();
  });

  it('is named with its origin in the log', async () => {
    const { headers } = await post('page', { profile: 'uk-na', load: 1 });
    expect(await service.usage('id = $1', [headers['x-request-id']])).toMatchObject([
      { origin: site },
    ]);
  });
});
