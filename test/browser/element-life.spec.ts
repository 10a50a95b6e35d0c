import type { Page } from 'playwright-core';
import { startBench, type Bench } from './support/browser';
import { answerOf, field, rememberEvents, told, waler, type WalerElement } from './support/element';
import { startSite } from './support/site';
import { failing, passing } from './support/waler';

/** The element through all that a page and a network do to it. */
let bench: Bench;
beforeAll(async () => {
  bench = await startBench();
});
afterAll(() => bench.stop());

const spansOf = (page: Page): Promise<unknown> =>
  waler(page)
    .evaluate((node) => (node as WalerElement).value as { spans?: unknown } | null)
    .then((value) => value?.spans);

/** Types a change and waits until it is answered. */
async function changeSpans(page: Page, text: string): Promise<void> {
  await field(page, 'Spans').fill(text);
  await page.waitForFunction(() => {
    const element = document.querySelector<WalerElement>('headtree-waler');
    return element?.result === null;
  });
  await answerOf(page);
}

/** What an engineer sees and has typed. */
const seen = async (page: Page): Promise<unknown> => ({
  spans: await field(page, 'Spans').inputValue(),
  section: await field(page, 'Section').inputValue(),
  result: await waler(page).evaluate((node) => (node as WalerElement).result?.utilisation),
  words: (await waler(page).evaluate((node) => node.shadowRoot?.textContent))?.length,
});

describe('an element that is taken out and put back', () => {
  it.each([
    ['at once', 0],
    ['100 ms later', 100],
  ])('%s keeps its fields, its answer and its events', async (_, pause) => {
    const page = await bench.open({ value: passing, prepare: rememberEvents });
    await answerOf(page);
    await changeSpans(page, '2.5 + 3 + 2.5');
    const before = await seen(page);
    await waler(page).evaluate(async (node, wait) => {
      const { parentElement } = node;
      node.remove();
      if (wait > 0) await new Promise((resolve) => setTimeout(resolve, wait));
      parentElement?.append(node);
    }, pause);
    await page.waitForTimeout(50);
    expect(await seen(page)).toEqual(before);
    expect(await spansOf(page)).toEqual([2.5, 3, 2.5]);
    await changeSpans(page, '2 + 2');
    expect((await told(page)).at(-1)).toMatchObject({ name: 'headtree-result' });
  });

  it('moves between parents and shadow roots without beginning anew', async () => {
    const page = await bench.open({ value: passing, after: '<div id="other"></div>' });
    await answerOf(page);
    await changeSpans(page, '2.5 + 3 + 2.5');
    const before = await seen(page);
    const same = await waler(page).evaluate((node) => {
      const first = node.shadowRoot?.querySelector('input');
      const other = document.querySelector('#other');
      other?.append(node);
      other?.attachShadow({ mode: 'open' }).append(node);
      return first?.isConnected === true && first === node.shadowRoot?.querySelector('input');
    });
    expect(same).toBe(true);
    expect(await seen(page)).toEqual(before);
  });

  it('is made anew with what was typed when it comes back after it was given up', async () => {
    const page = await bench.open({ value: passing });
    await answerOf(page);
    await changeSpans(page, '2.5 + 3 + 2.5');
    await page.clock.install();
    const node = await page.waitForSelector('headtree-waler');
    await node.evaluate((element) => element.remove());
    await page.clock.runFor(40_000);
    expect(
      await node.evaluate((element) => element.shadowRoot?.querySelector('input') ?? null),
    ).toBeNull();
    await node.evaluate((element) => document.body.append(element));
    await page.clock.resume();
    expect(await answerOf(page)).toBe('pass');
    expect(await spansOf(page)).toEqual([2.5, 3, 2.5]);
  });
});

describe('events', () => {
  it('bubble, cross shadow roots and carry what they say', async () => {
    const page = await bench.open({ prepare: rememberEvents });
    await page.evaluate((value) => {
      const element = document.querySelector<WalerElement>('headtree-waler');
      const host = document.body.appendChild(document.createElement('div'));
      if (element) host.attachShadow({ mode: 'open' }).append(element);
      if (element) element.value = value;
    }, passing);
    await page.waitForFunction(() => (window as unknown as { told: unknown[] }).told.length > 0);
    expect((await told(page)).at(-1)).toEqual({
      name: 'headtree-result',
      bubbles: true,
      composed: true,
      status: 'pass',
      spans: passing.spans,
    });
  });

  it('tell why there is no answer', async () => {
    const page = await bench.open({ value: passing, prepare: rememberEvents, key: 'htp_none' });
    await page.waitForFunction(() => (window as unknown as { told: unknown[] }).told.length > 0);
    expect((await told(page))[0]).toMatchObject({ name: 'headtree-error', kind: 'key-refused' });
  });
});

