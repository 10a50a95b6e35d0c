import { spawn, type ChildProcess } from 'node:child_process';
import { randomUUID } from 'node:crypto';
import { createServer } from 'node:net';
import { join } from 'node:path';
import { Client } from 'pg';
import { mintKey, type KeyKind } from '../../../server/features/keys/key-format';
import { createDatabase } from '../../support/database';

const root = process.cwd();

/** The built service as a process, on a database of its own. */
export interface RunningService {
  readonly url: string;
  /** Adds a client with one key; gives its text. */
  addKey(kind: KeyKind, origins: readonly string[]): Promise<string>;
  sql<Row>(text: string, values?: unknown[]): Promise<Row[]>;
  /** Ends the process; the database stays. */
  goAway(): Promise<void>;
  /** Starts it again, on the same port. */
  comeBack(): Promise<void>;
  stop(): Promise<void>;
}

export async function startService(): Promise<RunningService> {
  const database = await createDatabase();
  const owner = new Client({ connectionString: database.ownerUrl });
  owner.on('error', () => undefined);
  await owner.connect();
  const port = await freePort();
  const url = `http://127.0.0.1:${port}`;
  const env = {
    ...process.env,
    NODE_ENV: 'production',
    HEADTREE_PORT: String(port),
    HEADTREE_LOG: 'warn',
    HEADTREE_DATABASE_URL: database.url,
  };
  const begin = async (): Promise<ChildProcess> => {
    const child = start(join(root, 'dist/server/main.js'), env);
    await answers(`${url}/readyz`, child);
    return child;
  };
  let process_ = await begin();
  const sql = async <Row>(text: string, values: unknown[] = []): Promise<Row[]> =>
    (await owner.query(text, values)).rows as Row[];
  return {
    url,
    sql,
    addKey: async (kind, origins) => {
      const { text, selector, sha256 } = mintKey(kind);
      const client = randomUUID();
      await sql(`INSERT INTO clients (id, name, pins) VALUES ($1, $2, '{}')`, [
        client,
        `client ${selector}`,
      ]);
      await sql(
        `INSERT INTO api_keys (client_id, kind, selector, secret_sha256, label, scopes, origins)
         VALUES ($1, $2, $3, $4, 'test', '{checks,catalogue}', $5)`,
        [client, kind, selector, sha256, origins],
      );
      return text;
    },
    goAway: () => end(process_),
    comeBack: async () => {
      process_ = await begin();
    },
    stop: async () => {
      await end(process_);
      await owner.end();
      await database.drop();
    },
  };
}

/** A port that was free a moment ago. */
export function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.on('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const address = server.address();
      const port = typeof address === 'object' && address ? address.port : 0;
      server.close(() => resolve(port));
    });
  });
}

/** A program of Node, whose last words are in the error when it does not start. */
export function start(script: string, env: NodeJS.ProcessEnv): ChildProcess {
  return spawn(process.execPath, [script], { cwd: root, env, stdio: ['ignore', 'ignore', 'pipe'] });
}

export async function end(child: ChildProcess): Promise<void> {
  if (child.exitCode !== null || child.signalCode !== null) return;
  const ended = new Promise((resolve) => child.once('exit', resolve));
  child.kill('SIGTERM');
  const late = setTimeout(() => child.kill('SIGKILL'), 3_000);
  await ended;
  clearTimeout(late);
}

/** Waits until an address answers well. */
export async function answers(url: string, child: ChildProcess, within = 20_000): Promise<void> {
  let words = '';
  child.stderr?.on('data', (chunk: Buffer) => (words += chunk.toString()));
  for (const until = Date.now() + within; Date.now() < until;) {
    if (child.exitCode !== null) throw new Error(`It ended while starting: ${words}`);
    const response = await fetch(url).catch(() => undefined);
    if (response?.ok) return;
    await new Promise((resolve) => setTimeout(resolve, 40));
  }
  throw new Error(`${url} did not answer in time. ${words}`);
}
