import { bays } from './bays';
import type { BeamLoad } from './beam.types';
import { ContinuousBeam } from './continuous-beam';
import { deflectionExtremes } from './deflection';
import { greatest, momentExtremes, wholeMember } from './extremes';
import { momentIntegral } from './macaulay.reference';
import { sectionPoints } from './section-points';
import { valuesAt } from './values-at';

/** A waler with everything on it, seen at 0.5 mm steps with the reactions alone. */
const loads: BeamLoad[] = [
  { kind: 'distributed', from: -500, to: 8400, start: 95, end: 95 },
  { kind: 'distributed', from: 1000, to: 6200, start: -12, end: 30 },
  { kind: 'point', at: 1500, value: 40e3 },
  { kind: 'point', at: 6000, value: 25e3 },
  { kind: 'moment', at: 4100, value: 30e6 },
];
const EI = 6.1e13;
const beam = new ContinuousBeam(
  {
    spans: [3000, 3000, 2400],
    overhangs: { start: 500, end: 0 },
    flexuralRigidity: EI,
    supportStiffness: [null, 120e3, null, null],
  },
  loads,
);
const state = beam.solve(loads);
const view = {
  start: -500,
  supports: [...beam.frame.supports],
  reactions: [...state.reactions],
  loads,
};
const step = 0.5;
const x = Array.from({ length: 17801 }, (_, i) => -500 + i * step);
const M = x.map((at) => momentIntegral(view, at, 0));

/** Slope and deflection from the moment amid each step, then made to vanish at the first and the last support. */
function integrated(): number[] {
  let slope = 0;
  let deflection = 0;
  const bent = x.map((_, i) => {
    if (i === 0) return 0;
    const turn = (-step * momentIntegral(view, x[i]! - step / 2, 0)) / EI;
    deflection += step * (slope + turn / 2);
    slope += turn;
    return deflection;
  });
  const first = bent[1000]!;
  const last = bent[17800]!;
  return bent.map((w, i) => w - first - ((last - first) * (i - 1000)) / 16800);
}

describe('a waler integrated in half-millimetre steps', () => {
  const w = integrated();

  it('rests on its rigid supports and compresses its spring', () => {
    expect(Math.abs(w[1000 + 12000]!)).toBeLessThan(1e-5);
    expect(w[1000 + 6000]!).toBeCloseTo(state.reactions[1]! / 120e3, 5);
  });

  it('deflects as the polynomials say', () => {
    for (let i = 0; i < x.length; i += 37) {
      expect(Math.abs(valuesAt(state, x[i]!).w - w[i]!)).toBeLessThan(1e-5);
    }
  });

  it('has nowhere more moment than the exact extremes', () => {
    const { min, max } = momentExtremes(state, wholeMember(state));
    expect(Math.max(...M)).toBeLessThanOrEqual(max.value * (1 + 1e-12));
    expect(Math.max(...M)).toBeCloseTo(max.value, -2);
    expect(Math.min(...M)).toBeGreaterThanOrEqual(min.value * (1 + 1e-12));
    expect(Math.min(...M)).toBeCloseTo(min.value, -2);
  });

  it('deflects nowhere more from its chords than the exact extremes', () => {
    for (const bay of bays(state)) {
      const [from, to] = [(bay.from + 500) / step, (bay.to + 500) / step];
      const start = bay.kind === 'span' ? w[from]! : w[to]!;
      const slope = bay.kind === 'span' ? (w[to]! - w[from]!) / (to - from) : 0;
      const relative = w.slice(from, to + 1).map((value, i) => value - start - slope * i);
      const { min, max } = deflectionExtremes(state, bay);
      expect(Math.max(...relative)).toBeCloseTo(max.value, 5);
      expect(Math.min(...relative)).toBeCloseTo(min.value, 5);
    }
  });

  it('has its section points where moment or shear can govern', () => {
    const points = sectionPoints(state);
    expect(points.map((point) => point.x)).toEqual(
      [...points.map((point) => point.x)].sort((a, b) => a - b),
    );
    // Free end, loads with a jump and supports: two sides each but at the member's ends.
    const sides = (at: number) => points.filter((point) => point.x === at).map(({ side }) => side);
    expect(sides(-500)).toEqual(['right']);
    expect(sides(0)).toEqual(['left', 'right']);
    expect(sides(1000)).toEqual(['both']);
    expect(sides(1500)).toEqual(['left', 'right']);
    expect(sides(4100)).toEqual(['left', 'right']);
    expect(sides(8400)).toEqual(['left']);
    const { min, max } = momentExtremes(state, wholeMember(state));
    for (const extreme of [min, max]) {
      expect(points.some((point) => point.M === extreme.value && point.x === extreme.x)).toBe(true);
    }
    for (const { x: at, M: moment, V: shear, side } of points) {
      const here = valuesAt(state, at, side === 'left' ? 'left' : 'right');
      expect(Math.abs(moment - here.M)).toBeLessThan(1e-3);
      expect(Math.abs(shear - here.V)).toBeLessThan(1e-6);
    }
    expect(greatest({ min, max }).span).toBeGreaterThan(0);
  });
});
