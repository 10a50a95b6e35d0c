import type { ProblemBody, ProblemItem } from '../contract';

/** What stood in the way of an answer, in kinds that a page treats differently. */
export type ApiErrorKind =
  /** The request is refused; `items` point at its fields. */
  | 'not-valid'
  /** The key is missing, unknown, revoked or expired. */
  | 'key-refused'
  /** The key may not do this from here. */
  | 'not-allowed'
  /** The limit of calls is reached. */
  | 'too-many'
  /** The service does not answer. */
  | 'away'
  /** A secret key was given to a page; nothing was sent. */
  | 'secret-key'
  /** Anything else. */
  | 'unexpected';

/** What an {@link ApiError} is made of. */
export interface ApiErrorFacts {
  readonly kind: ApiErrorKind;
  readonly message: string;
  readonly status?: number | undefined;
  readonly code?: string | undefined;
  readonly items?: readonly ProblemItem[] | undefined;
  readonly requestId?: string | undefined;
  readonly retryAfter?: number | undefined;
}

/** A call that gave no answer, with the pointers of what can be mended. */
export class ApiError extends Error {
  override readonly name = 'ApiError';
  readonly kind: ApiErrorKind;
  /** The HTTP status; undefined where nothing came back. */
  readonly status: number | undefined;
  /** Stable word for programs, such as `not-valid`. */
  readonly code: string | undefined;
  /** What the caller can mend, each with a JSON pointer into the request. */
  readonly items: readonly ProblemItem[];
  /** The service's own id of the call. */
  readonly requestId: string | undefined;
  /** Seconds to wait before the same call may succeed. */
  readonly retryAfter: number | undefined;

  constructor(facts: ApiErrorFacts) {
    super(facts.message);
    this.kind = facts.kind;
    this.status = facts.status;
    this.code = facts.code;
    this.items = facts.items ?? [];
    this.requestId = facts.requestId;
    this.retryAfter = facts.retryAfter;
  }

  /** Whether the same call may succeed later without a change. */
  get retryable(): boolean {
    return this.kind === 'away' || this.kind === 'too-many';
  }
}

const AWAY = 'The service does not answer. What you typed is kept; the check runs when it is back.';

/** The error of a call that nothing came back from. */
export function awayError(): ApiError {
  return new ApiError({ kind: 'away', message: AWAY });
}

/** Why a secret key is refused before anything is sent. */
export function secretKeyError(): ApiError {
  return new ApiError({
    kind: 'secret-key',
    message:
      'This is a secret key (htk_). Whoever opens the page could read it, so nothing was sent. Use a page key (htp_) and replace the secret one.',
  });
}

function kindOf(status: number): ApiErrorKind {
  if (status === 401) return 'key-refused';
  if (status === 403) return 'not-allowed';
  if (status === 429) return 'too-many';
  if (status === 502 || status === 503 || status === 504) return 'away';
  if (status === 400 || status === 409 || status === 413 || status === 422) return 'not-valid';
  return 'unexpected';
}

/** The error of an answer that is not one. */
export async function errorOf(response: Response): Promise<ApiError> {
  const problem = await problemOf(response);
  const kind = kindOf(response.status);
  const wait = Number(response.headers.get('Retry-After') ?? Number.NaN);
  return new ApiError({
    kind,
    message:
      kind === 'away' ? AWAY : (problem?.detail ?? `The service answered ${response.status}.`),
    status: response.status,
    code: problem?.code,
    items: problem?.errors,
    requestId: problem?.requestId ?? response.headers.get('X-Request-Id') ?? undefined,
    retryAfter: Number.isFinite(wait) && wait >= 0 ? wait : undefined,
  });
}

async function problemOf(response: Response): Promise<Partial<ProblemBody> | undefined> {
  try {
    const body: unknown = await response.json();
    return typeof body === 'object' && body !== null ? body : undefined;
  } catch {
    return undefined;
  }
}
