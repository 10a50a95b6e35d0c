import { spawn } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import {
  chownSync,
  closeSync,
  existsSync,
  mkdirSync,
  openSync,
  readFileSync,
  renameSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import { join } from 'node:path';
import { explain, lastLine } from './explain.mjs';
import { endProcess, markOf } from './process-mark.mjs';
import { run } from './run.mjs';
import { Stop } from './say.mjs';

/**
 * @typedef {object} ClusterOptions
 * @property {string} binaries folder of PostgreSQL's programs
 * @property {string} folder of the cluster
 * @property {{ uid: number, gid: number } | undefined} as
 * @property {number} port
 * @property {string} superuserPassword
 * @property {string} log
 * @property {boolean} [throwAway] lost at a crash, and faster for it
 * @typedef {object} Cluster
 * @property {string} name
 * @property {string} log
 * @property {import('./process-mark.mjs').ProcessMark} mark
 * @property {Promise<string>} ended resolves with the last thing it said, when it ends
 * @property {() => Promise<void>} stop
 */

const PATIENCE = 30_000;

/** Makes the cluster, whole or not at all. @param {ClusterOptions} options */
export async function makeCluster({ binaries, folder, as, superuserPassword }) {
  const partial = `${folder}.new`;
  rmSync(partial, { recursive: true, force: true });
  const passwordFile = `${folder}.${randomBytes(6).toString('hex')}`;
  try {
    mkdirSync(partial, { mode: 0o700 });
    writeFileSync(passwordFile, superuserPassword, { mode: 0o600 });
    if (as) for (const path of [partial, passwordFile]) chownSync(path, as.uid, as.gid);
    const made = await run(
      join(binaries, 'initdb'),
      ['-D', partial, '-U', 'postgres', '-A', 'scram-sha-256', `--pwfile=${passwordFile}`].concat(
        '--encoding=UTF8',
        '--locale=C',
      ),
      { cwd: '/', env: environment(), ...(as && { as }) },
    );
    if (made.code !== 0) {
      const output = made.stderr + made.stdout;
      const reason = output.split('\n').find((line) => /error|fatal|could not/i.test(line));
      throw (
        explain(output, folder) ??
        new Stop(`The database cannot be made in ${folder}: ${reason ?? lastLine(output)}`)
      );
    }
    renameSync(partial, folder);
  } finally {
    rmSync(passwordFile, { force: true });
    rmSync(partial, { recursive: true, force: true });
  }
}

/**
 * Starts the cluster in a process group of its own, so that Ctrl-C reaches the command and not it.
 * @param {ClusterOptions} options
 * @returns {Promise<Cluster>}
 */
export async function startCluster(options) {
  for (let attempt = 1; ; attempt++) {
    const cluster = launch(options);
    const failure = await Promise.race([cluster.ended, ready(options.folder, cluster.mark.pid)]);
    if (failure === undefined) return cluster;
    // Processes of a server that was killed let go of its memory a moment later.
    const held = /pre-existing shared memory block|lock file .* already exists/.test(failure);
    if (!held || attempt === 10) throw brokenCluster(options, failure);
    await new Promise((resolve) => setTimeout(resolve, 500));
  }
}

/** @param {ClusterOptions} options @returns {Cluster} */
function launch({ binaries, folder, as, port, log, throwAway = false }) {
  const settings = {
    listen_addresses: '127.0.0.1',
    port: String(port),
    unix_socket_directories: '',
    logging_collector: 'off',
    ...(throwAway && { fsync: 'off', synchronous_commit: 'off', full_page_writes: 'off' }),
  };
  const args = Object.entries(settings).flatMap(([name, value]) => ['-c', `${name}=${value}`]);
  const output = openSync(log, 'w', 0o600);
  const child = spawn(join(binaries, 'postgres'), ['-D', folder, ...args], {
    ...as,
    cwd: '/',
    env: environment(),
    detached: true,
    stdio: ['ignore', output, output],
  });
  closeSync(output);
  /** @type {Promise<string>} */
  const ended = new Promise((resolve) => {
    child.once('error', (error) => resolve(error.message));
    // A server that ends itself with a signal has said why.
    child.once('exit', (_, signal) =>
      resolve(signal === 'SIGKILL' ? `by ${signal}` : lastWords(log)),
    );
  });
  const mark = { pid: child.pid ?? 0, started: markOf(child.pid ?? 0)?.started ?? '' };
  return {
    name: 'database',
    log,
    mark,
    ended,
    async stop() {
      // SIGINT is PostgreSQL's fast stop: it ends sessions and leaves nothing to recover.
      await endProcess(mark, 'SIGINT', PATIENCE);
      await ended;
    },
  };
}

/** Resolves with nothing when the server takes connections. @param {string} folder @param {number} pid */
async function ready(folder, pid) {
  for (const until = Date.now() + PATIENCE; Date.now() < until;) {
    const lines = pidFile(folder);
    if (Number(lines[0]) === pid && lines[7]?.trim() === 'ready') return undefined;
    await new Promise((resolve) => setTimeout(resolve, 20));
  }
  return `it was not ready after ${PATIENCE / 1000} seconds`;
}

/** Ends the server that a killed command left, and forgets a pid file that names no server. @param {string} folder */
export async function endLeftover(folder) {
  const pid = Number(pidFile(folder)[0]);
  const mark = pid > 0 ? markOf(pid) : undefined;
  if (mark && isServerOf(folder, pid)) return endProcess(mark, 'SIGINT', PATIENCE);
  if (mark) rmSync(join(folder, 'postmaster.pid'), { force: true });
}

/** @param {string} folder @param {number} pid */
function isServerOf(folder, pid) {
  try {
    const args = readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0');
    return args.includes(folder) && args[0]?.includes('postgres');
  } catch {
    return false;
  }
}

/** @param {string} folder @returns {string[]} */
function pidFile(folder) {
  try {
    return readFileSync(join(folder, 'postmaster.pid'), 'utf8').split('\n');
  } catch {
    return [];
  }
}

/** @param {string} log */
function lastWords(log) {
  const lines = existsSync(log) ? readFileSync(log, 'utf8').trimEnd().split('\n') : [];
  const telling = lines.filter((line) => /FATAL|PANIC|ERROR|could not|\berror\b/i.test(line));
  return (telling.at(-1) ?? lines.at(-1) ?? '').replace(/^.*?(?=FATAL|PANIC|ERROR)/, '').trim();
}

/** @param {ClusterOptions} options @param {string} reason */
function brokenCluster({ folder, log }, reason) {
  return (
    explain(reason, folder) ??
    new Stop(
      `The database in ${folder} does not start (${reason}; more in ${log}). Restore it from a ` +
        `backup, or begin anew without its data: mv ${folder} ${folder}.broken && npm start`,
    )
  );
}

/** Nothing of the caller's environment: no PG* variable may lead the server elsewhere. */
function environment() {
  return { PATH: process.env.PATH, LC_ALL: 'C', TZ: 'UTC' };
}
