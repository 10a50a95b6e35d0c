import { createServer } from 'node:net';
import { Stop } from './say.mjs';

/**
 * Tries to listen: the port taken, or the code of what prevents it.
 * @param {number} port @param {string} [host]
 * @returns {Promise<{ port: number } | { problem: string }>}
 */
export function tryPort(port, host = '127.0.0.1') {
  return new Promise((resolve) => {
    const server = createServer();
    server.once('error', (error) =>
      resolve({ problem: 'code' in error ? String(error.code) : error.message }),
    );
    server.listen({ port, host, exclusive: true }, () => {
      const address = server.address();
      const taken = typeof address === 'object' && address ? address.port : port;
      server.close(() => resolve({ port: taken }));
    });
  });
}

/**
 * The remembered port while it is free, else any free one.
 * @param {number | undefined} remembered
 */
export async function freePort(remembered) {
  for (const port of remembered === undefined ? [0] : [remembered, 0]) {
    const tried = await tryPort(port);
    if ('port' in tried) return tried.port;
  }
  throw new Stop('No port of 127.0.0.1 is free for the database. Close some programs.');
}

/**
 * Stops with what to do when the API could not listen.
 * @param {number} port @param {string} host
 */
export async function requirePort(port, host) {
  const tried = await tryPort(port, host);
  if ('port' in tried) return;
  const other = 'HEADTREE_PORT=4311 npm start';
  if (tried.problem === 'EADDRINUSE') {
    throw new Stop(
      `Port ${port} of ${host} is in use by another program. Stop it, or choose another: ${other}`,
    );
  }
  if (tried.problem === 'EACCES') {
    throw new Stop(`This user may not listen on port ${port}. Choose another: ${other}`);
  }
  throw new Stop(
    `Cannot listen on ${host} (${tried.problem}). Set HEADTREE_HOST to an address of this machine.`,
  );
}
