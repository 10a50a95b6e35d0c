import fc from 'fast-check';
import { bays } from './bays';
import type { BeamLoad } from './beam.types';
import type { BeamState } from './beam-state';
import { clipLoad, loadsByPanel } from './clip-load';
import { ContinuousBeam } from './continuous-beam';
import { deflectionExtremes } from './deflection';
import { greatest, momentExtremes } from './extremes';
import { type LoadPattern, baywise, everyPattern, loadPatterns } from './load-patterns';
import { UnitCases } from './unit-cases';
import { valuesAt } from './values-at';

const rigid = (n: number) => Array.from({ length: n + 1 }, () => null);

/** Unit spans with a uniform load of 1 on those named. */
function pattern(loaded: number[]): BeamState {
  const loads = loaded.flatMap((w, i): BeamLoad[] =>
    w ? [{ kind: 'distributed', from: i, to: i + 1, start: w, end: w }] : [],
  );
  const n = loaded.length;
  const beam = new ContinuousBeam(
    {
      spans: loaded.map(() => 1),
      overhangs: { start: 0, end: 0 },
      flexuralRigidity: 1,
      supportStiffness: rigid(n),
    },
    loads,
  );
  return beam.solve(loads);
}

const table: [number[], number[], number[], (number | null)[], number[]][] = [
  [
    [1, 0],
    [0, -0.0625, 0],
    [0.4375, 0.625, -0.0625],
    [0.0957, null],
    [0.009151, -0.004009],
  ],
  [
    [1, 0, 1],
    [0, -0.05, -0.05, 0],
    [0.45, 0.55, 0.55, 0.45],
    [0.10125, null, 0.10125],
    [0.009917, -0.00625, 0.009917],
  ],
  [
    [0, 1, 0],
    [0, -0.05, -0.05, 0],
    [-0.05, 0.55, 0.55, -0.05],
    [null, 0.075, null],
    [-0.003208, 0.006771, -0.003208],
  ],
  [
    [1, 1, 0],
    [0, -0.11667, -0.03333, 0],
    [0.38333, 1.2, 0.45, -0.03333],
    [0.07347, 0.05347, null],
    [0.0059, 0.003763, -0.002138],
  ],
  [
    [1, 0, 1, 0],
    [0, -0.05357, -0.03571, -0.05357, 0],
    [0.44643, 0.57143, 0.46429, 0.57143, -0.05357],
    [0.09965, null, 0.08052, null],
    [0.009698, -0.005587, 0.007444, -0.003437],
  ],
  [
    [1, 1, 0, 1],
    [0, -0.12054, -0.01786, -0.05804, 0],
    [0.37946, 1.22321, 0.35714, 0.59821, 0.44196],
    [0.072, 0.06108, null, 0.09767],
    [0.005675, 0.004529, -0.00478, 0.009424],
  ],
  [
    [0, 1, 1, 0],
    [0, -0.03571, -0.10714, -0.03571, 0],
    [-0.03571, 0.46429, 1.14286, 0.46429, -0.03571],
    [null, 0.05612, 0.05612, null],
    [-0.002291, 0.004173, 0.004173, -0.002291],
  ],
  [
    [1, 0, 1, 0, 1],
    [0, -0.05263, -0.03947, -0.03947, -0.05263, 0],
    [0.44737, 0.56579, 0.48684, 0.48684, 0.56579, 0.44737],
    [0.10007, null, 0.08553, null, 0.10007],
    [0.009756, -0.00576, 0.008087, -0.00576, 0.009756],
  ],
  [
    [0, 1, 0, 1, 0],
    [0, -0.05263, -0.03947, -0.03947, -0.05263, 0],
    [-0.05263, 0.56579, 0.48684, 0.48684, 0.56579, -0.05263],
    [null, 0.07903, null, 0.07903, null],
    [-0.003376, 0.007266, -0.004934, 0.007266, -0.003376],
  ],
  [
    [1, 1, 0, 1, 0],
    [0, -0.11962, -0.02153, -0.04426, -0.05144, 0],
    [0.38038, 1.2177, 0.37919, 0.51555, 0.55861, -0.05144],
    [0.07235, 0.05924, null, 0.07718, null],
    [0.005728, 0.004347, -0.004125, 0.007041, -0.0033],
  ],
];

