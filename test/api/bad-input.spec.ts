import { checks } from '../../server/engine/checks/registry';
import { validateAnswer, validateRequest } from '../../server/middleware/validation';
import { contract } from '../../server/middleware/validation/document';
import {
  type AllowedCase,
  allowedCases,
  type BadInputCase,
  badInputCases,
  casesByField,
} from '../contract/bad-input-matrix';
import type { Json } from '../contract/sample';
import { startService, type TestService } from './support/service';

let service: TestService & { keys: Record<'good', string> };
beforeAll(async () => {
  service = await startService(
    { good: { rateLimit: 1_000_000 } },
    { checks, validate: validateRequest },
  );
});
afterAll(() => service.stop());

interface Answered {
  readonly status: number;
  readonly type: string;
  readonly body: { code?: string; errors?: { pointer: string; code: string; message: string }[] };
}

const text = (body: Json): string =>
  typeof body === 'object' && body !== null && !Array.isArray(body)
    ? JSON.stringify({ profile: 'uk-na', ...body })
    : JSON.stringify(body);

/** As a caller does: what may succeed later is sent again, a few times. */
async function post(check: string, body: string, attempts = 5): Promise<Answered> {
  const answer = await fetch(`${service.url}/v1/checks/${check}?detail=summary`, {
    method: 'POST',
    headers: {
      Authorization: `Bearer ${service.keys.good}`,
      'Content-Type': 'application/json',
    },
    body,
  });
  const answered = (await answer.json()) as Answered['body'];
  if (answer.status === 503 && attempts > 0) {
    await new Promise((resolve) => setTimeout(resolve, 500));
    return post(check, body, attempts - 1);
  }
  const type = answer.headers.get('content-type')?.split(';')[0] ?? '';
  return { status: answer.status, type, body: answered };
}

/** Many at a time, as callers do. */
async function each<T>(items: readonly T[], work: (item: T) => Promise<void>): Promise<void> {
  const queue = [...items];
  const lane = async (): Promise<void> => {
    for (let item = queue.pop(); item !== undefined; item = queue.pop()) await work(item);
  };
  await Promise.all(Array.from({ length: 8 }, lane));
}

function fault({ expectedCode, pointer }: BadInputCase, { status, type, body }: Answered): string {
  if (status !== 422) return `status ${status}`;
  if (type !== 'application/problem+json') return `type ${type}`;
  const found = body.errors?.find((item) => item.pointer === pointer);
  if (!found?.code || !found.message) return `nothing at ${pointer}`;
  return expectedCode === undefined || found.code === expectedCode ? '' : `code ${found.code}`;
}

describe.each(checks)('$id', ({ id, requestSchema }) => {
  it('that is at fault is refused at its field, and never logged as a success', async () => {
    const cases = casesByField(requestSchema);
    const wrong: string[] = [];
    await each(cases, async (one) => {
      const words = fault(one, await post(id, text(one.body)));
      if (words !== '') wrong.push(`${one.name}: ${words}`);
    });
    expect(wrong).toEqual([]);
    const rows = await service.usage('check_id = $1', [id]);
    expect(rows.filter((row) => row.http_status === 422)).toHaveLength(cases.length);
    expect(rows.filter((row) => row.http_status < 400 || row.answer !== null)).toEqual([]);
    process.stdout.write(
      `bad ${id} over HTTP: ${cases.length} of ${badInputCases(requestSchema).length}\n`,
    );
  }, 300_000);

  it('with a zero or a negative that the contract allows is no defect', async () => {
    const kindOf = ({ name, field }: AllowedCase) => `${field} ${name.replace(/^[^:]*: /, '')}`;
    const all = allowedCases(requestSchema).map((one) => [kindOf(one), one] as const);
    const cases = [...new Map(all).values()];
    const wrong: string[] = [];
    await each(cases, async ({ name, body }) => {
      const { status, body: answer } = await post(id, text(body));
      // What the engine does not cover, or cannot be, it refuses in its own words; the contract has no quarrel.
      const quarrel = validateRequest(requestSchema, body);
      if ((status !== 200 && status !== 422) || quarrel.length > 0)
        wrong.push(`${name}: ${status} ${String(answer.code)}`);
    });
    expect(wrong).toEqual([]);
  }, 300_000);
});

it.each([
  ['Waler', 'waler'],
  ['TwinWaler', 'waler'],
  ['Section', 'section'],
  ['Stress', 'stress'],
])('the example "%s" of the contract is answered', async (name, check) => {
  const { value } = contract.components.examples[name] as { value: Json };
  const { status, body } = await post(check, text(value));
  expect(status === 200 ? validateAnswer('CheckAnswer', body) : [status, body]).toEqual([]);
});
