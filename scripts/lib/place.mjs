import { resolve } from 'node:path';
import { root } from './home.mjs';
import { Stop } from './say.mjs';

/**
 * Where the service is to run, from the same settings that `server/config.ts` reads; here before
 * anything is installed.
 * @param {NodeJS.ProcessEnv} env
 */
export function readPlace(env) {
  const text = (/** @type {string} */ name) => env[name]?.trim() || undefined;
  const given = text('HEADTREE_PORT') ?? '4310';
  const port = Number(given);
  if (!/^\d+$/.test(given) || port < 1 || port > 65535) {
    throw new Stop(`HEADTREE_PORT is "${given}": it must be a whole number from 1 to 65535.`);
  }
  const host = text('HEADTREE_HOST') ?? '127.0.0.1';
  const shown = host === '0.0.0.0' ? '127.0.0.1' : host === '::' ? '[::1]' : host;
  const application = text('HEADTREE_DATABASE_URL');
  const owner = text('HEADTREE_DATABASE_OWNER_URL');
  if ((application === undefined) !== (owner === undefined)) {
    throw new Stop(
      'A database of your own needs both HEADTREE_DATABASE_URL and HEADTREE_DATABASE_OWNER_URL.',
    );
  }
  return {
    host,
    port,
    url: `http://${shown.includes(':') && !shown.startsWith('[') ? `[${shown}]` : shown}:${port}`,
    home: resolve(root, text('HEADTREE_HOME') ?? '.headtree'),
    ownDatabase: application && owner ? { application, owner } : undefined,
  };
}
