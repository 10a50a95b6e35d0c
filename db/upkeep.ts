import type { Sequelize } from 'sequelize';
import { tryWithLock } from './lock';
import { makePartitions } from './partitions';
import { forgetRateCounts } from './rate-counts';
import { rollUpHours } from './rollup';
import { forgetSessions } from './sessions';

export interface UpkeepDone {
  readonly partitionsMade: readonly string[];
  readonly hoursRolledUp: number;
  readonly rateCountsForgotten: number;
  readonly sessionsForgotten: number;
}

export interface UpkeepOptions {
  readonly owner: Sequelize;
  readonly ownerUrl: string;
  readonly everyMs: number;
  onDone(done: UpkeepDone): void;
  onFailure(message: string): void;
}

export interface Upkeep {
  /** Begins no further round and waits for the one under way. */
  stop(): Promise<void>;
}

/** One round, as the owner; `undefined` when another process is at it. */
export function upkeepOnce(owner: Sequelize, ownerUrl: string): Promise<UpkeepDone | undefined> {
  return tryWithLock(ownerUrl, 'upkeep', async () => ({
    partitionsMade: await makePartitions(owner),
    hoursRolledUp: await rollUpHours(owner),
    rateCountsForgotten: await forgetRateCounts(owner),
    sessionsForgotten: await forgetSessions(owner),
  }));
}

/** Rounds for ever, the first at once; a round that fails is told of and tried again at the next. */
export function startUpkeep(options: UpkeepOptions): Upkeep {
  let stopped = false;
  let timer: NodeJS.Timeout | undefined;
  let underWay = round();
  return {
    async stop() {
      stopped = true;
      clearTimeout(timer);
      await underWay;
    },
  };

  async function round(): Promise<void> {
    try {
      const done = await upkeepOnce(options.owner, options.ownerUrl);
      if (done) options.onDone(done);
    } catch (error) {
      options.onFailure(error instanceof Error ? error.message : 'unknown');
    }
    if (isStopped()) return;
    timer = setTimeout(() => {
      underWay = round();
    }, options.everyMs);
  }

  function isStopped(): boolean {
    return stopped;
  }
}
