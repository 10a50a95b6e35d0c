import { Client } from 'pg';
import { createDatabase, type TestDatabase } from '../support/database';
import { NOT_GRANTED, refusal } from '../support/refused';

describe('rights of the application role', () => {
  let database: TestDatabase;
  let application: Client;

  beforeAll(async () => {
    database = await createDatabase();
    application = new Client({ connectionString: database.url });
    await application.connect();
    await application.query(
      `insert into usage_events (id, at, method, route)
       values ('01JGFJJZ000000000000000000', now(), 'POST', '/v1/checks/waler')`,
    );
    await application.query(
      `insert into audit_events (actor, action, subject) values ('spec', 'tried', 'rights')`,
    );
  });

  afterAll(async () => {
    await application.end();
    await database.drop();
  });

  describe.each(['usage_events', 'audit_events'])('%s', (table) => {
    it('may be added to and read', async () => {
      const { rowCount } = await application.query(`select 1 from ${table}`);
      expect(rowCount).toBeGreaterThanOrEqual(1);
    });

    it.each([
      ['changed', `update ${table} set at = now()`],
      ['deleted', `delete from ${table}`],
      ['emptied', `truncate ${table}`],
      ['dropped', `drop table ${table}`],
    ])('may not be %s', async (_, statement) => {
      expect(await refusal(application.query(statement))).toBe(NOT_GRANTED);
    });
  });

  it('may not reach around usage_events by a partition', async () => {
    const { rows } = await application.query<{ name: string }>(
      `select inhrelid::regclass::text as name from pg_inherits
        where inhparent = 'usage_events'::regclass`,
    );
    expect(rows.length).toBeGreaterThanOrEqual(5);
    for (const { name } of rows) {
      expect(await refusal(application.query(`delete from ${name}`))).toBe(NOT_GRANTED);
      expect(await refusal(application.query(`insert into ${name} default values`))).toBe(
        NOT_GRANTED,
      );
    }
  });

  it.each([
    ['a hash of a key', `update api_keys set secret_sha256 = ''`],
    ['the scopes of a key', `update api_keys set scopes = '{usage}'`],
    ['the roles of a person', `update users set roles = '{admin}'`],
    ['the password of a person', `update users set password_hash = ''`],
    ['a person', `insert into users (email, name) values ('me@firm.example', 'Me')`],
    ['a roll-up', `insert into usage_hourly values (now(), null, '/', 200, null, 1, 1)`],
    ['how far the roll-up came', `delete from work_marks`],
    ['the marks of migrations', `delete from schema_migrations`],
    ['the schema', `create table mine (id integer)`],
    ['a guard', `alter table profile_revisions disable trigger all`],
  ])('may not touch %s', async (_, statement) => {
    expect(await refusal(application.query(statement))).toBe(NOT_GRANTED);
  });

  it('is granted nothing beyond what is listed', async () => {
    const { rows } = await application.query<{ line: string }>(
      `select table_name || ': ' || string_agg(privilege_type, ', ' order by privilege_type) as line
         from information_schema.table_privileges
        where grantee = current_user and table_schema = 'public'
        group by table_name order by table_name`,
    );
    expect(rows.map(({ line }) => line)).toEqual([
      'api_keys: INSERT, SELECT',
      'audit_events: INSERT, SELECT',
      'clients: INSERT, SELECT',
      'factor_profiles: INSERT, SELECT',
      'profile_revisions: INSERT, SELECT',
      'rate_counts: DELETE, INSERT, SELECT, UPDATE',
      'schema_migrations: SELECT',
      'sessions: DELETE, INSERT, SELECT, UPDATE',
      'usage_events: INSERT, SELECT',
      'usage_events_default: SELECT',
      'usage_hourly: SELECT',
      'users: SELECT',
    ]);
  });
});
