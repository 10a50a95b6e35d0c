import type { Sequelize } from 'sequelize';
import { connect } from '../../db/connect';
import { withLock } from '../../db/lock';
import { RateCount, UsageEvent, UsageHour } from '../../db/models';
import { rollUpHours } from '../../db/rollup';
import { startUpkeep, upkeepOnce, type UpkeepDone } from '../../db/upkeep';
import { createDatabase, type TestDatabase } from '../support/database';

const HOUR = 3_600_000;
const hoursAgo = (hours: number) => new Date(Math.floor(Date.now() / HOUR - hours) * HOUR + 60_000);

let n = 0;
const call = (at: Date, more: Partial<Record<string, unknown>> = {}) => ({
  id: `01JGFJJZ${String(++n).padStart(18, '0')}`,
  at,
  method: 'POST',
  route: '/v1/checks/waler',
  httpStatus: 200,
  answer: 'pass',
  durationUs: 1_000,
  ...more,
});

describe('upkeep', () => {
  let database: TestDatabase;
  let owner: Sequelize;

  beforeEach(async () => {
    database = await createDatabase();
    owner = connect(database.ownerUrl, { max: 1 });
  });

  afterEach(async () => {
    await owner.close();
    await database.drop();
  });

  const rolledUp = async () =>
    (await UsageHour.findAll({ order: ['hour', 'answer'] })).map(
      ({ hour, answer, calls, durationUsSum }) => ({ hour, answer, calls, durationUsSum }),
    );

  it('gathers completed hours, counts repeats, and a stream at its end row', async () => {
    const at = hoursAgo(3);
    await UsageEvent.bulkCreate([
      call(at),
      call(at, { repeats: 4 }),
      call(at, { answer: 'fail' }),
      call(at, { phase: 'start', httpStatus: null, answer: null, durationUs: null }),
      call(at, { phase: 'end', answer: null, durationUs: 7_000 }),
      call(new Date()),
    ]);
    expect(await rollUpHours(owner)).toBeGreaterThanOrEqual(1);
    const hour = new Date(Math.floor(at.getTime() / HOUR) * HOUR);
    expect(await rolledUp()).toEqual([
      { hour, answer: 'fail', calls: 1, durationUsSum: '1000' },
      { hour, answer: 'pass', calls: 5, durationUsSum: '5000' },
      { hour, answer: null, calls: 1, durationUsSum: '7000' },
    ]);
  });

  it('rolls the latest hours up again, for rows that came late, and gives no row twice', async () => {
    await UsageEvent.create(call(hoursAgo(3)));
    await rollUpHours(owner);
    await UsageEvent.create(call(hoursAgo(3)));
    await rollUpHours(owner);
    await rollUpHours(owner);
    expect((await rolledUp()).map(({ calls }) => calls)).toEqual([2]);
  });

  it('has nothing to gather where nothing was called', async () => {
    expect(await rollUpHours(owner)).toBe(0);
  });

  it('forgets windows of a day ago and keeps those that count', async () => {
    const count = { policy: 'key', subject: 's', hits: 1 };
    await RateCount.create({ ...count, windowStart: hoursAgo(30) });
    await RateCount.create({ ...count, windowStart: new Date() });
    expect((await upkeepOnce(owner, database.ownerUrl))?.rateCountsForgotten).toBe(1);
    expect(await RateCount.count()).toBe(1);
  });

  it('stands back while another process is at it, and works again afterwards', async () => {
    const meanwhile = await withLock(database.ownerUrl, 'upkeep', () =>
      upkeepOnce(owner, database.ownerUrl),
    );
    expect(meanwhile).toBeUndefined();
    expect(await upkeepOnce(owner, database.ownerUrl)).toBeDefined();
  });

  it('tells of a failed round by its message and tries again', async () => {
    const failures: string[] = [];
    const done = await new Promise<UpkeepDone>((resolve) => {
      void owner.query('alter table usage_hourly rename to elsewhere').then(async () => {
        await UsageEvent.create(call(hoursAgo(3)));
        const upkeep = startUpkeep({
          owner,
          ownerUrl: database.ownerUrl,
          everyMs: 10,
          onFailure: (message) => {
            failures.push(message);
            void owner.query('alter table if exists elsewhere rename to usage_hourly');
          },
          onDone: (round) => void upkeep.stop().then(() => resolve(round)),
        });
      });
    });
    expect(failures[0]).toContain('usage_hourly');
    expect(done.hoursRolledUp).toBeGreaterThanOrEqual(1);
  });
});
