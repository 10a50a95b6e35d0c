import { Refusal, type RefusalItem } from '../engine/refusal';
import { GatherFull } from './gather';
import { isProblemCode, problemKinds, type ProblemCode } from './problem-codes';

interface ProblemOptions {
  readonly errors?: readonly RefusalItem[];
  readonly headers?: Readonly<Record<string, string>>;
  readonly cause?: unknown;
}

/** A problem of the caller or of the service, thrown anywhere and answered as problem details. */
export class Problem extends Error {
  readonly errors: readonly RefusalItem[];
  readonly headers: Readonly<Record<string, string>>;

  constructor(
    readonly code: ProblemCode,
    readonly detail: string,
    { errors = [], headers = {}, cause }: ProblemOptions = {},
  ) {
    super(detail, { cause });
    this.name = 'Problem';
    this.errors = errors;
    this.headers = headers;
  }

  get status(): number {
    return problemKinds[this.code].status;
  }
}

const retrySoon = { 'Retry-After': '1' };

/** The service cannot do it just now, for a reason that passes. */
export const awayProblem = (
  code: 'log-unavailable' | 'database-unavailable' | 'busy',
  cause?: unknown,
): Problem =>
  new Problem(code, `${problemKinds[code].title}. Nothing was done; ask again.`, {
    headers: retrySoon,
    cause,
  });

/**
 * A refusal of the engine keeps its own code where that has a page. Otherwise the clause tells:
 * what a clause leaves out lies outside the check, the rest is for the caller to mend.
 */
function codeOfRefusal({ code, items }: Refusal): ProblemCode {
  if (isProblemCode(code) && problemKinds[code].status === 422) return code;
  const mendable = items.length > 0 && items.every(({ clause }) => clause === undefined);
  return mendable ? 'not-valid' : 'outside-scope';
}

const problemOfRefusal = (refusal: Refusal): Problem =>
  new Problem(codeOfRefusal(refusal), refusal.detail, { errors: refusal.items });

/** What went wrong, as a problem. Whatever is not expected says nothing of its inside. */
export function toProblem(error: unknown): Problem {
  if (error instanceof Problem) return error;
  if (error instanceof Refusal) return problemOfRefusal(error);
  if (error instanceof GatherFull) return awayProblem('busy', error);
  return new Problem('unexpected', 'A defect of this service.', { cause: error });
}

/** RFC 9457 problem details. */
export interface ProblemBody {
  readonly type: string;
  readonly title: string;
  readonly status: number;
  readonly detail: string;
  readonly instance: string;
  readonly code: ProblemCode;
  readonly requestId: string;
  readonly retryable: boolean;
  readonly errors: readonly RefusalItem[];
}

export function problemBody(problem: Problem, instance: string, requestId: string): ProblemBody {
  const { code, detail, errors } = problem;
  const { title, status, retryable } = problemKinds[code];
  const type = `/problems/${code}`;
  return { type, title, status, detail, instance, code, requestId, retryable, errors };
}
