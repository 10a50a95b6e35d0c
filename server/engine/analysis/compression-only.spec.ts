import fc from 'fast-check';
import { bays } from './bays';
import type { BeamLoad } from './beam.types';
import { fromStandingPair, solveCompressionOnly } from './compression-only';
import { ContinuousBeam } from './continuous-beam';
import { deflectionExtremes } from './deflection';
import { greatest, momentExtremes, wholeMember } from './extremes';
import { sectionPoints } from './section-points';
import { UnitCases } from './unit-cases';

function member(
  spans: number[],
  loads: BeamLoad[],
  overhangs = { start: 0, end: 0 },
  stiffness?: (number | null)[],
) {
  const beam = new ContinuousBeam(
    {
      spans,
      overhangs,
      flexuralRigidity: 6e13,
      supportStiffness: stiffness ?? Array.from({ length: spans.length + 1 }, () => null),
    },
    loads,
  );
  return new UnitCases(
    beam,
    loads.map((load) => [load]),
  );
}
const ones = (cases: UnitCases) => Array.from({ length: cases.count }, () => 1);
const uniform = (q: number, from: number, to: number): BeamLoad => ({
  kind: 'distributed',
  from,
  to,
  start: q,
  end: q,
});

function standing(cases: UnitCases, factors: number[] = ones(cases)) {
  const solution = solveCompressionOnly(cases, factors);
  if (solution.kind !== 'state') throw new Error('a mechanism');
  return solution;
}

describe('a waler of 6.0 and 1.5 m under 95 kN/m', () => {
  const cases = member([6000, 1500], [uniform(95, 0, 7500)]);
  const both = cases.combine([1]);

  it('would pull on its end prop', () => {
    expect(both.kind === 'state' && both.state.reactions[2]! < 0).toBe(true);
  });

  it('lifts off it, and has 376 kN m in the span', () => {
    const { state, lifted } = standing(cases);
    expect(lifted).toEqual([2]);
    expect(greatest(momentExtremes(state, wholeMember(state))).value / 1e6).toBeCloseTo(375.7, 1);
    // R = 95 · 7.5 · (6 - 3.75) / 6; M = R² / 2q.
    const R = (95 * 7500 * 2250) / 6000;
    expect(state.reactions[0]!).toBeCloseTo(R, 6);
    expect(momentExtremes(state, wholeMember(state)).max.value).toBeCloseTo(R ** 2 / 190, 3);
    expect(state.supportDeflections[2]!).toBeLessThan(0);
  });

  it('counts what is left of the short span as an overhang', () => {
    const { state } = standing(cases);
    const [span, overhang] = bays(state);
    expect(span).toMatchObject({ span: 1, kind: 'span', length: 6000, supports: [0, 1] });
    expect(overhang).toMatchObject({
      span: 2,
      kind: 'overhang',
      length: 1500,
      supports: [1, null],
    });
    const tip = deflectionExtremes(state, overhang!).min;
    expect(tip.x).toBe(7500);
    expect(tip.value).toBeCloseTo(state.supportDeflections[2]!, 9);
  });
});

describe('a middle support that lifts', () => {
  it('merges its two spans into one bay', () => {
    // Load on the overhangs only: the middle support is left behind.
    const loads = [uniform(50, -2000, 0), uniform(50, 6000, 8000)];
    const cases = member([3000, 3000], loads, { start: 2000, end: 2000 });
    const { state, lifted } = standing(cases);
    expect(lifted).toEqual([1]);
    expect(bays(state).map(({ span, from, to }) => [span, from, to])).toEqual([
      [0, -2000, 0],
      [1, 0, 6000],
      [3, 6000, 8000],
    ]);
    const there = sectionPoints(state).filter(({ x }) => x === 3000);
    expect(there.map(({ side }) => side)).toEqual(['left', 'right']);
    const { min } = deflectionExtremes(state, bays(state)[1]!);
    expect(min.x).toBeCloseTo(3000, 6);
    expect(min.value).toBeCloseTo(state.supportDeflections[1]!, 9);
  });
});

describe('supports that drop out one by one until a single one is left', () => {
  it('are taken in again: two of them do hold the member', () => {
    const loads: BeamLoad[] = [
      { kind: 'distributed', from: 15651, to: 20330, start: 20, end: -56 },
      { kind: 'distributed', from: 8744, to: 13868, start: -29, end: 80 },
    ];
    const cases = member([3956, 8264, 7271], loads, { start: 1952, end: 839 }, [
      170393,
      null,
      null,
      192846,
    ]);
    expect(standing(cases).lifted).toEqual([2, 3]);
  });
});

