import { openSync, closeSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { writeWhole } from './home.mjs';
import { endProcess, isAlive, markOf } from './process-mark.mjs';
import { Stop } from './say.mjs';

/** @typedef {import('./process-mark.mjs').ProcessMark} ProcessMark */
/** @typedef {{ command: ProcessMark, url: string, children: ProcessMark[] }} Run */

/**
 * Says that this command runs in the home, and that no other may; ends what a command that was
 * killed has left running.
 * @param {string} home @param {string} url
 * @returns {Promise<{ remember: (pids: number[]) => void, forget: () => void }>}
 */
export async function claimHome(home, url) {
  const file = join(home, 'run.json');
  const command = markOf(process.pid) ?? { pid: process.pid, started: '' };
  await clear(file);
  try {
    closeSync(openSync(file, 'wx', 0o600));
  } catch (error) {
    if (!(error instanceof Error && 'code' in error && error.code === 'EEXIST')) throw error;
    throw new Stop(`Headtree is being started in ${home} by another command. Wait for it.`);
  }
  writeFileSync(file, JSON.stringify({ command, url, children: [] }));
  return {
    remember: (pids) => {
      const children = pids.map(markOf).filter((mark) => mark !== undefined);
      writeWhole(file, JSON.stringify({ command, url, children }));
    },
    forget: () => rmSync(file, { force: true }),
  };
}

/** @param {string} file */
async function clear(file) {
  const last = read(file);
  if (last && isAlive(last.command)) {
    throw new Stop(
      `Headtree is running already at ${last.url} (process ${last.command.pid}). ` +
        'Use that one, or stop it with Ctrl-C first.',
    );
  }
  for (const child of last?.children ?? []) await endProcess(child, 'SIGTERM', 10_000);
  rmSync(file, { force: true });
}

/** @param {string} file @returns {Run | undefined} */
function read(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return undefined;
  }
}
