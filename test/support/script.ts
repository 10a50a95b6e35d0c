import { execFile } from 'node:child_process';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { promisify } from 'node:util';

const scripts = join(__dirname, '../../scripts');

/** What a call came to: its value, or the message it stopped with. */
export type Outcome = { readonly value?: unknown } | { readonly stopped: string };

/**
 * Calls a function of `scripts/` in a process of its own: the scripts are native modules, which
 * Jest does not load.
 */
export async function callScript(
  file: string,
  name: string,
  ...args: readonly unknown[]
): Promise<Outcome> {
  const code = `
    const script = await import(${JSON.stringify(pathToFileURL(join(scripts, file)).href)});
    let outcome;
    try {
      outcome = { value: await script[${JSON.stringify(name)}](...${JSON.stringify(args)}) };
    } catch (error) {
      outcome = { stopped: error.message };
    }
    console.log(JSON.stringify(outcome));`;
  const { stdout } = await promisify(execFile)(
    process.execPath,
    ['--input-type=module', '--eval', code],
    { maxBuffer: 2 ** 28 },
  );
  return JSON.parse(stdout.trim().split('\n').at(-1) ?? '') as Outcome;
}
