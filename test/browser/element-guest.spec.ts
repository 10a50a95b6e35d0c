import type { Page } from 'playwright-core';
import { startBench, type Bench } from './support/browser';
import { failing, passing } from './support/waler';

/** The element as a guest on somebody else's page: it leaves no trace and suffers none. */
let bench: Bench;
beforeAll(async () => {
  bench = await startBench();
});
afterAll(() => bench.stop());

/** What the page says on its console, from the start. */
function listen(said: string[]) {
  return async (page: Page): Promise<void> => {
    page.on('console', (message) => said.push(`${message.type()} ${message.text()}`));
    page.on('pageerror', (error) => said.push(`thrown ${error.message}`));
    await page.addInitScript(() => {
      const seen: string[] = [];
      Object.assign(window, { seenViolations: seen, namesBefore: Object.keys(window) });
      document.addEventListener('securitypolicyviolation', (event) =>
        seen.push(`${event.violatedDirective} ${event.blockedURI}`),
      );
    });
  };
}

const violations = (page: Page): Promise<string[]> =>
  page.evaluate(() => (window as unknown as { seenViolations: string[] }).seenViolations);

const answered = (page: Page): Promise<unknown> =>
  page.waitForFunction(() => {
    const element = document.querySelector('headtree-waler');
    return element && 'result' in element && element.result !== null;
  });

describe('a page with a strict policy', () => {
  it('is not told of one violation, with everything of the element in use', async () => {
    const said: string[] = [];
    const { url } = bench.service;
    const page = await bench.open({
      value: passing,
      prepare: listen(said),
      policy:
        `default-src 'none'; script-src ${url}; connect-src ${url}; font-src ${url}; ` +
        "style-src 'none'; base-uri 'none'; form-action 'none'; " +
        "require-trusted-types-for 'script'; trusted-types angular",
    });
    await answered(page);
    for (const details of await page.locator('headtree-waler details > summary').all())
      await details.click();
    // Formulas come after the text that stands in for them, and their font after them.
    await page.waitForFunction(() =>
      [...document.fonts].some(
        ({ family, status }) => family.includes('Headtree Math') && status === 'loaded',
      ),
    );
    await page.evaluate(() => document.fonts.ready);
    expect(await violations(page)).toEqual([]);
    expect(said).toEqual([]);
    const fonts = await page.evaluate(() =>
      [...document.fonts].filter(({ status }) => status === 'loaded').map(({ family }) => family),
    );
    expect(new Set(fonts.map((family) => family.replaceAll('"', '')))).toEqual(
      new Set(['Headtree Sans', 'Headtree Mono', 'Headtree Math']),
    );
  });
});

describe('a second copy of the script', () => {
  it('warns, names both versions and does no harm', async () => {
    const said: string[] = [];
    const script = `${bench.service.url}/elements/v1/headtree-elements.js`;
    const page = await bench.open({
      value: passing,
      prepare: listen(said),
      head: `<script src="${script}?v=other" async></script>`,
    });
    await answered(page);
    await page.addScriptTag({ url: `${script}?v=late` });
    await page.waitForTimeout(200);
    const version =
      /Headtree elements (\d+\.\d+\.\d+): <headtree-waler> is defined already, by Headtree elements \1\./;
    expect(said).toHaveLength(2);
    for (const line of said) expect(line).toMatch(version);
    expect(await page.locator('headtree-waler').count()).toBe(1);
  });
});

describe('the page', () => {
  it('gets no global name', async () => {
    const page = await bench.open({ value: passing, prepare: listen([]) });
    await answered(page);
    const added = await page.evaluate(() => {
      const { namesBefore } = window as unknown as { namesBefore: string[] };
      return Object.keys(window).filter(
        (name) => ![...namesBefore, 'namesBefore', 'seenViolations'].includes(name),
      );
    });
    expect(added).toEqual([]);
  });

  it('gets no style and no change outside the element', async () => {
    const page = await bench.open({ value: passing });
    await answered(page);
    expect(await page.locator('style, link').count()).toBe(0);
    expect(await page.evaluate(() => document.adoptedStyleSheets.length)).toBe(0);
    expect(
      await page.evaluate(() => document.head.children.length + document.body.children.length),
    ).toBe(6);
  });

  it('keeps its focus', async () => {
    const page = await bench.open({
      value: passing,
      before: '<input id="own" autofocus>',
    });
    await answered(page);
    expect(await page.evaluate(() => document.activeElement?.id)).toBe('own');
  });
});

