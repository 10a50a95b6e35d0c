import type { Page } from 'playwright-core';
import { startBench, type Bench, type OpenOptions } from './support/browser';
import { answerOf, anyCheck, check, type WalerElement } from './support/element';
import { keyboardOf, type Keyboard } from './support/keyboard';

/** A cross-section and states of stress from an empty form to the working, without a pointer. */
let bench: Bench;
beforeAll(async () => {
  bench = await startBench();
});
afterAll(() => bench.stop());

async function opened(
  element: NonNullable<OpenOptions['element']>,
): Promise<{ page: Page; keyboard: Keyboard }> {
  const page = await bench.open({
    element,
    before: '<a href="#" id="before">Before</a>',
    after: '<a href="#" id="after">After</a>',
  });
  await page.locator('#before').focus();
  return { page, keyboard: keyboardOf(page) };
}

const valueOf = (page: Page): Promise<unknown> =>
  page.evaluate((any) => document.querySelector<WalerElement>(any)?.value, anyCheck);

it('fills in a cross-section by its dimensions, reads the answer and leaves', async () => {
  const { page, keyboard } = await opened('headtree-section');
  const write = async (label: RegExp, text: string): Promise<void> => {
    await keyboard.tabTo(label);
    await page.keyboard.type(text);
  };
  await write(/^Section by$/, 'SHS, hot');
  await write(/^Steel$/, 'S355');
  await write(/^h, side$/, '150');
  await write(/^t, walls$/, '8');
  await write(/^Axial force$/, 'tension');
  await write(/^N, tension$/, '200');
  await write(/^My, about y-y$/, '24,5');
  await write(/^T, torsion$/, '6 kNm');
  expect(await answerOf(page)).toBe('pass');
  expect(await valueOf(page)).toMatchObject({
    section: { shape: 'SHS', h: 150, t: 8, forming: 'hot-finished' },
    effects: { tension: 200, My: 24.5, T: 6 },
  });
  await keyboard.tabTo(/^Bending about y-y/);
  await page.keyboard.press('Enter');
  await check(page).locator('details[open] math').first().waitFor();
  expect(await keyboard.unseenStops('#before', 'After')).toEqual([]);
});

it('writes states of stress in rows, takes one out and leaves', async () => {
  const { page, keyboard } = await opened('headtree-stress');
  await keyboard.tabTo(/^a section under design effects$/);
  await page.keyboard.press('ArrowDown');
  await keyboard.tabTo(/^Steel$/);
  await page.keyboard.type('S275');
  await keyboard.tabTo(/^Stress along the member$/);
  await page.keyboard.type('180');
  await keyboard.tabTo(/^Shear stress$/);
  await page.keyboard.type('65');
  await page.keyboard.press('Enter');
  await page.waitForTimeout(100);
  expect(await keyboard.focused()).toBe('Stress along the member');
  await page.keyboard.type('-12,5');
  await page.waitForFunction(
    (any) => JSON.stringify(document.querySelector<WalerElement>(any)?.value).includes('-12.5'),
    anyCheck,
  );
  expect(await answerOf(page)).toBe('pass');
  expect(await valueOf(page)).toMatchObject({
    states: [{ sigmaX: 180, tau: 65 }, { sigmaX: -12.5 }],
  });
  await keyboard.tabTo(/^Remove state 2$/);
  await page.keyboard.press('Enter');
  await page.waitForTimeout(100);
  expect(await keyboard.focused()).toBe('Remove state 1');
  expect(await valueOf(page)).toMatchObject({ states: [{ sigmaX: 180, tau: 65 }] });
  expect(await keyboard.unseenStops('#before', 'After')).toEqual([]);
});
