/** `npm start`: makes what is missing, starts the database, the API and the worker, stops them. */
import { join } from 'node:path';
import { build, output } from './lib/build.mjs';
import { buildWeb } from './lib/build-web.mjs';
import { makeEnding } from './lib/ending.mjs';
import { explain, textOf } from './lib/explain.mjs';
import { makeHome, root, writeSettings } from './lib/home.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { readPlace } from './lib/place.mjs';
import { requirePort } from './lib/port.mjs';
import { prepare, serviceEnvironment } from './lib/prepare.mjs';
import { startDatabase } from './lib/private-database.mjs';
import { claimHome } from './lib/run-file.mjs';
import { stopRunning } from './lib/run.mjs';
import { outliveReader, print, say, Stop } from './lib/say.mjs';
import { startService, waitUntilReady } from './lib/service.mjs';
import { sessionSecret } from './lib/session-secret.mjs';
import { welcome } from './lib/welcome.mjs';

const ending = makeEnding();
/** What is told to be full or shut when a failure does not say. */
let home = root;

/** Starts everything; resolves with what keeps running. */
async function launch() {
  const place = readPlace(process.env);
  const { url } = place;
  home = place.home;
  makeHome(home);
  const claim = await claimHome(home, url);
  ending.add(claim.forget);
  await requirePort(place.port, place.host);
  await ensurePackages(root, join(home, 'logs/npm.log'), (npm) => claim.remember([npm]));
  ending.check();

  const [database] = await allSettled(openDatabase(place), build());
  ending.check();
  const { urls, settings, cluster } = database;
  const { demoKey, demoPeople = [] } = await prepare(urls, settings);
  if (settings && demoKey !== undefined) writeSettings(home, { ...settings, demoKey, demoPeople });
  ending.check();
  // Callers of the API are served all the same: the pages answer that they are not built.
  await buildWeb().catch((error) => say(textOf(error)));
  ending.check();

  const env = serviceEnvironment(urls, {
    HEADTREE_HOST: place.host,
    HEADTREE_PORT: String(place.port),
    HEADTREE_HOME: home,
  });
  // The owner's connection is for the worker alone: what answers callers cannot change the schema.
  const apiEnv = {
    ...env,
    HEADTREE_DATABASE_OWNER_URL: undefined,
    HEADTREE_SESSION_SECRET: process.env.HEADTREE_SESSION_SECRET || sessionSecret(home),
  };
  const logOf = (/** @type {string} */ name) => join(home, `logs/${name}.log`);
  const start = (/** @type {string} */ name, /** @type {string} */ script, each = env) => {
    const log = logOf(name);
    const service = startService({ name, script: join(output, script), env: each, log });
    ending.add(service.stop);
    return service;
  };
  const services = [start('api', 'main.js', apiEnv), start('worker', 'worker.js')];
  claim.remember(services.map(({ mark }) => mark.pid));
  await waitUntilReady(url, services, ending);
  say('ready');
  welcome({ url, demoKey, demoPeople, home });
  return cluster ? [...services, cluster] : services;
}

/** @param {ReturnType<typeof readPlace>} place */
async function openDatabase({ ownDatabase }) {
  if (!ownDatabase) return startDatabase({ home, database: 'headtree', ending });
  say('using the database of HEADTREE_DATABASE_URL');
  return { urls: ownDatabase, settings: undefined, cluster: undefined };
}

/**
 * Both results, once both have settled: what is half started could not be stopped.
 * @template A, B
 * @param {Promise<A>} a @param {Promise<B>} b
 */
async function allSettled(a, b) {
  await Promise.allSettled([a, b]);
  return Promise.all([a, b]);
}

async function main() {
  outliveReader();
  const launched = launch();
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
    process.on(signal, () => void stop(launched));
  }
  try {
    const running = await launched;
    const over = await Promise.race(
      running.map(({ name, log, ended }) =>
        ended.then((words) => `The ${name} ended: ${words || 'without a word'} (more in ${log})`),
      ),
    );
    if (!ending.begun()) throw new Stop(over);
  } catch (error) {
    if (ending.begun()) return;
    process.stderr.write(`\n${(explain(error, home) ?? new Stop(textOf(error))).message}\n`);
    stopRunning();
    await ending.end();
    process.exit(1);
  }
}

/** @param {Promise<unknown>} launched */
async function stop(launched) {
  if (ending.begun()) return;
  ending.begin();
  print('');
  say('stopping');
  stopRunning();
  await launched.catch(() => undefined);
  await ending.end();
  say('stopped');
  process.exit(0);
}

await main();
