import { FactorProfile, ProfileRevisionRow } from '../../../db/models';
import type { Departure, RevisionStatus } from '../../engine/profiles/profile';
import type { ProfileTree } from '../../engine/profiles/tree';

/** A revision as kept, with the words of its profile. */
export interface ProfileRow {
  readonly slug: string;
  readonly title: string;
  readonly owner: string;
  readonly revision: number;
  readonly status: RevisionStatus;
  readonly tree: ProfileTree;
  readonly departures: readonly Departure[];
  readonly sha256: string;
  readonly effectiveFrom: Date;
  readonly expiresAt: Date | null;
  readonly approvedAt: Date | null;
  readonly approvedBy: string | null;
}

export interface ProfileStore {
  all(): Promise<ProfileRow[]>;
}

export class DatabaseProfileStore implements ProfileStore {
  async all(): Promise<ProfileRow[]> {
    const [profiles, revisions] = await Promise.all([
      FactorProfile.findAll(),
      ProfileRevisionRow.findAll(),
    ]);
    const bySlug = new Map(profiles.map((profile) => [profile.slug, profile]));
    return revisions.map((row) => ({
      slug: row.slug,
      title: bySlug.get(row.slug)?.title ?? row.slug,
      owner: bySlug.get(row.slug)?.owner ?? '',
      revision: row.revision,
      status: row.status,
      tree: row.tree,
      departures: row.departures,
      sha256: row.sha256,
      effectiveFrom: row.effectiveFrom,
      expiresAt: row.expiresAt,
      approvedAt: row.approvedAt,
      approvedBy: row.approvedBy,
    }));
  }
}
