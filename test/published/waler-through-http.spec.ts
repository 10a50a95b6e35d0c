import { checks } from '../../server/engine/checks/registry';
import type { CheckAnswer } from '../../server/engine/checks/contract';
import { validateRequest } from '../../server/middleware/validation';
import { ask } from '../api/support/ask';
import { startService } from '../api/support/service';
import { compare, readExamples } from './example';
import { walerCases } from './waler-cases';

const examples = readExamples('steel.json');

describe('published bending, shear and deflection, through the API with their stated inputs', () => {
  let service: Awaited<ReturnType<typeof startService<'caller'>>>;
  let compared = 0;
  let roundedOnTheWay = 0;

  beforeAll(async () => {
    service = await startService({ caller: {} }, { checks, validate: validateRequest });
  });
  afterAll(async () => {
    process.stdout.write(
      `published values compared: ${compared}, of those from a source that rounds on its way: ${roundedOnTheWay}\n`,
    );
    await service.stop();
  });

  describe.each(walerCases)('$id', ({ id, request, values, rounded = {}, without = {} }) => {
    const example = examples.get(id);
    if (!example) throw new Error(`${id} is not published`);
    const memory = example.from_memory ? ' (recalled, to be confirmed)' : '';

    test(`${example.title}${memory}`, async () => {
      const { status, body } = await ask(service.server, {
        method: 'post',
        path: '/v1/checks/waler',
        key: service.keys.caller,
        body: request,
      });
      expect([status, body.detail]).toEqual([200, undefined]);
      for (const [key, pick] of Object.entries(values)) {
        const comparison = compare(
          example,
          key,
          pick(body as unknown as CheckAnswer),
          rounded[key],
        );
        expect(comparison).toMatchObject({ holds: true, words: comparison.words });
        compared += 1;
        if (rounded[key] !== undefined) roundedOnTheWay += 1;
      }
    });

    test('no published value is left out without a reason', () => {
      const told = [...Object.keys(values), ...Object.keys(without)].sort();
      expect(told).toEqual(Object.keys(example.published).sort());
    });
  });
});
