/** A page of a list; the token is the service's own. */
export interface Page<T> {
  readonly items: readonly T[];
  readonly nextPageToken: string | null;
}
