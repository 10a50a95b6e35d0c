import type { components } from '../../../openapi/generated/types';
import type { ProfileRevision } from '../profiles/profile';

export type CheckAnswer = components['schemas']['CheckAnswer'];

/** `summary` gathers no working and costs nothing for it. */
export type Detail = 'full' | 'summary';

export interface CheckContext {
  readonly profile: ProfileRevision;
  readonly detail: Detail;
}

/**
 * A check of the contract. The registry of checks gives the routes, so that adding one means
 * adding its file.
 */
export interface Check<Request = unknown> {
  /** The last part of its path: `/v1/checks/{id}`. */
  readonly id: string;
  readonly title: string;
  /** Name of its request in the contract's schemas. */
  readonly requestSchema: string;
  /**
   * Runs the check on a request that is valid against its schema.
   *
   * @throws {Refusal} when the request lies outside what the check covers.
   */
  run(request: Request, context: CheckContext): CheckAnswer;
  /** Spans × combinations × items: what tells a quick check from one for a worker thread. */
  cost(request: Request): number;
}
