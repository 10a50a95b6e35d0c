import { readFileSync } from 'node:fs';
import type { Page } from 'playwright-core';

const source = readFileSync(require.resolve('axe-core/axe.min.js'), 'utf8');

interface Found {
  readonly id: string;
  readonly impact: string | null;
  readonly nodes: readonly { readonly target: unknown; readonly failureSummary?: string }[];
}

/** What axe finds against WCAG 2.2 AA, one line each; empty when all is well. */
export async function axe(page: Page, within = 'headtree-waler'): Promise<string[]> {
  await page.evaluate(source);
  const found = await page.evaluate(async (selector) => {
    const { axe: runner } = window as unknown as {
      axe: { run(context: string, options: object): Promise<{ violations: Found[] }> };
    };
    const { violations } = await runner.run(selector, {
      runOnly: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'],
      rules: { 'target-size': { enabled: true } },
      resultTypes: ['violations'],
    });
    return violations;
  }, within);
  return found.flatMap(({ id, nodes }) =>
    nodes.map(({ target, failureSummary = '' }) =>
      [id, JSON.stringify(target), failureSummary.split('\n')[1]?.trim()].join(' '),
    ),
  );
}
