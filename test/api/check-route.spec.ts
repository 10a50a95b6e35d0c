import { ask, type Answered, type Asking } from './support/ask';
import { startService, type TestService } from './support/service';

const keys = {
  good: {},
  house: { defaultProfile: 'uk-na' },
  limited: { profiles: ['uk-na'] },
  noChecks: { scopes: ['catalogue'] },
};
let service: TestService & { keys: Record<keyof typeof keys, string> };

beforeAll(async () => {
  service = await startService(keys);
});
afterAll(() => service.stop());

interface Posting extends Omit<Asking, 'path' | 'key' | 'body'> {
  readonly as?: keyof typeof keys;
  readonly path?: string;
}
const post = (
  body: object | string,
  { as = 'good', path = '/v1/checks/fake', ...more }: Posting = {},
): Promise<Answered> =>
  ask(service.server, { method: 'post', path, key: service.keys[as], body, ...more });
const good = { profile: 'uk-na', load: 0.5 };

/** The row of an answer, by the id it carried. */
const rowOf = async (id: unknown) => {
  const rows = await service.usage('id = $1', [id]);
  expect(rows).toHaveLength(1);
  return rows[0];
};

describe('200', () => {
  it('answers with the check and its row in the log is there already', async () => {
    const { status, body, headers } = await post(good, { headers: { 'X-Request-Id': 'job-7' } });
    expect(status).toBe(200);
    expect(body).toMatchObject({ status: 'pass', utilisation: 0.5 });
    expect(await rowOf(headers['x-request-id'])).toMatchObject({
      route: '/v1/checks/fake',
      method: 'POST',
      check_id: 'fake',
      profile: 'uk-na',
      profile_revision: 1,
      http_status: 200,
      code: null,
      answer: 'pass',
      utilisation: 0.5,
      governing: 'bending-y',
      caller_request_id: 'job-7',
      address: '127.0.0.1',
      phase: 'whole',
      repeats: 1,
    });
  });

  it('takes the default profile of the client', async () => {
    const { status, body } = await post({ load: 2 }, { as: 'house' });
    expect(status).toBe(200);
    expect(body).toMatchObject({ status: 'fail', profile: { slug: 'uk-na', revision: 1 } });
  });

  it('runs a costly check apart', async () => {
    const { status } = await post({ profile: 'uk-na', load: 50_000 });
    expect(status).toBe(200);
  });

  it('carries limits and our id, and says nothing of what it is made with', async () => {
    const { headers } = await post(good);
    expect(headers['x-request-id']).toMatch(/^[0-9A-HJKMNP-TV-Z]{26}$/);
    expect(headers.ratelimit).toMatch(/^"key"; r=\d+; t=\d+$/);
    expect(headers['ratelimit-policy']).toMatch(/^"key"; q=6000; w=60; pk=:/);
    expect(headers['x-powered-by']).toBeUndefined();
    expect(headers.etag).toBeUndefined();
  });

  it('does not keep a label that is not well formed, or that holds a key', async () => {
    for (const label of ['two words', 'x'.repeat(200), service.keys.good]) {
      const { headers } = await post(good, { headers: { 'X-Request-Id': label } });
      expect(await rowOf(headers['x-request-id'])).toMatchObject({ caller_request_id: null });
    }
  });
});

describe('400', () => {
  it.each(['{"profile":', '', 'load=1', '\u0000'])('for the body %j', async (text) => {
    const { status, body } = await post(text);
    expect(status).toBe(400);
    expect(body).toMatchObject({ code: 'not-json', type: '/problems/not-json' });
  });
});

describe('403', () => {
  it('for a profile that the key may not use, whether there is one or not', async () => {
    for (const profile of ['en-recommended', 'no-such', 'no-such@3']) {
      const { status, body } = await post({ profile, load: 1 }, { as: 'limited' });
      expect(status).toBe(403);
      expect(body).toMatchObject({ code: 'profile-not-allowed' });
    }
  });

  it('for a scope that the key lacks, with the scope named', async () => {
    const { status, body, headers } = await post(good, { as: 'noChecks' });
    expect(status).toBe(403);
    expect(body).toMatchObject({ code: 'scope-missing' });
    expect(headers['www-authenticate']).toContain('scope="checks", error="insufficient_scope"');
  });
});

