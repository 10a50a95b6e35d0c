import { mkdirSync, mkdtempSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ask, type Answered } from './support/ask';
import { startService, type TestService } from './support/service';

const folder = mkdtempSync(join(tmpdir(), 'headtree-console-'));
const built = join(folder, 'console');
const away = join(folder, 'away');

let service: TestService;
beforeAll(async () => {
  mkdirSync(join(built, 'media'), { recursive: true });
  writeFileSync(
    join(built, 'index.html'),
    '<!doctype html><html lang="en"><head><title>Headtree</title></head><body><app-root></app-root></body></html>',
  );
  writeFileSync(join(built, 'main-AB12CD34.js'), 'export {};');
  writeFileSync(join(built, 'media/public-sans-AB12CD34.woff2'), 'font');
  writeFileSync(join(built, 'favicon.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>');
  service = await startService({}, { consoleFolder: built });
});
afterAll(async () => {
  await service.stop();
  rmSync(folder, { recursive: true, force: true });
});

const browser = { Accept: 'text/html,application/xhtml+xml,application/xml;q=0.9,*/*;q=0.8' };
const get = (path: string, headers: Record<string, string> = {}): Promise<Answered> =>
  ask(service.server, { path, headers });

const nonceIn = ({ text }: Answered): string => /ngCspNonce="([^"]+)"/.exec(text)?.[1] ?? '';

describe('the page of the console', () => {
  it.each(['/', '/sign-in', '/clients/5a17c0de', '/usage?client=x'])('is at %s', async (path) => {
    const answer = await get(path, browser);
    expect(answer.status).toBe(200);
    expect(answer.headers['content-type']).toBe('text/html; charset=utf-8');
    expect(answer.headers['cache-control']).toBe('no-store');
    expect(answer.headers['x-request-id']).toBeDefined();
    const nonce = nonceIn(answer);
    expect(nonce).toMatch(/^[A-Za-z0-9+/]{24}$/);
    const policy = answer.headers['content-security-policy'] ?? '';
    expect(policy.split('; ')).toEqual([
      "default-src 'none'",
      "script-src 'self'",
      `style-src 'self' 'nonce-${nonce}'`,
      "style-src-attr 'none'",
      "img-src 'self' data:",
      "font-src 'self'",
      "connect-src 'self'",
      "base-uri 'none'",
      "form-action 'self'",
      "frame-ancestors 'none'",
      "require-trusted-types-for 'script'",
      'trusted-types angular angular#components',
    ]);
  });

  it('has another nonce each time, and holds nothing of the caller', async () => {
    const path = '/%22%3E%3Cscript%3E?to=<script>';
    const [one, two] = [await get(path, browser), await get(path, browser)];
    expect(nonceIn(one)).not.toBe(nonceIn(two));
    expect(one.text).not.toContain('<script>');
  });

  it('is no answer to programs, nor where the service has its own', async () => {
    for (const path of ['/clients', '/main-ZZZZZZZZ.js']) {
      const { status, body } = await get(path, { Accept: '*/*' });
      expect([path, status, body.code]).toEqual([path, 404, 'not-found']);
    }
    for (const path of ['/v1/none', '/v1', '/problems/none', '/elements/none']) {
      const { status, text } = await get(path, browser);
      expect([path, status, text.includes('app-root')]).toEqual([path, 404, false]);
    }
    for (const path of ['/docs/', '/problems', '/healthz', '/readyz', '/v1/openapi.json'])
      expect((await get(path, browser)).text).not.toContain('app-root');
    const posted = await ask(service.server, {
      method: 'post',
      path: '/clients',
      headers: browser,
    });
    expect(posted.status).toBe(404);
  });
});

describe('files of the console', () => {
  it('are kept for good when their name says what is in them', async () => {
    for (const path of ['/main-AB12CD34.js', '/media/public-sans-AB12CD34.woff2']) {
      const { status, headers } = await get(path);
      expect([path, status]).toEqual([path, 200]);
      expect(headers['cache-control']).toBe('public, max-age=31536000, immutable');
      expect(headers['x-content-type-options']).toBe('nosniff');
    }
    expect((await get('/favicon.svg')).headers['cache-control']).toBe('no-cache');
  });

  it('are those of its folder alone', async () => {
    for (const path of [
      '/../package.json',
      '/%2e%2e/console.spec.ts',
      '/..%2faway',
      '/.git/config',
    ])
      expect([path, (await get(path)).status]).toEqual([path, 404]);
    const raw = await get('/index.html');
    expect([raw.status, raw.text.includes('<app-root>')]).toEqual([404, false]);
  });
});

describe('without a build', () => {
  beforeAll(() => renameSync(built, away));
  afterAll(() => renameSync(away, built));

  it('the first page is the service’s own', async () => {
    const { status, text } = await get('/', browser);
    expect(status).toBe(200);
    expect(text).toContain('/docs/');
  });

  it('an address of the console says so', async () => {
    const { status, text, headers } = await get('/clients', browser);
    expect(status).toBe(404);
    expect(text).toContain('The console is not built');
    expect(headers['content-security-policy']).toContain("default-src 'none'");
    expect((await get('/clients')).body.code).toBe('not-found');
  });

  it('it is found as soon as it is built', async () => {
    renameSync(away, built);
    expect((await get('/', browser)).text).toContain('app-root');
    renameSync(built, away);
  });
});
