import { randomUUID } from 'node:crypto';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { Writable } from 'node:stream';
import { Pool } from 'pg';
import pino from 'pino';
import { connect } from '../../../db/connect';
import { createApp, routeTable, type AppDeps } from '../../../server/app';
import { readinessOf } from '../../../server/features/health/readiness';
import { mintKey, type KeyKind } from '../../../server/features/keys/key-format';
import { DatabaseKeyStore, type KeyStore } from '../../../server/features/keys/key-store';
import { DatabaseProfileStore } from '../../../server/features/profiles/profile-store';
import { matchHere } from '../../../server/features/people/password';
import { UsageLog } from '../../../server/features/usage/usage-log';
import { runHere } from '../../../server/features/checks/check-runner';
import { DatabaseChangeFeed } from '../../../server/middleware/change-feed';
import type { Route } from '../../../server/middleware/route';
import { createDatabase, type TestDatabase } from '../../support/database';
import { fakeCheck, validateFake } from './fake-check';

export interface KeyOptions {
  readonly kind?: KeyKind;
  readonly scopes?: readonly string[];
  readonly origins?: readonly string[];
  readonly profiles?: readonly string[] | null;
  readonly rateLimit?: number | null;
  readonly expiresAt?: Date | null;
  readonly revokedAt?: Date | null;
  readonly defaultProfile?: string | null;
  readonly pins?: Readonly<Record<string, number>>;
  readonly clientDisabledAt?: Date | null;
}

export interface UsageRecord {
  readonly [column: string]: unknown;
  readonly id: string;
  readonly http_status: number;
}

/** The whole service over a database of its own, with the fake check unless told otherwise. */
export interface TestService {
  readonly server: Server;
  readonly url: string;
  readonly database: TestDatabase;
  readonly routes: readonly Route[];
  readonly feed: DatabaseChangeFeed;
  /** All that was logged to standard output. */
  readonly printed: () => string;
  readonly keyQueries: () => number;
  /** Runs SQL as the owner. */
  sql<Row>(text: string, values?: unknown[]): Promise<Row[]>;
  /** Rows of the usage log, oldest first. */
  usage(where?: string, values?: unknown[]): Promise<UsageRecord[]>;
  stop(): Promise<void>;
}

export const allScopes = ['checks', 'catalogue', 'admin'];

/** Adds a client with one key; gives its text. */
export async function addKey(owner: Pool, options: KeyOptions = {}): Promise<string> {
  const { text, selector, sha256, kind } = mintKey(options.kind ?? 'secret');
  const client = randomUUID();
  await owner.query(
    `INSERT INTO clients (id, name, default_profile, pins, disabled_at) VALUES ($1, $2, $3, $4, $5)`,
    [
      client,
      `client ${selector}`,
      options.defaultProfile ?? null,
      JSON.stringify(options.pins ?? {}),
      options.clientDisabledAt ?? null,
    ],
  );
  const expiresAt =
    options.expiresAt ?? (kind === 'cell' ? new Date(Date.now() + 86_400_000) : null);
  await owner.query(
    `INSERT INTO api_keys (client_id, kind, selector, secret_sha256, label, scopes, origins,
       profiles, rate_limit, created_at, expires_at, revoked_at)
     VALUES ($1, $2, $3, $4, 'test', $5, $6, $7, $8, now() - interval '2 days', $9, $10)`,
    [
      client,
      kind,
      selector,
      sha256,
      options.scopes ?? allScopes,
      options.origins ?? [],
      options.profiles ?? null,
      options.rateLimit ?? null,
      expiresAt,
      options.revokedAt ?? null,
    ],
  );
  return text;
}

export async function startService<Name extends string>(
  keys: Readonly<Record<Name, KeyOptions>>,
  overrides: Partial<AppDeps> = {},
): Promise<TestService & { keys: Readonly<Record<Name, string>> }> {
  const database = await createDatabase();
  const owner = new Pool({ connectionString: database.ownerUrl, max: 2 });
  owner.on('error', () => undefined);
  const texts = {} as Record<Name, string>;
  for (const name of Object.keys(keys) as Name[]) texts[name] = await addKey(owner, keys[name]);

  let printed = '';
  const sink = new Writable({
    write(chunk: Buffer, _encoding, done) {
      printed += chunk.toString();
      done();
    },
  });
  const sequelize = connect(database.url, { max: 3 });
  const pool = new Pool({ connectionString: database.url, max: 4 });
  pool.on('error', () => undefined);
  const feed = new DatabaseChangeFeed({ url: database.url, onGap: () => undefined });
  const usage = new UsageLog(pool);
  const store = new DatabaseKeyStore(sequelize);
  let keyQueries = 0;
  const keyStore: KeyStore = {
    all: () => store.all(),
    noteUse: (ids) => store.noteUse(ids),
    find: (selector) => {
      keyQueries++;
      return store.find(selector);
    },
  };
  const deps: AppDeps = {
    checks: [fakeCheck],
    validate: validateFake,
    runApart: runHere,
    pool,
    sequelize,
    keyStore,
    profileStore: new DatabaseProfileStore(),
    feed,
    usage,
    readiness: readinessOf(sequelize, feed),
    logger: pino({ level: 'info' }, sink),
    matchPassword: matchHere,
    session: { secret: 'a secret of the tests, long enough', secure: false },
    ...overrides,
  };
  const routes = routeTable(deps);
  const server = createServer(createApp(deps, routes));
  await feed.start();
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));

  const sql = async <Row>(text: string, values: unknown[] = []): Promise<Row[]> =>
    (await owner.query(text, values)).rows as Row[];
  return {
    server,
    url: `http://127.0.0.1:${(server.address() as AddressInfo).port}`,
    database,
    routes,
    feed,
    keys: texts,
    printed: () => printed,
    keyQueries: () => keyQueries,
    sql,
    usage: (where = 'true', values = []) =>
      sql<UsageRecord>(`SELECT * FROM usage_events WHERE ${where} ORDER BY id`, values),
    stop: async () => {
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
      await usage.close().catch(() => undefined);
      await feed.close();
      await Promise.allSettled([pool.end(), sequelize.close(), owner.end()]);
      await database.drop();
    },
  };
}

/** Waits for what comes of itself, such as a notification. */
export async function until(
  holds: () => Promise<boolean> | boolean,
  within = 5_000,
): Promise<void> {
  const end = Date.now() + within;
  while (!(await holds())) {
    if (Date.now() > end) throw new Error('It did not come about in time.');
    await new Promise((resolve) => setTimeout(resolve, 10));
  }
}
