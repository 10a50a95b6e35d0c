import { randomBytes } from 'node:crypto';
import { readFile, stat } from 'node:fs/promises';
import { join } from 'node:path';
import express, { Router, type Request, type RequestHandler, type Response } from 'express';
import { callOf } from '../../middleware/call';
import { page } from '../page';

/** What the build names by its content never changes under that name. */
const hashed = /-[A-Z0-9]{8}\.\w+$/;

/** Paths of the service's own: nothing of the console is there. */
const ours = /^\/(v1|docs|problems|elements|healthz|readyz|metrics)(\/|$)/;

const policyFor = (nonce: string): string =>
  [
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
  ].join('; ');

/** Angular gives the nonce that stands here to every style that it adds. */
const withNonce = (index: string, nonce: string): string =>
  index.replace('<app-root', `<app-root ngCspNonce="${nonce}"`);

/** The page of the console, read again when it was built anew; undefined when there is none. */
class IndexPage {
  private text = '';
  private changed = Number.NaN;

  constructor(private readonly file: string) {}

  async read(): Promise<string | undefined> {
    try {
      const { mtimeMs } = await stat(this.file);
      if (mtimeMs !== this.changed) {
        this.text = await readFile(this.file, 'utf8');
        this.changed = mtimeMs;
      }
      return this.text;
    } catch (error) {
      if (isMissing(error)) return undefined;
      throw error;
    }
  }
}

const isMissing = (error: unknown): boolean =>
  typeof error === 'object' && error !== null && 'code' in error && error.code === 'ENOENT';

const notBuilt = page(
  'The console is not built',
  `<h1>The console is not built</h1>
<p>This address belongs to the console, which is made from the same repository and is not there:
<code>npm start</code> builds it and says why when it cannot.</p>
<p><a href="/">To the first page</a> · <a href="/docs/">API documentation</a></p>`,
);

function sendPage(response: Response, status: number, text: string, policy: string): void {
  response.status(status);
  response.setHeader('Content-Security-Policy', policy);
  response.setHeader('Content-Type', 'text/html; charset=utf-8');
  response.setHeader('Cache-Control', 'no-store');
  response.setHeader('Vary', 'Accept');
  response.setHeader('Content-Length', Buffer.byteLength(text));
  response.end(text);
}

/** A browser that opens an address; programs that take anything get the API's own answers. */
const wantsPage = (request: Request): boolean => request.accepts(['json', 'html']) === 'html';

/**
 * The console: its files, and for every address of its own the one page, with a nonce made for this
 * answer alone. Without a build the first page stays the service's own.
 */
export function consoleFiles(folder: string): RequestHandler {
  const index = new IndexPage(join(folder, 'index.html'));
  const router = Router({ caseSensitive: true, strict: true });
  const files = express.static(folder, {
    index: false,
    redirect: false,
    dotfiles: 'ignore',
    setHeaders: (response, path) => {
      response.setHeader(
        'Cache-Control',
        hashed.test(path) ? 'public, max-age=31536000, immutable' : 'no-cache',
      );
    },
  });
  router.use((request, response, next) => {
    const reads = request.method === 'GET' || request.method === 'HEAD';
    if (!reads || ours.test(request.path) || request.path === '/index.html') {
      next('router');
      return;
    }
    callOf(response).route = 'console';
    next();
  });
  router.use(files as RequestHandler);
  router.use(async (request, response, next) => {
    const isFirst = request.path === '/';
    const text = isFirst || wantsPage(request) ? await index.read() : undefined;
    if (text !== undefined) {
      const nonce = randomBytes(18).toString('base64');
      sendPage(response, 200, withNonce(text, nonce), policyFor(nonce));
    } else if (!isFirst && wantsPage(request)) {
      const policy = notBuilt.headers?.['Content-Security-Policy'] ?? "default-src 'none'";
      sendPage(response, 404, String(notBuilt.body), policy);
    } else next();
  });
  return router;
}
