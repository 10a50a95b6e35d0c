import { performance } from 'node:perf_hooks';

export interface GatherOptions<Row, Result> {
  /** Writes the rows in one statement and answers one result for each, in order. */
  readonly flush: (rows: readonly Row[]) => Promise<readonly Result[]>;
  /** Whether an error lies in a row (and not in the way to the database). */
  readonly isPoison?: (error: unknown) => boolean;
  readonly maxBatch?: number;
  /** Rows that may wait; one more is refused. */
  readonly maxWaiting?: number;
  /** Milliseconds that a row may wait for its flush to begin. */
  readonly maxAge?: number;
  /** Milliseconds; for tests. */
  readonly clock?: () => number;
}

/** More is waiting, or has waited longer, than the gatherer takes on. */
export class GatherFull extends Error {
  override readonly name = 'GatherFull';
}

interface Rider<Row, Result> {
  readonly row: Row;
  readonly since: number;
  readonly resolve: (result: Result) => void;
  readonly reject: (error: unknown) => void;
}

/** Two flushes overlap the database's work with ours; a third would only make smaller batches. */
const maxFlights = 2;

/**
 * Rows of concurrent requests ride together. A flush begins on setImmediate while fewer than two
 * are in flight; otherwise a row rides with the next. There is no timer, so nothing waits when the
 * service is idle and batches grow by themselves when it is not.
 */
export class Gatherer<Row, Result> {
  private readonly options: Required<GatherOptions<Row, Result>>;
  private waiting: Rider<Row, Result>[] = [];
  private flights = 0;
  private scheduled = false;
  private idleWaiters: (() => void)[] = [];

  constructor(options: GatherOptions<Row, Result>) {
    this.options = {
      isPoison: () => false,
      maxBatch: 500,
      maxWaiting: 5_000,
      maxAge: 5_000,
      clock: () => performance.now(),
      ...options,
    };
  }

  /** Settles when the row's flush does. */
  add(row: Row): Promise<Result> {
    const { maxWaiting, maxAge, clock } = this.options;
    const now = clock();
    const oldest = this.waiting[0];
    if (this.waiting.length >= maxWaiting || (oldest && now - oldest.since > maxAge))
      return Promise.reject(new GatherFull('Too much is waiting to be written.'));
    return new Promise<Result>((resolve, reject) => {
      this.waiting.push({ row, since: now, resolve, reject });
      this.schedule();
    });
  }

  /** Settles when nothing waits or flies. */
  idle(): Promise<void> {
    if (this.flights === 0 && this.waiting.length === 0) return Promise.resolve();
    return new Promise((resolve) => this.idleWaiters.push(resolve));
  }

  private schedule(): void {
    if (this.scheduled || this.flights >= maxFlights || this.waiting.length === 0) return;
    this.scheduled = true;
    setImmediate(() => {
      this.scheduled = false;
      this.depart();
    });
  }

  private depart(): void {
    this.dropAged();
    const riders = this.waiting.splice(0, this.options.maxBatch);
    this.flights++;
    void this.fly(riders).then(() => {
      this.flights--;
      this.schedule();
      if (this.flights === 0 && this.waiting.length === 0)
        for (const done of this.idleWaiters.splice(0)) done();
    });
    this.schedule();
  }

  private dropAged(): void {
    const limit = this.options.clock() - this.options.maxAge;
    const fresh = this.waiting.findIndex(({ since }) => since >= limit);
    const aged = this.waiting.splice(0, fresh < 0 ? this.waiting.length : fresh);
    for (const { reject } of aged) reject(new GatherFull('Waited too long to be written.'));
  }

  /** Never rejects: each rider learns its own end. A poisoned row is found by halving. */
  private async fly(riders: readonly Rider<Row, Result>[]): Promise<void> {
    if (riders.length === 0) return;
    try {
      const results = await this.options.flush(riders.map(({ row }) => row));
      riders.forEach(({ resolve }, index) => resolve(results[index] as Result));
    } catch (error) {
      if (riders.length === 1 || !this.options.isPoison(error)) {
        for (const { reject } of riders) reject(error);
        return;
      }
      const half = riders.length >> 1;
      await this.fly(riders.slice(0, half));
      await this.fly(riders.slice(half));
    }
  }
}
