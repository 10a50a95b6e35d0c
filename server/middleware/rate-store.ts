import type { ClientRateLimitInfo, Store } from 'express-rate-limit';
import type { Pool } from 'pg';
import { Gatherer } from './gather';
import { patience } from './patience';

interface Hit {
  readonly policy: string;
  readonly subject: string;
  readonly hits: number;
}

interface CountRow {
  readonly policy: string;
  readonly subject: string;
  readonly hits: number;
  /** Milliseconds of the window that are left, by the database's clock. */
  readonly rest: number;
}

export type RateCounts = Gatherer<Hit, ClientRateLimitInfo>;

/** The window is the minute of the database's clock, so that all processes count alike. */
const upsert = {
  ...patience,
  name: 'rate-counts',
  text: `INSERT INTO rate_counts AS counted (policy, subject, window_start, hits)
    SELECT policy, subject, date_trunc('minute', now()), hits
      FROM unnest($1::text[], $2::text[], $3::int[]) AS given (policy, subject, hits)
    ON CONFLICT (policy, subject, window_start) DO UPDATE SET hits = counted.hits + excluded.hits
    RETURNING policy, subject, hits,
      ceil(1000 * extract(epoch FROM window_start + interval '1 minute' - now()))::int AS rest`,
};

const slot = ({ policy, subject }: { policy: string; subject: string }): string =>
  `${policy} ${subject}`;

async function count(pool: Pool, hits: readonly Hit[]): Promise<ClientRateLimitInfo[]> {
  const sums = new Map<string, Hit>();
  for (const hit of hits) {
    const before = sums.get(slot(hit))?.hits ?? 0;
    sums.set(slot(hit), { ...hit, hits: before + hit.hits });
  }
  // Sorted, so that two processes take the locks of the same rows in the same order: no deadlock.
  const rows = [...sums.entries()].sort(([a], [b]) => (a < b ? -1 : 1)).map(([, row]) => row);
  const answered = await pool.query<CountRow>({
    ...upsert,
    values: [
      rows.map(({ policy }) => policy),
      rows.map(({ subject }) => subject),
      rows.map(({ hits: sum }) => sum),
    ],
  });
  const counted = new Map(answered.rows.map((row) => [slot(row), row]));
  const rank = new Map<string, number>();
  return hits.map((hit) => {
    const key = slot(hit);
    const row = counted.get(key);
    const soFar = (rank.get(key) ?? 0) + hit.hits;
    rank.set(key, soFar);
    // Each rider has its own place in the count: those before the batch, then those before it.
    const before = (row?.hits ?? 0) - (sums.get(key)?.hits ?? 0);
    return {
      totalHits: Math.max(1, before + soFar),
      resetTime: new Date(Date.now() + Math.max(1, row?.rest ?? 0)),
    };
  });
}

/** Concurrent hits ride in one upsert, whatever key or policy they count against. */
export const rateCounts = (pool: Pool): RateCounts =>
  new Gatherer({ flush: (hits) => count(pool, hits) });

/** The counts of one policy, shared by every process over the database. */
export class RateStore implements Store {
  readonly localKeys = false;
  readonly prefix: string;

  constructor(
    private readonly policy: string,
    private readonly counts: RateCounts,
  ) {
    this.prefix = policy;
  }

  increment(subject: string): Promise<ClientRateLimitInfo> {
    return this.counts.add({ policy: this.policy, subject, hits: 1 });
  }

  async decrement(subject: string): Promise<void> {
    await this.counts.add({ policy: this.policy, subject, hits: -1 });
  }

  /** Windows end by themselves. */
  resetKey(): void {
    throw new Error('A count is not reset.');
  }
}
