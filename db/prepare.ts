import { connect } from './connect';
import { withLock } from './lock';
import { migrate } from './migrate';
import { makePartitions } from './partitions';
import { publishProfiles } from './publish';
import { seedScenario } from './seeders/scenario';

export interface PrepareOptions {
  readonly ownerUrl: string;
  readonly applicationRole: string;
  /** Adds the invented scenario and its key, which is minted unless this one still opens. */
  readonly demo?: { readonly key: string | undefined };
}

export interface Prepared {
  readonly migrations: readonly string[];
  readonly partitions: readonly string[];
  readonly published: readonly string[];
  /** The scenario's secret key: the only time it is told. */
  readonly demoKey?: string;
}

/** Makes a database fit to serve; doing it again changes only what is missing. */
export async function prepare(options: PrepareOptions): Promise<Prepared> {
  const { ownerUrl, applicationRole, demo } = options;
  const owner = connect(ownerUrl, { max: 1, name: 'headtree prepare' });
  try {
    return await withLock(ownerUrl, 'prepare', async () => ({
      migrations: await migrate(owner, { applicationRole }),
      partitions: await withLock(ownerUrl, 'upkeep', () => makePartitions(owner)),
      published: await publishProfiles(owner),
      ...(demo && { demoKey: await seedScenario(owner, demo.key) }),
    }));
  } finally {
    await owner.close();
  }
}
