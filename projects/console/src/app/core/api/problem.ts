import { HttpErrorResponse } from '@angular/common/http';

/** One place the caller can mend. */
export interface ProblemItem {
  readonly pointer: string;
  readonly code: string;
  readonly message: string;
  readonly fix?: string;
}

/** What went wrong, in the service's own words where it gave any. */
export class Problem extends Error {
  override readonly name = 'Problem';

  constructor(
    readonly status: number,
    readonly code: string,
    readonly title: string,
    readonly detail: string,
    readonly errors: readonly ProblemItem[] = [],
    readonly requestId: string | null = null,
    readonly retryAfter: number | null = null,
  ) {
    super(detail);
  }

  /** The message for a field, by the JSON pointer of the field or of anything inside it. */
  at(pointer: string): string | undefined {
    const item = this.errors.find(
      (each) => each.pointer === pointer || each.pointer.startsWith(`${pointer}/`),
    );
    return item && [item.message, item.fix].filter(Boolean).join(' ');
  }
}

interface ProblemBody {
  code?: string;
  title?: string;
  detail?: string;
  errors?: ProblemItem[];
  requestId?: string;
}

const away = 'The service does not answer. Nothing was changed.';

export function problemOf(error: unknown): Problem {
  if (error instanceof Problem) return error;
  if (!(error instanceof HttpErrorResponse))
    return new Problem(0, 'unexpected', 'Something went wrong here', 'The page met a defect.');
  if (error.status === 0) return new Problem(0, 'away', 'The service is away', away);
  const body = (isObject(error.error) ? error.error : {}) as ProblemBody;
  const wait = Number(error.headers.get('Retry-After'));
  return new Problem(
    error.status,
    body.code ?? 'unexpected',
    body.title ?? 'The service gave no reason',
    body.detail ?? `It answered ${error.status}.`,
    body.errors ?? [],
    body.requestId ?? error.headers.get('X-Request-Id'),
    wait > 0 ? wait : null,
  );
}

const isObject = (value: unknown): value is object => typeof value === 'object' && value !== null;
