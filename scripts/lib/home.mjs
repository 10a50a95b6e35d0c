import {
  accessSync,
  chmodSync,
  constants,
  mkdirSync,
  readFileSync,
  renameSync,
  writeFileSync,
} from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { Stop } from './say.mjs';

/** The checkout. */
export const root = resolve(dirname(fileURLToPath(import.meta.url)), '../..');

/** Whether the command runs as root, so that PostgreSQL must run as another user. */
export const isRoot = process.getuid?.() === 0;

/**
 * What a machine remembers between starts. Passwords are made here and stay here.
 * @typedef {object} Settings
 * @property {string} superuserPassword
 * @property {string} ownerPassword
 * @property {string} applicationPassword
 * @property {number} [databasePort]
 * @property {string} [databaseFolder] where the cluster is, when not in the home itself
 * @property {string} [demoKey]
 * @property {DemoPerson[]} [demoPeople]
 */

/** @typedef {{ email: string, role: string, password: string, passwordHash: string }} DemoPerson */

/**
 * Makes the private folder. PostgreSQL's user must be able to pass through it when root runs this.
 * @param {string} home
 */
export function makeHome(home) {
  try {
    mkdirSync(home, { recursive: true });
    chmodSync(home, isRoot ? 0o711 : 0o700);
    mkdirSync(join(home, 'logs'), { recursive: true, mode: 0o700 });
    accessSync(home, constants.W_OK);
  } catch (error) {
    const reason = error instanceof Error && 'code' in error ? String(error.code) : 'unknown';
    throw new Stop(
      `The private folder ${home} cannot be used (${reason}). Make it this user's own, or choose ` +
        'another: HEADTREE_HOME=/some/where npm start',
    );
  }
}

/** @param {string} home @param {() => Settings} fresh @returns {Settings} */
export function readSettings(home, fresh) {
  const file = join(home, 'settings.json');
  let text;
  try {
    text = readFileSync(file, 'utf8');
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'ENOENT') return fresh();
    throw error;
  }
  try {
    return JSON.parse(text);
  } catch {
    throw new Stop(
      `${file} cannot be read: it is no JSON. Restore it, or move ${home} away to begin anew.`,
    );
  }
}

/** @param {string} home @param {Settings} settings */
export function writeSettings(home, settings) {
  writeWhole(join(home, 'settings.json'), `${JSON.stringify(settings, undefined, 2)}\n`);
}

/**
 * Writes a private file so that it is there whole or not at all.
 * @param {string} file @param {string} text
 */
export function writeWhole(file, text) {
  const partial = `${file}.${process.pid}.new`;
  writeFileSync(partial, text, { mode: 0o600 });
  renameSync(partial, file);
}
