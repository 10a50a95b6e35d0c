import { catalogue } from '../../server/engine/sections/catalogue';
import { validateAnswer } from '../../server/middleware/validation';
import { ask, type Answered } from './support/ask';
import { startService, type TestService } from './support/service';

const families = [...new Set(catalogue.map(({ family }) => family))];

let service: TestService & { keys: Record<'good' | 'few' | 'checks', string> };
beforeAll(async () => {
  service = await startService({ good: {}, few: { rateLimit: 2 }, checks: { scopes: ['checks'] } });
});
afterAll(() => service.stop());

interface Section {
  readonly designation: string;
  readonly family: string;
}

/** Numbers by name. */
const valuesOf = (quantities: unknown): Partial<Record<string, number>> =>
  Object.fromEntries(
    Object.entries(quantities as Record<string, { value: number }>).map(([name, { value }]) => [
      name,
      value,
    ]),
  );

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
    ['rhs 150x150', 'SHS 150x150'],
    ['CF SHS 150', 'CF SHS 150x150'],
    ['hf shs 150x150x8', 'SHS 150x150x8'],
    ['150 x 100 x 12 L', 'L 150x100x12'],
    ['chs 114,3', 'CHS 114.3'],
    ['R 20', 'R 20'],
    ['timber 47', 'timber 47x'],
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

  it.each(families)('lists the family %s, every section valid', async (family) => {
    const { body, status } = await read(`?family=${encodeURIComponent(family)}&pageSize=500`);
    expect([status, validateAnswer('SectionList', body)]).toEqual([200, []]);
    expect((body.items as Section[]).map(({ designation }) => designation)).toEqual(
      catalogue.filter((entry) => entry.family === family).map(({ designation }) => designation),
    );
  });

  it('narrows by shape', async () => {
    const { body } = await read('?shape=angle&pageSize=500');
    const items = body.items as Section[];
    expect(new Set(items.map(({ family }) => family))).toEqual(new Set(['L']));
    expect((await read('?shape=I&family=L')).body.items).toEqual([]);
  });

  it('gives an unequal angle with its principal axes and its shear centre', async () => {
    const { status, body } = await read(`/${encodeURIComponent('150x100x12 L')}`);
    expect([status, validateAnswer('SectionFacts', body)]).toEqual([200, []]);
    expect(body).toMatchObject({ designation: 'L 150x100x12', family: 'L', shape: 'angle' });
    expect(valuesOf(body.dimensions)).toEqual({ h: 150, b: 100, t: 12, r1: 12, r2: 6 });
    const properties = valuesOf(body.properties);
    const { Iy = NaN, Iz = NaN, Iyz = NaN, Iu = NaN, Iv = NaN, A = NaN } = properties;
    expect(Iu + Iv).toBeCloseTo(Iy + Iz, 3);
    expect((Iu * Iv) / (Iy * Iz - Iyz ** 2)).toBeCloseTo(1, 9);
    expect(Iyz).toBeLessThan(0);
    expect(properties.iv).toBeCloseTo(Math.sqrt(Iv / A), 9);
    expect(properties.zc).toBeGreaterThan(properties.yc ?? NaN);
    expect(properties.z0).toBeCloseTo((properties.zc ?? NaN) - 6, 9);
    expect(Object.keys(properties)).not.toContain('Wply');
  });

  it('tells hot-finished and cold-formed apart, and takes hot where it is not said', async () => {
    const [plain, hot, cold] = await Promise.all(
      ['RHS 200x100x8', 'HF RHS 200x100x8', 'RHS 200x100x8 cold-formed'].map(async (spelling) => {
        const { body } = await read(`/${encodeURIComponent(spelling)}`);
        return body;
      }),
    );
    expect(plain).toEqual(hot);
    expect(hot).toMatchObject({ family: 'RHS', forming: 'hot-finished' });
    expect(cold).toMatchObject({ designation: 'CF RHS 200x100x8', forming: 'cold-formed' });
    expect(valuesOf(hot?.dimensions)).toEqual({ h: 200, b: 100, t: 8, ro: 12, ri: 8 });
    expect(valuesOf(cold?.dimensions)).toEqual({ h: 200, b: 100, t: 8, ro: 20, ri: 12 });
    expect(valuesOf(hot?.properties).Wt).toBeGreaterThan(valuesOf(cold?.properties).Wt ?? NaN);
  });

  it('gives a channel with tapered flanges', async () => {
    const { body } = await read('/UPN%20200');
    const { taper, ...lengths } = body.dimensions as Record<string, unknown>;
    expect(valuesOf(lengths)).toEqual({ h: 200, b: 75, tw: 8.5, tf: 11.5, r: 11.5 });
    expect(valuesOf(taper)).toEqual({ slope: 0.08, at: 37.5, r2: 6 });
    const { yc = NaN, e0 = NaN, y0 } = valuesOf(body.properties);
    expect(yc).toBeCloseTo(20.1, 0);
    expect(y0).toBeCloseTo(yc + e0 - 4.25, 9);
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
  it.each(['UPN 200', 'L 150x100x12', 'CF SHS 150x150x8', 'CHS 114.3x5', 'R 20', 'timber 47x150'])(
    'for %s',
    async (designation) => {
      const path = `/${encodeURIComponent(designation)}`;
      const etag = (await read(path)).headers.etag ?? '';
      expect((await read(path, { 'If-None-Match': etag })).status).toBe(304);
    },
  );

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
  it.each([
    'family=UX',
    'shape=star',
    'shape=I&shape=I',
    'pageToken=abc',
    'pageToken=MTo',
    'pageSize=0',
    'pageSize=1e2',
    'find=ub',
  ])('for ?%s', async (query) => {
    const { status, body } = await read(`?${query}`);
    expect([status, body.code]).toEqual([422, 'query-not-valid']);
  });
});
