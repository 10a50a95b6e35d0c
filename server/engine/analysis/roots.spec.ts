import fc from 'fast-check';
import { polynomial, unitRoots } from './roots';

/** Coefficients of Π (x - root), ascending. */
const fromRoots = (roots: number[]) =>
  roots.reduce((c, root) => [0, ...c].map((value, i) => value - root * (c[i] ?? 0)), [1]);

describe('roots between 0 and 1', () => {
  it('of x² - x + 0.21 are 0.3 and 0.7', () => {
    const [a, b] = unitRoots([0.21, -1, 1]);
    expect(a).toBeCloseTo(0.3, 14);
    expect(b).toBeCloseTo(0.7, 14);
  });

  it('of a quadratic that is nearly a line come without cancellation', () => {
    expect(unitRoots([-0.5, 1, 1e-18])).toEqual([0.5]);
  });

  it('of nothing and of constants are none', () => {
    expect(unitRoots([0, 0, 0])).toEqual([]);
    expect(unitRoots([2])).toEqual([]);
  });

  it('of quartics are all found, to rounding, when they lie apart', () => {
    const root = fc.integer({ min: -19, max: 39 }).map((i) => i / 20 + 0.013);
    fc.assert(
      fc.property(fc.uniqueArray(root, { minLength: 1, maxLength: 4 }), (roots) => {
        const c = fromRoots(roots);
        const expected = roots.filter((x) => x > 0 && x < 1).sort((a, b) => a - b);
        const found = unitRoots(c);
        expect(found).toHaveLength(expected.length);
        found.forEach((x, i) => expect(Math.abs(x - expected[i]!)).toBeLessThan(1e-11));
        found.forEach((x) => expect(Math.abs(polynomial(c, x))).toBeLessThan(1e-13));
      }),
      { numRuns: 1000 },
    );
  });
});
