import { chmodSync, existsSync, mkdtempSync, readFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { run } from './run.mjs';
import { say } from './say.mjs';

/**
 * Where the cluster of a home is, or is to be: in the home, or under the system's temporary folder
 * when PostgreSQL's user cannot reach the home.
 * @param {string} home @param {string | undefined} remembered
 * @param {{ uid: number, gid: number } | undefined} as
 */
export async function chooseClusterFolder(home, remembered, as) {
  if (remembered !== undefined && existsSync(remembered)) return remembered;
  const inside = join(home, 'database');
  if (as === undefined || existsSync(inside)) return inside;
  const reached = await run('test', ['-x', home], { as, cwd: '/' });
  if (reached.code === 0) return inside;
  const outside = mkdtempSync(join(tmpdir(), 'headtree-'));
  chmodSync(outside, 0o711);
  say(`user postgres cannot reach ${home}: the database goes to ${outside}`);
  return join(outside, 'database');
}

/** The version of PostgreSQL that made a cluster. @param {string} folder */
export function clusterMajor(folder) {
  try {
    return Number.parseInt(readFileSync(join(folder, 'PG_VERSION'), 'utf8'), 10) || undefined;
  } catch {
    return undefined;
  }
}
