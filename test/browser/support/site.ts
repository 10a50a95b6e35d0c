import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';

/** A page of somebody else's, on an origin of its own. */
export interface SitePage {
  readonly html: string;
  readonly policy?: string;
}

export interface Site {
  readonly origin: string;
  /** Puts a page at a path; gives its address. */
  put(path: string, page: SitePage): string;
  stop(): Promise<void>;
}

/** A site of another origin whose pages the spec writes. */
export async function startSite(): Promise<Site> {
  const pages = new Map<string, SitePage>();
  const server = createServer((request, response) => {
    if (request.url === '/favicon.ico') return response.writeHead(204).end();
    const page = pages.get(request.url ?? '/');
    if (!page) return response.writeHead(404).end();
    return response
      .writeHead(200, {
        'Content-Type': 'text/html; charset=utf-8',
        ...(page.policy && { 'Content-Security-Policy': page.policy }),
      })
      .end(page.html);
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const origin = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  return {
    origin,
    put: (path, page) => {
      pages.set(path, page);
      return origin + path;
    },
    stop: async () => {
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
    },
  };
}
