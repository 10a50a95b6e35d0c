import { join } from 'node:path';
import { output } from './build.mjs';
import { explain, lastLine } from './explain.mjs';
import { root } from './home.mjs';
import { run } from './run.mjs';
import { say, Stop } from './say.mjs';

/** @typedef {{ migrations: string[], partitions: string[], published: string[], demoKey?: string, demoPeople?: import('./home.mjs').DemoPerson[] }} Prepared */

/**
 * Migrates the database and fills in what the service needs.
 * @param {import('./database.mjs').Urls} urls
 * @param {Pick<import('./home.mjs').Settings, 'demoKey' | 'demoPeople'> | undefined} demo adds the invented scenario
 * @returns {Promise<Prepared>}
 */
export async function prepare(urls, demo) {
  const ran = await run(
    process.execPath,
    ['--enable-source-maps', join(output, 'prepare.js'), ...(demo ? ['--demo'] : [])],
    {
      cwd: root,
      env: serviceEnvironment(urls, {
        HEADTREE_DEMO_KEY: demo?.demoKey,
        HEADTREE_DEMO_PEOPLE: JSON.stringify(demo?.demoPeople ?? []),
      }),
    },
  );
  if (ran.code !== 0) {
    const reason = lastLine(ran.stderr);
    throw explain(reason, 'the database') ?? new Stop(`The database cannot be prepared: ${reason}`);
  }
  /** @type {Prepared} */
  const prepared = JSON.parse(lastLine(ran.stdout));
  const { migrations, published } = prepared;
  say(
    migrations.length + published.length === 0
      ? 'database is up to date'
      : `database migrated (${migrations.length}), profiles added: ${published.join(', ') || 'none'}`,
  );
  return prepared;
}

/**
 * What a process of the service is started with.
 * @param {import('./database.mjs').Urls} urls @param {NodeJS.ProcessEnv} more
 * @returns {NodeJS.ProcessEnv}
 */
export function serviceEnvironment(urls, more = {}) {
  return {
    NODE_ENV: 'production',
    ...process.env,
    HEADTREE_DATABASE_URL: urls.application,
    HEADTREE_DATABASE_OWNER_URL: urls.owner,
    ...more,
  };
}
