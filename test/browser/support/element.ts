import type { Locator, Page } from 'playwright-core';

/** The element of any check. */
export const anyCheck = 'headtree-waler, headtree-section, headtree-stress';

/** The element as a page's script sees it. */
export interface WalerElement extends HTMLElement {
  key: string;
  value: object | null;
  readonly result: { readonly status: string; readonly utilisation: number | null } | null;
  check(): Promise<unknown>;
  reset(): void;
}

export const waler = (page: Page): Locator => page.locator('headtree-waler');

/** The one element of a page, of whichever check it is. */
export const check = (page: Page): Locator => page.locator(anyCheck);

/** Waits for the answer to what the fields hold; gives its status. */
export async function answerOf(page: Page): Promise<string> {
  const status = await page.waitForFunction(
    (any) => document.querySelector<WalerElement>(any)?.result?.status,
    anyCheck,
  );
  return String(await status.jsonValue());
}

/** Counts what the element tells, from before it is there, at the document and at the element. */
export interface Told {
  readonly name: string;
  readonly at: 'document' | 'window';
  readonly bubbles: boolean;
  readonly composed: boolean;
  readonly status?: string;
  readonly kind?: string;
  readonly spans?: readonly number[];
}

export async function rememberEvents(page: Page): Promise<void> {
  await page.addInitScript(() => {
    const told: unknown[] = [];
    Object.assign(window, { told });
    for (const name of ['headtree-input', 'headtree-result', 'headtree-error'])
      document.addEventListener(name, (event) => {
        const { detail, bubbles, composed } = event as CustomEvent<{
          value?: { spans?: number[] };
          result?: { status: string };
          kind?: string;
        }>;
        const { value, result, kind } = detail;
        told.push({ name, bubbles, composed, status: result?.status, kind, spans: value?.spans });
      });
  });
}

export const told = (page: Page): Promise<Told[]> =>
  page.evaluate(() => (window as unknown as { told: Told[] }).told);

/** The field of a label, in the shadow root. */
export const field = (page: Page, label: string | RegExp): Locator =>
  check(page).getByLabel(label, { exact: true });
