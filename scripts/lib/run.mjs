import { spawn } from 'node:child_process';

/**
 * @typedef {object} RunOptions
 * @property {string} [cwd]
 * @property {NodeJS.ProcessEnv} [env]
 * @property {{ uid: number, gid: number }} [as] another user to run as; for root only
 * @property {'gather' | 'show' | 'errors'} [output] whether to gather it, show it, or show errors only
 * @property {(pid: number) => void} [started] told of its process
 * @typedef {{ code: number, stdout: string, stderr: string }} Ran
 */

/** @type {Record<string, import('node:child_process').StdioOptions>} */
const OUTPUTS = {
  gather: ['ignore', 'pipe', 'pipe'],
  show: ['ignore', 'inherit', 'inherit'],
  errors: ['ignore', 'ignore', 'inherit'],
};

/** @type {Set<import('node:child_process').ChildProcess>} */
const underWay = new Set();

/**
 * Runs a program to its end; it has no standard input.
 * @param {string} program @param {readonly string[]} args @param {RunOptions} [options]
 * @returns {Promise<Ran>}
 */
export function run(program, args, options = {}) {
  const { cwd, env, as, output = 'gather' } = options;
  return new Promise((resolve, reject) => {
    const child = spawn(program, args, {
      ...(cwd === undefined ? {} : { cwd }),
      ...(env === undefined ? {} : { env }),
      ...as,
      stdio: OUTPUTS[output],
    });
    underWay.add(child);
    if (child.pid !== undefined) options.started?.(child.pid);
    let stdout = '';
    let stderr = '';
    child.stdout?.setEncoding('utf8').on('data', (text) => (stdout += text));
    child.stderr?.setEncoding('utf8').on('data', (text) => (stderr += text));
    child.on('error', (error) => {
      underWay.delete(child);
      reject(error);
    });
    child.on('close', (code) => {
      underWay.delete(child);
      resolve({ code: code ?? 1, stdout, stderr });
    });
  });
}

/** Ends whatever `run` has not finished; for when the command itself is told to stop. */
export function stopRunning() {
  for (const child of underWay) child.kill('SIGTERM');
}
