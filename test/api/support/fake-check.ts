import type { Check, CheckAnswer } from '../../../server/engine/checks/check';
import { Refusal, type RefusalItem } from '../../../server/engine/refusal';

interface FakeRequest {
  readonly profile?: string;
  readonly load: number;
  readonly note?: string;
}

/** An answer of the contract's shape that cost nothing to find. */
function answerTo(load: number, profile: { slug: string; revision: number }): CheckAnswer {
  return {
    check: 'waler',
    status: load <= 1 ? 'pass' : 'fail',
    utilisation: load,
    governing: 'bending-y',
    profile: { slug: profile.slug, revision: profile.revision },
  } as unknown as CheckAnswer;
}

/**
 * A check for the tests of the plumbing: its utilisation is the load it is given. A negative load
 * is refused, 13 is a defect, and the cost is the load.
 */
export const fakeCheck: Check<FakeRequest> = {
  id: 'fake',
  title: 'A check for tests',
  requestSchema: 'WalerRequest',
  cost: ({ load }) => load,
  run({ load }, { profile }) {
    if (load < 0)
      throw new Refusal('outside-scope', 'A negative load is not covered.', [
        { pointer: '/load', code: 'negative', message: 'Must not be negative.' },
      ]);
    if (load === 13) throw new Error('a defect with htk_abcdefghijkl_SECRET in its message');
    return answerTo(load, profile);
  },
};

/** What the contract would say of the fake check's request. */
export function validateFake(_schema: string, body: unknown): RefusalItem[] {
  if (typeof body !== 'object' || body === null || Array.isArray(body))
    return [{ pointer: '', code: 'type', message: 'Must be an object.' }];
  const items: RefusalItem[] = [];
  for (const [name, value] of Object.entries(body)) {
    const pointer = `/${name}`;
    const wanted = { load: 'number', profile: 'string', note: 'string' }[name];
    if (wanted === undefined)
      items.push({ pointer, code: 'unknown-field', message: 'No such field.' });
    else if (typeof value !== wanted)
      items.push({ pointer, code: 'type', message: `Must be a ${wanted}.` });
  }
  if (!Object.hasOwn(body, 'load'))
    items.push({ pointer: '/load', code: 'required', message: 'Is missing.' });
  return items;
}
