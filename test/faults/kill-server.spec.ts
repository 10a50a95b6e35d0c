import { Pool } from 'pg';
import { addKey, until } from '../api/support/service';
import { createDatabase, type TestDatabase } from '../support/database';
import { startCallers, type Acknowledged } from './callers';
import { startServer } from './server-process';

/** `npm run test:faults` asks for more. */
const rounds = Number(process.env.HEADTREE_FAULT_ROUNDS ?? 2);

let database: TestDatabase;
let owner: Pool;
let key: string;
beforeAll(async () => {
  database = await createDatabase();
  owner = new Pool({ connectionString: database.ownerUrl, max: 1 });
  key = await addKey(owner, { rateLimit: 1_000_000_000 });
});
afterAll(async () => {
  await owner.end();
  await database.drop();
});

interface Logged {
  readonly label: string;
  readonly ids: readonly string[];
  readonly statuses: readonly number[];
}

/** Each answer that a caller had in hand has exactly one row, of its id and its status. */
async function expectLogged(name: string, acknowledged: readonly Acknowledged[]): Promise<void> {
  const { rows } = await owner.query<Logged>(
    `SELECT caller_request_id AS label, array_agg(id::text) AS ids,
            array_agg(http_status::int) AS statuses
       FROM usage_events WHERE caller_request_id LIKE $1 GROUP BY 1`,
    [`${name}-%`],
  );
  const logged = new Map(rows.map((row) => [row.label, row]));
  const wrong = acknowledged.filter(({ label, requestId, status }) => {
    const row = logged.get(label);
    return row?.ids.join() !== requestId || row.statuses.join() !== String(status);
  });
  expect(wrong).toEqual([]);
  expect(rows.filter(({ ids }) => ids.length !== 1)).toEqual([]);
}

const pause = (milliseconds: number): Promise<void> =>
  new Promise((resolve) => setTimeout(resolve, milliseconds));

describe('a server that is killed in the middle of its work', () => {
  it(
    'has logged every answer that it gave, once',
    async () => {
      for (let round = 0; round < rounds; round++) {
        const name = `kill-${round}`;
        const server = await startServer(database.url);
        const callers = startCallers(server.port, key, name);
        await until(() => callers.acknowledged.length > 100, 20_000);
        await pause(Math.random() * 400);
        await server.kill();
        await callers.stop();
        await expectLogged(name, callers.acknowledged);
      }
    },
    rounds * 40_000,
  );
});

describe('a server whose connections the database cuts', () => {
  it('goes on, and has logged every answer that it gave, once', async () => {
    const server = await startServer(database.url);
    const callers = startCallers(server.port, key, 'cut');
    const role = new Pool({ connectionString: database.url, max: 1 });
    for (let round = 0; round < rounds; round++) {
      const before = callers.acknowledged.length;
      await until(() => callers.acknowledged.length > before + 100, 20_000);
      await role.query(
        `SELECT pg_terminate_backend(pid) FROM pg_stat_activity
          WHERE usename = current_user AND pid <> pg_backend_pid()
            AND datname = current_database()`,
      );
    }
    const before = callers.acknowledged.length;
    await until(() => callers.acknowledged.length > before + 100, 20_000);
    await callers.stop();
    await role.end();
    await server.kill();
    const good = callers.acknowledged.filter(({ status }) => status === 200);
    expect(good.length).toBeGreaterThan(200);
    // A 503 is the one answer that may go out without a row.
    expect(callers.acknowledged.every(({ status }) => status === 200 || status === 503)).toBe(true);
    await expectLogged('cut', good);
  }, 120_000);
});
