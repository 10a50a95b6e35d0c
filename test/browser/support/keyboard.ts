import type { Page } from 'playwright-core';

/** A page as the keyboard goes through it. */
export interface Keyboard {
  /** What has the focus, in words, through shadow roots. */
  focused(): Promise<string>;
  /** Tabs on until the focus is where it is wanted. */
  tabTo(wanted: RegExp, most?: number): Promise<void>;
  /** Tabs from one link to another and gives what does not show that it has the focus. */
  unseenStops(from: string, to: string): Promise<string[]>;
}

export function keyboardOf(page: Page): Keyboard {
  const focused = (): Promise<string> =>
    page.evaluate(() => {
      let at = document.activeElement;
      while (at?.shadowRoot?.activeElement) at = at.shadowRoot.activeElement;
      const field = at instanceof HTMLInputElement || at instanceof HTMLSelectElement ? at : null;
      const words = at?.getAttribute('aria-label') ?? (field?.labels?.[0] ?? at)?.textContent;
      return (words ?? '').trim().replace(/\s+/g, ' ');
    });
  const isMarked = (): Promise<boolean> =>
    page.evaluate(() => {
      let at = document.activeElement;
      while (at?.shadowRoot?.activeElement) at = at.shadowRoot.activeElement;
      // A field shows it on the line that it is written on.
      return [at, at?.parentElement ?? null].some((element) => {
        if (!element) return false;
        const { outlineStyle, outlineWidth } = getComputedStyle(element);
        return outlineStyle !== 'none' && Number.parseFloat(outlineWidth) >= 2;
      });
    });
  return {
    focused,
    async tabTo(wanted, most = 40) {
      for (let i = 0; i < most; i++) {
        await page.keyboard.press('Tab');
        if (wanted.test(await focused())) return;
      }
      throw new Error(`Nothing of ${wanted.source} is met by the Tab key.`);
    },
    async unseenStops(from, to) {
      const unseen: string[] = [];
      await page.locator(from).focus();
      for (let stops = 0; stops < 150; stops++) {
        await page.keyboard.press('Tab');
        const name = await focused();
        if (name === to) return unseen;
        if (!(await isMarked())) unseen.push(name);
      }
      throw new Error('The Tab key never left the element.');
    },
  };
}
