import type { Check, CheckAnswer, CheckContext } from '../../engine/checks/check';

/** Runs a check away from the thread that answers. */
export type RunApart = (
  check: Check,
  request: unknown,
  context: CheckContext,
) => Promise<CheckAnswer>;

/** Spans × combinations × patterns: above this a check would hold up others for milliseconds. */
export const costBound = 20_000;

export const runHere: RunApart = (check, request, context) =>
  Promise.resolve().then(() => check.run(request, context));

/** A quick check here and at once, a costly one apart. */
export const checkRunner =
  (apart: RunApart): RunApart =>
  (check, request, context) =>
    (check.cost(request) > costBound ? apart : runHere)(check, request, context);
