import { lstatSync, mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { endLeftover } from './cluster.mjs';
import { makeHome } from './home.mjs';
import { isAlive, markOf } from './process-mark.mjs';

const NAME = /^headtree-test-(\d+)-(\d*)-/;

/** A folder for one run of the tests, removed at its end or, if that never came, by the next run. */
export async function makeTestHome() {
  await sweep();
  const mark = markOf(process.pid);
  const home = mkdtempSync(join(tmpdir(), `headtree-test-${process.pid}-${mark?.started ?? ''}-`));
  makeHome(home);
  return home;
}

async function sweep() {
  for (const name of readdirSync(tmpdir())) {
    const [, pid, started] = NAME.exec(name) ?? [];
    if (pid === undefined || isAlive({ pid: Number(pid), started: started ?? '' })) continue;
    const home = join(tmpdir(), name);
    if (lstatSync(home).uid !== process.getuid?.()) continue;
    await endLeftover(join(home, 'database'));
    rmSync(home, { recursive: true, force: true });
  }
}
