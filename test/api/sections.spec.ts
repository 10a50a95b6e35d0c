import { catalogue } from '../../server/engine/sections/catalogue';
import { validateAnswer } from '../../server/middleware/validation';
import { ask, type Answered } from './support/ask';
import { startService, type TestService } from './support/service';

let service: TestService & { keys: Record<'good' | 'few' | 'checks', string> };
beforeAll(async () => {
  service = await startService({ good: {}, few: { rateLimit: 2 }, checks: { scopes: ['checks'] } });
});
afterAll(() => service.stop());

interface Section {
  readonly designation: string;
  readonly family: string;
}

const read = (path: string, headers: Record<string, string> = {}): Promise<Answered> =>
  ask(service.server, { path: `/v1/sections${path}`, key: service.keys.good, headers });
const found = async (query: Record<string, string>): Promise<string[]> => {
  const { status, body } = await read(`?${new URLSearchParams(query).toString()}`);
  expect([status, validateAnswer('SectionList', body)]).toEqual([200, []]);
  return (body.items as Section[]).map(({ designation }) => designation);
};

describe('200', () => {
  it('gives a section in any spelling, with the properties of the tables', async () => {
    for (const spelling of [
      'UB 457x191x67',
      '457 x 191 x 67 UB',
      'ub457X191X67',
      '457×191×67UKB',
    ]) {
      const { status, body } = await read(`/${encodeURIComponent(spelling)}`);
      expect([status, validateAnswer('SectionFacts', body)]).toEqual([200, []]);
      expect(body.designation).toBe('UB 457x191x67');
      const { Wply, iy, Iz } = body.properties as Record<string, { value: number; unit: string }>;
      expect(Wply?.value).toBeCloseTo(1_471_000, -4);
      expect([Wply?.unit, iy?.unit]).toEqual(['mm^3', 'mm']);
      expect(iy?.value).toBeCloseTo(185, 0);
      expect(Iz?.value).toBeCloseTo(14_520_000, -5);
    }
  });

  it.each([
    ['457 191', 'UB 457x191'],
    ['ub457', 'UB 457'],
    ['UB 457x191x', 'UB 457x191x'],
    ['HE 200 B', 'HE 200 B'],
    ['heb200', 'HE 200 B'],
    ['ipe', 'IPE'],
    ['152 x 152 x 23', 'UC 152x152x23'],
  ])('finds %s, what begins so first', async (search, first) => {
    const designations = await found({ search });
    expect(designations.length).toBeGreaterThan(0);
    expect(designations[0]?.startsWith(first)).toBe(true);
  });

  it('finds what holds the text after what begins with it', async () => {
    const designations = await found({ search: '191x67' });
    expect(designations).toContain('UB 457x191x67');
    expect(await found({ search: 'no such section' })).toEqual([]);
    expect(await found({ search: "%' or 1=1 --" })).toEqual([]);
  });

  it('narrows by family', async () => {
    const { body } = await read('?family=UC&pageSize=500');
    const items = body.items as Section[];
    expect(items.every(({ family }) => family === 'UC')).toBe(true);
    expect(items).toHaveLength(catalogue.filter(({ family }) => family === 'UC').length);
  });

  it('gives every section once, page by page', async () => {
    const seen: string[] = [];
    let token: string | null = null;
    do {
      const { body } = await read(`?pageSize=150${token === null ? '' : `&pageToken=${token}`}`);
      seen.push(...(body.items as Section[]).map(({ designation }) => designation));
      token = body.nextPageToken as string | null;
    } while (token !== null);
    expect(seen).toEqual(catalogue.map(({ designation }) => designation));
  });
});

describe('304', () => {
  it('for who has the answer already, at no cost and in the log', async () => {
    const ask304 = (headers: Record<string, string>): Promise<Answered> =>
      ask(service.server, {
        path: '/v1/sections/UB%20457x191x67',
        key: service.keys.few,
        headers,
      });
    const first = await ask304({});
    expect(first.status).toBe(200);
    expect(first.headers.etag).toMatch(/^"[\w-]{22}"$/);
    expect(first.headers['cache-control']).toBe('private, no-cache');
    const etag = first.headers.etag ?? '';
    for (const known of [etag, `W/${etag}`, `"other", ${etag}`, '*', etag, etag]) {
      const again = await ask304({ 'If-None-Match': known });
      expect([again.status, again.text]).toEqual([304, '']);
      expect(again.headers.etag).toBe(etag);
      expect(again.headers['content-type']).toBeUndefined();
      expect(await service.usage('id = $1', [again.headers['x-request-id']])).toMatchObject([
        { http_status: 304, route: '/v1/sections/:designation' },
      ]);
      // The count is given back after the answer.
      await new Promise((resolve) => setTimeout(resolve, 100));
    }
    expect((await ask304({ 'If-None-Match': '"other"' })).status).toBe(200);
    expect((await ask304({})).status).toBe(429);
  });

  it('the list too, and another list has another tag', async () => {
    const first = await read('?search=ub457');
    const etag = first.headers.etag ?? '';
    expect((await read('?search=ub457', { 'If-None-Match': etag })).status).toBe(304);
    expect((await read('?search=ub533', { 'If-None-Match': etag })).status).toBe(200);
  });
});

describe('403', () => {
  it('for a key without the scope', async () => {
    const { status } = await ask(service.server, {
      path: '/v1/sections',
      key: service.keys.checks,
    });
    expect(status).toBe(403);
  });
});

describe('404', () => {
  it('says what is near', async () => {
    const { status, body } = await read('/UB%20457x191x68');
    expect([status, body.code]).toEqual([404, 'not-found']);
    expect(body.detail).toContain('UB 457x191x67');
  });
});

describe('422', () => {
  it.each(['family=UX', 'pageToken=abc', 'pageToken=MTo', 'pageSize=0', 'pageSize=1e2', 'find=ub'])(
    'for ?%s',
    async (query) => {
      const { status, body } = await read(`?${query}`);
      expect([status, body.code]).toEqual([422, 'query-not-valid']);
    },
  );
});
