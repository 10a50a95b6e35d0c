import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { startBench, type Bench } from './browser';
import { sectionStates } from './section-states';
import { states as walerStates } from './states';

const states = { ...walerStates, ...sectionStates };

const folder = join(process.cwd(), '.headtree/screens');
const sizes = [
  { width: 1440, height: 1000 },
  { width: 390, height: 844 },
];

async function shoot(bench: Bench, name: string): Promise<void> {
  const state = states[name];
  for (const size of sizes)
    for (const colorScheme of ['light', 'dark'] as const) {
      if (!state) continue;
      const page = await bench.open({ ...state.options, ...size, colorScheme });
      await state.reach(page);
      await page.evaluate(() => document.fonts.ready);
      const file = `${name.replaceAll(' ', '-')}-${size.width}-${colorScheme}.png`;
      await page.screenshot({ path: join(folder, file), fullPage: true });
      await page.context().close();
      console.log(file);
    }
}

async function main(wanted: readonly string[]): Promise<void> {
  mkdirSync(folder, { recursive: true });
  const bench = await startBench();
  try {
    for (const name of Object.keys(states))
      if (wanted.length === 0 || wanted.some((word) => name.includes(word)))
        await shoot(bench, name).catch((error: unknown) => console.error(name, String(error)));
  } finally {
    await bench.stop();
  }
}

void main(process.argv.slice(2));
