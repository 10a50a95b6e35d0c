import type { Sequelize } from 'sequelize';
import { connect } from '../../db/connect';
import { UsageEvent } from '../../db/models';
import { makePartitions, partitionHealth } from '../../db/partitions';
import { createDatabase, type TestDatabase } from '../support/database';

const logged = (at: string, n: number) => ({
  id: `01JGFJJZ${String(n).padStart(18, '0')}`,
  at: new Date(at),
  method: 'POST',
  route: '/v1/checks/waler',
});

describe('months of usage_events', () => {
  let database: TestDatabase;
  let application: Sequelize;
  let owner: Sequelize;

  beforeEach(async () => {
    database = await createDatabase();
    application = connect(database.url, { max: 1 });
    owner = connect(database.ownerUrl, { max: 1 });
  });

  afterEach(async () => {
    await Promise.all([application.close(), owner.close()]);
    await database.drop();
  });

  it('are ready, this one and three ahead, in a prepared database', async () => {
    expect(await partitionHealth(application)).toEqual({ missing: [], strayRows: 0 });
  });

  it('are told of when they are missing, over the end of a year', async () => {
    const { missing } = await partitionHealth(application, new Date('2041-11-30T23:59:59Z'));
    expect(missing).toEqual([
      'usage_events_2041_11',
      'usage_events_2041_12',
      'usage_events_2042_01',
      'usage_events_2042_02',
    ]);
  });

  it('are made once', async () => {
    const now = new Date('2041-11-30T23:59:59Z');
    expect(await makePartitions(owner, now)).toHaveLength(4);
    expect(await makePartitions(owner, now)).toEqual([]);
    expect(await partitionHealth(application, now)).toEqual({ missing: [], strayRows: 0 });
  });

  it('catch no row of a neighbour: a month begins and ends in UTC', async () => {
    await makePartitions(owner, new Date('2041-11-15T00:00:00Z'));
    await UsageEvent.bulkCreate([
      logged('2041-11-30T23:59:59.999Z', 1),
      logged('2041-12-01T00:00:00.000Z', 2),
    ]);
    const [rows] = await owner.query(
      `select tableoid::regclass::text as month from usage_events order by at`,
    );
    expect(rows).toEqual([{ month: 'usage_events_2041_11' }, { month: 'usage_events_2041_12' }]);
  });

  it('take over the rows that fell into DEFAULT before they were there', async () => {
    await UsageEvent.bulkCreate([
      logged('2041-11-30T12:00:00Z', 1),
      logged('2042-06-01T12:00:00Z', 2),
    ]);
    expect((await partitionHealth(application)).strayRows).toBe(2);
    const made = await makePartitions(owner, new Date('2041-11-15T00:00:00Z'));
    expect(made).toEqual([
      'usage_events_2041_11',
      'usage_events_2041_12',
      'usage_events_2042_01',
      'usage_events_2042_02',
      'usage_events_2042_06',
    ]);
    expect((await partitionHealth(application)).strayRows).toBe(0);
    expect(await UsageEvent.count()).toBe(2);
  });
});
