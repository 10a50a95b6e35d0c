import type { Sequelize } from 'sequelize';
import { partitionHealth, type PartitionHealth } from '../../../db/partitions';
import type { ChangeFeed } from '../../middleware/change-feed';

/** How the service stands. */
export interface Readiness {
  readonly database: boolean;
  /** Whether keys and profiles in memory are as the database has them. */
  readonly listener: boolean;
  /** Null when the database does not say. */
  readonly partitions: PartitionHealth | null;
}

export const readinessOf =
  (sequelize: Sequelize, feed: ChangeFeed): (() => Promise<Readiness>) =>
  async () => {
    const listener = feed.isTrusted('keys') && feed.isTrusted('profiles');
    try {
      return { database: true, listener, partitions: await partitionHealth(sequelize) };
    } catch {
      return { database: false, listener, partitions: null };
    }
  };
