import { bays } from './bays';
import type { BeamLoad } from './beam.types';
import { solveCompressionOnly } from './compression-only';
import { ContinuousBeam } from './continuous-beam';
import { deflectionExtremes } from './deflection';
import { envelope } from './envelope';
import { momentExtremes, shearExtremes, wholeMember } from './extremes';
import { loadPatterns } from './load-patterns';
import { UnitCases } from './unit-cases';
import { valuesAt } from './values-at';

/** Three spans and an overhang, one case a panel, and the states of all patterns that only push. */
function patternedWaler() {
  const beam = new ContinuousBeam(
    {
      spans: [3000, 4200, 2400],
      overhangs: { start: 600, end: 0 },
      flexuralRigidity: 6e13,
      supportStiffness: [null, 120e3, null, null],
    },
    [{ kind: 'point', at: 5000, value: 0 }],
  );
  const cases = new UnitCases(
    beam,
    beam.frame.panels.map(({ from, to }, i): BeamLoad[] => [
      { kind: 'distributed', from, to, start: 40, end: 40 + 10 * i },
      ...(i === 2 ? [{ kind: 'point' as const, at: 5000, value: 9e4 }] : []),
    ]),
  );
  return loadPatterns(beam.frame.panels.length).flatMap(({ loaded }) => {
    const solution = solveCompressionOnly(cases, loaded.map(Number));
    return solution.kind === 'state' ? [solution.state] : [];
  });
}

describe('the envelope of a patterned waler with lifted props', () => {
  const states = patternedWaler();
  const diagrams = envelope(states);

  it('has states on different supports', () => {
    expect(new Set(states.map(({ acting }) => acting.join())).size).toBeGreaterThan(1);
  });

  it('runs from end to end in order, with both sides of each breakpoint', () => {
    const x = diagrams.moment.map((point) => point.x);
    expect([...x].sort((a, b) => a - b)).toEqual(x);
    expect([x[0], x.at(-1)]).toEqual([-600, 9600]);
    const load = diagrams.shear.filter((point) => point.x === 5000);
    expect(load.map(({ side }) => side)).toEqual(['left', 'right']);
    expect(load[0]!.max).not.toBeCloseTo(load[1]!.max, 0);
    expect(diagrams.shear.filter(({ span }) => span === 2).length).toBeGreaterThan(20);
  });

  it('holds every state at every station', () => {
    for (const state of states) {
      for (const { x, side, min, max } of diagrams.moment) {
        const { M } = valuesAt(state, x, side);
        if (!(M >= min && M <= max)) throw new Error(`${M} at ${x} is not in ${min}, ${max}`);
      }
    }
  });

  it('shows the exact extremes of moment, shear and deflection', () => {
    const overall = (values: { min: { value: number }; max: { value: number } }[]) => [
      Math.min(...values.map(({ min }) => min.value)),
      Math.max(...values.map(({ max }) => max.value)),
    ];
    const shown = (points: { min: number; max: number }[]) => [
      Math.min(...points.map(({ min }) => min)),
      Math.max(...points.map(({ max }) => max)),
    ];
    const close = (a: number[], b: number[]) =>
      a.forEach((value, i) =>
        expect(Math.abs(value - b[i]!)).toBeLessThan(1e-12 * Math.abs(value)),
      );
    close(shown(diagrams.moment), overall(states.map((s) => momentExtremes(s, wholeMember(s)))));
    close(shown(diagrams.shear), overall(states.map((s) => shearExtremes(s, wholeMember(s)))));
    const deflections = states.flatMap((s) => bays(s).map((bay) => deflectionExtremes(s, bay)));
    close(shown(diagrams.deflection), overall(deflections));
  });

  it('is empty for no states', () => {
    expect(envelope([])).toEqual({ moment: [], shear: [], deflection: [] });
  });
});
