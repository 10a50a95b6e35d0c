import { checks } from '../../server/engine/checks/registry';
import type { CheckAnswer } from '../../server/engine/checks/contract';
import { validateRequest } from '../../server/middleware/validation';
import { ask, type Answered } from '../api/support/ask';
import { startService } from '../api/support/service';
import { compare, compareInput, readExamples } from './example';
import { leftToLater } from './left-to-later';
import type { PublishedCase } from './published-case';
import { sectionCases } from './section-cases';
import { stressCases } from './stress-cases';
import { walerCases } from './waler-cases';

const examples = readExamples('steel.json');
const cases: readonly PublishedCase[] = [...walerCases, ...sectionCases, ...stressCases];
const taken = new Set(cases.map(({ id }) => id));

function exampleOf(id: string) {
  const example = examples.get(id);
  if (!example) throw new Error(`${id} is not published`);
  return example;
}

function wordsOf(one: PublishedCase): string {
  const { title, from_memory } = exampleOf(one.id);
  const given = one.given === undefined ? '' : ` (given: ${one.given})`;
  const memory = from_memory ? ' (recalled, to be confirmed)' : '';
  return `${one.id} by ${one.check}: ${title}${given}${memory}`;
}

describe('published steel examples, through the API with their stated inputs', () => {
  let service: Awaited<ReturnType<typeof startService<'caller'>>>;
  /** Published values by example and name, and those whose source rounds on its way. */
  const compared = new Set<string>();
  const roundedOnTheWay = new Set<string>();
  let comparisons = 0;
  let inputsMade = 0;

  beforeAll(async () => {
    service = await startService(
      { caller: { rateLimit: 1_000 } },
      { checks, validate: validateRequest },
    );
  });
  afterAll(() => service.stop());

  const answered = ({ check, request }: PublishedCase): Promise<Answered> =>
    ask(service.server, {
      method: 'post',
      path: `/v1/checks/${check}`,
      key: service.keys.caller,
      body: request,
    });

  test.each(cases.map((one) => [wordsOf(one), one] as const))('%s', async (_words, one) => {
    const { id, rounded = {}, made = {} } = one;
    const example = exampleOf(id);
    const { status, body } = await answered(one);
    const expected = one.refused === undefined ? [200, undefined] : [422, [one.refused]];
    expect([status, body.errors?.map(({ code }) => code)]).toEqual(expected);
    const answer = body as unknown as CheckAnswer;
    const ours: [string, number][] =
      one.refused === undefined
        ? Object.entries(one.values).map(([key, pick]) => [key, pick(answer)])
        : Object.entries(one.values).map(([key, pick]) => [key, pick(body)]);
    for (const [key, value] of ours) {
      const comparison = compare(example, key, value, rounded[key]);
      expect(comparison).toMatchObject({ holds: true, words: comparison.words });
      comparisons += 1;
      compared.add(`${id} ${key}`);
      if (rounded[key] !== undefined) roundedOnTheWay.add(`${id} ${key}`);
    }
    for (const [key, { half, pick }] of Object.entries(made)) {
      const comparison = compareInput(example, key, { ours: pick(answer), half }, rounded[key]);
      expect(comparison).toMatchObject({ holds: true, words: comparison.words });
      inputsMade += 1;
    }
  });

  test.each([...taken])('%s: every value is compared, or left out with a reason', (id) => {
    const parts = cases.filter((one) => one.id === id);
    const values = new Set(parts.flatMap((one) => Object.keys(one.values)));
    const without = parts.flatMap((one) => Object.keys(one.without ?? {}));
    expect([...values, ...without].sort()).toEqual(Object.keys(exampleOf(id).published).sort());
  });

  test('every example is taken by a check, or left to a later one with the reason', () => {
    expect([...taken, ...leftToLater.keys()].sort()).toEqual([...examples.keys()].sort());
  });

  test('totals', () => {
    const sum = (ids: Iterable<string>): number =>
      [...ids].reduce((total, id) => total + Object.keys(exampleOf(id).published).length, 0);
    const leftOut = cases.flatMap(({ without = {} }) => Object.keys(without)).length;
    expect(compared.size).toBe(sum(taken) - leftOut);
    console.info(
      `published steel examples: ${taken.size} of ${examples.size} taken by ${cases.length} requests; ` +
        `${compared.size} of their ${sum(taken)} values compared (${comparisons} comparisons), ` +
        `${roundedOnTheWay.size} of them from a source that rounds on its way, ${leftOut} left out; ` +
        `${inputsMade} stated inputs made anew; ` +
        `${leftToLater.size} examples with ${sum(leftToLater.keys())} values left to later`,
    );
  });
});