describe('404', () => {
  it('for a check that there is not, and it is logged', async () => {
    const { status, body, headers } = await post(good, { path: '/v1/checks/none' });
    expect(status).toBe(404);
    expect(body).toMatchObject({ code: 'not-found', instance: '/v1/checks/none' });
    expect(headers.ratelimit).toBeDefined();
    expect(await rowOf(headers['x-request-id'])).toMatchObject({ http_status: 404, route: 'none' });
  });

  it('for the wrong method, with the right one named', async () => {
    const { status, headers } = await ask(service.server, {
      path: '/v1/checks/fake',
      key: service.keys.good,
    });
    expect(status).toBe(404);
    expect(headers.allow).toBe('POST');
  });

  it.each(['/v1/checks/%ff', '/v1/checks/fake/', '/V1/checks/fake', '/v1/%2e%2e/x'])(
    'for the path %s',
    async (path) => expect((await post(good, { path })).status).toBe(404),
  );
});

describe('413', () => {
  it('for more than 1 MB', async () => {
    const { status, body } = await post({ ...good, note: 'x'.repeat(1024 * 1024) });
    expect(status).toBe(413);
    expect(body).toMatchObject({ code: 'too-large' });
  });
});

describe('415', () => {
  it.each([
    ['Content-Type', 'text/csv'],
    ['Content-Type', 'application/json; charset=utf-7'],
    ['Content-Encoding', 'compress'],
  ])('for %s: %s', async (name, value) => {
    const { status, body } = await post(JSON.stringify(good), { headers: { [name]: value } });
    expect(status).toBe(415);
    expect(body).toMatchObject({ code: 'media-type' });
  });
});

describe('422', () => {
  it('names each place that is not valid', async () => {
    const { status, body } = await post({ load: 'heavy', lode: 1 });
    expect(status).toBe(422);
    expect(body).toMatchObject({ code: 'not-valid' });
    expect(body.errors?.map(({ pointer }) => pointer)).toEqual(['/load', '/lode']);
  });

  it('when no profile is named and there is no default', async () => {
    const { status, body, headers } = await post({ load: 1 });
    expect(status).toBe(422);
    expect(body).toMatchObject({ code: 'profile-required', errors: [{ pointer: '/profile' }] });
    expect(await rowOf(headers['x-request-id'])).toMatchObject({
      check_id: 'fake',
      code: 'profile-required',
      answer: null,
    });
  });

  it.each(['no-such', 'uk-na@99', 'UK NA', 'uk-na@0', '__proto__', ''])(
    'for the profile %j',
    async (profile) => {
      const { status, body } = await post({ profile, load: 1 });
      expect(status).toBe(422);
      expect(body).toMatchObject({ code: 'unknown-profile' });
    },
  );

  it('for what the check does not cover', async () => {
    const { status, body } = await post({ profile: 'uk-na@1', load: -1 });
    expect(status).toBe(422);
    expect(body).toMatchObject({ code: 'outside-scope', errors: [{ pointer: '/load' }] });
  });

  it.each(['detail=some', 'detail=full&detail=full', 'Detail=full', '__proto__=1', 'key=x'])(
    'for the query %s',
    async (query) => {
      const { status, body } = await post(good, { path: `/v1/checks/fake?${query}` });
      expect(status).toBe(422);
      expect(body).toMatchObject({ code: 'query-not-valid' });
    },
  );
});

describe('500', () => {
  it('says nothing of its inside, and nothing secret is printed', async () => {
    const { status, body } = await post({ profile: 'uk-na', load: 13 });
    expect(status).toBe(500);
    expect(JSON.stringify(body)).not.toContain('defect with');
    expect(service.printed()).not.toContain(service.keys.good);
  });
});
