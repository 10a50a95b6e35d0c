import type { Sequelize } from 'sequelize';
import { connect } from '../../db/connect';
import { pendingMigrations } from '../../db/migrate';
import {
  ApiKey,
  AuditEvent,
  Client,
  FactorProfile,
  ProfileRevisionRow,
  User,
} from '../../db/models';
import { prepare } from '../../db/prepare';
import type { DemoPerson } from '../../db/seeders/people';
import { addApprovedRevision, contentHash } from '../../db/revise';
import { publishedProfiles } from '../../server/engine/profiles/published';
import { keyPattern, parseKey } from '../../server/features/keys/key-format';
import { matchesPassword } from '../../server/features/people/password';
import { roles } from '../../server/features/people/policy';
import { createDatabase, type TestDatabase } from '../support/database';

describe('a prepared database', () => {
  let database: TestDatabase;
  let owner: Sequelize;
  let options: Parameters<typeof prepare>[0];

  beforeEach(async () => {
    database = await createDatabase();
    options = {
      ownerUrl: database.ownerUrl,
      applicationRole: new URL(database.url).username,
    };
    // prepare() binds the models to its own connection and closes it: ours is bound afterwards.
    owner = connect(database.ownerUrl, { max: 1 });
  });

  afterEach(async () => {
    await owner.close();
    await database.drop();
  });

  async function demo(key?: string): Promise<string> {
    const { demoKey } = await prepare({ ...options, demo: { key, people: [] } });
    await owner.close();
    owner = connect(database.ownerUrl, { max: 1 });
    return demoKey ?? '';
  }

  const firstRevision = (slug: string) =>
    ProfileRevisionRow.findOne({ where: { slug, revision: 1 }, rejectOnEmpty: true });

  it('has every migration, as the application role can see', async () => {
    const application = connect(database.url, { max: 1 });
    expect(await pendingMigrations(application)).toEqual([]);
    await application.close();
  });

  it('changes nothing when prepared again, by two at once', async () => {
    const nothing = { migrations: [], partitions: [], published: [] };
    expect(await Promise.all([prepare(options), prepare(options)])).toEqual([nothing, nothing]);
  });

  it('holds the published profiles as approved revisions with their hash', async () => {
    for (const content of publishedProfiles) {
      const row = await firstRevision(content.slug);
      expect(row).toMatchObject({ status: 'approved', sha256: contentHash(content) });
      expect(contentHash(row)).toBe(row.sha256);
    }
  });

  it('takes a published tree that changed as a new revision, never as an edit', async () => {
    const { slug, tree, departures, sha256 } = await firstRevision('en-recommended');
    const published = { slug, tree, departures, title: 'Title', owner: 'Owner' };
    const changed = { ...published, tree: { ...tree, added: {} } };
    expect(await addApprovedRevision(owner, changed, 'spec')).toBe('en-recommended@2');
    expect(await addApprovedRevision(owner, changed, 'spec')).toBeUndefined();
    expect(await addApprovedRevision(owner, published, 'spec')).toBe('en-recommended@3');
    expect((await firstRevision('en-recommended')).sha256).toBe(sha256);
  });

  it('holds no client, key or firm of the scenario unless that is asked for', async () => {
    expect(await Client.count()).toBe(0);
    expect(await FactorProfile.count()).toBe(publishedProfiles.length);
  });

  it('adds the scenario once', async () => {
    await demo();
    await demo();
    expect(await Client.count()).toBe(3);
    const house = await ProfileRevisionRow.findAll({
      where: { slug: 'copper-lane-house' },
      order: ['revision'],
    });
    expect(house.map(({ status, departures }) => [status, departures.length])).toEqual([
      ['approved', 2],
      ['approved', 3],
    ]);
    expect(house[0]?.departures[0]).toMatchObject({ path: 'steel.gamma_M0', from: 1, to: 1.1 });
    expect(house[0]?.tree).toMatchObject({ steel: { gamma_M0: { value: 1.1, kind: 'firm' } } });
  });

  it('mints a demo key, keeps it while it opens, and stores no secret', async () => {
    const key = await demo();
    expect(key).toMatch(keyPattern);
    expect(await demo(key)).toBe(key);
    const [row, ...others] = await ApiKey.findAll();
    expect(others).toEqual([]);
    expect(row?.scopes).toEqual(['checks', 'catalogue', 'admin']);
    expect(row?.secretSha256).toEqual(parseKey(key)?.sha256);
    expect(JSON.stringify(row)).not.toContain(key.slice(-40));
  });

  it('mints another when the known one is of another machine, and revokes the old', async () => {
    const first = await demo();
    const second = await demo('not a key');
    expect(second).not.toBe(first);
    const rows = await ApiKey.findAll({ where: { revokedAt: null } });
    expect(rows.map(({ selector }) => selector)).toEqual([parseKey(second)?.selector]);
  });

  it('has one person of the scenario for each role, whose password is made here and kept', async () => {
    const seed = async (people: readonly DemoPerson[]): Promise<readonly DemoPerson[]> => {
      const { demoPeople = [] } = await prepare({ ...options, demo: { key: undefined, people } });
      await owner.close();
      owner = connect(database.ownerUrl, { max: 1 });
      return demoPeople;
    };
    const first = await seed([]);
    expect(first.map(({ role }) => role)).toEqual(roles);
    expect(new Set(first.map(({ password }) => password)).size).toBe(roles.length);
    const rows = await User.findAll();
    for (const { email, role, password } of first) {
      const row = rows.find((each) => each.email === email);
      expect(row?.roles).toEqual([role]);
      expect(matchesPassword(password, row?.passwordHash)).toBe(true);
    }
    expect(await seed(first)).toEqual(first);
    const [admin, ...others] = await seed(first.slice(1));
    expect(others).toEqual(first.slice(1));
    expect(admin?.password).not.toBe(first[0]?.password);
    const row = await User.findOne({ where: { email: admin?.email ?? '' } });
    expect(matchesPassword(admin?.password ?? '', row?.passwordHash)).toBe(true);
    const said = JSON.stringify(await AuditEvent.findAll());
    for (const each of [...first, admin]) expect(said).not.toContain(each?.password);
  });
});
