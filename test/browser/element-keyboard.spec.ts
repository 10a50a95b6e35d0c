import type { Page } from 'playwright-core';
import { startBench, type Bench } from './support/browser';
import { answerOf, type WalerElement } from './support/element';
import { keyboardOf, type Keyboard } from './support/keyboard';

/** A waler from an empty form to its working, without a pointer. */
let bench: Bench;
let page: Page;
let keyboard: Keyboard;
beforeAll(async () => {
  bench = await startBench();
  page = await bench.open({
    before: '<a href="#" id="before">Before</a>',
    after: '<a href="#" id="after">After</a>',
  });
  keyboard = keyboardOf(page);
});
afterAll(() => bench.stop());

const valueOf = (): Promise<unknown> =>
  page.evaluate(() => document.querySelector<WalerElement>('headtree-waler')?.value);

it('fills the form, reads the answer and its working, and leaves', async () => {
  await page.locator('#before').focus();
  await keyboard.tabTo(/^Section$/);
  await page.keyboard.type('UB 457x191x67');
  await page.waitForTimeout(400);
  await page.keyboard.press('Escape');
  await keyboard.tabTo(/^Steel/);
  await page.keyboard.type('S275');
  await keyboard.tabTo(/^Spans$/);
  await page.keyboard.type('3 + 3 + 2,4');
  await keyboard.tabTo(/^Bearing at props$/);
  await page.keyboard.type('0.2');
  await keyboard.tabTo(/^Deflection limit$/);
  await page.keyboard.type('span/200');
  await keyboard.tabTo(/^(Name of the load|Add load)$/);
  if ((await keyboard.focused()) === 'Add load') {
    await page.keyboard.press('Enter');
    await page.waitForTimeout(100);
    if (!(await keyboard.focused()).includes('Name of the load'))
      await keyboard.tabTo(/^Name of the load$/);
  }
  await page.keyboard.type('earth');
  await keyboard.tabTo(/^Value$/);
  await page.keyboard.type('60');
  expect(await valueOf()).toMatchObject({ section: 'UB 457x191x67', spans: [3, 3, 2.4] });
  const status = await answerOf(page);
  expect(['pass', 'fail', 'incomplete']).toContain(status);

  // From a verification to its working.
  await keyboard.tabTo(/^(Bending|Shear)/);
  await page.keyboard.press('Enter');
  await page.waitForTimeout(300);
  expect(await page.locator('headtree-waler math').count()).toBeGreaterThan(0);
  expect(await page.locator('headtree-waler details[open] math').first().isVisible()).toBe(true);

  await keyboard.tabTo(/^After$/, 120);
});

it('shows where the focus is at every stop', async () => {
  expect(await keyboard.unseenStops('#before', 'After')).toEqual([]);
});
