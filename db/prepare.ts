import { connect } from './connect';
import { withLock } from './lock';
import { migrate } from './migrate';
import { makePartitions } from './partitions';
import { publishProfiles } from './publish';
import { seedPeople, type DemoPerson } from './seeders/people';
import { seedScenario } from './seeders/scenario';

export interface PrepareOptions {
  readonly ownerUrl: string;
  readonly applicationRole: string;
  /** Adds the invented scenario; its key and passwords are made anew unless these still open. */
  readonly demo?: { readonly key: string | undefined; readonly people: readonly DemoPerson[] };
}

export interface Prepared {
  readonly migrations: readonly string[];
  readonly partitions: readonly string[];
  readonly published: readonly string[];
  /** The scenario's secret key: the only time it is told. */
  readonly demoKey?: string;
  /** Its people with their passwords: told here alone. */
  readonly demoPeople?: readonly DemoPerson[];
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
      ...(demo && {
        demoKey: await seedScenario(owner, demo.key),
        demoPeople: await seedPeople(owner, demo.people),
      }),
    }));
  } finally {
    await owner.close();
  }
}
