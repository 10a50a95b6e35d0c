import { refusalOf, runWaler, uniform, verification } from '../../testing/waler';
import type { LoadInput, WalerRequest } from '../contract';

describe('variable loads of unlike signs', () => {
  const variable = (name: string, value: number, from = 0, to = 18): LoadInput => ({
    name,
    nature: 'variable',
    category: 'construction',
    kind: 'uniform',
    value,
    from,
    to,
  });
  const base: Partial<WalerRequest> = {
    spans: [6, 6, 6],
    selfWeight: false,
    supports: 'both-ways',
    deflectionLimit: 'span/100',
  };

  test.each(['both-ways', 'compression-only'] as const)(
    'stand where they do most together (%s)',
    (supports) => {
      const earth = uniform(supports === 'both-ways' ? 0.001 : 55);
      const [push, pull] = supports === 'both-ways' ? [60, -60] : [20, -14];
      const found = runWaler({
        ...base,
        supports,
        loads: [...earth, variable('a', push), variable('b', pull)],
      });
      for (const cut of [6, 12]) {
        const placed = runWaler({
          ...base,
          supports,
          patternLoading: false,
          loads: [...earth, variable('a', push, 0, cut), variable('b', pull, cut, 18)],
        });
        expect(found.utilisation).toBeGreaterThanOrEqual((placed.utilisation ?? NaN) * (1 - 1e-9));
      }
    },
  );

  test('one source that pushes on some spans and pulls on others is arranged by its parts', () => {
    const both = [variable('a', 50, 0, 12), variable('a', -50, 12, 18)];
    const found = runWaler({ ...base, loads: both });
    const part = runWaler({
      ...base,
      patternLoading: false,
      loads: [variable('a', 50, 6, 12), variable('a', -50, 12, 18)],
    });
    expect(found.utilisation).toBeGreaterThanOrEqual((part.utilisation ?? NaN) * (1 - 1e-9));
  });

  test('with design values a favourable one may be absent', () => {
    const alone = runWaler({ ...base, loadBasis: 'design', loads: [variable('a', 40)] });
    const both = runWaler({
      ...base,
      loadBasis: 'design',
      loads: [variable('a', 40), variable('b', -20)],
    });
    expect(both.utilisation).toBeGreaterThanOrEqual((alone.utilisation ?? NaN) * (1 - 1e-9));
  });
});

test('over too many elastic props for every arrangement the answer is incomplete', () => {
  const answer = runWaler({
    spans: Array.from({ length: 12 }, () => 3),
    supportStiffness: Array.from({ length: 13 }, () => 1),
    supports: 'both-ways',
    selfWeight: false,
    loads: [
      ...uniform(5),
      { name: 'q', nature: 'variable', category: 'construction', kind: 'uniform', value: 5 },
    ],
  });
  expect(answer.status).toBe('incomplete');
  expect(answer.missing.map(({ pointer }) => pointer)).toContain('/patternLoading');
  expect(answer.advisories.map(({ code }) => code)).toContain('props-give');
});

test.each(['toString', 'valueOf', 'hasOwnProperty'])('a source may be called %s', (name) => {
  const named = runWaler({ loads: [{ name, nature: 'permanent', kind: 'uniform', value: 95 }] });
  expect(named.utilisation).toBe(runWaler({ loads: uniform(95) }).utilisation);
});

test('bending about both axes is found where it peaks between the moments’ own extremes', () => {
  const answer = runWaler({
    loadBasis: 'design',
    spans: [20],
    loads: [
      { name: 'wedge', nature: 'permanent', kind: 'linear', start: 0, end: 9.130744304604377 },
    ],
  });
  expect(verification(answer, 'biaxial').utilisation).toBeCloseTo(1.00783, 4);
});

