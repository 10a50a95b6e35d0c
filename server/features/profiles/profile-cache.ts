import type { ProfileRevision, Standing } from '../../engine/profiles/profile';
import type { ChangeFeed } from '../../middleware/change-feed';
import type { ProfileRow, ProfileStore } from './profile-store';

/** What a revision is worth at a moment. */
export function standingAt(row: ProfileRow, now: Date): Standing {
  if (row.status === 'withdrawn') return 'withdrawn';
  if (row.status !== 'approved') return 'draft';
  if (row.effectiveFrom > now) return 'not-yet-in-effect';
  if (row.expiresAt !== null && row.expiresAt <= now) return 'expired';
  return 'in-effect';
}

export function revisionAt(row: ProfileRow, now: Date): ProfileRevision {
  const { slug, revision, title, status, sha256, tree, departures } = row;
  const standing = standingAt(row, now);
  return { slug, revision, title, status, standing, sha256, tree, departures };
}

/** Revisions by slug, newest first. */
export type Profiles = ReadonlyMap<string, readonly ProfileRow[]>;

/** All revisions, in memory; trusted as long as keys are, and read anew for each call after that. */
export class ProfileCache {
  private bySlug: Profiles = new Map();

  constructor(
    private readonly store: ProfileStore,
    private readonly feed: ChangeFeed,
  ) {
    feed.subscribe('profiles', async () => {
      this.bySlug = await this.read();
    });
  }

  async current(): Promise<Profiles> {
    return this.feed.isTrusted('profiles') ? this.bySlug : await this.read();
  }

  private async read(): Promise<Profiles> {
    const rows = await this.store.all();
    rows.sort((a, b) => b.revision - a.revision);
    const bySlug = new Map<string, ProfileRow[]>();
    for (const row of rows) {
      const others = bySlug.get(row.slug);
      if (others) others.push(row);
      else bySlug.set(row.slug, [row]);
    }
    return bySlug;
  }
}
