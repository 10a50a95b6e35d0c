import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { explain, lastLine } from './explain.mjs';
import { run } from './run.mjs';
import { say, Stop } from './say.mjs';

/** @typedef {Record<string, { version?: string, integrity?: string, optional?: boolean, link?: boolean }>} Locked */

/** Versions of Node older than this lack what the service uses. */
const OLDEST_NODE = [20, 19];

/** Stops when this Node is too old. */
export function requireNode(version = process.versions.node) {
  const [major = 0, minor = 0] = version.split('.').map(Number);
  const [oldestMajor = 0, oldestMinor = 0] = OLDEST_NODE;
  if (major > oldestMajor || (major === oldestMajor && minor >= oldestMinor)) return;
  throw new Stop(`This is Node ${version}; Headtree needs ${OLDEST_NODE.join('.')} or newer.`);
}

/**
 * Installs what `package-lock.json` names, when that is not what is installed.
 * @param {string} root @param {string} log file that keeps npm's output
 * @param {(pid: number) => void} [started] told of npm's process
 */
export async function ensurePackages(root, log, started) {
  requireNode();
  const stale = stalePackages(root);
  if (stale === undefined) return say('packages are installed');
  say(`installing packages, about a minute (${stale})`);
  const installed = await run('npm', ['ci', '--include=dev', '--no-audit', '--no-fund'], {
    cwd: root,
    ...(started && { started }),
  });
  const output = installed.stdout + installed.stderr;
  writeFileSync(log, output);
  if (installed.code !== 0) {
    const reason = /^npm (?:error|ERR!) (?!code |syscall |path |dest |errno )(.+)$/m.exec(
      output,
    )?.[1];
    throw (
      explain(output, root) ??
      new Stop(
        `npm could not install the packages: ${reason ?? lastLine(output)}. ` +
          `Mend that (is the network there?) and start again; the rest is in ${log}`,
      )
    );
  }
  say('packages installed');
}

/**
 * Why what is installed is not what the lock file names; undefined when it is. npm writes its own
 * list last, so an installation that was cut off has none.
 * @param {string} root
 */
export function stalePackages(root) {
  /** @type {Locked} */
  const wanted = JSON.parse(readFileSync(join(root, 'package-lock.json'), 'utf8')).packages;
  /** @type {Locked} */
  let installed;
  try {
    installed = JSON.parse(
      readFileSync(join(root, 'node_modules/.package-lock.json'), 'utf8'),
    ).packages;
  } catch {
    return 'none are there yet';
  }
  for (const [path, { version, integrity, optional }] of Object.entries(wanted)) {
    if (path === '') continue;
    const there = installed[path];
    // One for another system is optional, and rightly not there.
    if (!there && optional) continue;
    if (there?.version !== version || there?.integrity !== integrity) return `${path} differs`;
  }
  return undefined;
}
