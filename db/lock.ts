import { Client } from 'pg';

/** Work that only one process at a time may do on a database; the numbers are the lock's key. */
export const LOCKS = { prepare: 4_310_001, upkeep: 4_310_002 } as const;
export type LockName = keyof typeof LOCKS;

/** Does the work alone, after any other process that is at it. */
export async function withLock<T>(url: string, name: LockName, work: () => Promise<T>): Promise<T> {
  const client = await holder(url);
  try {
    await client.query('select pg_advisory_lock($1)', [LOCKS[name]]);
    return await work();
  } finally {
    await client.end();
  }
}

/** Does the work alone, or not at all: `undefined` says that another process is at it. */
export async function tryWithLock<T>(
  url: string,
  name: LockName,
  work: () => Promise<T>,
): Promise<T | undefined> {
  const client = await holder(url);
  try {
    const { rows } = await client.query<{ held: boolean }>(
      'select pg_try_advisory_lock($1) as held',
      [LOCKS[name]],
    );
    return rows[0]?.held ? await work() : undefined;
  } finally {
    await client.end();
  }
}

/** A connection of its own, which holds the lock: ending it, or losing it, lets go. */
async function holder(url: string): Promise<Client> {
  const client = new Client({ connectionString: url, application_name: 'headtree lock' });
  client.on('error', () => undefined);
  await client.connect();
  return client;
}
