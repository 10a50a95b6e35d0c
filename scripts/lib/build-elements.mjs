import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { brotliCompressSync, gzipSync } from 'node:zlib';
import { fontLicences, makeFonts } from './build-fonts.mjs';
import { root } from './home.mjs';

/** @typedef {{ name: string, bytes: number }} Part */

/**
 * Makes all that `/elements/v1/` serves.
 * @param {string} folder @param {(project: string, folder: string) => Promise<void>} angular
 * @returns {Promise<string>} the size in words
 */
export async function makeElements(folder, angular) {
  const built = join(folder, 'angular');
  await angular('widgets', built);
  const script = await wrap(join(built, 'main.js'));
  const parts = partsOf(JSON.parse(readFileSync(join(built, 'stats.json'), 'utf8')));
  const licences = [readFileSync(join(built, '3rdpartylicenses.txt'), 'utf8'), ...fontLicences()];
  rmSync(built, { recursive: true });

  const packed = gzipSync(script, { level: 9 });
  writeFileSync(join(folder, 'headtree-elements.js'), script);
  writeFileSync(join(folder, 'headtree-elements.js.gz'), packed);
  writeFileSync(join(folder, 'headtree-elements.js.br'), brotliCompressSync(script));
  writeFileSync(join(folder, 'licenses.txt'), licences.join(`\n${'-'.repeat(80)}\n`));
  const manifest = readFileSync(join(root, 'projects/widgets/custom-elements.json'));
  writeFileSync(join(folder, 'custom-elements.json'), manifest);
  await makeFonts(join(folder, 'fonts'));

  const sizes = { bytes: script.length, gzip: packed.length, parts };
  writeFileSync(join(folder, 'sizes.json'), `${JSON.stringify(sizes, undefined, 1)}\n`);
  return `${kib(packed.length)} KiB (gzip), of these ${inWords(sizes)}`;
}

/** One classic script that leaves no name behind. @param {string} file */
async function wrap(file) {
  const { version } = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8'));
  const esbuild = await import('esbuild');
  const { outputFiles } = await esbuild.build({
    entryPoints: [file],
    bundle: true,
    format: 'iife',
    minify: true,
    target: 'es2022',
    write: false,
    legalComments: 'none',
    logLevel: 'silent',
    define: { HEADTREE_VERSION: JSON.stringify(version) },
    banner: { js: `/*! Headtree elements ${version}, licences beside it in licenses.txt */` },
  });
  await esbuild.stop();
  return Buffer.from(/** @type {import('esbuild').OutputFile} */ (outputFiles[0]).contents);
}

/**
 * What the bundle is made of, in bytes before packing.
 * @param {import('esbuild').Metafile} stats @returns {Part[]}
 */
function partsOf(stats) {
  /** @type {Map<string, number>} */
  const sizes = new Map();
  for (const { inputs } of Object.values(stats.outputs)) {
    for (const [file, { bytesInOutput }] of Object.entries(inputs)) {
      const name = partOf(file);
      sizes.set(name, (sizes.get(name) ?? 0) + bytesInOutput);
    }
  }
  return [...sizes].map(([name, bytes]) => ({ name, bytes })).sort((a, b) => b.bytes - a.bytes);
}

/** @param {string} file */
function partOf(file) {
  const [, scope, name] = /node_modules\/(@[^/]+\/)?([^/]+)/.exec(file) ?? [];
  if (name) return `${scope ?? ''}${name}`;
  return /^projects\/(\w+)/.exec(file)?.[1] ?? 'rest';
}

/** Gzip finds repeats across parts, so a part's share is told and not its own size. */
const inWords = (/** @type {{ gzip: number, parts: readonly Part[] }} */ { gzip, parts }) => {
  const whole = parts.reduce((sum, { bytes }) => sum + bytes, 0);
  return parts
    .map(({ name, bytes }) => `${name} ${kib((gzip * bytes) / whole)}`)
    .slice(0, 6)
    .join(', ');
};
const kib = (/** @type {number} */ bytes) => (bytes / 1024).toFixed(1);
