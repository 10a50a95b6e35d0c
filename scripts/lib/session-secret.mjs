import { randomBytes } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { writeWhole } from './home.mjs';

/**
 * What signs the cookies of sessions: made once, so that people stay signed in over a new start.
 * @param {string} home @returns {string}
 */
export function sessionSecret(home) {
  const file = join(home, 'session-secret');
  try {
    const kept = readFileSync(file, 'utf8').trim();
    if (kept.length >= 32) return kept;
  } catch (error) {
    if (!(error instanceof Error && 'code' in error && error.code === 'ENOENT')) throw error;
  }
  const made = randomBytes(32).toString('base64url');
  writeWhole(file, `${made}\n`);
  return made;
}
