import { readFileSync } from 'node:fs';

/**
 * A process, told apart from a later one that was given the same number.
 * @typedef {{ pid: number, started: string }} ProcessMark
 */

/** @param {number} pid @returns {ProcessMark | undefined} undefined when there is none */
export function markOf(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    // The name, in brackets, may itself hold spaces and brackets.
    const [state, ...fields] = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    return state === 'Z' ? undefined : { pid, started: fields[18] ?? '' };
  } catch {
    return undefined;
  }
}

/** @param {ProcessMark | undefined} mark */
export function isAlive(mark) {
  return mark !== undefined && markOf(mark.pid)?.started === mark.started;
}

/**
 * Asks a process to end, and ends it when it has not after `patience` ms.
 * @param {ProcessMark} mark @param {NodeJS.Signals} signal @param {number} patience
 */
export async function endProcess(mark, signal, patience) {
  for (const each of [signal, /** @type {const} */ ('SIGKILL')]) {
    if (!isAlive(mark)) return;
    process.kill(mark.pid, each);
    for (const until = Date.now() + patience; isAlive(mark) && Date.now() < until;) {
      await new Promise((resolve) => setTimeout(resolve, 20));
    }
  }
}
