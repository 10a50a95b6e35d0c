import { randomBytes } from 'node:crypto';
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { chooseClusterFolder, clusterMajor } from './cluster-folder.mjs';
import { endLeftover, makeCluster, startCluster } from './cluster.mjs';
import { makeDatabase, urlsOf } from './database.mjs';
import { readSettings, writeSettings } from './home.mjs';
import { freePort } from './port.mjs';
import { ensurePostgres, postgresUser } from './postgres.mjs';
import { say } from './say.mjs';

/**
 * Makes, where it is missing, and starts the private cluster of a home, with the two roles and the
 * database.
 * @param {object} options
 * @param {string} options.home
 * @param {string} options.database
 * @param {import('./ending.mjs').Ending} options.ending told to stop the cluster
 * @param {boolean} [options.throwAway] for tests
 */
export async function startDatabase({ home, database, ending, throwAway = false }) {
  const remembered = readSettings(home, freshSettings);
  const there = remembered.databaseFolder ?? join(home, 'database');
  const { folder: binaries } = await ensurePostgres(clusterMajor(there));
  // Only now: the package that brings the programs brings their user too.
  const as = await postgresUser();
  const folder = await chooseClusterFolder(home, remembered.databaseFolder, as);
  // First, for it may hold the very port that is remembered.
  await endLeftover(folder);
  const settings = {
    ...remembered,
    databasePort: await freePort(remembered.databasePort),
    ...(folder === join(home, 'database') ? {} : { databaseFolder: folder }),
  };
  // Before the cluster: one whose passwords were never written down could not be opened again.
  writeSettings(home, settings);
  const { databasePort: port, superuserPassword } = settings;
  const log = join(home, 'logs/database.log');
  const options = { binaries, folder, as, port, superuserPassword, log, throwAway };
  if (!existsSync(folder)) {
    await makeCluster(options);
    say(`database made in ${folder}`);
  }
  const cluster = await startCluster(options);
  ending.add(cluster.stop);
  await makeDatabase({ port, settings, database, folder, ownerMakesDatabases: throwAway });
  say(`database started on port ${port} of 127.0.0.1`);
  return { cluster, settings, urls: urlsOf(port, settings, database) };
}

/** @returns {import('./home.mjs').Settings} */
function freshSettings() {
  const password = () => randomBytes(24).toString('base64url');
  return {
    superuserPassword: password(),
    ownerPassword: password(),
    applicationPassword: password(),
  };
}
