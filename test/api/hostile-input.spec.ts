import fc from 'fast-check';
import { checks } from '../../server/engine/checks/registry';
import { validateAnswer, validateRequest } from '../../server/middleware/validation';
import { ask, type Answered } from './support/ask';
import { startService, type TestService } from './support/service';

let service: TestService & { keys: Record<'good', string> };
beforeAll(async () => {
  service = await startService(
    { good: { rateLimit: 1_000_000 } },
    { checks, validate: validateRequest },
  );
});
afterAll(() => service.stop());

const path = '/v1/checks/waler';
const post = (body: object | string, query = ''): Promise<Answered> =>
  ask(service.server, { method: 'post', path: path + query, key: service.keys.good, body });

const good = {
  profile: 'uk-na',
  material: { type: 'steel', grade: 'S275' },
  section: 'UB 457x191x67',
  loadBasis: 'characteristic',
  spans: [3, 3],
  loads: [{ name: 'earth', nature: 'permanent', kind: 'uniform', value: 20 }],
};

/** The good body with one part of its text replaced. */
const altered = (from: string, to: string): string => JSON.stringify(good).replace(from, to);

describe('422', () => {
  it.each([
    ['__proto__', altered('{', '{"__proto__":{"a":1},')],
    ['__proto__ inside', altered('"kind"', '"__proto__":{"value":1},"kind"')],
    ['constructor', altered('{', '{"constructor":{"prototype":{}},')],
    ['an array', '[]'],
    ['null', 'null'],
    ['a number', '1'],
    ['text', '"waler"'],
    ['an object for an array', altered('[3,3]', '{"0":3,"length":1}')],
    ['a number that is none', altered('[3,3]', '[1e999,3]')],
    ['a huge number', altered('[3,3]', '[1e308,3]')],
    ['100,000 spans', altered('[3,3]', `[${'3,'.repeat(100_000)}3]`)],
    ['half of a surrogate pair', altered('earth', '\\ud800')],
    ['a control character', altered('earth', 'a\\u0000b')],
    ['a control character in a name', altered('"kind"', '"k\\u0007":1,"kind"')],
    ['deep nesting', `${'['.repeat(200_000)}${']'.repeat(200_000)}`],
    ['deep nesting of objects', `${'{"a":'.repeat(60_000)}1${'}'.repeat(60_000)}`],
    ['a thousand digits', altered('20', '9'.repeat(1_000))],
  ])('for %s', async (_name, text) => {
    const { status, body } = await post(text);
    expect([status, body.status]).toEqual([422, 422]);
    expect(body.errors?.length).toBeGreaterThan(0);
    expect(validateAnswer('Problem', body)).toEqual([]);
  });
});

describe('no answer is a 500', () => {
  const anyJson = fc.jsonValue({ maxDepth: 6, stringUnit: 'binary' });

  it('whatever JSON is sent', async () => {
    await fc.assert(
      fc.asyncProperty(anyJson, async (value) => {
        const { status } = await post(JSON.stringify(value));
        expect([400, 422]).toContain(status);
      }),
      { numRuns: 100 },
    );
  }, 60_000);

  it('whatever query is sent', async () => {
    await fc.assert(
      fc.asyncProperty(fc.webQueryParameters(), async (query) => {
        const { status } = await post(good, `?${query}`);
        expect([200, 422]).toContain(status);
      }),
      { numRuns: 50 },
    );
  }, 60_000);

  it('whatever path is asked', async () => {
    const paths = fc.array(fc.webSegment(), { maxLength: 5 }).map((parts) => `/${parts.join('/')}`);
    await fc.assert(
      fc.asyncProperty(paths, async (tail) => {
        const { status } = await ask(service.server, {
          path: `/v1${tail}`,
          key: service.keys.good,
        });
        expect([200, 404]).toContain(status);
      }),
      { numRuns: 50 },
    );
  }, 60_000);
});
