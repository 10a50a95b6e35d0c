import { mkdirSync, mkdtempSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { gunzipSync, gzipSync } from 'node:zlib';
import { Problem } from '../../middleware/problem';
import type { Answer, Asked } from '../../middleware/route';
import { elementRoutes } from './elements.routes';

const text = 'console.log("the script")';
let folder: string;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'headtree-elements-'));
  mkdirSync(join(folder, 'fonts'));
  writeFileSync(join(folder, 'headtree-elements.js'), text);
  writeFileSync(join(folder, 'headtree-elements.js.gz'), gzipSync(text));
  writeFileSync(join(folder, 'fonts/headtree-sans-400.woff2'), 'font');
});
afterEach(() => rmSync(folder, { recursive: true }));

const get = async (name: string, sent: Readonly<Record<string, string>> = {}): Promise<Answer> => {
  const route = elementRoutes(folder).find(({ path }) => path === `/elements/v1/${name}`);
  if (!route) throw new Error(`No route of ${name}`);
  const request = { get: (header: string) => sent[header] };
  return await route.handler({ request } as unknown as Asked);
};
const textOf = ({ body }: Answer): string => Buffer.from(body as Uint8Array).toString();

describe('200', () => {
  it('lets a page of any origin load the script', async () => {
    const { status, headers, contentType, body } = await get('headtree-elements.js');
    expect([status, contentType]).toEqual([200, 'text/javascript; charset=utf-8']);
    expect(Buffer.from(body as Uint8Array).toString()).toBe(text);
    expect(headers).toMatchObject({
      'Access-Control-Allow-Origin': '*',
      'Cross-Origin-Resource-Policy': 'cross-origin',
      Vary: 'Accept-Encoding',
    });
  });

  it('packs it for who takes that', async () => {
    const { headers, body } = await get('headtree-elements.js', {
      'accept-encoding': 'gzip, deflate, br',
    });
    expect(headers?.['Content-Encoding']).toBe('gzip');
    expect(gunzipSync(body as Uint8Array).toString()).toBe(text);
  });

  it.each(['identity', 'gzip;q=0', 'x-gzip', ''])(
    'leaves it unpacked for "%s"',
    async (accepted) => {
      const { headers } = await get('headtree-elements.js', { 'accept-encoding': accepted });
      expect(headers?.['Content-Encoding']).toBeUndefined();
    },
  );

  it('names a font as one', async () => {
    const { contentType, headers } = await get('fonts/headtree-sans-400.woff2');
    expect(contentType).toBe('font/woff2');
    expect(headers?.['Cache-Control']).toContain('604800');
  });

  it('gives the new one once it is built anew', async () => {
    const before = await get('headtree-elements.js');
    writeFileSync(join(folder, 'headtree-elements.js'), 'new');
    utimesSync(join(folder, 'headtree-elements.js'), new Date(0), new Date(0));
    const after = await get('headtree-elements.js');
    expect(textOf(after)).toBe('new');
    expect(after.headers?.ETag).not.toBe(before.headers?.ETag);
  });
});

describe('304', () => {
  it('answers who has it, by any of the tags sent', async () => {
    const { headers } = await get('headtree-elements.js');
    const etag = headers?.ETag ?? '';
    for (const sent of [etag, `W/${etag}`, `"other", ${etag}`, '*']) {
      const again = await get('headtree-elements.js', { 'if-none-match': sent });
      expect([again.status, again.body]).toEqual([304, '']);
    }
    expect((await get('headtree-elements.js', { 'if-none-match': '"other"' })).status).toBe(200);
  });
});

describe('503', () => {
  it('says in plain words that nothing is built, and lets any page read that', async () => {
    const asked = get('custom-elements.json');
    await expect(asked).rejects.toBeInstanceOf(Problem);
    await expect(asked).rejects.toMatchObject({
      code: 'elements-not-built',
      detail: 'custom-elements.json is not built yet.',
      headers: { 'Access-Control-Allow-Origin': '*', 'Retry-After': '60' },
    });
  });
});
