import { ask, type Answered } from './support/ask';
import { startService, type TestService } from './support/service';

interface Logged {
  readonly id: string;
  readonly httpStatus: number;
  readonly clientId: string;
}
interface Page {
  readonly items: readonly Logged[];
  readonly nextPageToken: string | null;
}

let service: TestService & { keys: Record<'tool' | 'admin', string> };
beforeAll(async () => {
  service = await startService({ tool: { scopes: ['checks'] }, admin: { scopes: ['admin'] } });
  for (const load of [0.5, 2, 0.25, -1, 3])
    await ask(service.server, {
      method: 'post',
      path: '/v1/checks/fake',
      key: service.keys.tool,
      body: { profile: 'uk-na', load },
    });
});
afterAll(() => service.stop());

const read = (query = ''): Promise<Answered> =>
  ask(service.server, { path: `/v1/usage${query}`, key: service.keys.admin });
const page = async (query: string): Promise<Page> => {
  const { status, body } = await read(query);
  expect(status).toBe(200);
  return body as unknown as Page;
};
const checks = 'check=fake';

describe('200', () => {
  it('lists the calls, newest first, without anything secret', async () => {
    const { items } = await page(`?${checks}`);
    expect(items.map(({ httpStatus }) => httpStatus)).toEqual([200, 422, 200, 200, 200]);
    expect(items.map(({ id }) => id)).toEqual(
      items
        .map(({ id }) => id)
        .sort()
        .reverse(),
    );
    const secret = service.keys.tool.slice(17);
    expect(JSON.stringify(items)).not.toContain(secret);
  });

  it('gives every call once over its pages, while new ones come in', async () => {
    const whole = await page(`?${checks}`);
    const seen: string[] = [];
    let token: string | null = '';
    while (token !== null) {
      const asked = token === '' ? '' : `&pageToken=${token}`;
      const part: Page = await page(`?${checks}&pageSize=2${asked}`);
      expect(part.items.length).toBeLessThanOrEqual(2);
      seen.push(...part.items.map(({ id }) => id));
      token = part.nextPageToken;
    }
    expect(seen).toEqual(whole.items.map(({ id }) => id));
  });

  it('narrows by status, answer, client and time', async () => {
    const { items } = await page(`?${checks}`);
    const client = items[0]?.clientId ?? '';
    const count = async (query: string) => (await page(`?${checks}&${query}`)).items.length;
    expect(await count('status=422')).toBe(1);
    expect(await count('answer=fail')).toBe(2);
    expect(await count(`client=${client}`)).toBe(5);
    expect(await count('client=00000000-0000-4000-8000-000000000000')).toBe(0);
    expect(await count('from=2026-01-01')).toBe(5);
    expect(await count('from=2999-01-01')).toBe(0);
    expect(await count('to=2020-01-01T00:00:00Z')).toBe(0);
  });

  it('gives one call by the id of its answer', async () => {
    const { items } = await page(`?${checks}`);
    const id = items[2]?.id ?? '';
    const { status, body } = await read(`/${id}`);
    expect([status, body.id, body.checkId]).toEqual([200, id, 'fake']);
  });
});

describe('403', () => {
  it('for a key without the scope', async () => {
    const { status } = await ask(service.server, { path: '/v1/usage', key: service.keys.tool });
    expect(status).toBe(403);
  });
});

describe('404', () => {
  it.each(['01KGAAAAAAAAAAAAAAAAAAAAAA', 'x', '%00', "';--"])('for the id %s', async (id) => {
    const { status, body } = await read(`/${id}`);
    expect([status, body.code]).toEqual([404, 'not-found']);
  });
});

describe('422', () => {
  it.each([
    'client=%07',
    'check=%00',
    'status=abc',
    'answer=maybe',
    'from=yesterday',
    'from=2026-13-45',
    'to=1',
    'pageSize=0',
    'pageSize=501',
    'pageToken=abc',
    'pageToken=MTowMUtHQUFBQUFBQUFBQUFBQUFBQUFBQQ==',
    'page=2',
    'status=200&status=200',
  ])('for ?%s', async (query) => {
    const { status, body } = await read(`?${query}`);
    expect([status, body.code]).toEqual([422, 'query-not-valid']);
    const [name] = query.split('=');
    expect(body.errors?.[0]?.pointer).toBe(`/query/${name ?? ''}`);
  });
});
