import { createHash } from 'node:crypto';
import {
  existsSync,
  mkdirSync,
  readFileSync,
  readdirSync,
  renameSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import { join } from 'node:path';
import { makeElements } from './build-elements.mjs';
import { root } from './home.mjs';
import { run } from './run.mjs';
import { say, Stop } from './say.mjs';

const dist = join(root, 'dist');
/** The elements as they are served: the script, its fonts, its manifest, the licences. */
export const elementsOutput = join(dist, 'elements');
/** The console as it is served. */
export const consoleOutput = join(dist, 'console');

const OWN = [
  'angular.json',
  'package-lock.json',
  ...['web', 'elements', 'fonts'].map((part) => `scripts/lib/build-${part}.mjs`),
];
const CONTRACT = ['openapi/generated/types.ts', 'projects/tsconfig.json', 'projects/checks'];

/**
 * Brings `dist/elements` and `dist/console` up to date with their sources, one after the other: a
 * build takes all the processors there are. Angular's own cache makes the second one shorter.
 */
export async function buildWeb() {
  await bring('elements', elementsOutput, [...OWN, ...CONTRACT, 'projects/widgets'], (folder) =>
    makeElements(folder, angular),
  );
  if (!existsSync(join(root, 'projects/console/src/main.ts'))) return;
  await bring(
    'console',
    consoleOutput,
    [...OWN, ...CONTRACT, 'projects/console'],
    async (folder) => {
      await angular('console', folder);
    },
  );
}

/**
 * @param {string} name @param {string} output @param {readonly string[]} sources
 * @param {(folder: string) => Promise<string | void>} make fills a folder that then takes its place
 */
async function bring(name, output, sources, make) {
  const hash = hashOf(sources);
  const stamp = `${output}.sha256`;
  if (read(stamp) === hash && existsSync(output)) return say(`${name} built already`);
  say(`building the ${name}, up to a minute the first time`);
  const partial = join(dist, `${name}.${process.pid}.new`);
  try {
    mkdirSync(partial, { recursive: true });
    const words = await make(partial);
    rmSync(stamp, { force: true });
    takePlace(partial, output);
    writeFileSync(stamp, hash);
    say(`${name} built${words ? `: ${words}` : ''}`);
  } finally {
    rmSync(partial, { recursive: true, force: true });
  }
}

/** Another build of the same sources may come between. @param {string} fresh @param {string} place */
function takePlace(fresh, place) {
  const old = `${place}.${process.pid}.old`;
  for (let tries = 3; tries > 0; tries--) {
    if (existsSync(place)) renameSync(place, old);
    try {
      renameSync(fresh, place);
      tries = 0;
    } catch (error) {
      if (tries === 1) throw error;
    }
    rmSync(old, { recursive: true, force: true });
  }
}

/** Hash over everything that a build is made of. @param {readonly string[]} sources */
function hashOf(sources) {
  const hash = createHash('sha256');
  for (const source of sources) {
    for (const file of filesOf(join(root, source))) {
      hash.update(file.slice(root.length)).update(readFileSync(file));
    }
  }
  return hash.digest('hex');
}

/** @param {string} path @returns {string[]} */
function filesOf(path) {
  if (/\.(json|ts|mjs)$/.test(path)) return [path];
  return readdirSync(path, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile() && !/\.(spec\.ts|md)$/.test(entry.name))
    .map((entry) => join(entry.parentPath, entry.name))
    .filter((file) => !file.includes('/testing/'))
    .sort();
}

/** @param {string} file */
function read(file) {
  try {
    return readFileSync(file, 'utf8');
  } catch {
    return undefined;
  }
}

/** Builds a project of angular.json into a folder. @param {string} project @param {string} folder */
async function angular(project, folder) {
  const stats = project === 'widgets' ? ['--stats-json'] : [];
  const args = ['build', project, '--output-path', folder, '--progress', 'false', ...stats];
  const { code, stdout, stderr } = await run(join(root, 'node_modules/.bin/ng'), args, {
    cwd: root,
    env: { ...process.env, NG_CLI_ANALYTICS: 'false', NO_COLOR: '1', CI: '1' },
  });
  if (code !== 0) throw new Stop(`The ${project} cannot be built: ${firstError(stdout + stderr)}`);
  // The builder puts what a browser loads in a folder of its own.
  const browser = join(folder, 'browser');
  if (!existsSync(browser)) return;
  for (const name of readdirSync(browser)) renameSync(join(browser, name), join(folder, name));
  rmSync(browser, { recursive: true });
}

/** The first error of the builder with its place. @param {string} output */
function firstError(output) {
  // eslint-disable-next-line no-control-regex -- colours are what is taken out
  const lines = output.replace(/\u001b\[[\d;]*m/g, '').split('\n');
  const first = lines.findIndex((line) => /error/i.test(line));
  if (first < 0) return output.trim().split('\n').at(-1) ?? 'no reason given';
  const place = lines.slice(first + 1).find((line) => /^\s+\S+:\d+:\d+:/.test(line));
  const words = lines[first]?.replace(/^\S* ?\[ERROR\] /, '').replace(/ ?\[plugin .*\]$/, '');
  return `${words?.trim()}${place ? ` (${place.trim().replace(/:$/, '')})` : ''}`;
}
