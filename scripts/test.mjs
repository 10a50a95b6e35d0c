/**
 * `npm test`: lint, types, contract and every spec, on a database of its own that is thrown away.
 * `npm test -- waler` runs only the specs whose path holds that word. The last line counts.
 */
import { readdirSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { findBrowser } from './lib/browser.mjs';
import { build } from './lib/build.mjs';
import { buildWeb } from './lib/build-web.mjs';
import { makeEnding } from './lib/ending.mjs';
import { explain, textOf } from './lib/explain.mjs';
import { root } from './lib/home.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { prepare, serviceEnvironment } from './lib/prepare.mjs';
import { startDatabase } from './lib/private-database.mjs';
import { run, stopRunning } from './lib/run.mjs';
import { outliveReader, print, say, Stop } from './lib/say.mjs';
import { makeTestHome } from './lib/test-home.mjs';

/** @typedef {{ passed: number, failed: number }} Count */
/** @typedef {{ name: string, run: () => Promise<Count> }} Step */

const ending = makeEnding();
const bin = (/** @type {string} */ name) => join(root, 'node_modules/.bin', name);

/** @param {readonly string[]} only @returns {Promise<Count>} */
async function test(only) {
  const home = await makeTestHome();
  ending.add(() => rmSync(home, { recursive: true, force: true }));
  await ensurePackages(root, join(home, 'logs/npm.log'));
  ending.check();
  await build();
  const browser = meetsBrowser(only) ? await findBrowser() : undefined;
  if (browser !== undefined) await buildWeb();
  ending.check();
  const { urls } = await startDatabase({
    home,
    database: 'headtree_template',
    ending,
    throwAway: true,
  });
  await prepare(urls, undefined);

  /** @type {Step[]} */
  const checks = [
    program('lint', 'eslint', ['.']),
    program('format', 'prettier', ['--check', '.', '--log-level', 'warn']),
    program('types', 'tsc', ['--noEmit', '-p', 'tsconfig.json']),
    program('types of browser specs', 'tsc', ['--noEmit', '-p', 'test/browser/tsconfig.json']),
    program('types of scripts', 'tsc', ['--noEmit', '-p', 'scripts/tsconfig.json']),
    { name: 'contract', run: checkContract },
  ];
  const specs = {
    name: 'specs',
    run: () => jest({ urls, browser, results: join(home, 'jest.json') }, only),
  };
  const total = { passed: 0, failed: 0 };
  const failures = [];
  for (const step of only.length > 0 ? [specs] : [...checks, specs]) {
    ending.check();
    const { passed, failed } = await step.run();
    total.passed += passed;
    total.failed += failed;
    if (failed > 0) failures.push(step.name);
    say(`${step.name} ${failed > 0 ? 'FAILED' : 'passed'}`);
  }
  if (failures.length > 0) print('', `Failed: ${failures.join(', ')}`);
  return total;
}

/** @param {string} name @param {string} command @param {string[]} args @returns {Step} */
function program(name, command, args) {
  return {
    name,
    run: async () => {
      const { code } = await run(bin(command), args, { cwd: root, output: 'show' });
      return code === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };
    },
  };
}

async function checkContract() {
  const contract = await import('./contract.mjs');
  const problems = await contract.checkContract();
  for (const problem of problems) print(`  ${String(problem)}`);
  return problems.length === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 };
}

/** Whether a spec that drives a browser is among those that run. @param {readonly string[]} only */
function meetsBrowser(only) {
  const folder = 'test/browser';
  const specs = readdirSync(join(root, folder)).filter((name) => name.endsWith('.spec.ts'));
  return only.length === 0
    ? specs.length > 0
    : specs.some((name) => only.some((word) => `${folder}/${name}`.includes(word)));
}

/**
 * @param {{ urls: import('./lib/database.mjs').Urls, browser: string | undefined, results: string }} given
 * @param {readonly string[]} only
 */
async function jest({ urls, browser, results }, only) {
  const { code } = await run(
    bin('jest'),
    [
      '--maxWorkers=2',
      '--testTimeout=30000',
      '--json',
      `--outputFile=${results}`,
      '--passWithNoTests',
      ...only,
    ],
    {
      cwd: root,
      output: 'errors',
      env: serviceEnvironment(urls, { NODE_ENV: 'test', HEADTREE_BROWSER: browser }),
    },
  );
  try {
    const { numPassedTests, numFailedTests, numRuntimeErrorTestSuites } = JSON.parse(
      readFileSync(results, 'utf8'),
    );
    const failed = numFailedTests + numRuntimeErrorTestSuites;
    // Jest may fail with no failed test, over a handle left open or a threshold.
    return { passed: numPassedTests, failed: code !== 0 && failed === 0 ? 1 : failed };
  } catch {
    return { passed: 0, failed: 1 };
  }
}

async function main() {
  outliveReader();
  /** @type {Count} */
  let count = { passed: 0, failed: 1 };
  const tested = test(process.argv.slice(2));
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
    process.on(signal, () => {
      ending.begin();
      stopRunning();
    });
  }
  try {
    count = await tested;
  } catch (error) {
    const told = ending.begun()
      ? 'Stopped before the end.'
      : (explain(error, root) ?? new Stop(textOf(error))).message;
    print('', told);
  }
  await ending.end();
  print(`${count.passed} passed, ${count.failed} failed`);
  process.exitCode = count.failed > 0 ? 1 : 0;
}

await main();
