import { pino } from 'pino';
import { connect } from '../db/connect';
import { startUpkeep } from '../db/upkeep';
import { readConfig, SettingsProblem, type Config } from './config';

/** How often the work behind the service looks whether something is due. */
const EVERY_MS = 5 * 60_000;

function run(config: Config): void {
  const log = pino({ level: config.log, name: 'worker' });
  if (config.databaseOwnerUrl === undefined) {
    log.fatal('HEADTREE_DATABASE_OWNER_URL is missing: the worker makes partitions as the owner.');
    process.exitCode = 1;
    return;
  }
  const owner = connect(config.databaseOwnerUrl, { max: 1, name: 'headtree worker' });
  const upkeep = startUpkeep({
    owner,
    ownerUrl: config.databaseOwnerUrl,
    everyMs: EVERY_MS,
    onDone: (done) => log.info(done, 'upkeep done'),
    // Only the message: a driver's error object can hold the password.
    onFailure: (message) => log.error({ reason: message }, 'upkeep failed, it is tried again'),
  });
  const stop = async (signal: NodeJS.Signals): Promise<void> => {
    log.info({ signal }, 'stopping');
    await upkeep.stop();
    await owner.close();
  };
  process.once('SIGTERM', (signal) => void stop(signal));
  process.once('SIGINT', (signal) => void stop(signal));
  log.info('working');
}

try {
  run(readConfig());
} catch (error) {
  if (!(error instanceof SettingsProblem)) throw error;
  process.stderr.write(`${error.message}\n`);
  process.exitCode = 1;
}
