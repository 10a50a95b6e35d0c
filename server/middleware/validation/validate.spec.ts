import { contract } from './document';
import { editDistance } from '../../engine/text/edit-distance';
import { nearest } from './nearest';
import { validateAnswer, validateRequest } from './validate';

const waler = {
  profile: 'uk-na',
  material: { type: 'steel', grade: 'S275' },
  section: 'UB 457x191x67',
  loadBasis: 'characteristic',
  spans: [3, '10 ft', 2.4],
  loads: [{ name: 'earth', nature: 'permanent', kind: 'uniform', value: 95 }],
};
const items = (changes: object) => validateRequest('WalerRequest', { ...waler, ...changes });
const told = (changes: object) => items(changes).map(({ pointer, code }) => `${pointer} ${code}`);

it('finds nothing wrong with a waler as an engineer would write it', () => {
  expect(items({})).toEqual([]);
});

it('knows every schema of the contract', () => {
  for (const name of Object.keys(contract.components.schemas)) {
    expect(() => validateAnswer(name, null)).not.toThrow();
  }
  expect(() => validateRequest('constructor', {})).toThrow('no schema constructor');
});

describe('a choice is told by what the caller wrote', () => {
  it.each([
    [
      'a misspelt kind of load',
      { loads: [{ ...waler.loads[0], kind: 'unifrom' }] },
      '/loads/0/kind not-one-of',
    ],
    ['no kind', { loads: [{ name: 'earth' }] }, '/loads/0/kind missing-field'],
    ['a shape in capitals', { section: { shape: 'rhs' } }, '/section/shape not-one-of'],
    ['neither shape nor designation', { section: { h: 450 } }, '/section/shape missing-field'],
    [
      'a grade beside strengths',
      { material: { type: 'steel', fy: 275, grade: 'S275' } },
      '/material/grade unknown-field',
    ],
    ['a misspelt face', { restraint: { loadedFce: 'full' } }, '/restraint/loadedFce unknown-field'],
    ['a word for a list', { lossOfProp: 'all' }, '/lossOfProp wrong-type'],
    [
      'a stiffness of zero',
      { supportStiffness: [null, 0] },
      '/supportStiffness/1 must-be-positive',
    ],
  ])('%s', (_, changes, expected) => {
    expect(told(changes)).toEqual([expected]);
  });
});

describe('a fix is given where one is known', () => {
  it.each([
    ['a misspelt field', { over_hangs: { start: 1 } }, 'Did you mean `overhangs`?'],
    [
      'a number as text',
      { spans: ['2.4'] },
      'Give it as a number, 2.4, or with its unit, "2.4 m".',
    ],
    [
      'a quantity as an answer has it',
      { spans: [{ value: 2.4, unit: 'm' }] },
      'Write it as text, "2.4 m".',
    ],
    ['a word of a list', { loadBasis: 'Charateristic' }, 'Did you mean "characteristic"?'],
    ['a profile in capitals', { profile: 'UK NA' }, 'Write it like "uk-na".'],
    [
      'a duration in a check with loads',
      { material: { type: 'timber', class: 'C24', serviceClass: 2, loadDuration: 'short-term' } },
      'Each combination takes the duration of the shortest action in it. Give `duration` on the load.',
    ],
  ])('%s', (_, changes, fix) => {
    expect(items(changes)).toEqual([expect.objectContaining({ fix })]);
  });
});

it('tells the deepest faults first, what is missing last, each place once', () => {
  const { profile, material, section, loadBasis } = waler;
  const body = {
    ...{ profile, material, section, loadBasis },
    ...{ lodas: [], spans: [-1], overhangs: { start: 'x' } },
  };
  expect(validateRequest('WalerRequest', body).map(({ pointer }) => pointer)).toEqual([
    '/spans/0',
    '/overhangs/start',
    '/lodas',
    '/loads',
  ]);
});

it('tells at most twenty', () => {
  expect(items({ spans: Array.from({ length: 40 }, () => -1) })).toHaveLength(20);
});

it('refuses keys that reach the prototype, wherever they stand', () => {
  const body: unknown = JSON.parse(
    '{"__proto__":{"spans":[3]},"section":{"designation":"IPE 200","constructor":1}}',
  );
  const pointers = validateRequest('WalerRequest', body).map(({ pointer }) => pointer);
  expect(pointers).toEqual(expect.arrayContaining(['/__proto__', '/section/constructor']));
  expect(({} as { spans?: unknown }).spans).toBeUndefined();
});

describe('a body made to cost time costs little', () => {
  const many = 300_000;
  it.each([
    ['spans', { spans: Array.from({ length: many }, () => -1) }],
    ['loads', { loads: Array.from({ length: many }, () => ({})) }],
    ['props', { lossOfProp: Array.from({ length: many }, (_, i) => i) }],
    ['fields', Object.fromEntries(Array.from({ length: 90_000 }, (_, i) => [`k${i}`, 1]))],
    ['a name', { section: '('.repeat(1e6) }],
    ['a number', { spans: ['1'.repeat(1e6)] }],
  ])('%s', (_, changes) => {
    const start = performance.now();
    const answer = items(changes);
    expect(answer.length).toBeGreaterThan(0);
    expect(JSON.stringify(answer).length).toBeLessThan(20_000);
    // A quadratic reading takes minutes.
    expect(performance.now() - start).toBeLessThan(60_000);
  });
});

describe('nearest', () => {
  it('counts a swap of neighbours as one step', () => {
    expect(editDistance('tpye', 'type')).toBe(1);
    expect(editDistance('', 'span')).toBe(4);
  });

  it('forgives case, hyphens and up to a third of the letters', () => {
    expect(nearest('steelgrade', ['steel-grade', 'spans'])).toBe('steel-grade');
    expect(nearest('ovrehangs', ['overhangs', 'loads'])).toBe('overhangs');
    expect(nearest('colour', ['overhangs', 'loads'])).toBeUndefined();
  });
});
