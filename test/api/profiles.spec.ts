import { ask, type Answered } from './support/ask';
import { startService, type TestService } from './support/service';

let service: TestService & { keys: Record<'all' | 'one' | 'pinned', string> };
beforeAll(async () => {
  service = await startService({
    all: {},
    one: { profiles: ['uk-na'] },
    pinned: { pins: { firm: 1 } },
  });
  await service.sql(`INSERT INTO factor_profiles (slug, title, owner)
    VALUES ('firm', 'A firm', 'Somebody'), ('later', 'Later', 'Somebody')`);
  const add = (slug: string, revision: number, status: string, from: string, expires: string) =>
    service.sql(
      `INSERT INTO profile_revisions (slug, revision, status, tree, departures, sha256,
         effective_from, expires_at, approved_at, approved_by, withdrawn_at, withdrawn_by)
       SELECT $1, $2, $3, tree, departures, sha256, now() + $4::interval,
         now() + nullif($5, '')::interval,
         case when $3 in ('approved', 'withdrawn') then now() end,
         case when $3 in ('approved', 'withdrawn') then 'A lead' end,
         case when $3 = 'withdrawn' then now() end, case when $3 = 'withdrawn' then 'A lead' end
       FROM profile_revisions WHERE slug = 'uk-na' AND revision = 1`,
      [slug, revision, status, from, expires],
    );
  await add('firm', 1, 'approved', '-3 days', '-1 day');
  await add('firm', 2, 'approved', '-2 days', '');
  await add('firm', 3, 'withdrawn', '-2 days', '');
  await add('firm', 4, 'approved', '1 day', '');
  await add('firm', 5, 'draft', '-1 day', '');
  await add('later', 1, 'approved', '1 day', '');
});
afterAll(() => service.stop());

type Name = keyof typeof service.keys;
const get = (path: string, key: Name = 'all'): Promise<Answered> =>
  ask(service.server, { path, key: service.keys[key] });
const check = (profile: string, key: Name = 'all'): Promise<Answered> =>
  ask(service.server, {
    method: 'post',
    path: '/v1/checks/fake',
    key: service.keys[key],
    body: { profile, load: 0.5 },
  });

describe('200', () => {
  it('lists the profiles that the key may use, with what each revision is worth today', async () => {
    const { status, body } = await get('/v1/profiles');
    expect(status).toBe(200);
    const items = body.items as { slug: string; current: number | null; revisions: unknown[] }[];
    expect(items.map(({ slug, current }) => [slug, current])).toEqual([
      ['en-recommended', 1],
      ['firm', 2],
      ['later', null],
      ['uk-na', 1],
    ]);
    expect(items[1]?.revisions).toMatchObject([
      { revision: 5, status: 'draft', standing: 'draft' },
      { revision: 4, status: 'approved', standing: 'not-yet-in-effect' },
      { revision: 3, status: 'withdrawn', standing: 'withdrawn' },
      { revision: 2, status: 'approved', standing: 'in-effect' },
      { revision: 1, status: 'approved', standing: 'expired' },
    ]);
    const limited = (await get('/v1/profiles', 'one')).body.items as { slug: string }[];
    expect(limited.map(({ slug }) => slug)).toEqual(['uk-na']);
  });

  it.each([
    ['firm', 2],
    ['firm@4', 4],
    ['later', 1],
  ])('reads %s with every value and where it comes from', async (name, revision) => {
    const { status, body } = await get(`/v1/profiles/${name}`);
    expect(status).toBe(200);
    expect(body.revision).toBe(revision);
    expect(JSON.stringify(body.tree)).toMatch(/"clause":.*"kind":/);
  });

  it.each([
    ['firm', 'all', 2],
    ['firm@1', 'all', 1],
    ['firm@5', 'all', 5],
    ['firm', 'pinned', 1],
    ['firm@2', 'pinned', 2],
  ] as const)('a check under %s by the key %s takes revision %d', async (name, key, revision) => {
    const { status, body } = await check(name, key);
    expect([status, body.profile]).toEqual([200, { slug: 'firm', revision }]);
  });
});

describe('404', () => {
  it.each([
    ['no-such', 'all'],
    ['firm@9', 'all'],
    ['FIRM', 'all'],
    ['firm', 'one'],
  ] as const)('for %s read by the key %s', async (name, key) => {
    const { status, body } = await get(`/v1/profiles/${name}`, key);
    expect([status, body.code]).toEqual([404, 'not-found']);
  });
});

describe('422', () => {
  it('for a profile of which no revision is in effect', async () => {
    const { status, body } = await check('later');
    expect([status, body.code]).toEqual([422, 'profile-not-in-effect']);
  });
});
