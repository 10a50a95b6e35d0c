import { Client } from 'pg';
import { createDatabase, type TestDatabase } from '../support/database';
import { APPROVED, NOT_GRANTED, refusal } from '../support/refused';

const hash = 'a'.repeat(64);

describe('an approved revision', () => {
  let database: TestDatabase;
  let application: Client;
  let owner: Client;

  beforeAll(async () => {
    database = await createDatabase();
    application = new Client({ connectionString: database.url });
    owner = new Client({ connectionString: database.ownerUrl });
    await Promise.all([application.connect(), owner.connect()]);
  });

  afterAll(async () => {
    await Promise.all([application.end(), owner.end()]);
    await database.drop();
  });

  beforeEach(async () => {
    await application.query(
      `insert into factor_profiles values ('spec', 'Spec', 'Spec') on conflict do nothing`,
    );
    await application.query(
      `insert into profile_revisions (slug, revision, status, tree, departures, sha256,
         approved_at, approved_by)
       select 'spec', coalesce(max(revision), 0) + 1, 'approved', '{}', '[]', '${hash}', now(), 'L'
         from profile_revisions where slug = 'spec'`,
    );
  });

  const newest = `slug = 'spec' and revision =
    (select max(revision) from profile_revisions where slug = 'spec')`;
  const set = (what: string) => `update profile_revisions set ${what} where ${newest}`;

  const contents = [
    `tree = '{"steel": {}}'`,
    `departures = '[{}]'`,
    `sha256 = '${'b'.repeat(64)}'`,
    `slug = 'uk-na', revision = 99`,
    `revision = 99`,
    `effective_from = now() + interval '1 day'`,
    `expires_at = now() + interval '1 day'`,
    `created_at = now() - interval '1 day'`,
  ];

  it.each(contents)('is refused to the application role: %s', async (what) => {
    expect(await refusal(application.query(set(what)))).toBe(NOT_GRANTED);
  });

  it.each([
    ...contents,
    `approved_by = 'someone else'`,
    `approved_at = null`,
    `status = 'draft'`,
    `status = 'proposed'`,
  ])('is refused to its owner too, by the trigger: %s', async (what) => {
    expect(await refusal(owner.query(set(what)))).toBe(APPROVED);
  });

  it('cannot be deleted, by either', async () => {
    const statement = `delete from profile_revisions where ${newest}`;
    expect(await refusal(application.query(statement))).toBe(NOT_GRANTED);
    expect(await refusal(owner.query(statement))).toBe(APPROVED);
    expect(await refusal(owner.query('truncate profile_revisions'))).toBe(APPROVED);
  });

  it('can be withdrawn by the application role, once and for good', async () => {
    const withdraw = set(`status = 'withdrawn', withdrawn_at = now(), withdrawn_by = 'L'`);
    expect(await refusal(application.query(withdraw))).toBeUndefined();
    expect(await refusal(application.query(set(`status = 'approved'`)))).toBe(APPROVED);
    expect(await refusal(application.query(set(`withdrawn_by = 'M'`)))).toBe(APPROVED);
    expect(await refusal(owner.query(set(`tree = '{"steel": {}}'`)))).toBe(APPROVED);
  });

  it('needs an approver and a time', async () => {
    const statement = `insert into profile_revisions (slug, revision, status, tree, departures,
      sha256) values ('spec', 50, 'approved', '{}', '[]', '${hash}')`;
    expect(await refusal(application.query(statement))).toBe('23514');
  });

  it('may be approved from a draft by the application role, which may not edit the draft', async () => {
    await application.query(`insert into factor_profiles values ('spec-draft', 'Spec', 'Spec')`);
    await application.query(
      `insert into profile_revisions (slug, revision, status, tree, departures, sha256)
       values ('spec-draft', 1, 'draft', '{}', '[]', '${hash}')`,
    );
    const draft = (what: string) =>
      refusal(application.query(`update profile_revisions set ${what} where slug = 'spec-draft'`));
    expect(await draft(`tree = '{"steel": {}}'`)).toBe(NOT_GRANTED);
    expect(
      await draft(`status = 'approved', approved_at = now(), approved_by = 'L'`),
    ).toBeUndefined();
    expect(await draft(`status = 'draft'`)).toBe(APPROVED);
  });
});
