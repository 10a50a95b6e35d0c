import type { Page, Route } from 'playwright-core';
import type { OpenOptions } from './browser';
import { answerOf, check, field } from './element';
import { failing, incomplete, passing } from './waler';

/** A state of the element: how it is reached and how one knows that it is there. */
export interface State {
  readonly options: OpenOptions;
  /** The status that it is told by, where there is an answer. */
  readonly status?: 'pass' | 'fail' | 'incomplete' | 'provisional';
  /** After the page is open. */
  readonly reach: (page: Page) => Promise<unknown>;
}

const checks = '**/v1/checks/*';

/** The real answer with its status changed, as if the factors were not settled. */
export async function unsettled(route: Route): Promise<void> {
  const response = await route.fetch();
  const answer = (await response.json()) as { profile: object };
  await route.fulfill({
    response,
    json: {
      ...answer,
      status: 'provisional',
      profile: { ...answer.profile, status: 'draft' },
    },
  });
}

/** The script has come, and then nothing more does. */
async function away(page: Page): Promise<void> {
  for (const path of ['**/v1/checks/**', '**/v1/profiles*', '**/custom-elements.json'])
    await page.route(path, (route) => route.abort());
}

/** Opens everything that can be opened. */
export async function openAll(page: Page): Promise<void> {
  await answerOf(page);
  await check(page).evaluate((node) => {
    for (const details of node.shadowRoot?.querySelectorAll('details') ?? []) details.open = true;
  });
  await page.waitForTimeout(300);
}

const says = (text: string | RegExp) => (page: Page) => page.getByText(text).first().waitFor();

/** Every state that a person can meet. */
export const states: Readonly<Record<string, State>> = {
  empty: { options: {}, reach: (page) => field(page, 'Spans').waitFor() },
  pass: {
    options: { value: passing, attributes: 'label="north face, level 2"' },
    status: 'pass',
    reach: answerOf,
  },
  fail: { options: { value: failing }, status: 'fail', reach: answerOf },
  incomplete: { options: { value: incomplete }, status: 'incomplete', reach: answerOf },
  provisional: {
    options: { value: passing, prepare: (page) => page.route(checks, unsettled) },
    status: 'provisional',
    reach: answerOf,
  },
  'fault beside a field': {
    options: { value: passing },
    reach: async (page) => {
      await answerOf(page);
      await field(page, 'Spans').fill('3 + three');
      await page.locator('[aria-invalid="true"]').first().waitFor();
    },
  },
  refused: {
    options: { value: { ...passing, section: 'UB 999x999x999' } },
    reach: says(/999x999x999/),
  },
  'key refused': {
    options: { value: passing, key: 'htp_none' },
    reach: says('The key is mistyped'),
  },
  'secret key': {
    options: { value: passing, key: `htk_none` },
    reach: says('This is a secret key'),
  },
  checking: {
    options: {
      value: passing,
      prepare: (page) => page.route(checks, () => new Promise(() => undefined)),
    },
    reach: (page) => page.waitForTimeout(800),
  },
  offline: {
    options: { value: passing, prepare: away },
    reach: says('The service does not answer'),
  },
  readonly: {
    options: { value: passing, attributes: 'readonly' },
    status: 'pass',
    reach: answerOf,
  },
  'everything open': {
    options: { value: { ...failing, restraint: 'at-supports' } },
    reach: openAll,
  },
};
