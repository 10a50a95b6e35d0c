import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';
import { startService, type RunningService } from './service';
import { startSite, type Site } from './site';
import { profile } from './waler';

const flags = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** A browser, the service and a site of another origin with a page key of its own. */
export interface Bench {
  readonly browser: Browser;
  readonly service: RunningService;
  readonly site: Site;
  readonly key: string;
  /** Opens a page of the site that holds the element, and waits until it can be used. */
  open(options?: OpenOptions): Promise<Page>;
  stop(): Promise<void>;
}

export interface OpenOptions {
  /** Which element the page holds; a waler's unless said. */
  readonly element?: 'headtree-waler' | 'headtree-section' | 'headtree-stress';
  readonly value?: object;
  /** Another site than the one that the page key lists. */
  readonly site?: Site;
  readonly key?: string;
  readonly attributes?: string;
  /** Put into the head. */
  readonly head?: string;
  /** Put before and after the element. */
  readonly before?: string;
  readonly after?: string;
  readonly policy?: string;
  readonly width?: number;
  readonly height?: number;
  readonly colorScheme?: 'light' | 'dark';
  readonly forcedColors?: 'active' | 'none';
  readonly reducedMotion?: 'reduce';
  /** Called with the page before it loads anything. */
  readonly prepare?: (page: Page) => Promise<unknown>;
}

export async function startBrowser(): Promise<Browser> {
  const executablePath = process.env.HEADTREE_BROWSER ?? '/usr/bin/chromium';
  return chromium.launch({ executablePath, args: flags });
}

export async function startBench(): Promise<Bench> {
  const [browser, service, site] = await Promise.all([startBrowser(), startService(), startSite()]);
  const key = await service.addKey('page', [site.origin]);
  const contexts = new Set<BrowserContext>();
  let pages = 0;
  return {
    browser,
    service,
    site,
    key,
    open: async (options = {}) => {
      const { width = 1440, height = 1000, policy, prepare } = options;
      const { colorScheme, forcedColors, reducedMotion } = options;
      const context = await browser.newContext({
        viewport: { width, height },
        ...(colorScheme && { colorScheme }),
        ...(forcedColors && { forcedColors }),
        ...(reducedMotion && { reducedMotion }),
      });
      contexts.add(context);
      const page = await context.newPage();
      await prepare?.(page);
      const html = htmlOf(service.url, { key, ...options });
      await page.goto(
        (options.site ?? site).put(`/${++pages}`, { html, ...(policy && { policy }) }),
      );
      await page.waitForFunction(() => customElements.get('headtree-waler') !== undefined);
      return page;
    },
    stop: async () => {
      await Promise.allSettled([...contexts].map((context) => context.close()));
      await browser.close();
      await Promise.allSettled([service.stop(), site.stop()]);
    },
  };
}

const escaped = (text: string): string =>
  text.replace(/[&<>"]/g, (sign) => `&#${sign.charCodeAt(0)};`);

/** A page as a firm would write it. */
export function htmlOf(service: string, options: OpenOptions): string {
  const {
    element = 'headtree-waler',
    key = '',
    value,
    attributes = '',
    head = '',
    before = '',
    after = '',
  } = options;
  const given = value ? ` value="${escaped(JSON.stringify(value))}"` : '';
  return `<!doctype html><html lang="en"><head><meta charset="utf-8"><title>Temporary works</title>
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta name="color-scheme" content="light dark">${head}
<script src="${service}/elements/v1/headtree-elements.js" async></script></head>
<body>${before}<main><h1>Design aids</h1>
<${element} key="${key}" profile="${profile}"${given} ${attributes}></${element}>
</main>${after}</body></html>`;
}
