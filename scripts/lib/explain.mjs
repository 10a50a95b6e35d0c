import { Stop } from './say.mjs';

/**
 * What went wrong, in the words of the system, and what to do. The first that fits is told.
 * @type {readonly (readonly [pattern: RegExp, advice: (place: string) => string])[]}
 */
const KNOWN = [
  [
    /ENOSPC|No space left on device|Disk quota exceeded|wrote only \d+ of \d+ bytes/i,
    (place) =>
      `The disk that holds ${place} is full. Free some space, or choose another folder: ` +
      'HEADTREE_HOME=/some/where npm start',
  ],
  [
    /EROFS|Read-only file system/i,
    (place) =>
      `${place} is on a read-only disk. Choose another folder: HEADTREE_HOME=/some/where npm start`,
  ],
  [
    /EACCES|EPERM|Permission denied|Operation not permitted/i,
    (place) =>
      `This user may not write in ${place}. Run as its owner, or choose another folder: ` +
      'HEADTREE_HOME=/some/where npm start',
  ],
];

/**
 * A one-line failure for what the system said, when it is one of the usual ones.
 * @param {unknown} error an error or the output of a program
 * @param {string} place what was being written
 * @returns {Stop | undefined}
 */
export function explain(error, place) {
  if (error instanceof Stop) return error;
  const known = advice(textOf(error), pathOf(error) ?? place);
  return known === undefined ? undefined : new Stop(known);
}

/** @param {string} said @param {string} place */
export function advice(said, place) {
  return KNOWN.find(([pattern]) => pattern.test(said))?.[1](place);
}

/** @param {unknown} error */
export function textOf(error) {
  return error instanceof Error ? error.message : String(error);
}

/** @param {unknown} error */
function pathOf(error) {
  return error instanceof Error && 'path' in error && typeof error.path === 'string'
    ? error.path
    : undefined;
}

/** The last line that says something. @param {string} output */
export function lastLine(output) {
  return output.trimEnd().split('\n').at(-1)?.trim() ?? '';
}
