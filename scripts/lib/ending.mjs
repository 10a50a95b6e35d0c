/** Thrown to leave a launch that was told to stop. */
export class Interrupted extends Error {}

/**
 * What a command has started and must stop, newest first.
 * @typedef {ReturnType<typeof makeEnding>} Ending
 */
export function makeEnding() {
  /** @type {(() => unknown)[]} */
  const tasks = [];
  let begun = false;
  return {
    /** @param {() => unknown} task done once, at the end */
    add: (task) => void tasks.push(task),
    /** Whether the end has been asked for. */
    begun: () => begun,
    /** Asks for the end: a launch under way leaves at its next `check`. */
    begin() {
      begun = true;
    },
    check() {
      if (begun) throw new Interrupted('told to stop');
    },
    /** Stops everything. */
    async end() {
      begun = true;
      for (let task = tasks.pop(); task; task = tasks.pop()) await task();
    },
  };
}
