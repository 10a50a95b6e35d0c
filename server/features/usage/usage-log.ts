import type { Pool } from 'pg';
import type { Call } from '../../middleware/call';
import { FloodGate } from './flood';
import { usageRow, type Ending } from './usage-row';
import { usageRows, type UsageRows } from './usage-writer';

/** The log of calls. An answer goes out when its `write` has settled. */
export class UsageLog {
  private readonly rows: UsageRows;
  private readonly gate: FloodGate;
  private readonly timer: NodeJS.Timeout;

  constructor(pool: Pool) {
    this.rows = usageRows(pool);
    this.gate = new FloodGate((row) => this.rows.add(row));
    this.timer = setInterval(() => this.gate.turn(Date.now()), 5_000);
    this.timer.unref();
  }

  async write(call: Call, ending: Ending): Promise<void> {
    const row = usageRow(call, ending);
    if (!call.key && !call.person && ending.status >= 400 && this.gate.takes(row)) return;
    await this.rows.add(row);
  }

  /** Writes what is still counted or waiting. */
  async close(): Promise<void> {
    clearInterval(this.timer);
    await this.gate.flush();
    await this.rows.idle();
  }
}
