import { checks } from '../../engine/checks/registry';
import { Refusal } from '../../engine/refusal';
import type { ThreadResult, ThreadTask } from './check-pool';

/** What a worker thread does. */
export default function runTask({ checkId, request, context }: ThreadTask): ThreadResult {
  const check = checks.find(({ id }) => id === checkId);
  if (!check) throw new Error(`No check ${checkId} in this thread.`);
  try {
    return { answer: check.run(request, context) };
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    const { code, detail, items } = error;
    return { refusal: { code, detail, items } };
  }
}
