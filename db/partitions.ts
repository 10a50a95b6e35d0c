import { QueryTypes, type Sequelize } from 'sequelize';

/** Months kept ready beyond the present one. */
const MONTHS_AHEAD = 3;
/** Rows looked at, at most, when telling how many fell into the DEFAULT partition. */
const STRAY_ROWS_COUNTED = 1_000;

export interface PartitionHealth {
  /** Months that should be ready and are not: `usage_events_2026_03`. */
  readonly missing: readonly string[];
  /** Rows in the DEFAULT partition, counted to 1,000: each fell outside the months there were. */
  readonly strayRows: number;
}

interface Month {
  readonly table: string;
  readonly from: string;
  readonly to: string;
}

/** Whether the months of `usage_events` are ready; either role may ask. */
export async function partitionHealth(
  sequelize: Sequelize,
  now: Date = new Date(),
): Promise<PartitionHealth> {
  const present = await existing(sequelize);
  const [row] = await sequelize.query<{ count: number }>(
    `select count(*)::int as count
       from (select 1 from usage_events_default limit ${STRAY_ROWS_COUNTED}) as stray`,
    { type: QueryTypes.SELECT },
  );
  return {
    missing: wanted(now)
      .map(({ table }) => table)
      .filter((table) => !present.has(table)),
    strayRows: row?.count ?? 0,
  };
}

/**
 * Makes the months that are missing, as the owner; rows of such a month that fell into the
 * DEFAULT partition move with it.
 *
 * @returns the partitions made.
 */
export async function makePartitions(owner: Sequelize, now: Date = new Date()): Promise<string[]> {
  const present = await existing(owner);
  const strayMonths = await owner.query<{ month: Date }>(
    `select distinct date_trunc('month', at, 'UTC') as month from usage_events_default`,
    { type: QueryTypes.SELECT },
  );
  const months = new Map(
    [...wanted(now), ...strayMonths.map(({ month }) => monthOf(month, 0))].map((m) => [m.table, m]),
  );
  const made: string[] = [];
  for (const month of months.values()) {
    if (present.has(month.table)) continue;
    await makePartition(owner, month);
    made.push(month.table);
  }
  return made;
}

async function makePartition(owner: Sequelize, { table, from, to }: Month): Promise<void> {
  await owner.transaction(async (transaction) => {
    // Attached, not created in place: the DEFAULT partition must be free of the month's rows first.
    await owner.query(
      `create table ${table} (like usage_events including all);
       lock table usage_events_default in share row exclusive mode;
       with moved as (
         delete from usage_events_default where at >= '${from}' and at < '${to}' returning *)
       insert into ${table} select * from moved;
       alter table usage_events attach partition ${table} for values from ('${from}') to ('${to}');`,
      { transaction },
    );
  });
}

async function existing(sequelize: Sequelize): Promise<Set<string>> {
  const rows = await sequelize.query<{ name: string }>(
    `select c.relname as name from pg_inherits i join pg_class c on c.oid = i.inhrelid
      where i.inhparent = 'usage_events'::regclass`,
    { type: QueryTypes.SELECT },
  );
  return new Set(rows.map(({ name }) => name));
}

function wanted(now: Date): Month[] {
  return Array.from({ length: MONTHS_AHEAD + 1 }, (_, ahead) => monthOf(now, ahead));
}

/** The month of a moment in UTC, or one that many months later. */
function monthOf(moment: Date, ahead: number): Month {
  const first = (later: number) =>
    new Date(Date.UTC(moment.getUTCFullYear(), moment.getUTCMonth() + later, 1)).toISOString();
  const from = first(ahead);
  return {
    table: `usage_events_${from.slice(0, 7).replace('-', '_')}`,
    from,
    to: first(ahead + 1),
  };
}
