import type { Page } from 'playwright-core';
import { axe, axeColours } from './axe';
import type { Bench } from './browser';
import { check } from './element';
import type { State } from './states';

const passGreen = 'rgb(46, 107, 74)';

/** Waits until the drawings are drawn again and the page is no wider than its window. */
const fitsItsWidth = (page: Page): Promise<unknown> =>
  page.waitForFunction(
    () => document.documentElement.scrollWidth === document.documentElement.clientWidth,
    undefined,
    { timeout: 5_000 },
  );

/** Waits until every box that scrolls inside itself is one that the keyboard reaches: observers tell it. */
const scrollsAreTold = async (page: Page): Promise<void> => {
  const element = await check(page).elementHandle();
  await page.waitForFunction(
    (node) =>
      [...(node.shadowRoot?.querySelectorAll('.ht-scroll') ?? [])]
        // What is folded away is measured when it opens.
        .filter((box) => box.checkVisibility())
        .filter((box) => box.querySelector('a, button, input, select, [tabindex]') === null)
        .every((box) => box.scrollWidth <= box.clientWidth + 1 || box.hasAttribute('tabindex')),
    element,
    { timeout: 5_000 },
  );
};

/** Every colour in the margin where the answer stands. */
const colours = (page: Page): Promise<string[]> =>
  check(page).evaluate((node) =>
    [...(node.shadowRoot?.querySelectorAll('.ht-margin *') ?? [])].flatMap((element) => {
      const { color, backgroundColor, fill, stroke } = getComputedStyle(element);
      return [color, backgroundColor, fill, stroke];
    }),
  );

/** What holds of each state, whichever element it is of. */
export function describeStates(states: Readonly<Record<string, State>>, bench: () => Bench): void {
  describe.each(Object.entries(states))('%s', (_, state) => {
    let page: Page;
    beforeAll(async () => {
      page = await bench().open({ ...state.options, reducedMotion: 'reduce' });
      await state.reach(page);
    });
    afterAll(() => page.context().close());

    it('has nothing in the colour of a pass unless it is one', async () => {
      const isGreen = (await colours(page)).includes(passGreen);
      expect(isGreen).toBe(state.status === 'pass');
    });

    const { status: word } = state;
    if (word !== undefined)
      it('is told by a word, a shape and a state that a page can style', async () => {
        const status = check(page).locator('.ht-status');
        expect((await status.textContent())?.trim().toLowerCase()).toContain(word);
        expect(await status.locator('svg').count()).toBe(1);
        expect(
          await check(page)
            .and(page.locator(`:state(${word})`))
            .count(),
        ).toBe(1);
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
      await scrollsAreTold(page);
      expect(await axe(page)).toEqual([]);
      await fitsItsWidth(page);
    });
  });
}
