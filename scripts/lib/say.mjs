import { performance } from 'node:perf_hooks';

/** A failure that is told in one line: what is wrong and what to do. */
export class Stop extends Error {}

const started = performance.now();

/** One short line of progress, with the seconds since the command began. @param {string} line */
export function say(line) {
  const seconds = (performance.now() - started) / 1000;
  process.stdout.write(`${seconds.toFixed(1).padStart(6)} s  ${line}\n`);
}

/** Lines without a time. @param {string[]} lines */
export function print(...lines) {
  process.stdout.write(`${lines.join('\n')}\n`);
}

/** Whoever reads the output may be gone before the command has stopped what it started. */
export function outliveReader() {
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => undefined);
}
