import type { ProfileTree } from './tree';

export type RevisionStatus = 'draft' | 'proposed' | 'approved' | 'withdrawn';

/** What a revision is worth on the day it is used; the server's clock decides, the engine reads it. */
export type Standing = 'in-effect' | 'not-yet-in-effect' | 'draft' | 'withdrawn' | 'expired';

/** A firm's stated difference from the published set its profile starts from. */
export interface Departure {
  readonly id: string;
  /** Path into the tree, parts joined by a dot. */
  readonly path: string;
  readonly from: number | string | null;
  readonly to: number | string | null;
  readonly reason: string;
}

/** One immutable revision of a factor profile, as the engine needs it. */
export interface ProfileRevision {
  readonly slug: string;
  readonly revision: number;
  readonly title: string;
  readonly status: RevisionStatus;
  readonly standing: Standing;
  /** SHA-256 over the canonical JSON of tree and departures, in hex. */
  readonly sha256: string;
  readonly tree: ProfileTree;
  readonly departures: readonly Departure[];
}