describe('a mechanism', () => {
  it('is said where the first support is lost and the loads press on its overhang', () => {
    const cases = member([3000, 3000], [{ kind: 'point', at: 2000, value: 1 }]);
    expect(solveCompressionOnly(cases, [1], [1, 2]).kind).toBe('mechanism');
    expect(solveCompressionOnly(cases, [1], [0, 2]).kind).toBe('state');
  });

  it('depends on the sense of a couple on an overhanging load', () => {
    const tip: BeamLoad = { kind: 'point', at: 7000, value: 1e3 };
    const couple = (value: number): BeamLoad => ({ kind: 'moment', at: 1000, value });
    for (const [value, kind] of [
      [-2e6, 'state'],
      [2e6, 'mechanism'],
    ] as const) {
      const cases = member([6000], [tip, couple(value)], { start: 0, end: 1000 });
      expect(solveCompressionOnly(cases, [1, 1]).kind).toBe(kind);
    }
  });

  it('is said of springs without stiffness', () => {
    const cases = member([3000], [uniform(1, 0, 3000)], { start: 0, end: 0 }, [null, 0]);
    expect(cases.combine([1]).kind).toBe('mechanism');
  });

  it.each<[string, number[], BeamLoad[], { start: number; end: number }]>([
    ['a load that pulls off', [3000], [uniform(-5, 0, 3000)], { start: 0, end: 0 }],
    [
      'a resultant beyond the last support',
      [3000, 3000],
      [{ kind: 'point', at: 7000, value: 1 }],
      { start: 0, end: 1500 },
    ],
    [
      'a couple alone',
      [3000, 3000],
      [{ kind: 'moment', at: 3000, value: 1e6 }],
      { start: 0, end: 0 },
    ],
  ])('is said of %s', (_, spans, loads, overhangs) => {
    const cases = member(spans, loads, overhangs);
    expect(solveCompressionOnly(cases, ones(cases)).kind).toBe('mechanism');
  });

  it('is said of a single support that is left', () => {
    expect(solveCompressionOnly(member([3000], [uniform(1, 0, 3000)]), [1], [1]).kind).toBe(
      'mechanism',
    );
  });

  it('is not said of a member without load', () => {
    expect(standing(member([3000], [uniform(1, 0, 3000)]), [0]).lifted).toEqual([]);
  });
});

describe('a lost prop', () => {
  it('is not listed as lifted', () => {
    const cases = member([3000, 3000, 3000], [uniform(40, 0, 9000)]);
    const solution = solveCompressionOnly(cases, [1], [0, 1, 3]);
    expect(solution).toMatchObject({ kind: 'state', lifted: [] });
    if (solution.kind === 'state') {
      expect(bays(solution.state).map(({ span, length }) => [span, length])).toEqual([
        [1, 3000],
        [2, 6000],
      ]);
    }
  });
});

describe('supports that only push, over random members', () => {
  const beams = fc.record({
    spans: fc.array(fc.integer({ min: 500, max: 8000 }), { minLength: 1, maxLength: 5 }),
    start: fc.integer({ min: 0, max: 2500 }),
    end: fc.integer({ min: 0, max: 2500 }),
    stiffness: fc.array(fc.option(fc.integer({ min: 500, max: 200000 })), {
      minLength: 8,
      maxLength: 8,
    }),
    loads: fc.array(
      fc.record({
        at: fc.integer({ min: 0, max: 100 }),
        to: fc.integer({ min: 0, max: 100 }),
        size: fc.integer({ min: -40, max: 100 }),
      }),
      {
        minLength: 1,
        maxLength: 5,
      },
    ),
  });
  const build = ({
    spans,
    start,
    end,
    stiffness,
    loads,
  }: typeof beams extends fc.Arbitrary<infer T> ? T : never) => {
    const length = spans.reduce((a, b) => a + b, 0) + start + end;
    const place = (i: number) => (i * length) / 100 - start;
    return member(
      spans,
      loads.map(({ at, to, size }): BeamLoad =>
        at === to
          ? { kind: 'point', at: place(at), value: 1000 * size }
          : uniform(size, place(Math.min(at, to)), place(Math.max(at, to))),
      ),
      { start, end },
      stiffness.slice(0, spans.length + 1),
    );
  };
  /** Every set of supports tried: those that push only and that the member does not enter. */
  const allAnswers = (cases: UnitCases): number[][] => {
    const supports = cases.beam.allSupports;
    const answers: number[][] = [];
    const size = cases.resultant(ones(cases)).size;
    for (let bits = 0; bits < 2 ** supports.length; bits++) {
      const acting = supports.filter((s) => (bits >> s) & 1);
      const sums = cases.supportSums(ones(cases), acting);
      if (!sums) continue;
      const scale = Math.max(...sums.deflections.map(Math.abs));
      const pushes = acting.every((s) => sums.reactions[s]! > -1e-9 * size);
      const clear = supports.every(
        (s) => acting.includes(s) || sums.deflections[s]! <= 1e-9 * scale,
      );
      if (pushes && clear) answers.push([...acting]);
    }
    return answers;
  };

  it('are the one set that pushes only and that the member does not enter', () => {
    fc.assert(
      fc.property(beams, (beam) => {
        const cases = build(beam);
        fc.pre(cases.resultant(ones(cases)).size > 0);
        const solution = solveCompressionOnly(cases, ones(cases));
        const answers = allAnswers(cases);
        if (solution.kind === 'mechanism') expect(answers).toEqual([]);
        else expect(answers.map((a) => a.join())).toContain(solution.state.acting.join());
      }),
      { numRuns: 100 },
    );
  });

  it('are found from the outermost pair as well', () => {
    fc.assert(
      fc.property(beams, (beam) => {
        const cases = build(beam);
        const solution = solveCompressionOnly(cases, ones(cases));
        fc.pre(solution.kind === 'state');
        const { size } = cases.resultant(ones(cases));
        fc.pre(size > 0);
        const found = fromStandingPair(cases, ones(cases), cases.beam.allSupports, 1e-9 * size);
        expect(allAnswers(cases).map((a) => a.join())).toContain(found?.join());
      }),
      { numRuns: 100 },
    );
  });
});
