import type { Sequelize } from 'sequelize';
import { publishedProfiles } from '../server/engine/profiles/published';
import { addApprovedRevision } from './revise';

/**
 * Brings the published profiles into the database, as the owner: the product needs them. Doing it
 * again changes nothing; a published tree that changed becomes a new revision.
 *
 * @returns the revisions added, `uk-na@1`.
 */
export async function publishProfiles(owner: Sequelize): Promise<string[]> {
  const added: string[] = [];
  for (const profile of publishedProfiles) {
    const revision = await addApprovedRevision(owner, profile, 'Headtree, as published');
    if (revision !== undefined) added.push(revision);
  }
  return added;
}
