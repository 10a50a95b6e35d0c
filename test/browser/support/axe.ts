import { readFileSync } from 'node:fs';
import type { Page } from 'playwright-core';
import { anyCheck } from './element';

const source = readFileSync(require.resolve('axe-core/axe.min.js'), 'utf8');

interface Found {
  readonly id: string;
  readonly impact: string | null;
  readonly nodes: readonly { readonly target: unknown; readonly failureSummary?: string }[];
}

const tags = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];
const targets = { 'target-size': { enabled: true } };

/** What axe finds against WCAG 2.2 AA, one line each; empty when all is well. */
export const axe = (page: Page): Promise<string[]> => run(page, { runOnly: tags, rules: targets });

/** The same, of colours only: for a scheme that changes nothing else. */
export const axeColours = (page: Page): Promise<string[]> =>
  run(page, { runOnly: { type: 'rule', values: ['color-contrast'] } });

async function run(page: Page, options: object): Promise<string[]> {
  if (!(await page.evaluate(() => 'axe' in window))) await page.evaluate(source);
  const found = await page.evaluate(
    async ({ context, given }) => {
      const { axe: runner } = window as unknown as {
        axe: { run(context: string, options: object): Promise<{ violations: Found[] }> };
      };
      const { violations } = await runner.run(context, given);
      return violations;
    },
    { context: anyCheck, given: { ...options, resultTypes: ['violations'] } },
  );
  return found.flatMap(({ id, nodes }) =>
    nodes.map(({ target, failureSummary = '' }) =>
      [id, JSON.stringify(target), failureSummary.split('\n')[1]?.trim()].join(' '),
    ),
  );
}