describe('a form', () => {
  it('gets the value as JSON, and puts it back on reset', async () => {
    const page = await bench.open({
      value: passing,
      attributes: 'name="waler"',
      before: '<form id="form">',
      after: '</form>',
    });
    await page.evaluate(() => {
      const form = document.querySelector<HTMLFormElement>('#form');
      const element = document.querySelector('headtree-waler');
      if (element) form?.append(element);
    });
    await answerOf(page);
    await changeSpans(page, '2,5 + 3 + 2.5');
    const sent = (): Promise<unknown> =>
      page.evaluate(() => {
        const form = document.querySelector<HTMLFormElement>('#form');
        const text = form && new FormData(form).get('waler');
        return typeof text === 'string' ? (JSON.parse(text) as { spans: unknown }).spans : text;
      });
    expect(await sent()).toEqual([2.5, 3, 2.5]);
    await page.evaluate(() => document.querySelector<HTMLFormElement>('#form')?.reset());
    await page.waitForTimeout(100);
    expect(await field(page, 'Spans').inputValue()).toMatch(/^3(\.0)? \+ 3(\.0)? \+ 2\.4$/);
    expect(await sent()).toEqual(passing.spans);
  });
});

describe('a slow network', () => {
  it('shows the answer to the last request only', async () => {
    const page = await bench.open({ value: passing, prepare: rememberEvents });
    await answerOf(page);
    let calls = 0;
    await page.route('**/v1/checks/waler*', async (route) => {
      // The first answer comes last.
      await new Promise((resolve) => setTimeout(resolve, calls++ === 0 ? 1_500 : 50));
      await route.continue().catch(() => undefined);
    });
    await field(page, 'Spans').fill('2.5 + 3 + 2.5');
    await page.waitForTimeout(600);
    await field(page, 'Spans').fill('2 + 2');
    await answerOf(page);
    await page.waitForTimeout(1_700);
    const results = (await told(page)).filter(({ name }) => name === 'headtree-result');
    expect(results.slice(1).map(({ spans }) => spans)).toEqual([[2, 2]]);
    expect(await spansOf(page)).toEqual([2, 2]);
  });
});

describe('a service that goes away', () => {
  it('is told as such, and the check runs by itself when it is back', async () => {
    const page = await bench.open({ value: passing, prepare: rememberEvents });
    await answerOf(page);
    await bench.service.goAway();
    await field(page, 'Spans').fill('2.5 + 3 + 2.5');
    await page.getByText('The service does not answer').first().waitFor();
    expect((await told(page)).at(-1)).toMatchObject({ name: 'headtree-error', kind: 'away' });
    expect(await spansOf(page)).toEqual([2.5, 3, 2.5]);
    await bench.service.comeBack();
    expect(await answerOf(page)).toBe('pass');
    await page.getByText('The service does not answer').first().waitFor({ state: 'hidden' });
    expect((await told(page)).at(-1)).toMatchObject({ spans: [2.5, 3, 2.5] });
  });
});

describe('a page whose origin no key lists', () => {
  it('is told so, not that the service is away', async () => {
    const stranger = await startSite();
    const page = await bench.open({ value: passing, prepare: rememberEvents, site: stranger });
    await page.getByText(`its origin ${stranger.origin} is on the list of no page key`).waitFor();
    const [first] = await told(page);
    expect(first).toMatchObject({ name: 'headtree-error', kind: 'not-allowed' });
    await page.context().close();
    await stranger.stop();
  });
});

describe('a page that makes many', () => {
  it('is not left with those it took out', async () => {
    const page = await bench.open({ value: failing });
    await answerOf(page);
    const session = await page.context().newCDPSession(page);
    const nodes = async (): Promise<number> => {
      await session.send('HeapProfiler.collectGarbage');
      const { nodes: count } = await session.send('Memory.getDOMCounters');
      return count;
    };
    const makeMany = (count: number): Promise<void> =>
      page.evaluate(async (many) => {
        const first = document.querySelector('headtree-waler');
        const batch = 20;
        for (let made = 0; made < many; made += batch) {
          const elements = Array.from({ length: batch }, () =>
            document.createElement('headtree-waler'),
          );
          first?.after(...elements);
          await new Promise((resolve) => requestAnimationFrame(resolve));
          for (const element of elements) element.remove();
        }
      }, count);
    await page.clock.install();
    await page.clock.resume();
    await makeMany(20);
    await page.clock.runFor(40_000);
    const before = await nodes();
    await makeMany(200);
    await page.clock.runFor(40_000);
    const after = await nodes();
    const perElement = await waler(page).evaluate(
      (node) => node.shadowRoot?.querySelectorAll('*').length ?? 0,
    );
    expect(perElement).toBeGreaterThan(10);
    expect(after - before).toBeLessThan(5 * perElement);
  });
});
