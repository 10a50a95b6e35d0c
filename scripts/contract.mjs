/**
 * The contract: bundles `openapi/` into one document, lints it, and generates what is typed from it.
 *
 * `npm run contract` writes `openapi/generated/`. `buildContract()` does so only when a source has
 * changed; `checkContract()` lists what is wrong and writes nothing.
 */
import { createHash } from 'node:crypto';
import { mkdir, readFile, readdir, writeFile } from 'node:fs/promises';
import { dirname, join, relative, sep } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';

const root = dirname(dirname(fileURLToPath(import.meta.url)));
const home = join(root, 'openapi');
const generated = join(home, 'generated');
const stamp = 'sources.sha256';

/** @typedef {Record<string, any>} Json */

/** Methods of a path item, the rest are its parameters and words. */
const methods = ['get', 'put', 'post', 'delete', 'options', 'head', 'patch', 'trace'];

/** @param {string} folder @returns {Promise<string[]>} */
async function yamlFiles(folder) {
  const entries = await readdir(folder, { withFileTypes: true, recursive: true });
  return entries
    .filter((entry) => entry.isFile() && entry.name.endsWith('.yaml'))
    .map((entry) => join(entry.parentPath, entry.name))
    .sort();
}

/** Hash over everything that the generated files are made of. */
async function hashOfSources() {
  const hash = createHash('sha256');
  for (const file of [...(await yamlFiles(home)), fileURLToPath(import.meta.url)]) {
    hash.update(relative(root, file).split(sep).join('/'));
    hash.update((await readFile(file, 'utf8')).replaceAll('\r\n', '\n'));
  }
  return hash.digest('hex');
}

/** @param {unknown} value */
const text = (value) => `${JSON.stringify(value, null, 1)}\n`;

/** @param {Json} document @returns {Json} */
const copyOf = (document) => JSON.parse(JSON.stringify(document));

/** @returns {Promise<{ document: Json, problems: string[] }>} */
async function bundleSources() {
  const { bundle, loadConfig, lint } = await import('@redocly/openapi-core');
  const ref = join(home, 'openapi.yaml');
  const config = await loadConfig({ configPath: join(home, 'lint', 'redocly.yaml') });
  const found = await lint({ ref, config });
  const { bundle: made, problems } = await bundle({ ref, config, removeUnusedComponents: false });
  const lines = [...found, ...problems].map((problem) => {
    const place = problem.location[0];
    const file = place ? relative(root, place.source.absoluteRef).split(sep).join('/') : 'openapi';
    return `${file} ${place?.pointer ?? ''} ${problem.ruleId}: ${problem.message}`;
  });
  return { document: made.parsed, problems: [...new Set(lines)] };
}

/**
 * What is answered today: operations marked `x-served: false` are taken out, and every component
 * that only they used.
 *
 * @param {Json} document @returns {Json}
 */
export function servedOnly(document) {
  const served = copyOf(document);
  for (const [path, item] of Object.entries(served.paths)) {
    for (const method of methods) {
      if (item[method]?.['x-served'] === false) delete item[method];
    }
    if (!methods.some((method) => method in item)) delete served.paths[path];
  }
  const used = reachable(served);
  for (const [kind, parts] of Object.entries(served.components)) {
    if (kind === 'securitySchemes') continue;
    for (const name of Object.keys(parts)) {
      if (!used.has(`#/components/${kind}/${name}`)) delete parts[name];
    }
    if (Object.keys(parts).length === 0) delete served.components[kind];
  }
  return served;
}

/** Every local reference that the paths reach. @param {Json} document @returns {Set<string>} */
function reachable(document) {
  /** @type {Set<string>} */
  const seen = new Set();
  /** @param {any} node */
  const walk = (node) => {
    if (node === null || typeof node !== 'object') return;
    for (const [key, value] of Object.entries(node)) {
      const isReference = typeof value === 'string' && value.startsWith('#/components/');
      if (isReference && !seen.has(value)) {
        seen.add(value);
        walk(
          value
            .split('/')
            .slice(1)
            .reduce((part, name) => part?.[name], document),
        );
      } else if (key !== 'example' && key !== 'examples') {
        walk(value);
      }
    }
  };
  walk(document.paths);
  return seen;
}

/** @param {Json} document */
async function typesOf(document) {
  const { default: generate, astToString } = await import('openapi-typescript');
  const tree = await generate(/** @type {any} */ (copyOf(document)), {
    immutable: true,
    defaultNonNullable: false,
    emptyObjectsUnknown: true,
  });
  return `/* Generated from openapi/ by \`npm run contract\`. Do not change by hand. */\n${astToString(tree)}`;
}

/** @returns {Promise<{ files: Record<string, string>, problems: string[], document: Json }>} */
async function generate() {
  const { document, problems } = await bundleSources();
  const files = {
    'openapi.json': text(document),
    'openapi.served.json': text(servedOnly(document)),
    'types.ts': await typesOf(document),
    [stamp]: `${await hashOfSources()}\n`,
  };
  return { files, problems, document };
}

/** @param {string} name */
async function readGenerated(name) {
  try {
    return await readFile(join(generated, name), 'utf8');
  } catch {
    return null;
  }
}

/** @param {Record<string, string>} files */
async function writeGenerated(files) {
  await mkdir(generated, { recursive: true });
  for (const [name, content] of Object.entries(files)) {
    if ((await readGenerated(name)) !== content) await writeFile(join(generated, name), content);
  }
}

/**
 * Writes the generated files if a source has changed since.
 *
 * @returns {Promise<boolean>} whether it wrote.
 */
export async function buildContract() {
  if ((await readGenerated(stamp))?.trim() === (await hashOfSources())) return false;
  const { files, problems } = await generate();
  if (problems.length > 0) throw new Error(`The contract is not sound:\n${problems.join('\n')}`);
  await writeGenerated(files);
  return true;
}

/**
 * What is wrong with the contract: lint, stale generated files, examples that do not validate.
 *
 * @returns {Promise<string[]>} empty when all is well.
 */
export async function checkContract() {
  const { files, problems } = await generate();
  const stale = [];
  for (const [name, content] of Object.entries(files)) {
    if ((await readGenerated(name)) !== content) {
      stale.push(`openapi/generated/${name} is stale: run \`npm run contract\``);
    }
  }
  return [...problems, ...stale];
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  const { files, problems } = await generate();
  if (problems.length > 0) {
    console.error(problems.join('\n'));
    console.error(`${problems.length} problems in the contract`);
    process.exitCode = 1;
  }
  await writeGenerated(files);
}
