import { ask as askService, type Answered } from './support/ask';
import { startService, until, type TestService } from './support/service';

const site = 'https://tools.example';
const limits = { key: 1_000, pageAddress: 3, person: 1_000, address: 20 };
let service: TestService & { keys: Record<'three' | 'crowd' | 'page', string> };

/** Counts begin anew with the minute: a test that counts keeps clear of its turn. */
const awayFromTheTurn = (): Promise<void> => until(() => Date.now() % 60_000 < 45_000, 20_000);

beforeAll(async () => {
  await awayFromTheTurn();
  service = await startService(
    {
      three: { rateLimit: 3 },
      crowd: { rateLimit: 40 },
      page: { kind: 'page', scopes: ['catalogue'], origins: [site] },
    },
    { limits },
  );
}, 30_000);
afterAll(() => service.stop());

const ask = (key?: keyof typeof service.keys, origin?: string): Promise<Answered> =>
  askService(service.server, {
    path: '/v1/checks',
    ...(key !== undefined && { key: service.keys[key] }),
    ...(origin !== undefined && { headers: { Origin: origin } }),
  });

describe('200', () => {
  it('counts down to the limit of the key', async () => {
    for (const left of [2, 1, 0]) {
      const { status, headers } = await ask('three');
      expect(status).toBe(200);
      expect(headers.ratelimit).toMatch(new RegExp(`^"key"; r=${left}; t=\\d+$`));
      expect(headers['ratelimit-policy']).toMatch(/^"key"; q=3; w=60/);
    }
  });
});

describe('401', () => {
  it('is counted by address', async () => {
    const { headers } = await ask();
    expect(headers.ratelimit).toMatch(/^"address"; r=\d+; t=\d+$/);
    expect(headers['ratelimit-policy']).toMatch(/^"address"; q=20; w=60/);
  });
});

describe('429', () => {
  it('names the policy, and Retry-After is its reset', async () => {
    const { status, body, headers } = await ask('three');
    expect(status).toBe(429);
    expect(body).toMatchObject({ code: 'rate-limited', retryable: true });
    expect(body.detail).toContain('"key"');
    expect(headers['retry-after']).toBe(/t=(\d+)/.exec(headers.ratelimit ?? '')?.[1]);
    const rows = await service.usage('id = $1', [headers['x-request-id']]);
    expect(rows).toMatchObject([{ http_status: 429, code: 'rate-limited' }]);
    expect(rows[0]?.client_id).not.toBeNull();
  });

  it('lets exactly as many through as it says, however they come', async () => {
    const answers = await Promise.all(Array.from({ length: 60 }, () => ask('crowd')));
    expect(answers.filter(({ status }) => status === 200)).toHaveLength(40);
    expect(answers.filter(({ status }) => status === 429)).toHaveLength(20);
  });

  it('holds a page key by address too, and the page can read it', async () => {
    const answers: Answered[] = [];
    for (let round = 0; round < 4; round++) answers.push(await ask('page', site));
    expect(answers.map(({ status }) => status)).toEqual([200, 200, 200, 429]);
    const last = answers[3];
    expect(last?.headers.ratelimit).toContain('"page-address"; r=0');
    expect(last?.body.detail).toContain('"page-address"');
    expect(last?.headers['access-control-allow-origin']).toBe(site);
    expect(last?.headers['access-control-expose-headers']).toContain('Retry-After');
  });

  it('holds whoever has no key by address; ten have a row each, the rest one for all', async () => {
    const answers = await Promise.all(Array.from({ length: 40 }, () => ask()));
    const refused = answers.filter(({ status }) => status === 429);
    expect(refused.length).toBeGreaterThanOrEqual(20);
    expect(answers.every(({ status }) => status === 401 || status === 429)).toBe(true);
    const ofStatus = (status: number) =>
      service.usage('http_status = $1 and key_id is null', [status]);
    expect(await ofStatus(401)).toHaveLength(10);
    expect(await ofStatus(429)).toHaveLength(10);
  });
});
