import { randomBytes } from 'node:crypto';
import { createServer } from 'node:http';
import { join } from 'node:path';
import pino from 'pino';
import { connect, connectPool } from '../db/connect';
import { createApp } from './app';
import { readConfig, SettingsProblem } from './config';
import { checks } from './engine/checks/registry';
import { checkPool } from './features/checks/check-pool';
import { readinessOf } from './features/health/readiness';
import { DatabaseKeyStore } from './features/keys/key-store';
import { passwordPool } from './features/people/password-pool';
import { DatabaseProfileStore } from './features/profiles/profile-store';
import { UsageLog } from './features/usage/usage-log';
import { DatabaseChangeFeed } from './middleware/change-feed';
import { validateRequest } from './middleware/validation';

async function main(): Promise<void> {
  const config = readConfig();
  // Lines are written behind the answers; what must be known is in the usage log already.
  const lines = pino.destination({ dest: 1, sync: false });
  const logger = pino({ level: config.log, base: { process: 'api' } }, lines);
  const warn = (message: string): void => logger.warn({ cause: message }, 'database');
  const url = config.databaseUrl;
  const sequelize = connect(url, { name: 'headtree-api' });
  const pool = connectPool(url, warn, { name: 'headtree-api', max: 6 });
  const feed = new DatabaseChangeFeed({ url, onGap: warn });
  const usage = new UsageLog(pool);
  const apart = checkPool(join(__dirname, 'check-thread.js'));
  const passwords = passwordPool(join(__dirname, 'password-thread.js'));
  if (config.sessionSecret === undefined)
    logger.warn('HEADTREE_SESSION_SECRET is not set: sessions end with this process.');
  const app = createApp({
    checks,
    validate: validateRequest,
    runApart: apart.run,
    pool,
    sequelize,
    keyStore: new DatabaseKeyStore(sequelize),
    profileStore: new DatabaseProfileStore(),
    feed,
    usage,
    readiness: readinessOf(sequelize, feed),
    logger,
    matchPassword: passwords.match,
    session: {
      secret: config.sessionSecret ?? randomBytes(32).toString('base64url'),
      secure: config.publicUrl?.protocol === 'https:',
    },
    consoleFolder: join(__dirname, '../console'),
  });
  await feed.start();

  const server = createServer(app);
  server.listen(config.port, config.host, () => {
    const address = server.address();
    const port = typeof address === 'object' ? address?.port : config.port;
    logger.info({ host: config.host, port }, 'listening');
  });
  server.on('error', (error) => {
    logger.fatal({ cause: error.message }, 'cannot listen');
    lines.flushSync();
    process.exit(1);
  });

  /** Answers what was asked, writes what is owed, goes. */
  const stop = (): void => {
    logger.info('stopping');
    server.close(() => {
      void Promise.allSettled([usage.close(), feed.close(), apart.close(), passwords.close()])
        .then(() => Promise.allSettled([pool.end(), sequelize.close()]))
        .then(() => process.exit(0));
    });
    server.closeIdleConnections();
    setTimeout(() => process.exit(1), 10_000).unref();
  };
  process.once('SIGTERM', stop);
  process.once('SIGINT', stop);
}

main().catch((error: unknown) => {
  const known = error instanceof SettingsProblem;
  process.stderr.write(`${known ? error.message : String(error)}\n`);
  process.exit(1);
});
