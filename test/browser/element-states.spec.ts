import type { Page } from 'playwright-core';
import { axe } from './support/axe';
import { startBench, type Bench, type OpenOptions } from './support/browser';
import { waler } from './support/element';
import { states } from './support/states';

/** Each state, for those who see, hear or enlarge it. */
let bench: Bench;
beforeAll(async () => {
  bench = await startBench();
}, 60_000);
afterAll(() => bench.stop());

async function reach(name: string, more: OpenOptions = {}): Promise<Page> {
  const state = states[name];
  if (!state) throw new Error(`No state ${name}`);
  const page = await bench.open({ ...state.options, ...more });
  await state.reach(page);
  return page;
}

const closed = (page: Page): Promise<void> => page.context().close();
const names = Object.keys(states);

describe('accessibility by WCAG 2.2 AA', () => {
  it.each(names)('%s: axe finds nothing', async (name) => {
    const page = await reach(name);
    expect(await axe(page)).toEqual([]);
    await closed(page);
  });

  it.each(['fail', 'offline', 'everything open'])('%s, dark: axe finds nothing', async (name) => {
    const page = await reach(name, { colorScheme: 'dark' });
    expect(await axe(page)).toEqual([]);
    await closed(page);
  });

  it.each(['fail', 'everything open'])('%s, 390 px: axe finds nothing', async (name) => {
    const page = await reach(name, { width: 390, height: 844 });
    expect(await axe(page)).toEqual([]);
    await closed(page);
  });
});

describe('narrow', () => {
  it.each(names)('%s: at 320 px the page never scrolls sideways', async (name) => {
    const page = await reach(name, { width: 320, height: 640, reducedMotion: 'reduce' });
    const { scroll, client } = await page.evaluate(() => {
      const { scrollWidth, clientWidth } = document.documentElement;
      return { scroll: scrollWidth, client: clientWidth };
    });
    expect(scroll).toBe(client);
    await closed(page);
  });
});

describe('a status', () => {
  it.each(['pass', 'fail', 'incomplete', 'provisional'])(
    '%s is a word, a shape and a state that a page can style',
    async (name) => {
      const page = await reach(name);
      const status = waler(page).locator('.ht-status');
      expect((await status.textContent())?.trim().toLowerCase()).toContain(name);
      expect(await status.locator('svg').count()).toBe(1);
      expect(await page.locator(`headtree-waler:state(${name})`).count()).toBe(1);
      await closed(page);
    },
  );

  it('that is no pass has nothing in the colour of a pass', async () => {
    const colours = async (name: string): Promise<Set<string>> => {
      const page = await reach(name);
      const seen = await waler(page).evaluate((node) =>
        [...(node.shadowRoot?.querySelectorAll('.ht-margin *') ?? [])].flatMap((element) => {
          const { color, backgroundColor, fill, stroke } = getComputedStyle(element);
          return [color, backgroundColor, fill, stroke];
        }),
      );
      await closed(page);
      return new Set(seen);
    };
    const green = 'rgb(46, 107, 74)';
    expect([...(await colours('pass'))]).toContain(green);
    for (const name of ['fail', 'incomplete', 'provisional', 'offline', 'empty'])
      expect([...(await colours(name))]).not.toContain(green);
  });
});
