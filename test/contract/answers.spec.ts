import request, { type Test } from 'supertest';
import { checks } from '../../server/engine/checks/registry';
import { allFormulas } from '../../server/engine/formula/registry';
import { validateAnswer, validateRequest } from '../../server/middleware/validation';
import { contract } from '../../server/middleware/validation/document';
import { startService, type TestService } from '../api/support/service';

let service: TestService & { keys: Record<'good', string> };
beforeAll(async () => {
  service = await startService({ good: {} }, { checks, validate: validateRequest });
});
afterAll(() => service.stop());

/** Supertest's body is of any type. */
async function answerTo(test: Test): Promise<{ status: number; body: unknown }> {
  const answer = await test;
  return { status: answer.status, body: answer.body as unknown };
}

async function get(path: string): Promise<unknown> {
  const { status, body } = await answerTo(
    request(service.server)
      .get(path)
      .set('Authorization', `Bearer ${service.keys.good}`)
      .set('Accept', 'application/json'),
  );
  expect({ path, status }).toEqual({ path, status: 200 });
  return body;
}

it('what the service answers is what the contract says', async () => {
  const [formula] = allFormulas();
  const asked: readonly (readonly [schema: string, path: string])[] = [
    ['CheckList', '/v1/checks'],
    ['JsonSchema', '/v1/checks/waler/schema'],
    ['Formula', `/v1/formulas/${formula?.id ?? ''}`],
    ['ProfileList', '/v1/profiles'],
    ['ProfileDetail', '/v1/profiles/uk-na'],
    ['ProfileDetail', '/v1/profiles/uk-na@1'],
    ['UsageList', '/v1/usage'],
    ['OpenApiDocument', '/v1/openapi.json'],
    ['Health', '/healthz'],
    ['Readiness', '/readyz'],
    ['ProblemKindList', '/problems'],
    ['ProblemKind', '/problems/not-valid'],
  ];
  for (const [schema, path] of asked) {
    const items = validateAnswer(schema, await get(path));
    expect({ path, items }).toEqual({ path, items: [] });
  }
});

it('a problem is what the contract says', async () => {
  const { body, status } = await answerTo(
    request(service.server)
      .post('/v1/checks/waler')
      .set('Authorization', `Bearer ${service.keys.good}`)
      .send({ spans: [] }),
  );
  expect(status).toBe(422);
  expect(validateAnswer('Problem', body)).toEqual([]);
});

describe.each([
  ['waler', 'Waler'],
  ['section', 'Section'],
  ['stress', 'Stress'],
])('%s', (check, example) => {
  it.each(['full', 'summary'])(
    'answered with detail=%s is what the contract says',
    async (detail) => {
      const { body, status } = await answerTo(
        request(service.server)
          .post(`/v1/checks/${check}?detail=${detail}`)
          .set('Authorization', `Bearer ${service.keys.good}`)
          .send(contract.components.examples[example]?.value as object),
      );
      expect(status).toBe(200);
      expect(validateAnswer('CheckAnswer', body)).toEqual([]);
    },
  );
});
