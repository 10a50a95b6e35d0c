import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { checks } from '../../server/engine/checks/registry';
import { problemKinds } from '../../server/middleware/problem-codes';
import { validateAnswer, validateRequest } from '../../server/middleware/validation';
import { ask, type Answered } from './support/ask';
import { startService, type TestService } from './support/service';

let service: TestService & { keys: Record<'good', string> };
beforeAll(async () => {
  service = await startService({ good: {} }, { checks, validate: validateRequest });
});
afterAll(() => service.stop());

const get = (path: string, headers = {}): Promise<Answered> =>
  ask(service.server, { path, headers });
const withKey = (path: string): Promise<Answered> =>
  ask(service.server, { path, key: service.keys.good });

/** Source files of the server whose text can name a code. */
const sources = readdirSync(join(__dirname, '../../server'), { recursive: true })
  .map(String)
  .filter((name) => name.endsWith('.ts') && !name.endsWith('.spec.ts'))
  .map((name) => readFileSync(join(__dirname, '../../server', name), 'utf8'))
  .join('\n');

describe('a problem', () => {
  const codes = Object.keys(problemKinds);

  it.each(codes)('%s has a page that says why and what to do', async (code) => {
    const { status, text, headers } = await get(`/problems/${code}`, { Accept: 'text/html' });
    expect(status).toBe(200);
    expect(headers['content-type']).toBe('text/html; charset=utf-8');
    expect(headers['content-security-policy']).toMatch(/style-src 'sha256-/);
    expect(text).toContain('<html lang="en">');
    expect(text.match(/<h1>/g)).toHaveLength(1);
    expect(text).toContain('What to do');
    const json = await get(`/problems/${code}`, { Accept: 'application/json' });
    expect(json.body).toMatchObject({ code, type: `/problems/${code}` });
  });

  it.each(codes)('%s is one that the server can answer', (code) => {
    expect(sources).toContain(code.includes('-') ? `'${code}'` : code);
  });

  it('that there is not is none', async () => {
    for (const code of ['none', '__proto__', 'toString'])
      expect((await get(`/problems/${code}`)).status).toBe(404);
    expect((await get('/problems', { Accept: 'text/html' })).text).toContain('/problems/not-json');
  });

  it('is of the shape that the contract names', async () => {
    const { body, headers } = await get('/v1/none');
    expect(headers['content-type']).toContain('application/problem+json');
    expect(validateAnswer('Problem', body)).toEqual([]);
  });
});

describe('200', () => {
  it('the first page names the service, the documentation and the cautions', async () => {
    const { status, text } = await get('/');
    expect(status).toBe(200);
    for (const words of ['Headtree', '/docs/', 'competent persons', 'is not a\npass'])
      expect(text).toContain(words);
  });

  it('the contract as it is answered today, and a page that shows it', async () => {
    const { status, body, headers } = await get('/v1/openapi.json');
    expect([status, body.openapi]).toEqual([200, '3.1.0']);
    expect(headers.ratelimit).toBeDefined();
    const docs = await get('/docs/');
    expect(docs.text).toContain('Headtree API');
    expect(docs.headers['content-security-policy']).toContain("style-src 'self' 'unsafe-inline'");
    expect((await get('/')).headers['content-security-policy']).not.toContain('unsafe-inline');
  });

  it('every path of the contract is a route, and every route of /v1 is in the contract', async () => {
    const { body } = await get('/v1/openapi.json');
    const paths = Object.keys(body.paths as object).map((path) =>
      path.replace(/\{\w+\}/g, ':').replace(/\/+$/, ''),
    );
    const routes = service.routes.map(({ path }) => path.replace(/:\w+/g, ':'));
    const under = (path: string): boolean => path.startsWith('/v1');
    expect(paths.filter(under).sort()).toEqual([...new Set(routes.filter(under))].sort());
  });

  it('the probes', async () => {
    const health = await get('/healthz');
    expect([health.status, validateAnswer('Health', health.body)]).toEqual([200, []]);
    const ready = await get('/readyz');
    expect([ready.status, validateAnswer('Readiness', ready.body)]).toEqual([200, []]);
  });

  it('what is read with a key is what the contract says', async () => {
    const shapes = {
      '/v1/checks': 'CheckList',
      '/v1/profiles': 'ProfileList',
      '/v1/profiles/uk-na': 'ProfileDetail',
      '/v1/usage': 'UsageList',
    };
    for (const [path, shape] of Object.entries(shapes)) {
      const { status, body } = await withKey(path);
      expect([path, status, validateAnswer(shape, body)]).toEqual([path, 200, []]);
    }
  });

  it('the schema of a check stands alone', async () => {
    const { status, text } = await withKey('/v1/checks/waler/schema');
    expect(status).toBe(200);
    const references = [...text.matchAll(/"\$ref":"([^"]+)"/g)].map(([, reference]) => reference);
    const { $defs } = JSON.parse(text) as { $defs: Record<string, unknown> };
    for (const reference of references)
      expect(Object.keys($defs)).toContain(reference?.slice('#/$defs/'.length));
  });
});

describe('404', () => {
  it.each(['/none', '/docs/none.js', '/v1', '/v1/', '/healthz/', '/V1/openapi.json'])(
    'for %s',
    async (path) => {
      const { status, headers } = await get(path);
      expect(status).toBe(404);
      expect(headers['x-request-id']).toBeDefined();
    },
  );
});