describe.each(table)(
  'unit spans loaded as %j',
  (loaded, supportMoments, reactions, inSpan, deflections) => {
    const state = pattern(loaded);

    it('has the moments, reactions and deflections of the three-moment solution', () => {
      supportMoments.forEach((m, i) =>
        expect(Math.abs(valuesAt(state, i).M - m)).toBeLessThan(6e-6),
      );
      reactions.forEach((r, i) => expect(Math.abs(state.reactions[i]! - r)).toBeLessThan(6e-6));
      bays(state).forEach((bay, i) => {
        const expected = inSpan[i];
        if (typeof expected === 'number') {
          expect(Math.abs(momentExtremes(state, bay).max.value - expected)).toBeLessThan(6e-6);
        }
        const deflection = greatest(deflectionExtremes(state, bay)).value;
        expect(Math.abs(deflection - deflections[i]!)).toBeLessThan(6e-7);
      });
    });
  },
);

describe('load patterns', () => {
  it('are 2n + 2 for three panels and more', () => {
    for (let n = 3; n <= 50; n++) expect(loadPatterns(n)).toHaveLength(2 * n + 2);
  });

  it('are listed once where they coincide: 2 for one panel, 4 for two', () => {
    expect(loadPatterns(1).map(({ name }) => name)).toEqual(['all', 'none']);
    expect(loadPatterns(2).map(({ name }) => name)).toEqual(['all', 'none', 'odd', 'even']);
  });

  it('load both neighbours of an inner support with alternates beyond, and the complement', () => {
    const byName = new Map(
      loadPatterns(6).map(({ name, loaded }) => [name, loaded.map(Number).join('')]),
    );
    expect(byName.get('neighbours-3')).toBe('101101');
    expect(byName.get('without-neighbours-3')).toBe('010010');
  });

  it('cover a lost support when they are made over the bays that are left', () => {
    const spans = fc.array(fc.integer({ min: 1500, max: 6000 }), { minLength: 3, maxLength: 6 });
    fc.assert(
      fc.property(spans, fc.integer({ min: 0, max: 6 }), (spans, lost) => {
        const cases = panelCases(spans, { start: 800, end: 0 }, [5, 9, 7, 8, 6, 5, 9, 7]);
        const acting = cases.beam.allSupports.filter((s) => s !== lost % (spans.length + 1));
        const solution = cases.combine(
          Array.from({ length: cases.count }, () => 0),
          acting,
        );
        if (solution.kind !== 'state') throw new Error('a mechanism');
        const patterns = baywise(cases.beam.frame.panels, bays(solution.state));
        const of = (list: LoadPattern[]) =>
          extremes(
            cases,
            list.map(({ loaded }) => loaded.map(Number)),
            acting,
          );
        const brute = of(everyPattern(cases.count));
        const scale = Math.max(...brute.map(Math.abs));
        of(patterns).forEach((value, i) => {
          if (Math.abs(value - brute[i]!) > 1e-10 * scale) {
            throw new Error(`number ${i}: ${value} is not ${brute[i]!}`);
          }
        });
      }),
      { numRuns: 25 },
    );
  });

  it('give the envelope of all 2^n patterns for moments, shears and reactions at supports and in spans', () => {
    const spans = fc.array(fc.integer({ min: 1500, max: 6000 }), { minLength: 2, maxLength: 6 });
    const overhang = fc.oneof(fc.constant(0), fc.integer({ min: 300, max: 1500 }));
    fc.assert(
      fc.property(
        spans,
        overhang,
        overhang,
        fc.array(fc.integer({ min: 1, max: 30 }), { minLength: 8, maxLength: 8 }),
        (spans, start, end, sizes) => {
          const cases = panelCases(spans, { start, end }, sizes);
          const n = cases.count;
          const every = Array.from({ length: 2 ** n }, (_, bits) =>
            Array.from({ length: n }, (_, i) => (bits >> i) & 1),
          );
          const brute = extremes(cases, every);
          const quick = extremes(
            cases,
            loadPatterns(n).map(({ loaded }) => loaded.map(Number)),
          );
          const scale = Math.max(...brute.map(Math.abs));
          brute.forEach((value, i) => {
            if (Math.abs(value - quick[i]!) > 1e-10 * scale)
              throw new Error(`number ${i}: ${quick[i]} is not ${value}`);
          });
        },
      ),
      { numRuns: 25 },
    );
  });
});

