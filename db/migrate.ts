import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import { Umzug } from 'umzug';
import { grantApplication } from './grants';
import { migrations } from './migrations';
import type { RunSql } from './migrations/migration';

export interface MigrateOptions {
  /** Role that the service answers as; it is given its rights anew each time. */
  readonly applicationRole: string;
}

/**
 * Brings the schema up to date, as the owner. The caller holds the lock against a second one.
 *
 * @returns the names of the migrations that ran now.
 */
export async function migrate(owner: Sequelize, options: MigrateOptions): Promise<string[]> {
  await owner.query(`create table if not exists schema_migrations (
    name text primary key, ran_at timestamptz not null default now())`);
  const ran = await umzug(owner).up();
  await inTransaction(owner, (run) => grantApplication(run, options.applicationRole));
  return ran.map(({ name }) => name);
}

/** Names of the migrations that this code knows and the database has not run. */
export async function pendingMigrations(sequelize: Sequelize): Promise<string[]> {
  const executed = await executedMigrations(sequelize);
  return migrations.map(({ name }) => name).filter((name) => !executed.includes(name));
}

function umzug(owner: Sequelize): Umzug {
  return new Umzug({
    migrations: migrations.map(({ name, up }) => ({
      name,
      // Marked in the migration's own transaction: it is either done and marked, or neither.
      up: () =>
        inTransaction(owner, async (run, transaction) => {
          await up(run);
          await owner.query('insert into schema_migrations (name) values ($1)', {
            bind: [name],
            transaction,
          });
        }),
    })),
    storage: {
      executed: () => executedMigrations(owner),
      logMigration: () => Promise.resolve(),
      unlogMigration: () => Promise.reject(new Error('Migrations only go forward.')),
    },
    logger: undefined,
  });
}

async function executedMigrations(sequelize: Sequelize): Promise<string[]> {
  const rows = await sequelize.query<{ name: string }>(
    'select name from schema_migrations order by name',
    { type: QueryTypes.SELECT },
  );
  return rows.map(({ name }) => name);
}

function inTransaction(
  sequelize: Sequelize,
  work: (run: RunSql, transaction: Transaction) => Promise<void>,
): Promise<void> {
  return sequelize.transaction((transaction) =>
    work(async (sql) => {
      await sequelize.query(sql, { transaction });
    }, transaction),
  );
}
