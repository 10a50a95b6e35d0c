import { createHash } from 'node:crypto';
import type { Sequelize } from 'sequelize';
import { canonicalJson } from '../server/engine/profiles/canonical';
import type { Departure } from '../server/engine/profiles/profile';
import type { ProfileTree } from '../server/engine/profiles/tree';
import { AuditEvent, FactorProfile, ProfileRevisionRow } from './models';

export interface ApprovedContent {
  readonly slug: string;
  readonly title: string;
  readonly owner: string;
  readonly tree: ProfileTree;
  readonly departures: readonly Departure[];
}

/** SHA-256 in hex over the canonical JSON of tree and departures. */
export function contentHash(content: Pick<ApprovedContent, 'tree' | 'departures'>): string {
  const { tree, departures } = content;
  return createHash('sha256').update(canonicalJson({ tree, departures })).digest('hex');
}

/**
 * Adds the content as an approved revision unless the latest one already is this content. What was
 * approved is never edited: changed content becomes the next revision.
 *
 * @returns `slug@revision` when one was added.
 */
export async function addApprovedRevision(
  owner: Sequelize,
  content: ApprovedContent,
  approvedBy: string,
): Promise<string | undefined> {
  const { slug, title, tree } = content;
  const sha256 = contentHash(content);
  return owner.transaction(async (transaction) => {
    const [profile] = await FactorProfile.findOrCreate({
      where: { slug },
      defaults: { slug, title, owner: content.owner },
      transaction,
    });
    if (profile.title !== title) await profile.update({ title }, { transaction });
    const latest = await ProfileRevisionRow.findOne({
      where: { slug },
      order: [['revision', 'DESC']],
      transaction,
    });
    if (latest?.sha256 === sha256) return undefined;
    const revision = (latest?.revision ?? 0) + 1;
    const now = new Date();
    await ProfileRevisionRow.create(
      {
        slug,
        revision,
        status: 'approved',
        tree,
        departures: [...content.departures],
        sha256,
        effectiveFrom: now,
        approvedAt: now,
        approvedBy,
      },
      { transaction },
    );
    const subject = `${slug}@${revision}`;
    await AuditEvent.create(
      { actor: approvedBy, action: 'revision.approved', subject, detail: { sha256 } },
      { transaction },
    );
    return subject;
  });
}
