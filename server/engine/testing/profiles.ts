import type { ProfileRevision } from '../profiles/profile';
import { publishedProfiles } from '../profiles/published';

/** A published set as an approved revision in effect, for specs. */
export function publishedRevision(slug: string): ProfileRevision {
  const found = publishedProfiles.find((one) => one.slug === slug);
  if (!found) throw new Error(`${slug} is not published`);
  const { title, tree, departures } = found;
  return {
    slug,
    revision: 1,
    title,
    status: 'approved',
    standing: 'in-effect',
    sha256: '0'.repeat(64),
    tree,
    departures,
  };
}
