import { bays } from './bays';
import type { BeamLoad } from './beam.types';
import { ContinuousBeam } from './continuous-beam';
import { deflectionExtremes } from './deflection';
import { greatest } from './extremes';
import { valuesAt } from './values-at';

const EI = 6.1e13;
const L = 3000;
const q = 40;

function solve(spans: number[], supportStiffness: (number | null)[]) {
  const load: BeamLoad = {
    kind: 'distributed',
    from: 0,
    to: spans.reduce((a, b) => a + b, 0),
    start: q,
    end: q,
  };
  const beam = new ContinuousBeam(
    { spans, overhangs: { start: 0, end: 0 }, flexuralRigidity: EI, supportStiffness },
    [load],
  );
  return beam.solve([load]);
}
const exact = (value: number, expected: number, tolerance = 1e-9) => {
  expect(Math.abs(value - expected)).toBeLessThanOrEqual(tolerance * Math.abs(expected));
};

describe('two spans over a spring', () => {
  it.each([0.1, 10, 1e3, 120e3, 1e7, 1e12])('of %f N/mm: R = 5qL⁴/24EI over L³/6EI + 1/k', (k) => {
    const state = solve([L, L], [null, k, null]);
    // The simply supported 2L deflects 5 q (2L)⁴ / 384 EI; a force at its middle takes back R (2L)³ / 48 EI.
    const R = (5 * q * L ** 4) / (24 * EI) / (L ** 3 / (6 * EI) + 1 / k);
    exact(state.reactions[1]!, R);
    exact(state.supportDeflections[1]!, R / k);
    exact(valuesAt(state, L).M, (q * L ** 2) / 2 - (R * L) / 2);
  });

  it('has the chord of the displaced support as its reference', () => {
    const state = solve([L, L], [null, 120e3, null]);
    const [left] = bays(state);
    const { x, value } = greatest(deflectionExtremes(state, left!));
    exact(value, valuesAt(state, x).w - (state.supportDeflections[1]! * x) / L);
    expect(x).toBeLessThan(L / 2);
  });
});

describe('supports that all sink alike', () => {
  it('leave the reactions of a single span as they are', () => {
    const state = solve([L], [5e3, 5e3]);
    exact(state.reactions[0]!, (q * L) / 2);
    exact(state.supportDeflections[1]!, (q * L) / 2 / 5e3);
    const chorded = greatest(deflectionExtremes(state, bays(state)[0]!));
    exact(chorded.value, (5 * q * L ** 4) / (384 * EI));
  });
});

describe('conditioning', () => {
  it.each([
    [30, 3000, 30],
    [3000, 30, 3000],
    [50, 5000, 5000],
  ])('spans of %i, %i and %i mm keep the three-moment equations', (...spans) => {
    const state = solve(spans, [null, null, null, null]);
    const [a, b, c] = spans;
    const [m1, m2] = [valuesAt(state, a).M, valuesAt(state, a + b).M];
    exact(2 * m1 * (a + b) + m2 * b, (-q * (a ** 3 + b ** 3)) / 4);
    exact(m1 * b + 2 * m2 * (b + c), (-q * (b ** 3 + c ** 3)) / 4);
  });

  it('spans of 30 and 3000 mm on springs keep equilibrium and the springs', () => {
    const state = solve([30, 3000, 30], [null, 5e4, 5e4, null]);
    exact(state.reactions[1]!, 5e4 * state.supportDeflections[1]!);
    exact(
      state.reactions.reduce((a, b) => a + b),
      q * 3060,
    );
    // Symmetric: rigid end, spring, and a middle that is level; one equation for the spring's force.
    const [a, b] = [30, 3000];
    exact(state.reactions[0]!, state.reactions[3]!);
    const R1 = state.reactions[1]!;
    const R0 = state.reactions[0]!;
    // w(a) from the end span with the level middle: slope at the support by half the middle's M area.
    const M1 = R0 * a - (q * a ** 2) / 2;
    const slope = (q * b ** 3) / (24 * EI) + (M1 * b) / (2 * EI);
    const w = slope * a + ((R0 * a ** 3) / 3 - (q * a ** 4) / 8) / EI;
    exact(w, R1 / 5e4, 1e-8);
  });
});
