import { ulid } from 'ulid';
import type { UsageRow } from './usage-row';

const minute = 60_000;
const rowsOfTheirOwn = 10;
const maxSubjects = 10_000;

interface Flood {
  /** Refusals of this address, status and minute so far. */
  seen: number;
  /** Those past the tenth, by code: the first of them with how many it stands for. */
  readonly merged: Map<string, UsageRow>;
}

/**
 * Refusals of callers without a good key. The first ten of an address, status and minute have a row
 * each; the rest are counted here and written as one row with `repeats` when the minute is over, so
 * that nobody fills the log by knocking. A crash loses that count, never a row of its own.
 */
export class FloodGate {
  private floods = new Map<string, Flood>();
  private minute = 0;

  constructor(private readonly write: (row: UsageRow) => Promise<unknown>) {}

  /** Whether the row is taken into a count, so that nothing needs to be written for it now. */
  takes(row: UsageRow): boolean {
    this.turn(row.at.getTime());
    const subject = `${row.address ?? ''} ${row.http_status}`;
    let flood = this.floods.get(subject);
    if (!flood) {
      if (this.floods.size >= maxSubjects) return false;
      flood = { seen: 0, merged: new Map() };
      this.floods.set(subject, flood);
    }
    flood.seen++;
    if (flood.seen <= rowsOfTheirOwn) return false;
    const code = row.code ?? '';
    const before = flood.merged.get(code);
    flood.merged.set(
      code,
      before
        ? { ...before, repeats: before.repeats + 1 }
        : { ...row, route: 'many', key_selector: null, caller_request_id: null },
    );
    return true;
  }

  /** Writes the counts of a minute that is over. */
  turn(now: number): void {
    const current = Math.floor(now / minute);
    if (current <= this.minute) return;
    this.minute = current;
    this.flush().catch(() => undefined);
  }

  async flush(): Promise<void> {
    const rows = [...this.floods.values()].flatMap(({ merged }) => [...merged.values()]);
    this.floods = new Map();
    // An id of its own: the one it came with was answered to a caller as a single call.
    const merged = rows.map((row) => ({ ...row, id: ulid(row.at.getTime()) }));
    await Promise.all(merged.map((row) => this.write(row)));
  }
}
