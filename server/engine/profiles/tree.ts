/** How the project comes to know a value. `derived` and `bound` follow from a stated rule. */
export type ProvenanceKind =
  'sourced' | 'recalled' | 'derived' | 'bound' | 'common-practice' | 'firm';

/** A value with where it comes from; the leaf of every profile's tree. */
export interface ProfileValue<T extends number | string = number | string> {
  readonly value: T;
  /** One of the answer's units; `1` for a ratio and for a choice. */
  readonly unit: string;
  readonly clause: string;
  /** Title of the publication, or how the value follows. */
  readonly source: string;
  readonly locator?: string;
  readonly kind: ProvenanceKind;
  /** The published example, read in its source, that uses a recalled value. */
  readonly confirmedBy?: string;
  readonly note?: string;
}

/** The tree of a profile: names to branches or to values. */
export interface ProfileTree {
  readonly [name: string]: ProfileTree | ProfileValue;
}
