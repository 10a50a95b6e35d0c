import { spawn, type ChildProcess } from 'node:child_process';
import { join } from 'node:path';
import { createInterface } from 'node:readline';

const script = join(__dirname, '../../dist/server/main.js');

/** The built server in a process of its own. */
export interface ServerProcess {
  readonly port: number;
  /** Ends it as a power cut would; resolves when it is gone. */
  kill(): Promise<void>;
}

const goneOf = (child: ChildProcess): Promise<void> =>
  new Promise((resolve) => {
    if (child.exitCode !== null || child.signalCode !== null) resolve();
    else child.once('exit', () => resolve());
  });

/** The port that it says it listens on. */
async function portOf(child: ChildProcess): Promise<number> {
  if (!child.stdout) throw new Error('The server has no standard output.');
  for await (const line of createInterface({ input: child.stdout })) {
    const { msg, port } = JSON.parse(line) as { msg?: string; port?: number };
    if (msg === 'listening' && port !== undefined) return port;
  }
  throw new Error('The server ended before it listened.');
}

export async function startServer(databaseUrl: string): Promise<ServerProcess> {
  const child = spawn(process.execPath, [script], {
    env: {
      ...process.env,
      HEADTREE_DATABASE_URL: databaseUrl,
      HEADTREE_DATABASE_OWNER_URL: '',
      HEADTREE_PORT: '0',
      HEADTREE_LOG: 'info',
    },
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  const port = await portOf(child);
  child.stdout.resume();
  return {
    port,
    kill: async () => {
      const gone = goneOf(child);
      child.kill('SIGKILL');
      await gone;
    },
  };
}