const hostile = `<style>
* { all: unset !important; color: red !important; font: 40px/3 fantasy !important;
  letter-spacing: 1em !important; text-transform: uppercase !important; direction: rtl !important;
  --ink: red !important; --paper: red !important; --sheet: red !important; }
*::before { content: 'x' !important; }
</style>`;

/** How every element in the shadow root is drawn. */
const drawn = (page: Page): Promise<string[]> =>
  page.evaluate(() => {
    const root = document.querySelector('headtree-waler')?.shadowRoot;
    const names = [
      ...['color', 'backgroundColor', 'font', 'letterSpacing', 'textTransform', 'direction'],
      ...['display', 'padding', 'margin', 'border', 'cursor', 'textAlign', 'whiteSpace'],
    ] as const;
    return [...(root?.querySelectorAll('*') ?? [])].map((element) => {
      const style = getComputedStyle(element);
      return [element.tagName, ...names.map((name) => style[name as 'color'])].join(' | ');
    });
  });

describe('a hostile style sheet', () => {
  it('changes nothing in the element', async () => {
    const calm = await bench.open({
      value: failing,
      head: '<style>body { margin: 0; }</style>',
    });
    const under = await bench.open({ value: failing, head: hostile });
    await Promise.all([answered(calm), answered(under)]);
    const wanted = await drawn(calm);
    expect(wanted.length).toBeGreaterThan(20);
    const changed = (await drawn(under)).filter((line, i) => line !== wanted[i]);
    expect(changed.slice(0, 3)).toEqual([]);
  });

  it('leaves the element to be laid out and hidden by the page', async () => {
    const page = await bench.open({
      value: passing,
      head: '<style>headtree-waler { margin: 7px; max-width: 600px; }</style>',
    });
    const element = page.locator('headtree-waler');
    expect((await element.boundingBox())?.width).toBe(600);
    await element.evaluate((node) => ((node as HTMLElement).hidden = true));
    expect(await element.isVisible()).toBe(false);
  });
});

describe('a secret key', () => {
  const secret = 'htk_0123456789ab_0123456789012345678901234567890123456789012abcdef';

  it.each([
    ['in the attribute', { key: secret }],
    ['in the property', { key: '' }],
  ])('%s is refused where it can be seen, not sent and not kept', async (_, { key }) => {
    const asked: string[] = [];
    const page = await bench.open({
      key,
      value: passing,
      prepare: async (opened) => {
        opened.on('request', (request) => {
          if (request.url().includes('/v1/checks')) asked.push(request.url());
          const sent = JSON.stringify(request.headers());
          if (sent.includes(secret)) asked.push(`the secret to ${request.url()}`);
        });
        await opened.addInitScript(() => {
          const told: unknown[] = [];
          Object.assign(window, { told });
          document.addEventListener('headtree-error', (event) =>
            told.push((event as CustomEvent<unknown>).detail),
          );
        });
      },
    });
    const element = page.locator('headtree-waler');
    if (key === '')
      await element.evaluate(
        (node, text) => ((node as unknown as { key: string }).key = text),
        secret,
      );
    await page.getByText('This is a secret key').first().waitFor();
    await element.evaluate((node) => (node as unknown as { check(): unknown }).check());
    expect(asked).toEqual([]);
    expect(await page.evaluate(() => document.documentElement.outerHTML)).not.toContain(secret);
    expect(await element.evaluate((node) => (node as unknown as { key: string }).key)).toBe('htk_');
    const told = await page.evaluate(
      () => (window as unknown as { told: { kind: string }[] }).told,
    );
    expect(told.map(({ kind }) => kind)).toContain('secret-key');
  });
});
