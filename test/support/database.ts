import { randomBytes } from 'node:crypto';
import { Client } from 'pg';

/** A database of one spec file: migrated, with the published profiles, and nothing else in it. */
export interface TestDatabase {
  /** Connection of the application role. */
  readonly url: string;
  readonly ownerUrl: string;
  /** Removes the database; connections still open to it are cut. */
  drop(): Promise<void>;
}

/** Clones the template that `npm test` has made, so that spec files run side by side. */
export async function createDatabase(): Promise<TestDatabase> {
  const url = fromEnvironment('HEADTREE_DATABASE_URL');
  const ownerUrl = fromEnvironment('HEADTREE_DATABASE_OWNER_URL');
  const template = ownerUrl.pathname.slice(1);
  const name = `spec_${randomBytes(8).toString('hex')}`;
  await asOwner(ownerUrl, `create database ${name} template ${template}`);
  return {
    url: at(url, name),
    ownerUrl: at(ownerUrl, name),
    drop: async () => {
      await asOwner(ownerUrl, cutConnections(name));
      await asOwner(ownerUrl, `drop database if exists ${name}`);
    },
  };
}

/**
 * Not `drop … with (force)`: that ends every session, and fails when one is the superuser's autovacuum
 * worker. A plain drop asks that worker to leave and waits for it.
 */
function cutConnections(database: string): string {
  return `select pg_terminate_backend(pid) from pg_stat_activity
    where datname = '${database}' and backend_type = 'client backend' and pid <> pg_backend_pid()`;
}

function fromEnvironment(name: string): URL {
  const value = process.env[name];
  if (!value)
    throw new Error('This spec needs a database: run it by `npm test -- <part of its path>`.');
  return new URL(value);
}

function at(url: URL, database: string): string {
  const moved = new URL(url);
  moved.pathname = `/${database}`;
  return moved.href;
}

/** From another database: nobody may be connected to a template while it is cloned. */
async function asOwner(ownerUrl: URL, statement: string): Promise<void> {
  const client = new Client({ connectionString: at(ownerUrl, 'postgres') });
  await client.connect();
  try {
    await client.query(statement);
  } finally {
    await client.end();
  }
}