describe('characteristic values', () => {
  test('that no set ever factors are refused', () => {
    const loadSets = [
      { id: 's', situation: 'persistent', combination: 'none', loads: uniform(190) },
    ] as const;
    expect(refusalOf({ loadSets }).code).toBe('never-factored');
  });

  test('of a category that the profile does not know are refused at their place', () => {
    const loads = [
      { name: 'q', nature: 'variable', category: 'bogus', kind: 'uniform', value: 1 },
    ] as const;
    expect(refusalOf({ loads }).items[0]).toMatchObject({
      code: 'unknown-category',
      pointer: '/loads/0/category',
    });
  });
});

describe('steel by name', () => {
  test.each(['S275', 's 275', 'S275JR', 'S275J2+N', 'S275NL', 'S275J0H', 'S275J2W+N'])(
    '%s',
    (grade) => {
      expect(runWaler({ material: { type: 'steel', grade } }).values.f_y?.value).toBe(275);
    },
  );

  test.each(['S2755', 'S275garbage', 'S275 or so', '275', 'S100'])('%s is refused', (grade) => {
    expect(refusalOf({ material: { type: 'steel', grade } }).code).toBe('unknown-grade');
  });

  test('above 460 N/mm² is outside of EN 1993-1-1', () => {
    expect(refusalOf({ material: { type: 'steel', fy: 500 } }).items[0]?.clause).toBe(
      'EN 1993-1-12',
    );
  });
});

test.each([
  [{ Wply: 1e5 }, '/section/properties/Wply'],
  [{ Avz: 1e7 }, '/section/properties/Avz'],
])('properties that contradict each other are refused: %j', (properties, pointer) => {
  const section = { designation: 'UB 457x191x67', properties };
  expect(refusalOf({ section }).items[0]).toMatchObject({ code: 'contradiction', pointer });
});

describe('loads that do not fit the member', () => {
  const point = (at: number): LoadInput[] => [
    { name: 'p', nature: 'permanent', kind: 'point', value: 10, at },
  ];

  test.each<[string, Partial<WalerRequest>, string, string]>([
    ['beyond its end', { loads: point(9) }, 'outside-member', '/loads/0/at'],
    ['before its start', { loads: point(-0.1) }, 'outside-member', '/loads/0/at'],
    [
      'under the name of own weight',
      { loads: [{ name: 'Self-Weight', nature: 'permanent', kind: 'uniform', value: 1 }] },
      'reserved-name',
      '/loads/0/name',
    ],
    ['a span of next to nothing', { spans: [1e-320, 3] }, 'too-short', '/spans/0'],
    ['none at all', { loads: [] }, 'empty', '/loads'],
    [
      'wrong number of stiffnesses',
      { supportStiffness: [null, 1] },
      'wrong-count',
      '/supportStiffness',
    ],
  ])('%s', (_what, change, code, pointer) => {
    expect(refusalOf(change).items[0]).toMatchObject({ code, pointer });
  });

  test('one name with two natures is two sources', () => {
    const loads = [
      ...uniform(1),
      { name: 'earth', nature: 'variable', kind: 'uniform', value: 1 } as const,
    ];
    expect(refusalOf({ loads }).items[0]).toMatchObject({
      code: 'one-source-two-kinds',
      pointer: '/loads/1/nature',
    });
  });

  test('seven variable sources are too many', () => {
    const loads = Array.from(
      { length: 7 },
      (_, i) =>
        ({
          name: `v${i}`,
          nature: 'variable',
          category: 'wind',
          kind: 'uniform',
          value: 1,
        }) as const,
    );
    expect(refusalOf({ loads }).code).toBe('too-many');
  });
});

test('units in feet and kips give the same answer', () => {
  const metric = runWaler();
  const feet = runWaler({
    spans: [`${3 / 0.3048} ft`, '118.11023622047244 in', '2400 mm'],
    loads: [
      {
        name: 'earth',
        nature: 'permanent',
        kind: 'uniform',
        value: `${(95 * 0.3048) / 4.4482216152605} kip/ft`,
      },
      {
        name: 'surcharge',
        nature: 'variable',
        category: 'surcharge',
        kind: 'area',
        value: '22 kPa',
        width: `${1 / 0.3048} ft`,
      },
    ],
  });
  expect(feet.utilisation).toBeCloseTo(metric.utilisation ?? NaN, 9);
});
