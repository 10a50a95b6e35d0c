import type { Pool } from 'pg';
import { Gatherer } from '../../middleware/gather';
import { patience } from '../../middleware/patience';
import type { UsageRow } from './usage-row';

const columns = {
  id: 'text',
  at: 'timestamptz',
  phase: 'text',
  client_id: 'uuid',
  key_id: 'uuid',
  key_selector: 'text',
  person_id: 'uuid',
  method: 'text',
  route: 'text',
  check_id: 'text',
  profile: 'text',
  profile_revision: 'int4',
  http_status: 'int2',
  code: 'text',
  answer: 'text',
  utilisation: 'float8',
  governing: 'text',
  items: 'int4',
  duration_us: 'int4',
  address: 'inet',
  origin: 'text',
  caller_request_id: 'text',
  repeats: 'int4',
} as const satisfies Readonly<Record<keyof UsageRow, string>>;

const names = Object.keys(columns) as (keyof UsageRow)[];
const arrays = names.map((name, index) => `$${index + 1}::${columns[name]}[]`);

/**
 * One prepared statement for any number of rows. The id decides: a batch that is sent again, after
 * its connection broke, adds no row twice.
 */
const insert = {
  ...patience,
  name: 'usage-rows',
  text: `INSERT INTO usage_events (${names.join(', ')})
    SELECT * FROM unnest(${arrays.join(', ')}) ON CONFLICT DO NOTHING`,
};

const quoted = (text: string): string => `"${text.replace(/["\\]/g, '\\$&')}"`;

/** PostgreSQL's text form of an array; the driver's own goes the long way round for each value. */
function arrayText(rows: readonly UsageRow[], name: keyof UsageRow): string {
  let text = '{';
  for (const row of rows) {
    const value = row[name];
    if (text.length > 1) text += ',';
    if (value === null) text += 'NULL';
    else if (typeof value === 'number') text += String(value);
    else text += typeof value === 'string' ? quoted(value) : quoted(value.toISOString());
  }
  return `${text}}`;
}

const sqlState = (error: unknown): string | undefined =>
  error instanceof Error && 'code' in error && typeof error.code === 'string'
    ? error.code
    : undefined;

/** Data exceptions and broken constraints lie in a row; anything else lies in the way there. */
export const isPoison = (error: unknown): boolean => /^2[23]...$/.test(sqlState(error) ?? '');

const isCut = (error: unknown): boolean => {
  const state = sqlState(error);
  return state === undefined || /^(08|57P)|^E[A-Z]+$/.test(state);
};

export type UsageRows = Gatherer<UsageRow, void>;

/** Settles a row when it is committed. */
export function usageRows(pool: Pool): UsageRows {
  const write = async (rows: readonly UsageRow[]): Promise<void> => {
    await pool.query({ ...insert, values: names.map((name) => arrayText(rows, name)) });
  };
  return new Gatherer<UsageRow, void>({
    isPoison,
    flush: async (rows) => {
      const began = Date.now();
      try {
        await write(rows);
      } catch (error) {
        // A connection that broke while idle fails its first use, and at once: the next one is new.
        if (!isCut(error) || Date.now() - began > 500) throw error;
        await write(rows);
      }
      return rows.map(() => undefined);
    },
  });
}
