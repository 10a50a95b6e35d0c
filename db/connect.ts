import { Pool } from 'pg';
import { Sequelize } from 'sequelize';
import { initModels } from './models';

export interface ConnectOptions {
  /** Greatest number of connections held at once. */
  readonly max?: number;
  /** Name shown in `pg_stat_activity`. */
  readonly name?: string;
}

/** Connects with Sequelize and binds the models; nothing is opened before the first query. */
export function connect(url: string, options: ConnectOptions = {}): Sequelize {
  const sequelize = new Sequelize(url, {
    dialect: 'postgres',
    logging: false,
    define: { timestamps: false, underscored: true },
    pool: { max: options.max ?? 8, min: 0, idle: 10_000, acquire: 10_000 },
    dialectOptions: {
      application_name: options.name ?? 'headtree',
      connectionTimeoutMillis: 5_000,
    },
  });
  initModels(sequelize);
  return sequelize;
}

/**
 * A plain pool for hot paths: named statements and arrays, which Sequelize does not speak.
 *
 * @param onIdleError told when a connection that nobody was using breaks; only a message, because
 *   a driver's error object can hold the password.
 */
export function connectPool(
  url: string,
  onIdleError: (message: string) => void,
  options: ConnectOptions = {},
): Pool {
  const pool = new Pool({
    connectionString: url,
    max: options.max ?? 4,
    idleTimeoutMillis: 30_000,
    connectionTimeoutMillis: 5_000,
    application_name: options.name ?? 'headtree',
  });
  pool.on('error', (error) => onIdleError(error.message));
  return pool;
}
