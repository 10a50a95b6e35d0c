import { accessSync, constants } from 'node:fs';
import { delimiter, join } from 'node:path';
import { isRoot } from './home.mjs';
import { run } from './run.mjs';
import { say, Stop } from './say.mjs';

const NAMES = ['chromium', 'chromium-browser', 'google-chrome-stable', 'google-chrome'];

/**
 * The program of a Chromium: the one that `HEADTREE_BROWSER` names, one on the path, or Debian's,
 * which root installs.
 * @returns {Promise<string>}
 */
export async function findBrowser() {
  const named = process.env['HEADTREE_BROWSER'];
  if (named) {
    if (isProgram(named)) return named;
    throw new Stop(`HEADTREE_BROWSER is "${named}": there is no program of that name.`);
  }
  return onPath() ?? install();
}

/** Quiet, and alone: nothing of a browser's own goes out while the tests listen. */
export const browserFlags = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

function onPath() {
  const folders = (process.env['PATH'] ?? '').split(delimiter).filter(Boolean);
  return NAMES.flatMap((name) => folders.map((folder) => join(folder, name))).find(isProgram);
}

/** @param {string} file */
function isProgram(file) {
  try {
    accessSync(file, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

const WORDS = 'The browser tests need Chromium, and there is none.';

async function install() {
  const command = 'apt-get install -y --no-install-recommends chromium';
  if (!isRoot || !isProgram('/usr/bin/apt-get')) {
    throw new Stop(
      `${WORDS} Install it, on Debian by \`sudo ${command}\`, or name one: ` +
        'HEADTREE_BROWSER=/path/to/chromium npm test',
    );
  }
  say('installing Chromium for the browser tests');
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  const [program = '', ...args] = command.split(' ');
  let { code, stderr } = await run(program, args, { env });
  if (code !== 0) {
    await run(program, ['update'], { env });
    ({ code, stderr } = await run(program, args, { env }));
  }
  const found = onPath();
  if (code === 0 && found) return found;
  const reason = stderr.trim().split('\n').at(-1) ?? '';
  throw new Stop(`${WORDS} \`${command}\` did not work: ${reason}`);
}
