import { ask as askService } from './support/ask';
import { Pool } from 'pg';
import { mintKey } from '../../server/features/keys/key-format';
import { addKey, startService, until, type TestService } from './support/service';

let service: TestService & { keys: Record<'one' | 'two' | 'three', string> };
beforeAll(async () => {
  service = await startService({ one: {}, two: {}, three: {} });
});
afterAll(() => service.stop());

const ask = async (key: string): Promise<number> =>
  (await askService(service.server, { path: '/v1/checks', key })).status;

const revoke = (key: string): Promise<unknown> =>
  service.sql('UPDATE api_keys SET revoked_at = now() WHERE selector = $1', [key.slice(4, 16)]);

/** Cuts the listener's connection. */
const cut = async (): Promise<void> => {
  const { url } = service.database;
  const pool = new Pool({ connectionString: url, max: 1 });
  await pool.query(
    `SELECT pg_terminate_backend(pid) FROM pg_stat_activity
      WHERE application_name = 'headtree-listener' AND datname = current_database()`,
  );
  await pool.end();
};

describe('a change of keys', () => {
  it('is known as soon as it is notified', async () => {
    expect(await ask(service.keys.one)).toBe(200);
    await revoke(service.keys.one);
    await until(async () => (await ask(service.keys.one)) === 401, 500);
  });

  it('lets a new key in', async () => {
    const owner = new Pool({ connectionString: service.database.ownerUrl, max: 1 });
    const key = await addKey(owner);
    await owner.end();
    await until(async () => (await ask(key)) === 200, 500);
  });

  it('that was missed while the listener was away is known after the gap', async () => {
    expect(await ask(service.keys.two)).toBe(200);
    await cut();
    await revoke(service.keys.two);
    await until(async () => (await ask(service.keys.two)) === 401, 2_500);
    await until(() => service.feed.isTrusted('keys'));
  });

  it('notes the day of last use, once', async () => {
    const days = async () =>
      service.sql<{ last_used_on: unknown }>(
        'SELECT last_used_on FROM api_keys WHERE selector = $1',
        [service.keys.two.slice(4, 16)],
      );
    await until(async () => (await days())[0]?.last_used_on !== null);
  });
});

describe('while the listener is away for more than two seconds', () => {
  beforeAll(async () => {
    await service.feed.close();
    await until(() => !service.feed.isTrusted('keys'));
  });

  it('each key is looked up in the database', async () => {
    expect(await ask(service.keys.three)).toBe(200);
    const before = service.keyQueries();
    expect(before).toBeGreaterThan(0);
    await revoke(service.keys.three);
    expect(await ask(service.keys.three)).toBe(401);
    expect(service.keyQueries()).toBe(before + 1);
  });

  it('a mistyped key is refused without a query, an unknown one with one', async () => {
    const { text } = mintKey('secret');
    const before = service.keyQueries();
    expect(await ask(text.slice(0, -1) + (text.endsWith('0') ? '1' : '0'))).toBe(401);
    expect(service.keyQueries()).toBe(before);
    expect(await ask(text)).toBe(401);
    expect(service.keyQueries()).toBe(before + 1);
  });

  it('readiness says so', async () => {
    const { status, body } = await askService(service.server, { path: '/readyz' });
    expect([status, body.listener, body.database]).toEqual([503, false, true]);
  });
});
