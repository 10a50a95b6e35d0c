import type { Sequelize } from 'sequelize';
import { partitionHealth, type PartitionHealth } from '../../../db/partitions';
import type { ChangeFeed } from '../../middleware/change-feed';

/** How the service stands. */
export interface Readiness {
  readonly database: boolean;
  /** Whether keys and profiles in memory are as the database has them. */
  readonly listener: boolean;
  /** A warning is no reason to be taken out: the DEFAULT partition takes what has no other. */
  readonly partitions: { readonly ok: boolean; readonly warnings: readonly string[] };
}

function warningsOf({ missing, strayRows }: PartitionHealth): string[] {
  return [
    ...missing.map((table) => `The partition ${table} is missing.`),
    ...(strayRows > 0 ? [`${strayRows} rows lie in the DEFAULT partition.`] : []),
  ];
}

export const readinessOf =
  (sequelize: Sequelize, feed: ChangeFeed): (() => Promise<Readiness>) =>
  async () => {
    const listener = feed.isTrusted('keys') && feed.isTrusted('profiles');
    try {
      const warnings = warningsOf(await partitionHealth(sequelize));
      return { database: true, listener, partitions: { ok: warnings.length === 0, warnings } };
    } catch {
      const warnings = ['The database does not answer.'];
      return { database: false, listener, partitions: { ok: false, warnings } };
    }
  };
