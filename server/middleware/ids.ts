import { randomFillSync } from 'node:crypto';
import { monotonicFactory } from 'ulid';

const block = new Uint8Array(4_096);
let used = block.length;

/** Randomness by the block: asked for character by character it costs more than the id itself. */
function random(): number {
  if (used === block.length) {
    randomFillSync(block);
    used = 0;
  }
  return (block[used++] ?? 0) / 256;
}

/** Ids of calls: ULIDs, ascending within a process. */
export const nextId = monotonicFactory(random);
