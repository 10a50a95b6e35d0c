/** One thing a caller can mend, at its place in the request. */
export interface RefusalItem {
  /** JSON pointer into the request. */
  readonly pointer: string;
  readonly code: string;
  readonly message: string;
  readonly fix?: string;
  readonly clause?: string;
}

/** The engine will not answer: the input is not valid, or lies outside what the check covers. */
export class Refusal extends Error {
  constructor(
    readonly code: string,
    readonly detail: string,
    readonly items: readonly RefusalItem[] = [],
  ) {
    super(detail);
    this.name = 'Refusal';
  }
}