/** One case a panel, each with a uniform load of its own size. */
function panelCases(spans: number[], overhangs: { start: number; end: number }, sizes: number[]) {
  const beam = new ContinuousBeam(
    { spans, overhangs, flexuralRigidity: 1e13, supportStiffness: rigid(spans.length) },
    [],
  );
  return new UnitCases(
    beam,
    beam.frame.panels.map(({ from, to }, i): BeamLoad[] => [
      { kind: 'distributed', from, to, start: sizes[i]!, end: sizes[i]! },
    ]),
  );
}

/** Over the patterns: least and greatest support moment, reaction and shear, greatest moment of each span. */
function extremes(
  cases: UnitCases,
  patterns: number[][],
  acting: readonly number[] = cases.beam.allSupports,
): number[] {
  const { supports } = cases.beam.frame;
  const list: number[][] = patterns.map((factors) => {
    const solution = cases.combine(factors, acting);
    if (solution.kind !== 'state') throw new Error('a mechanism');
    const { state } = solution;
    const at = acting.flatMap((i) => {
      const x = supports[i]!;
      const [left, right] = [valuesAt(state, x, 'left'), valuesAt(state, x, 'right')];
      const force = [left.V, right.V, state.reactions[i]!].map((value) => 1000 * value);
      return [left.M, ...force].flatMap((value) => [value, -value]);
    });
    return [...at, ...bays(state).map((bay) => momentExtremes(state, bay).max.value)];
  });
  return list[0]!.map((_, i) => Math.max(...list.map((row) => row[i]!)));
}

describe('a load clipped to panels', () => {
  const load: BeamLoad = { kind: 'distributed', from: 1000, to: 5000, start: 10, end: 30 };

  it('is cut linearly', () => {
    expect(clipLoad(load, 2000, 4000)).toEqual({
      ...load,
      from: 2000,
      to: 4000,
      start: 15,
      end: 25,
    });
    expect(clipLoad(load, 0, 6000)).toBe(load);
    expect(clipLoad(load, 5000, 6000)).toBeNull();
  });

  it('belongs to the right panel alone when it is a point load on a support', () => {
    const point: BeamLoad = { kind: 'point', at: 3000, value: 5 };
    expect(clipLoad(point, 0, 3000)).toBeNull();
    expect(clipLoad(point, 3000, 6000)).toBe(point);
    expect(clipLoad(point, 0, 3000, true)).toBe(point);
  });

  it('sums to the whole load over the panels, its ends included', () => {
    const loads: BeamLoad[] = [
      load,
      { kind: 'point', at: 6000, value: 5 },
      { kind: 'point', at: 3000, value: 7 },
    ];
    const beam = new ContinuousBeam(
      {
        spans: [3000, 3000],
        overhangs: { start: 0, end: 0 },
        flexuralRigidity: 1e13,
        supportStiffness: rigid(2),
      },
      loads,
    );
    const parts = loadsByPanel(loads, beam.frame.panels);
    expect(parts.map((part) => part.length)).toEqual([1, 3]);
    const [whole, sum] = [beam.solve(loads), beam.solve(parts.flat())];
    whole.values.forEach((value, i) => expect(sum.values[i]!).toBeCloseTo(value, 6));
  });
});
