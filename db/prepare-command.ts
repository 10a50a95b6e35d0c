/**
 * Makes the database fit to serve, then tells on its standard output, as one line of JSON, what it
 * did. Run by the start and test commands before anything connects.
 */
import { prepare } from './prepare';
import { readConfig } from '../server/config';
import type { DemoPerson } from './seeders/people';

async function run(): Promise<void> {
  const { databaseUrl, databaseOwnerUrl } = readConfig();
  if (databaseOwnerUrl === undefined) throw new Error('HEADTREE_DATABASE_OWNER_URL is missing.');
  const prepared = await prepare({
    ownerUrl: databaseOwnerUrl,
    applicationRole: decodeURIComponent(new URL(databaseUrl).username),
    ...(process.argv.includes('--demo') && {
      demo: { key: process.env.HEADTREE_DEMO_KEY, people: knownPeople() },
    }),
  });
  process.stdout.write(`${JSON.stringify(prepared)}\n`);
}

/** What the start command remembers of them. */
const knownPeople = (): DemoPerson[] =>
  JSON.parse(process.env.HEADTREE_DEMO_PEOPLE ?? '[]') as DemoPerson[];

run().catch((error: unknown) => {
  // Only the message: a driver's error object can hold the password.
  process.stderr.write(`${error instanceof Error ? error.message : 'unknown failure'}\n`);
  process.exitCode = 1;
});
