import { availableParallelism } from 'node:os';
import { Piscina } from 'piscina';
import type { CheckAnswer } from '../../engine/checks/check';
import { Refusal, type RefusalItem } from '../../engine/refusal';
import { awayProblem } from '../../middleware/problem';
import type { RunApart } from './check-runner';

/** A class does not survive the way between threads: a refusal travels as its parts. */
export type ThreadResult =
  | { readonly answer: CheckAnswer }
  | { readonly refusal: { code: string; detail: string; items: readonly RefusalItem[] } };

export interface ThreadTask {
  readonly checkId: string;
  readonly request: unknown;
  readonly context: Parameters<RunApart>[2];
}

/** Worker threads for costly checks; past the queue's length the caller is told to ask again. */
export function checkPool(filename: string): { run: RunApart; close: () => Promise<void> } {
  const pool = new Piscina<ThreadTask, ThreadResult>({
    filename,
    minThreads: 0,
    maxThreads: Math.max(1, availableParallelism() - 1),
    idleTimeout: 30_000,
    maxQueue: 64,
  });
  return {
    run: async (check, request, context) => {
      if (pool.queueSize >= 64) throw awayProblem('busy');
      const result = await pool.run({ checkId: check.id, request, context });
      if ('answer' in result) return result.answer;
      const { code, detail, items } = result.refusal;
      throw new Refusal(code, detail, items);
    },
    close: () => pool.destroy(),
  };
}
