/** Runs a TypeScript tool of this folder against the built service, on a database thrown away. */
import { rmSync } from 'node:fs';
import { join } from 'node:path';
import { findBrowser } from '../../../scripts/lib/browser.mjs';
import { build } from '../../../scripts/lib/build.mjs';
import { buildWeb } from '../../../scripts/lib/build-web.mjs';
import { makeEnding } from '../../../scripts/lib/ending.mjs';
import { root } from '../../../scripts/lib/home.mjs';
import { prepare, serviceEnvironment } from '../../../scripts/lib/prepare.mjs';
import { startDatabase } from '../../../scripts/lib/private-database.mjs';
import { run, stopRunning } from '../../../scripts/lib/run.mjs';
import { makeTestHome } from '../../../scripts/lib/test-home.mjs';

/** @param {string} name file of `support/` without its ending @param {readonly string[]} args */
export async function runTool(name, args) {
  const ending = makeEnding();
  const bundle = join(root, `dist/${name}.${process.pid}.cjs`);
  ending.add(() => rmSync(bundle, { force: true }));
  for (const signal of ['SIGINT', 'SIGTERM']) {
    process.on(signal, () => {
      ending.begin();
      stopRunning();
    });
  }
  try {
    const HEADTREE_BROWSER = await findBrowser();
    await build();
    await buildWeb();
    const esbuild = await import('esbuild');
    await esbuild.build({
      entryPoints: [join(root, 'test/browser/support', `${name}.ts`)],
      outfile: bundle,
      bundle: true,
      platform: 'node',
      target: 'node20',
      packages: 'external',
      logLevel: 'error',
    });
    const home = await makeTestHome();
    ending.add(() => rmSync(home, { recursive: true, force: true }));
    const { urls } = await startDatabase({
      home,
      database: 'headtree_template',
      ending,
      throwAway: true,
    });
    await prepare(urls, undefined);
    const env = serviceEnvironment(urls, { HEADTREE_BROWSER });
    const { code } = await run(process.execPath, [bundle, ...args], {
      cwd: root,
      output: 'show',
      env,
    });
    process.exitCode = code;
  } catch (error) {
    process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
    process.exitCode = 1;
  }
  await ending.end();
}
