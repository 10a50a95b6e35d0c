import type { Page } from 'playwright-core';
import { startBench, type Bench } from './support/browser';
import { answerOf, type WalerElement } from './support/element';

/** A waler from an empty form to its working, without a pointer. */
let bench: Bench;
let page: Page;
beforeAll(async () => {
  bench = await startBench();
  page = await bench.open({
    before: '<a href="#" id="before">Before</a>',
    after: '<a href="#" id="after">After</a>',
  });
});
afterAll(() => bench.stop());

/** What has the focus, in words, through shadow roots. */
const focused = (): Promise<string> =>
  page.evaluate(() => {
    let at = document.activeElement;
    while (at?.shadowRoot?.activeElement) at = at.shadowRoot.activeElement;
    const field = at instanceof HTMLInputElement || at instanceof HTMLSelectElement ? at : null;
    const words = at?.getAttribute('aria-label') ?? (field?.labels?.[0] ?? at)?.textContent;
    return (words ?? '').trim().replace(/\s+/g, ' ');
  });

/** Tabs on until the focus is where it is wanted. */
async function tabTo(wanted: RegExp, most = 40): Promise<void> {
  for (let i = 0; i < most; i++) {
    await page.keyboard.press('Tab');
    if (wanted.test(await focused())) return;
  }
  throw new Error(`Nothing of ${wanted.source} is met by the Tab key.`);
}

const valueOf = (): Promise<unknown> =>
  page.evaluate(() => document.querySelector<WalerElement>('headtree-waler')?.value);

it('fills the form, reads the answer and its working, and leaves', async () => {
  await page.locator('#before').focus();
  await tabTo(/^Section$/);
  await page.keyboard.type('UB 457x191x67');
  await page.waitForTimeout(400);
  await page.keyboard.press('Escape');
  await tabTo(/^Steel/);
  await page.keyboard.type('S275');
  await tabTo(/^Spans$/);
  await page.keyboard.type('3 + 3 + 2,4');
  await tabTo(/^Bearing at props$/);
  await page.keyboard.type('0.2');
  await tabTo(/^Deflection limit$/);
  await page.keyboard.type('span/200');
  await tabTo(/^(Name of the load|Add load)$/);
  if ((await focused()) === 'Add load') {
    await page.keyboard.press('Enter');
    await page.waitForTimeout(100);
    if (!(await focused()).includes('Name of the load')) await tabTo(/^Name of the load$/);
  }
  await page.keyboard.type('earth');
  await tabTo(/^Value$/);
  await page.keyboard.type('60');
  expect(await valueOf()).toMatchObject({ section: 'UB 457x191x67', spans: [3, 3, 2.4] });
  const status = await answerOf(page);
  expect(['pass', 'fail', 'incomplete']).toContain(status);

  // From a verification to its working.
  await tabTo(/^(Bending|Shear)/);
  await page.keyboard.press('Enter');
  await page.waitForTimeout(300);
  expect(await page.locator('headtree-waler math').count()).toBeGreaterThan(0);
  expect(await page.locator('headtree-waler details[open] math').first().isVisible()).toBe(true);

  await tabTo(/^After$/, 120);
});

it('shows where the focus is at every stop', async () => {
  await page.locator('#before').focus();
  for (let stops = 0; stops < 150; stops++) {
    await page.keyboard.press('Tab');
    const name = await focused();
    if (name === 'After') return;
    const seen = await page.evaluate(() => {
      let at = document.activeElement;
      while (at?.shadowRoot?.activeElement) at = at.shadowRoot.activeElement;
      // A field shows it on the line that it is written on.
      const marked = [at, at?.parentElement ?? null].some((element) => {
        if (!element) return false;
        const { outlineStyle, outlineWidth } = getComputedStyle(element);
        return outlineStyle !== 'none' && Number.parseFloat(outlineWidth) >= 2;
      });
      return marked;
    });
    expect([name, seen]).toEqual([name, true]);
  }
  throw new Error('The Tab key never left the element.');
});
