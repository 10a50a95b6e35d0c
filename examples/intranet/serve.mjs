/**
 * The intranet of an invented firm, on an origin of its own, under a strict policy.
 *
 *   HEADTREE_PAGE_KEY=htp_… node examples/intranet/serve.mjs
 *
 * The page key must list this page's origin, http://127.0.0.1:4320 unless told otherwise.
 */
import { readFileSync } from 'node:fs';
import { createServer } from 'node:http';

const {
  HEADTREE_URL: service = 'http://127.0.0.1:4310',
  HEADTREE_PAGE_KEY: key = '',
  HEADTREE_PROFILE: profile = 'en-recommended',
  INTRANET_PORT: port = '4320',
} = process.env;

/** All that a page needs to allow for the element; it needs no nonce and no 'unsafe-inline'. */
const POLICY = [
  "default-src 'none'",
  `script-src 'self' ${service}`,
  `connect-src ${service}`,
  `font-src ${service}`,
  "style-src 'self'",
  "base-uri 'none'",
  "form-action 'none'",
  "frame-ancestors 'none'",
  "require-trusted-types-for 'script'",
  'trusted-types angular',
].join('; ');

const STEEL = { type: 'steel', grade: 'S275' };

/** The waler that its page begins with. */
const WALER = {
  section: 'UB 457x191x67',
  material: STEEL,
  spans: [3, 3, 2.4],
  loadBasis: 'characteristic',
  loads: [
    { name: 'earth', nature: 'permanent', kind: 'uniform', value: 95 },
    { name: 'surcharge', nature: 'variable', category: 'surcharge', kind: 'uniform', value: 22 },
  ],
  restraint: 'full',
  bearing: { length: 0.2, endDistance: 0.1 },
  deflectionLimit: 'span/200',
};

/** Its cross-section at a prop. */
const SECTION = {
  section: 'UB 457x191x67',
  material: STEEL,
  effects: { compression: 250, My: 180, Vz: 300 },
};

/** Stresses that the firm has from elsewhere. */
const STRESS = {
  material: STEEL,
  states: [
    { sigmaX: 100, tau: 20 },
    { sigmaX: 180, sigmaZ: -40, tau: 65 },
  ],
};

const FILES = {
  '/': ['index.html', 'text/html; charset=utf-8'],
  '/sections': ['sections.html', 'text/html; charset=utf-8'],
  '/site.js': ['site.js', 'text/javascript; charset=utf-8'],
  '/site.css': ['site.css', 'text/css; charset=utf-8'],
};

const escaped = (text) => text.replace(/[&<>"]/g, (sign) => `&#${sign.charCodeAt(0)};`);
const values = { waler: WALER, section: SECTION, stress: STRESS };
const words = {
  service,
  key,
  profile,
  ...Object.fromEntries(
    Object.entries(values).map(([name, value]) => [name, JSON.stringify(value)]),
  ),
};

const server = createServer(({ url = '/' }, response) => {
  const [name, type] = FILES[url.split('?', 1)[0]] ?? [];
  if (!name) return response.writeHead(404, { 'Content-Type': 'text/plain' }).end('Not here.\n');
  const text = readFileSync(new URL(name, import.meta.url), 'utf8');
  response.writeHead(200, {
    'Content-Type': type,
    'Cache-Control': 'no-store',
    'Content-Security-Policy': POLICY,
  });
  response.end(text.replace(/\{\{(\w+)\}\}/g, (_, word) => escaped(words[word])));
});

server.listen(Number(port), '127.0.0.1', () => {
  const { port: taken } = server.address();
  console.log(`Saltmarsh Temporary Works: http://127.0.0.1:${taken} with checks of ${service}`);
  if (key === '') {
    console.log(
      'No page key: have one made in the console for the origin above, then start with it in ' +
        'HEADTREE_PAGE_KEY.',
    );
  }
});
