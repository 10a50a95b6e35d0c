import type { Page } from 'playwright-core';
import { startBench, type Bench } from './support/browser';
import { answerOf, anyCheck, check, field, rememberEvents, told } from './support/element';
import type { WalerElement } from './support/element';
import { requests } from './support/section-states';

/** Cross-section and stress on a page and over a network: the manners of the waler. */
let bench: Bench;
beforeAll(async () => {
  bench = await startBench();
});
afterAll(() => bench.stop());

const elements = [
  ['headtree-section', requests.section],
  ['headtree-stress', requests.stress],
] as const;

const valueOf = (page: Page): Promise<{ effects?: { My?: unknown } } | null> =>
  check(page).evaluate((node) => (node as WalerElement).value as { effects?: object } | null);

async function waitForStatus(page: Page, status: string): Promise<void> {
  await page.waitForFunction(
    ([any, wanted]) => document.querySelector<WalerElement>(any)?.result?.status === wanted,
    [anyCheck, status] as const,
  );
}

describe.each(elements)('%s', (element, value) => {
  it('is told of no violation under a strict policy, with everything in use', async () => {
    const said: string[] = [];
    const { url } = bench.service;
    const page = await bench.open({
      element,
      value,
      prepare: (opened) => {
        opened.on('console', (message) => said.push(message.text()));
        opened.on('pageerror', (error) => said.push(error.message));
        return Promise.resolve();
      },
      policy:
        `default-src 'none'; script-src ${url}; connect-src ${url}; font-src ${url}; ` +
        "style-src 'none'; base-uri 'none'; form-action 'none'; " +
        "require-trusted-types-for 'script'; trusted-types angular",
    });
    await answerOf(page);
    for (const summary of await check(page).locator('details > summary').all())
      if (await summary.isVisible()) await summary.click();
    expect(said).toEqual([]);
  });

  it('keeps what was typed through a move, tells it, and goes back on reset', async () => {
    const page = await bench.open({ element, value, prepare: rememberEvents });
    await answerOf(page);
    await field(page, 'My, about y-y').fill('−900,5');
    await waitForStatus(page, 'fail');
    await check(page).evaluate((node) => node.parentElement?.prepend(node));
    await page.waitForTimeout(50);
    expect(await field(page, 'My, about y-y').inputValue()).toBe('−900,5');
    expect((await valueOf(page))?.effects?.My).toBe(-900.5);
    const names = (await told(page)).map(({ name, bubbles, composed }) => [
      name,
      bubbles,
      composed,
    ]);
    expect(names).toEqual([
      ['headtree-result', true, true],
      ['headtree-input', true, true],
      ['headtree-result', true, true],
    ]);
    await check(page).evaluate((node) => (node as WalerElement).reset());
    await waitForStatus(page, 'pass');
    expect(await field(page, 'My, about y-y').inputValue()).toBe('180');
  });

  it('has neither answer nor value while a field cannot be read, and says so', async () => {
    const page = await bench.open({ element, value, prepare: rememberEvents });
    await answerOf(page);
    await field(page, 'My, about y-y').fill('abc');
    const state = await check(page).evaluate((node) => {
      const { result, value } = node as WalerElement;
      return { result, value, passes: node.matches(':state(pass)') };
    });
    expect(state).toEqual({ result: null, value: null, passes: false });
    await field(page, 'My, about y-y').fill('20');
    await answerOf(page);
    const names = (await told(page)).map(({ name }) => name.replace('headtree-', ''));
    expect(names).toEqual(['result', 'input', 'input', 'result']);
    await check(page).evaluate((node) => ((node as WalerElement).value = null));
    expect(await field(page, 'My, about y-y').inputValue()).toBe('');
  });

  it('shows the answer to the last request only', async () => {
    const page = await bench.open({ element, value, prepare: rememberEvents });
    await answerOf(page);
    let calls = 0;
    await page.route('**/v1/checks/*', async (route) => {
      // The first answer comes last.
      await new Promise((resolve) => setTimeout(resolve, calls++ === 0 ? 1_500 : 50));
      await route.continue().catch(() => undefined);
    });
    await field(page, 'My, about y-y').fill('900');
    await page.waitForTimeout(600);
    await field(page, 'My, about y-y').fill('20');
    await answerOf(page);
    await page.waitForTimeout(1_700);
    const results = (await told(page)).filter(({ name }) => name === 'headtree-result');
    expect(results.map(({ status }) => status)).toEqual(['pass', 'pass']);
  });

  it('says that the service is away and answers by itself when it is back', async () => {
    const page = await bench.open({ element, value });
    await answerOf(page);
    await bench.service.goAway();
    await field(page, 'My, about y-y').fill('900');
    await page.getByText('The service does not answer').first().waitFor();
    await bench.service.comeBack();
    await waitForStatus(page, 'fail');
    expect(await field(page, 'My, about y-y').inputValue()).toBe('900');
  });

  it('refuses a secret key and takes it out of the attribute', async () => {
    const page = await bench.open({ element, value, key: 'htk_none' });
    await page.getByText('This is a secret key').first().waitFor();
    expect(await check(page).getAttribute('key')).toBe('htk_');
    expect(await check(page).evaluate((node) => (node as WalerElement).result)).toBeNull();
  });
});

it('puts what the service refuses beside the field that it points at', async () => {
  const page = await bench.open({
    element: 'headtree-section',
    value: { ...requests.section, effects: { T: 5 } },
  });
  await check(page).locator('[aria-invalid="true"]').first().waitFor();
  const wrong = await check(page)
    .locator('.ht-bad label')
    .evaluateAll((labels) => labels.map((label) => label.textContent));
  expect(wrong.length).toBeGreaterThan(0);
  for (const label of wrong) expect(label).toMatch(/^[TB], /);
});
