import { createHash } from 'node:crypto';
import { mkdirSync, readdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';
import { root } from './home.mjs';
import { say, Stop } from './say.mjs';

/** What is bundled, and the name it gets in `dist/server`. */
const PROCESSES = {
  main: 'server/main.ts',
  worker: 'server/worker.ts',
  'check-thread': 'server/features/checks/check-thread.ts',
  prepare: 'db/prepare-command.ts',
};
export const output = join(root, 'dist/server');
const stamp = join(output, 'sources.sha256');

/** Brings `openapi/generated` and `dist/server` up to date with their sources. */
export async function build() {
  // Not at the top: this is read before anything is installed.
  const { buildContract } = await import('../contract.mjs');
  await buildContract();
  const hash = sourcesHash();
  if (builtHash() === hash) return say('server is built');
  await bundle();
  writeFileSync(stamp, hash);
  say('server built');
}

async function bundle() {
  const esbuild = await import('esbuild');
  const built = await esbuild
    .build({
      absWorkingDir: root,
      entryPoints: { ...PROCESSES, ...threads() },
      outdir: output,
      bundle: true,
      platform: 'node',
      target: 'node20',
      format: 'cjs',
      packages: 'external',
      sourcemap: true,
      write: false,
      logLevel: 'silent',
    })
    .catch((error) => {
      throw new Stop(`The server cannot be built: ${firstProblem(error)}`);
    });
  await esbuild.stop();
  mkdirSync(output, { recursive: true });
  rmSync(stamp, { force: true });
  for (const { path, contents } of built.outputFiles) {
    mkdirSync(dirname(path), { recursive: true });
    const partial = `${path}.${process.pid}.new`;
    writeFileSync(partial, contents);
    renameSync(partial, path);
  }
}

/** Code of worker threads: each `*-thread.ts` is bundled beside the processes. */
function threads() {
  const files = readdirSync(join(root, 'server'), { recursive: true, encoding: 'utf8' });
  return Object.fromEntries(
    files
      .filter((file) => file.endsWith('-thread.ts'))
      .map((file) => [basename(file, '.ts'), join('server', file)]),
  );
}

/** Hash over everything that the bundle is made of. */
function sourcesHash() {
  const hash = createHash('sha256');
  const folders = ['server', 'db', 'openapi/generated'];
  const files = folders.flatMap((folder) =>
    readdirSync(join(root, folder), { recursive: true, withFileTypes: true })
      .filter((entry) => entry.isFile() && !entry.name.endsWith('.spec.ts'))
      .map((entry) => join(entry.parentPath, entry.name)),
  );
  files.push(join(root, 'package-lock.json'), join(root, 'scripts/lib/build.mjs'));
  for (const file of files.sort()) hash.update(file.slice(root.length)).update(readFileSync(file));
  return hash.digest('hex');
}

function builtHash() {
  try {
    return readFileSync(stamp, 'utf8');
  } catch {
    return undefined;
  }
}

/** @param {unknown} error */
function firstProblem(error) {
  /** @type {{ errors?: { text: string, location?: { file: string, line: number } | null }[] }} */
  const failure = Object(error);
  const first = failure.errors?.[0];
  if (!first) return String(error);
  const { text, location } = first;
  return location ? `${text} (${location.file}:${location.line})` : text;
}
