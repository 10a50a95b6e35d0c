import { Client } from 'pg';
import { ask, type Answered } from './support/ask';
import { startService, until, type TestService } from './support/service';

let service: TestService & { keys: Record<'good', string> };
beforeAll(async () => {
  service = await startService({ good: {} });
});
afterAll(() => service.stop());

const post = (key?: string): Promise<Answered> =>
  ask(service.server, {
    method: 'post',
    path: '/v1/checks/fake',
    key,
    body: { profile: 'uk-na', load: 0.5 },
  });

/** Nobody gets in any more, and whoever is in is put out. */
async function cutOff(): Promise<void> {
  const { url, ownerUrl } = service.database;
  const name = new URL(url).pathname.slice(1);
  const outside = new URL(ownerUrl);
  outside.pathname = '/postgres';
  const inside = new Client({ connectionString: url });
  await inside.connect();
  const owner = new Client({ connectionString: outside.href });
  await owner.connect();
  await owner.query(`ALTER DATABASE ${name} WITH ALLOW_CONNECTIONS false`);
  await owner.end();
  await inside.query(
    `SELECT pg_terminate_backend(pid) FROM pg_stat_activity
      WHERE usename = current_user AND pid <> pg_backend_pid() AND datname = current_database()`,
  );
  await inside.end();
}

describe('503', () => {
  it('goes out, never an unlogged answer, once the log takes no rows', async () => {
    expect((await post(service.keys.good)).status).toBe(200);
    await service.sql('ALTER TABLE usage_events RENAME TO usage_events_away');
    for (const key of [service.keys.good, undefined, 'htk_mistyped']) {
      const { status, body, headers } = await post(key);
      expect([status, body.code]).toEqual([503, 'log-unavailable']);
      expect(body.retryable).toBe(true);
      expect(headers['retry-after']).toBe('1');
      expect(headers['content-type']).toContain('application/problem+json');
    }
    await service.sql('ALTER TABLE usage_events_away RENAME TO usage_events');
    expect((await post(service.keys.good)).status).toBe(200);
    expect(await service.usage()).toHaveLength(2);
  });

  it('survives connections that the database cuts', async () => {
    const inside = new Client({ connectionString: service.database.url });
    await inside.connect();
    await inside.query(
      `SELECT pg_terminate_backend(pid) FROM pg_stat_activity
        WHERE usename = current_user AND pid <> pg_backend_pid() AND datname = current_database()`,
    );
    await inside.end();
    expect((await post(service.keys.good)).status).toBe(200);
    await until(async () => (await post(service.keys.good)).status === 200);
  });

  it('goes out while the database is away, and the probes say so', async () => {
    await cutOff();
    const { status, body, headers } = await post(service.keys.good);
    expect(status).toBe(503);
    expect(body.code).toMatch(/^(database|log)-unavailable$/);
    expect(headers['retry-after']).toBe('1');
    await until(() => !service.feed.isTrusted('keys'));
    expect((await post(service.keys.good)).body.code).toBe('database-unavailable');
    expect((await ask(service.server, { path: '/healthz' })).status).toBe(200);
    const ready = await ask(service.server, { path: '/readyz' });
    expect([ready.status, ready.body.database]).toEqual([503, false]);
    expect(service.printed()).not.toContain(new URL(service.database.url).password);
  });
});
