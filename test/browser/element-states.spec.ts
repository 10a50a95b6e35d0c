import type { Page } from 'playwright-core';
import { axe, axeColours } from './support/axe';
import { startBench, type Bench } from './support/browser';
import { waler } from './support/element';
import { states } from './support/states';

/** Each state, for those who see, hear or enlarge it. */
let bench: Bench;
beforeAll(async () => {
  bench = await startBench();
});
afterAll(() => bench.stop());

const statuses = ['pass', 'fail', 'incomplete', 'provisional'];
const passGreen = 'rgb(46, 107, 74)';

/** Waits until the drawings are drawn again and the page is no wider than its window. */
const fitsItsWidth = (page: Page): Promise<unknown> =>
  page.waitForFunction(
    () => document.documentElement.scrollWidth === document.documentElement.clientWidth,
    undefined,
    { timeout: 5_000 },
  );

/** Every colour in the margin where the answer stands. */
const colours = (page: Page): Promise<string[]> =>
  waler(page).evaluate((node) =>
    [...(node.shadowRoot?.querySelectorAll('.ht-margin *') ?? [])].flatMap((element) => {
      const { color, backgroundColor, fill, stroke } = getComputedStyle(element);
      return [color, backgroundColor, fill, stroke];
    }),
  );

describe.each(Object.keys(states))('%s', (name) => {
  let page: Page;
  beforeAll(async () => {
    const state = states[name];
    page = await bench.open({ ...state?.options, reducedMotion: 'reduce' });
    await state?.reach(page);
  });
  afterAll(() => page.context().close());

  it('has nothing in the colour of a pass unless it is one', async () => {
    const isGreen = (await colours(page)).includes(passGreen);
    expect(isGreen).toBe(['pass', 'readonly'].includes(name));
  });

  if (statuses.includes(name))
    it('is told by a word, a shape and a state that a page can style', async () => {
      const status = waler(page).locator('.ht-status');
      expect((await status.textContent())?.trim().toLowerCase()).toContain(name);
      expect(await status.locator('svg').count()).toBe(1);
      expect(await page.locator(`headtree-waler:state(${name})`).count()).toBe(1);
    });

  if (name === 'pass')
    it('says beside its status what was waived and why', async () => {
      const panel = (await waler(page).locator('.ht-margin').textContent()) ?? '';
      expect(panel).toMatch(/Waived, not verified: transverse force.*stiffeners at every prop/);
      expect(panel).not.toContain('Everything this check owes was verified');
    });

  it('holds WCAG 2.2 AA by axe, light and dark', async () => {
    expect(await axe(page)).toEqual([]);
    await page.emulateMedia({ colorScheme: 'dark' });
    expect(await axeColours(page)).toEqual([]);
    await page.emulateMedia({ colorScheme: 'light' });
  });

  it('holds it at 320 px too, where the page never scrolls sideways', async () => {
    await page.setViewportSize({ width: 320, height: 640 });
    await fitsItsWidth(page);
    expect(await axe(page)).toEqual([]);
    await fitsItsWidth(page);
  });
});
