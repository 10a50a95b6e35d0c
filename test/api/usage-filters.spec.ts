import { validateAnswer } from '../../server/middleware/validation';
import { mintKey } from '../../server/features/keys/key-format';
import { ask, type Answered } from './support/ask';
import { addPerson, signIn, type Visitor } from './support/people';
import { startService, type TestService } from './support/service';

interface Logged {
  readonly id: string;
  readonly clientName: string | null;
  readonly keySelector: string | null;
  readonly personId: string | null;
  readonly personName: string | null;
  readonly profile: string | null;
}

let service: TestService & { keys: Record<'tool' | 'other', string> };
let lead: Visitor;
let leadId: string;
const selectorOf = (key: string): string => key.slice(4, 16);

const check = (key: string, profile: string, load = 0.5): Promise<Answered> =>
  ask(service.server, {
    method: 'post',
    path: '/v1/checks/fake',
    key,
    body: { profile, load },
  });

beforeAll(async () => {
  service = await startService({ tool: { rateLimit: 100_000 }, other: {} });
  leadId = await addPerson(service, 'lead@firm.example', ['lead']);
  lead = await signIn(service, 'lead@firm.example');
  for (const load of [0.5, 2, 0.5]) await check(service.keys.tool, 'uk-na', load);
  await check(service.keys.other, 'en-recommended');
  await check(service.keys.other, 'no-such-profile');
  await lead.ask({
    method: 'post',
    path: '/v1/checks/fake',
    body: { profile: 'uk-na@1', load: 0.5 },
  });
});
afterAll(() => service.stop());

const read = async (query: string): Promise<readonly Logged[]> => {
  const { status, body } = await lead.ask({ path: `/v1/usage?check=fake&${query}` });
  expect([query, status, validateAnswer('UsageList', body)]).toEqual([query, 200, []]);
  return body.items as Logged[];
};
const count = async (query: string): Promise<number> => (await read(query)).length;

describe('the log is narrowed', () => {
  it('by the public part of a key, also of one that does not hold', async () => {
    expect(await count(`key=${selectorOf(service.keys.tool)}`)).toBe(3);
    expect(await count(`key=${selectorOf(service.keys.other)}`)).toBe(2);
    const forged = mintKey('secret').text;
    await check(forged, 'uk-na');
    expect(await read(`key=${selectorOf(forged)}`)).toMatchObject([{ clientName: null }]);
  });

  it('by part of the name of a client, whatever the capitals, and nothing but text', async () => {
    const selector = selectorOf(service.keys.tool);
    expect(await count(`client=${encodeURIComponent(`CLIENT ${selector}`)}`)).toBe(3);
    expect(await count(`client=${selector.slice(2, 9).toLowerCase()}`)).toBe(3);
    expect(await count('client=client')).toBe(5);
    for (const text of ['%25', '_', "' or true --", 'nobody'])
      expect(await count(`client=${encodeURIComponent(text)}`)).toBe(0);
  });

  it('by person, whose name it tells', async () => {
    expect(await read(`person=${leadId}`)).toMatchObject([
      { personId: leadId, personName: 'Person lead@firm.example', keySelector: null },
    ]);
    expect(await count('person=00000000-0000-4000-8000-000000000000')).toBe(0);
  });

  it('by factor profile and revision', async () => {
    expect(await count('profile=uk-na')).toBe(4);
    expect(await count('profile=uk-na@1')).toBe(4);
    expect(await count('profile=uk-na@2')).toBe(0);
    expect(await count('profile=en-recommended')).toBe(1);
  });

  it('by several at once', async () => {
    const selector = selectorOf(service.keys.tool);
    expect(await count(`key=${selector}&answer=fail&status=200&profile=uk-na`)).toBe(1);
    expect(await count(`key=${selector}&client=${selectorOf(service.keys.other)}`)).toBe(0);
  });

  it.each(['key=htk_abc', 'person=me', 'profile=UK', 'profile=uk-na@0'])(
    '422 for ?%s',
    async (query) => {
      const { status, body } = await lead.ask({ path: `/v1/usage?${query}` });
      expect([status, body.code]).toEqual([422, 'query-not-valid']);
    },
  );

  it('422 for a whole key, which is not said back', async () => {
    const { status, text } = await lead.ask({ path: `/v1/usage?key=${service.keys.tool}` });
    expect(status).toBe(422);
    expect(text).not.toContain(service.keys.tool.slice(17));
    expect(service.printed()).not.toContain(service.keys.tool.slice(17));
  });
});

describe('its pages', () => {
  it('give every call that was there once, while others come in between', async () => {
    const selector = selectorOf(service.keys.tool);
    for (let each = 0; each < 20; each++) await check(service.keys.tool, 'uk-na');
    const before = (await read(`key=${selector}&pageSize=500`)).map(({ id }) => id);
    const seen: string[] = [];
    let token: string | null = null;
    do {
      const query: string = token === null ? '' : `&pageToken=${token}`;
      const { body } = await lead.ask({ path: `/v1/usage?key=${selector}&pageSize=4${query}` });
      seen.push(...(body.items as Logged[]).map(({ id }) => id));
      token = body.nextPageToken as string | null;
      await Promise.all([check(service.keys.tool, 'uk-na'), check(service.keys.tool, 'uk-na')]);
    } while (token !== null);
    expect(seen).toEqual(before);
  });

  it('cost one person no more than their limit, and say so', async () => {
    const { headers } = await lead.ask({ path: '/v1/usage' });
    expect(headers['ratelimit-policy']).toMatch(/^"person"; q=1200; w=60/);
    expect(headers.ratelimit).toMatch(/^"person"; r=\d+; t=\d+$/);
  });
});

describe('one call', () => {
  it('names its client and its person', async () => {
    const [own] = await read(`person=${leadId}`);
    const { status, body } = await lead.ask({ path: `/v1/usage/${own?.id ?? ''}` });
    expect([status, validateAnswer('UsageEvent', body)]).toEqual([200, []]);
    expect(body).toMatchObject({ personName: 'Person lead@firm.example', clientName: null });
  });
});
