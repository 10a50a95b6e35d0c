import { outlinesOf, type Drawable } from './outlines';
import { centroidOf, type Place } from './polygon';
import { modelOf } from '../../testing/section-answers';
import { layoutSection } from './layout-section';

/** Area and second moments of an outline less its hole, by the outline alone. */
function propertiesOf(section: Drawable) {
  const outlines = outlinesOf(section) ?? [];
  const centre = centroidOf(outlines);
  const sum = (of: (a: Place, b: Place) => number) =>
    outlines.reduce((total, outline, index) => {
      const own = outline.reduce((part, one, at) => {
        const next = outline[(at + 1) % outline.length] ?? one;
        const [a, b] = [one, next].map(({ y, z }) => ({ y: y - centre.y, z: z - centre.z }));
        if (!a || !b) return part;
        return part + (a.y * b.z - b.y * a.z) * of(a, b);
      }, 0);
      return total + (index === 0 ? 1 : -1) * Math.abs(own);
    }, 0);
  return {
    A: sum(() => 0.5),
    Iy: sum((a, b) => (a.z ** 2 + a.z * b.z + b.z ** 2) / 12),
    Iz: sum((a, b) => (a.y ** 2 + a.y * b.y + b.y ** 2) / 12),
    centre,
  };
}

const ub = { h: 453.4, b: 189.9, tw: 8.5, tf: 12.7, r: 10.2 };

describe('an outline', () => {
  it.each([
    // As the section tables have them: A in cm², I_y and I_z in cm⁴.
    ['UB 457x191x67', { shape: 'I', sizes: ub }, 85.5, 29400, 1450],
    ['HE 200 B', { shape: 'I', sizes: { h: 200, b: 200, tw: 9, tf: 15, r: 18 } }, 78.1, 5700, 2000],
    [
      'IPN 200',
      { shape: 'I', sizes: { h: 200, b: 90, tw: 7.5, tf: 11.3, r: 7.5, r2: 4.5, slope: 0.14 } },
      33.4,
      2140,
      117,
    ],
    [
      'UPN 200',
      {
        shape: 'channel',
        sizes: { h: 200, b: 75, tw: 8.5, tf: 11.5, r: 11.5, r2: 6, slope: 0.08 },
      },
      32.2,
      1910,
      148,
    ],
    ['RHS 200x100x8', { shape: 'RHS', sizes: { h: 200, b: 100, t: 8 } }, 44.8, 2230, 739],
    [
      'CF RHS 200x100x8',
      { shape: 'RHS', sizes: { h: 200, b: 100, t: 8 }, coldFormed: true },
      43.2,
      2090,
      705,
    ],
    ['CHS 168.3x8', { shape: 'CHS', sizes: { d: 168.3, t: 8 } }, 40.3, 1300, 1300],
    [
      'L 150x90x12',
      { shape: 'angle', sizes: { h: 150, b: 90, t: 12, r1: 12, r2: 6 } },
      27.5,
      627,
      171,
    ],
    ['a flat', { shape: 'rectangle', sizes: { h: 100, b: 20 } }, 20, 166.7, 6.67],
    ['a round', { shape: 'round', sizes: { d: 50 } }, 19.6, 30.7, 30.7],
  ] as [string, Drawable, number, number, number][])(
    'of %s holds the area and the second moments of the tables',
    (_, section, area, Iy, Iz) => {
      const made = propertiesOf(section);
      expect(made.A / 100 / area).toBeCloseTo(1, 1.9);
      expect(made.Iy / 1e4 / Iy).toBeCloseTo(1, 1.9);
      expect(made.Iz / 1e4 / Iz).toBeCloseTo(1, 1.9);
    },
  );

  it('has its centroid where the tables have it', () => {
    const angle = propertiesOf({
      shape: 'angle',
      sizes: { h: 150, b: 90, t: 12, r1: 12, r2: 6 },
    });
    expect([angle.centre.y, -angle.centre.z].map((value) => Math.round(value * 10) / 10)).toEqual([
      21.2, 50.8,
    ]);
  });

  it('is none while its dimensions make none', () => {
    for (const section of [
      { shape: 'I', sizes: {} },
      { shape: 'I', sizes: { ...ub, tf: 300 } },
      { shape: 'CHS', sizes: { d: 100, t: 60 } },
      { shape: 'something else', sizes: ub },
    ])
      expect(outlinesOf(section)).toBeNull();
  });
});

describe('the drawing', () => {
  const sketch = {
    name: 'UB 457x191x67',
    shape: 'I',
    dimensions: ub,
    ineffective: [{ under: 'N', y: 0, z: 0, width: 8.5, height: 96 }],
  } as const;
  const model = modelOf(sketch);

  it.each([288, 340, 520])('keeps every word inside a width of %d px and apart', (width) => {
    const { marks, sizes, letters } = layoutSection(model, width);
    for (const { x, text } of marks) expect(x + text.length * 7.25).toBeLessThanOrEqual(width);
    for (const { x, text } of sizes) expect(x - (text.length * 7.25) / 2).toBeGreaterThanOrEqual(0);
    const lines = [...marks.map(({ y }) => y), letters[0]?.y ?? 0].sort((a, b) => a - b);
    lines
      .slice(1)
      .forEach((y, index) => expect(y - (lines[index] ?? 0)).toBeGreaterThanOrEqual(11));
  });

  it('draws depth and width to one scale', () => {
    const { outline } = layoutSection(model, 340);
    const numbers = [...outline.matchAll(/([\d.]+) ([\d.]+)/g)].map(([, x, y]) => [
      Number(x),
      Number(y),
    ]);
    const across = numbers.map(([x = 0]) => x);
    const down = numbers.map(([, y = 0]) => y);
    const [wide, tall] = [across, down].map((all) => Math.max(...all) - Math.min(...all));
    expect((tall ?? 0) / (wide ?? 1)).toBeCloseTo(453.4 / 189.9, 1);
  });

  it('hatches a thin strip so that it can be seen', () => {
    const [hatch] = layoutSection(model, 340).hatches;
    expect(hatch?.lines.match(/M/g)?.length).toBeGreaterThan(5);
  });
});
