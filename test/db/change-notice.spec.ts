import { Client } from 'pg';
import { createDatabase, type TestDatabase } from '../support/database';

describe('notices on headtree_changes', () => {
  let database: TestDatabase;
  let owner: Client;
  let heard: string[] = [];

  beforeAll(async () => {
    database = await createDatabase();
    owner = new Client({ connectionString: database.ownerUrl });
    await owner.connect();
    owner.on('notification', ({ payload }) => heard.push(payload ?? ''));
    await owner.query('listen headtree_changes');
    await owner.query(`insert into clients (id, name) values (
      '00000000-0000-4000-8000-000000000001', 'Spec')`);
    await owner.query(`insert into api_keys (client_id, kind, selector, secret_sha256, label, scopes)
      values ('00000000-0000-4000-8000-000000000001', 'secret', 'specSelector',
              sha256('spec'), 'Spec', '{checks}')`);
    await owner.query(`insert into factor_profiles values ('spec', 'Spec', 'Spec')`);
    await owner.query(`insert into profile_revisions (slug, revision, status, tree, departures, sha256)
      values ('spec', 1, 'draft', '{}', '[]', '${'a'.repeat(64)}')`);
  });

  afterAll(async () => {
    await owner.end();
    await database.drop();
  });

  /** What one statement is heard to say; a second round trip brings in what is on its way. */
  async function noticesOf(statement: string): Promise<string[]> {
    heard = [];
    await owner.query(statement);
    await owner.query('select 1');
    return heard;
  }

  it.each([
    ['keys', `update clients set pins = '{"uk-na": 1}' where name = 'Spec'`],
    ['keys', `update clients set disabled_at = now() where name = 'Spec'`],
    ['keys', `insert into clients (name) values ('Spec two')`],
    ['keys', `update api_keys set revoked_at = now() where selector = 'specSelector'`],
    ['keys', `delete from api_keys where selector = 'specSelector'`],
    ['profiles', `update factor_profiles set title = 'New' where slug = 'spec'`],
    ['profiles', `update profile_revisions set status = 'proposed' where slug = 'spec'`],
    ['profiles', `delete from profile_revisions where slug = 'spec'`],
    ['profiles', `delete from factor_profiles where slug = 'spec'`],
  ])('says %s after: %s', async (payload, statement) => {
    expect(await noticesOf(statement)).toEqual([payload]);
  });

  it.each([
    ['a change that changes nothing', `update clients set name = name`],
    ['a change of no row', `update factor_profiles set title = 'x' where slug = 'none'`],
    ['the day a key was used, for calls set it', `update api_keys set last_used_on = current_date`],
    [
      'a call',
      `insert into usage_events (id, at, method, route)
       values ('01JGFJJZ000000000000000000', now(), 'GET', '/v1/sections')`,
    ],
    [
      'a count',
      `insert into rate_counts (policy, subject, window_start, hits) values ('k', 's', now(), 1)`,
    ],
  ])('says nothing for %s', async (_, statement) => {
    expect(await noticesOf(statement)).toEqual([]);
  });
});
