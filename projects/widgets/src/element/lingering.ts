/** What lives on for a while after it was taken out of the page. */
export interface Lingering {
  /** Told when it is not coming back soon. */
  end(): void;
}

/** A page that takes an element out to put it elsewhere does so within this time. */
const PATIENCE = 30_000;
/** Beyond this many, the oldest go first, so that a page that makes many never piles them up. */
const MOST = 16;
/** A list that is sorted anew takes all of its elements out at once. */
const MOVE = 1_000;

/** By the time they left, oldest first. */
const left = new Map<Lingering, number>();
let timer: ReturnType<typeof setTimeout> | undefined;

/** Lets something live on until it is back or its time is over. */
export function linger(one: Lingering): void {
  left.delete(one);
  left.set(one, performance.now());
  timer ??= setTimeout(sweep, MOVE);
}

/** It is back. */
export function stay(one: Lingering): void {
  left.delete(one);
}

function sweep(): void {
  timer = undefined;
  const now = performance.now();
  for (const [one, since] of left) {
    const age = now - since;
    const isOver = age >= PATIENCE || (left.size > MOST && age >= MOVE / 2);
    if (!isOver) break;
    left.delete(one);
    one.end();
  }
  if (left.size > 0) timer = setTimeout(sweep, MOVE);
}
