import { spawn } from 'node:child_process';
import { closeSync, openSync, readFileSync, renameSync } from 'node:fs';
import { root } from './home.mjs';
import { lastLine } from './explain.mjs';
import { endProcess, markOf } from './process-mark.mjs';
import { Stop } from './say.mjs';

const PATIENCE = 30_000;

/**
 * @typedef {object} Service
 * @property {string} name
 * @property {string} log
 * @property {import('./process-mark.mjs').ProcessMark} mark
 * @property {Promise<string>} ended resolves with the last thing it said, when it ends
 * @property {() => Promise<void>} stop
 */

/**
 * Starts a process of the service, in a group of its own: Ctrl-C reaches the command, which stops
 * them in order.
 * @param {{ name: string, script: string, env: NodeJS.ProcessEnv, log: string }} options
 * @returns {Service}
 */
export function startService({ name, script, env, log }) {
  keepLast(log);
  const output = openSync(log, 'w', 0o600);
  const child = spawn(process.execPath, ['--enable-source-maps', script], {
    cwd: root,
    env,
    detached: true,
    stdio: ['ignore', output, output],
  });
  closeSync(output);
  /** @type {Promise<string>} */
  const ended = new Promise((resolve) => {
    child.once('error', (error) => resolve(error.message));
    child.once('exit', (_, signal) => resolve(signal ? `by ${signal}` : lastWords(log)));
  });
  const mark = { pid: child.pid ?? 0, started: markOf(child.pid ?? 0)?.started ?? '' };
  return {
    name,
    log,
    mark,
    ended,
    async stop() {
      await endProcess(mark, 'SIGTERM', 10_000);
      await ended;
    },
  };
}

/**
 * Waits until the API says that it is ready.
 * @param {string} url @param {readonly Service[]} services @param {import('./ending.mjs').Ending} ending
 */
export async function waitUntilReady(url, services, ending) {
  /** @type {string | undefined} */
  let over;
  for (const { name, ended, log } of services) {
    void ended.then((words) => (over ??= `The ${name} ended while starting: ${words} (${log})`));
  }
  let answer = 'nothing';
  for (const until = Date.now() + PATIENCE; Date.now() < until;) {
    ending.check();
    if (over !== undefined) throw new Stop(over);
    try {
      const signal = globalThis.AbortSignal.timeout(2_000);
      const response = await fetch(`${url}/readyz`, { signal });
      if (response.ok) return;
      answer = `${response.status} ${(await response.text()).slice(0, 300)}`;
    } catch {
      // Not listening yet.
    }
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  const logs = services.map(({ log }) => log).join(' and ');
  throw new Stop(
    `Not ready after ${PATIENCE / 1000} seconds: ${url}/readyz answers ${answer}. See ${logs}`,
  );
}

/** @param {string} log */
function keepLast(log) {
  try {
    renameSync(log, `${log}.previous`);
  } catch {
    // The first start has none.
  }
}

/** The message of the last line, which may be one of JSON. @param {string} log */
function lastWords(log) {
  const line = lastLine(readFileSync(log, 'utf8'));
  try {
    const { msg, err } = JSON.parse(line);
    return [msg, err?.message].filter(Boolean).join(': ');
  } catch {
    return line;
  }
}
