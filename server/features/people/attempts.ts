import { createHash } from 'node:crypto';
import type { Pool } from 'pg';
import { patience } from '../../middleware/patience';
import { Problem } from '../../middleware/problem';

/**
 * Sign-ins that may fail in a quarter of an hour. One address is held at one account early; the
 * account as a whole much later, so that nobody is locked out by somebody else's guessing.
 */
export const attemptLimits = { address: 60, account: 10, accountAnywhere: 100 } as const;
export type AttemptLimits = Readonly<Record<keyof typeof attemptLimits, number>>;

const windowSeconds = 900;
const window = `to_timestamp(floor(extract(epoch FROM now()) / ${windowSeconds}) * ${windowSeconds})`;

const count = {
  ...patience,
  name: 'sign-in-count',
  text: `INSERT INTO rate_counts AS counted (policy, subject, window_start, hits)
    SELECT policy, subject, ${window}, 1
      FROM unnest($1::text[], $2::text[]) AS given (policy, subject)
    ON CONFLICT (policy, subject, window_start) DO UPDATE SET hits = counted.hits + 1
    RETURNING policy, hits,
      ceil(extract(epoch FROM window_start - now()) + ${windowSeconds})::int AS rest`,
};

const giveBack = {
  ...patience,
  name: 'sign-in-give-back',
  text: `UPDATE rate_counts SET hits = greatest(0, hits - 1)
    WHERE (policy, subject) IN (SELECT * FROM unnest($1::text[], $2::text[]))
      AND window_start = ${window}`,
};

interface Counted {
  readonly policy: string;
  readonly hits: number;
  readonly rest: number;
}

/** What is typed in the email field may be a password by mistake: only its hash is kept. */
const accountOf = (email: string): string =>
  createHash('sha256').update(email).digest('base64url').slice(0, 32);

/** Counts sign-ins before they are looked at, in the database: for all processes together. */
export class Attempts {
  constructor(
    private readonly pool: Pool,
    private readonly limits: AttemptLimits = attemptLimits,
  ) {}

  /** @throws {Problem} `rate-limited`, whether there is such a person or not. */
  async begin(email: string, address: string): Promise<void> {
    const { rows } = await this.pool.query<Counted>({ ...count, values: slots(email, address) });
    const most: Readonly<Record<string, number>> = {
      'sign-in-account': this.limits.account,
      'sign-in-account-anywhere': this.limits.accountAnywhere,
      'sign-in-address': this.limits.address,
    };
    const over = rows.filter(({ policy, hits }) => hits > (most[policy] ?? 0));
    if (over.length === 0) return;
    const seconds = String(Math.max(1, ...over.map(({ rest }) => rest)));
    throw new Problem('rate-limited', `Too many sign-ins failed; try again in ${seconds} s.`, {
      headers: { 'Retry-After': seconds },
    });
  }

  /** A sign-in that went well does not count. */
  async succeeded(email: string, address: string): Promise<void> {
    await this.pool.query({ ...giveBack, values: slots(email, address) });
  }
}

/** Policies in the order of their names: two sign-ins never wait for each other crosswise. */
function slots(email: string, address: string): [string[], string[]] {
  const account = accountOf(email);
  return [
    ['sign-in-account', 'sign-in-account-anywhere', 'sign-in-address'],
    [`${account} ${address}`, account, address],
  ];
}
