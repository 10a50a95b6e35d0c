import type { ApiError, CheckAnswer } from '@headtree/checks';

/** `detail` of `headtree-input`: after each change by the user that can be sent, and once when none can. */
export interface InputDetail {
  /** The request as it now stands; null while the fields hold none that can be sent. */
  readonly value: object | null;
}

/** `detail` of `headtree-result`: a new answer. */
export interface ResultDetail {
  readonly result: CheckAnswer;
  /** The request that it answers. */
  readonly value: object | null;
}

/** `detail` of `headtree-error`: why there is no answer. */
export type ErrorDetail = Readonly<
  Pick<ApiError, 'kind' | 'message'> &
    Partial<Pick<ApiError, 'code' | 'status' | 'items' | 'requestId' | 'retryAfter' | 'retryable'>>
>;

/** A plain copy: an event's detail outlives the code that made it. */
export function errorDetail(error: ApiError): ErrorDetail {
  const { kind, message, code, status, items, requestId, retryAfter, retryable } = error;
  return { kind, message, code, status, items, requestId, retryAfter, retryable };
}
