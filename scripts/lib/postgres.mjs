import { accessSync, constants, existsSync, readdirSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { isRoot } from './home.mjs';
import { lastLine } from './explain.mjs';
import { run } from './run.mjs';
import { say, Stop } from './say.mjs';

/** The oldest server the schema is written for. */
const OLDEST = 13;
const DEBIAN = '/usr/lib/postgresql';

/** @typedef {{ folder: string, major: number }} Binaries */

/**
 * Finds PostgreSQL's server programs, or installs Debian's.
 * @param {number | undefined} major of the cluster there is: only its own version can run it
 * @returns {Promise<Binaries>}
 */
export async function ensurePostgres(major) {
  const found = (await findPostgres(major)) ?? (await installPostgres(major));
  say(`PostgreSQL ${found.major} in ${found.folder}`);
  return found;
}

/**
 * @param {number | undefined} major
 * @param {{ debian?: string, path?: string }} [places]
 * @returns {Promise<Binaries | undefined>}
 */
export async function findPostgres(major, places = {}) {
  const debian = places.debian ?? DEBIAN;
  const path = (places.path ?? process.env.PATH ?? '').split(delimiter).filter(Boolean);
  for (const folder of [...debianFolders(debian), ...path]) {
    if (!hasPrograms(folder)) continue;
    const { stdout } = await run(join(folder, 'postgres'), ['--version']);
    const there = Number(/\s(\d+)/.exec(stdout)?.[1] ?? 0);
    if (major === undefined ? there >= OLDEST : there === major) return { folder, major: there };
  }
  return undefined;
}

/** Newest first. @param {string} debian */
function debianFolders(debian) {
  if (!existsSync(debian)) return [];
  return readdirSync(debian)
    .filter((name) => /^\d+$/.test(name))
    .sort((a, b) => Number(b) - Number(a))
    .map((name) => join(debian, name, 'bin'));
}

/** @param {string} folder */
function hasPrograms(folder) {
  try {
    for (const program of ['postgres', 'initdb']) {
      accessSync(join(folder, program), constants.X_OK);
    }
    return true;
  } catch {
    return false;
  }
}

/** @param {number | undefined} major @returns {Promise<Binaries>} */
async function installPostgres(major) {
  const name = major === undefined ? 'postgresql' : `postgresql-${major}`;
  const commands = `apt-get update && apt-get install -y ${name}`;
  const why =
    major === undefined
      ? `PostgreSQL ${OLDEST} or newer is not on this machine`
      : `The database was made by PostgreSQL ${major}, which is no longer on this machine`;
  if (!isRoot) throw new Stop(`${why}. Run this, then start again: sudo sh -c '${commands}'`);
  if (!existsSync('/usr/bin/apt-get')) throw new Stop(`${why}. Install it, then start again.`);
  say(`${why}: installing Debian's, about a minute`);
  for (const args of [['update'], ['install', '-y', '--no-install-recommends', name]]) {
    const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
    const ran = await run('apt-get', args, { env });
    if (ran.code !== 0) {
      const reason = lastLine(ran.stderr) || lastLine(ran.stdout);
      throw new Stop(`apt-get ${args.join(' ')} failed: ${reason} Try it by hand: ${commands}`);
    }
  }
  const found = await findPostgres(major);
  if (!found) throw new Stop(`${name} was installed, but its programs were not found.`);
  return found;
}

/**
 * PostgreSQL refuses to run as root: the user it runs as instead, undefined for this one.
 * @returns {Promise<{ uid: number, gid: number } | undefined>}
 */
export async function postgresUser() {
  if (!isRoot) return undefined;
  const [uid, gid] = await Promise.all(['-u', '-g'].map((what) => run('id', [what, 'postgres'])));
  if (uid?.code !== 0 || gid?.code !== 0) {
    throw new Stop(
      'PostgreSQL does not run as root and there is no user postgres. ' +
        'Make one, then start again: useradd --system postgres',
    );
  }
  return { uid: Number(uid.stdout), gid: Number(gid.stdout) };
}
