import { Problem } from '../../middleware/problem';
import type { Answer, Asked, Route } from '../../middleware/route';
import { builtFolder, BuiltFiles } from './built-files';

const script = 'text/javascript; charset=utf-8';
const font = 'font/woff2';
const text = 'text/plain; charset=utf-8';
/** A page has a new version within five minutes and meanwhile never waits for it. */
const soon = 'public, max-age=300, stale-while-revalidate=86400';
const week = 'public, max-age=604800';

/** Every file that a page of another origin may load. */
const files: readonly (readonly [name: string, contentType: string, cache: string])[] = [
  ['headtree-elements.js', script, soon],
  ['custom-elements.json', 'application/json; charset=utf-8', soon],
  ['fonts/headtree-sans-400.woff2', font, week],
  ['fonts/headtree-sans-600.woff2', font, week],
  ['fonts/headtree-mono-400.woff2', font, week],
  ['fonts/headtree-mono-600.woff2', font, week],
  ['fonts/headtree-math.woff2', font, week],
  ['licenses.txt', text, week],
];

/** Static files hold nothing of a caller: any page may load them. */
const open = {
  'Access-Control-Allow-Origin': '*',
  'Cross-Origin-Resource-Policy': 'cross-origin',
  Vary: 'Accept-Encoding',
};

/** Weak comparison, as `If-None-Match` asks for. */
const holds = (wanted: string | undefined, etag: string): boolean =>
  wanted?.split(',').some((each) => [etag, '*'].includes(each.trim().replace(/^W\//, ''))) ?? false;

/** The elements' script, its fonts and its manifest, as built by the start command. */
export function elementRoutes(folder: string = builtFolder): Route[] {
  const built = new BuiltFiles(folder);
  return files.map(([name, contentType, cache]) => ({
    method: 'get',
    path: `/elements/v1/${name}`,
    policy: { kind: 'public' },
    rate: 'free',
    logged: false,
    // A page may add one of its own making, to get past its own caches.
    query: { v: 'text' },
    handler: async ({ request }: Asked): Promise<Answer> => {
      const file = await built.read(name, request.get('accept-encoding'));
      if (!file)
        throw new Problem('elements-not-built', `${name} is not built yet.`, {
          headers: { ...open, 'Retry-After': '60' },
        });
      const headers = { ...open, 'Cache-Control': cache, ETag: file.etag };
      if (holds(request.get('if-none-match'), file.etag)) return { status: 304, body: '', headers };
      const packed = file.encoding ? { 'Content-Encoding': file.encoding } : {};
      return { status: 200, body: file.bytes, contentType, headers: { ...headers, ...packed } };
    },
  }));
}
