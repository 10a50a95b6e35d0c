import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Page } from 'playwright-core';
import { startBench, type Bench } from './browser';
import { answerOf, field, type WalerElement } from './element';
import { passing } from './waler';

const rounds = 15;

interface Sizes {
  readonly bytes: number;
  readonly gzip: number;
  readonly parts: readonly { readonly name: string; readonly bytes: number }[];
}

const kib = (bytes: number): string => (bytes / 1024).toFixed(1).padStart(7);

function printSizes(): void {
  const text = readFileSync(join(process.cwd(), 'dist/elements/sizes.json'), 'utf8');
  const { bytes, gzip, parts } = JSON.parse(text) as Sizes;
  const whole = parts.reduce((sum, part) => sum + part.bytes, 0);
  console.log('headtree-elements.js, KiB');
  console.log(`${kib(gzip)}  gzip (${kib(bytes).trim()} before)`);
  for (const { name, bytes: own } of parts)
    if (own / whole > 0.002) console.log(`${kib((gzip * own) / whole)}    its share by ${name}`);
}

function spread(values: readonly number[]): string {
  const sorted = [...values].sort((a, b) => a - b);
  const at = (share: number): string =>
    (sorted[Math.round(share * (sorted.length - 1))] ?? Number.NaN).toFixed(0).padStart(5);
  return `median ${at(0.5)}  tenth ${at(0.1)}  nine tenths ${at(0.9)}  (${values.length} rounds)`;
}

/** From the page's navigation to a first answer that is painted, and to fields that can be used. */
async function openings(bench: Bench): Promise<{ usable: number[]; answered: number[] }> {
  const usable: number[] = [];
  const answered: number[] = [];
  for (let round = 0; round < rounds; round++) {
    const page = await bench.open({
      value: passing,
      prepare: (opened) =>
        opened.addInitScript(() => {
          const painted = (name: string): void => {
            requestAnimationFrame(() => setTimeout(() => performance.mark(name)));
          };
          void customElements.whenDefined('headtree-waler').then(() => painted('usable'));
          document.addEventListener('headtree-result', () => painted('answered'), { once: true });
        }),
    });
    const times = await page.waitForFunction(() => {
      const at = (name: string): number | undefined =>
        performance.getEntriesByName(name)[0]?.startTime;
      const [first, last] = [at('usable'), at('answered')];
      return first !== undefined && last !== undefined ? [first, last] : undefined;
    });
    const [first = Number.NaN, last = Number.NaN] = (await times.jsonValue()) ?? [];
    usable.push(first);
    answered.push(last);
    await page.context().close();
  }
  return { usable, answered };
}

/** From a key that is pressed to its answer painted. */
async function presses(page: Page): Promise<number[]> {
  await answerOf(page);
  await page.evaluate(() => {
    const times: number[] = [];
    Object.assign(window, { times });
    let pressed = 0;
    document.addEventListener('keydown', (event) => (pressed = event.timeStamp));
    document.addEventListener('headtree-result', () =>
      requestAnimationFrame(() => setTimeout(() => times.push(performance.now() - pressed))),
    );
  });
  const spans = field(page, 'Spans');
  await spans.focus();
  await page.keyboard.press('End');
  for (let round = 0; round < rounds; round++) {
    // 2.4, 2.41, 2.4, 2.41 … m
    await page.keyboard.press(round % 2 === 0 ? '1' : 'Backspace');
    await page.waitForFunction(
      (count) => (window as unknown as { times: number[] }).times.length === count,
      round + 1,
    );
  }
  return page.evaluate(() => (window as unknown as { times: number[] }).times);
}

async function main(): Promise<void> {
  printSizes();
  const bench = await startBench();
  try {
    const { usable, answered } = await openings(bench);
    console.log(`\nms from navigation, each with an empty cache`);
    console.log(`fields can be used    ${spread(usable)}`);
    console.log(`first answer painted  ${spread(answered)}`);
    const page = await bench.open({ value: passing });
    console.log(`\nms from a key press to its answer painted, the wait for more keys included`);
    console.log(`                      ${spread(await presses(page))}`);
    const server = await page.evaluate(
      () => document.querySelector<WalerElement>('headtree-waler')?.result?.status,
    );
    console.log(`\nloopback, ${server ?? 'no'} answers, Chromium ${bench.browser.version()}`);
  } finally {
    await bench.stop();
  }
}

void main();
