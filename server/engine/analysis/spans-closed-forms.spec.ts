import { bays } from './bays';
import type { BeamLoad } from './beam.types';
import { ContinuousBeam } from './continuous-beam';
import { deflectionExtremes, relativeDeflections } from './deflection';
import { greatest, momentExtremes, shearExtremes } from './extremes';
import { sectionPoints } from './section-points';
import { supportValues, valuesAt } from './values-at';

const EI = 6.1e13;
const L = 6000;

/** A single span with overhangs. */
function span(loads: BeamLoad[], overhangs = { start: 0, end: 0 }) {
  const beam = new ContinuousBeam(
    { spans: [L], overhangs, flexuralRigidity: EI, supportStiffness: [null, null] },
    loads,
  );
  const state = beam.solve(loads);
  return { state, bays: bays(state) };
}
/** Two spans L with the second a mirror image of the first: the first is fixed at its right end. */
function propped(loads: BeamLoad[]) {
  const mirror = loads.map((load): BeamLoad => {
    if (load.kind !== 'distributed') return { ...load, at: 2 * L - load.at };
    return {
      ...load,
      from: 2 * L - load.to,
      to: 2 * L - load.from,
      start: load.end,
      end: load.start,
    };
  });
  const beam = new ContinuousBeam(
    {
      spans: [L, L],
      overhangs: { start: 0, end: 0 },
      flexuralRigidity: EI,
      supportStiffness: [null, null, null],
    },
    [...loads, ...mirror],
  );
  return beam.solve([...loads, ...mirror]);
}
const uniform = (q: number, from = 0, to = L): BeamLoad => ({
  kind: 'distributed',
  from,
  to,
  start: q,
  end: q,
});
const trapezoid = (start: number, end: number): BeamLoad => ({
  kind: 'distributed',
  from: 0,
  to: L,
  start,
  end,
});
const point = (value: number, at: number): BeamLoad => ({ kind: 'point', at, value });

const exact = (value: number, expected: number) => {
  expect(Math.abs(value - expected)).toBeLessThanOrEqual(1e-9 * Math.abs(expected));
};
const most = (solved: ReturnType<typeof span>, bay = 0) =>
  greatest(deflectionExtremes(solved.state, solved.bays[bay]!));
const moment = (solved: ReturnType<typeof span>) =>
  greatest(momentExtremes(solved.state, { from: 0, to: L }));

describe('a simply supported span', () => {
  it('under a uniform load: wL²/8, 5wL⁴/384EI, shear qL/2 - qx', () => {
    const solved = span([uniform(20)]);
    exact(moment(solved).value, (20 * L ** 2) / 8);
    exact(most(solved).value, (5 * 20 * L ** 4) / (384 * EI));
    exact(most(solved).x, L / 2);
    exact(valuesAt(solved.state, 1500).V, 20 * (L / 2 - 1500));
    exact(valuesAt(solved.state, 1500).M, (20 * 1500 * (L - 1500)) / 2);
  });

  it.each([1000, 2500, 3000, 5400])(
    'under a point load at %i mm: Wab/L, and its deflections',
    (a) => {
      const b = L - a;
      const solved = span([point(4e4, a)]);
      const [longer, shorter] = [Math.max(a, b), Math.min(a, b)];
      exact(moment(solved).value, (4e4 * a * b) / L);
      exact(moment(solved).x, a);
      exact(solved.state.reactions[0]!, (4e4 * b) / L);
      exact(valuesAt(solved.state, a).w, (4e4 * a ** 2 * b ** 2) / (3 * EI * L));
      exact(
        most(solved).value,
        (4e4 * shorter * (L ** 2 - shorter ** 2) ** 1.5) / (9 * Math.sqrt(3) * EI * L),
      );
      const place = Math.sqrt((L ** 2 - shorter ** 2) / 3);
      exact(most(solved).x, longer === a ? place : L - place);
    },
  );

  it.each([
    [1, 2],
    [0, 1],
    [1, 0],
    [0.4, 1.3],
  ])('under a trapezoid from %f to %f N/mm', (w1, w2) => {
    const solved = span([trapezoid(w1, w2)]);
    exact(solved.state.reactions[0]!, (L * (2 * w1 + w2)) / 6);
    exact(solved.state.reactions[1]!, (L * (w1 + 2 * w2)) / 6);
    exact(valuesAt(solved.state, L / 2).M, ((w1 + w2) * L ** 2) / 16);
    exact(valuesAt(solved.state, L / 2).w, (5 * (w1 + w2) * L ** 4) / (768 * EI));
    exact(moment(solved).x, (L * (-w1 + Math.sqrt((w1 ** 2 + w1 * w2 + w2 ** 2) / 3))) / (w2 - w1));
  });

  it('under a moment at its end: reactions m/L, 9√3 deflection at L/√3 from it', () => {
    const solved = span([{ kind: 'moment', at: 0, value: 9e7 }]);
    exact(solved.state.reactions[0]!, -9e7 / L);
    exact(solved.state.reactions[1]!, 9e7 / L);
    exact(valuesAt(solved.state, 0).M, 9e7);
    exact(most(solved).value, (9e7 * L ** 2) / (9 * Math.sqrt(3) * EI));
    exact(L - most(solved).x, L / Math.sqrt(3));
  });

  it('under a moment inside it: M jumps up by m, and the span stays still at both ends', () => {
    const a = 2000;
    const solved = span([{ kind: 'moment', at: a, value: 9e7 }]);
    exact(valuesAt(solved.state, a, 'left').M, (-9e7 * a) / L);
    exact(valuesAt(solved.state, a, 'right').M, (9e7 * (L - a)) / L);
    // w = m a (L - a) (L - 2a) / (3 EI L) at the moment, here with the load's sign.
    exact(valuesAt(solved.state, a).w, (9e7 * a * (L - a) * (L - 2 * a)) / (3 * EI * L));
  });
});

describe('a stretch of a span', () => {
  const { state } = span([uniform(20)]);

  it('has its extreme at its end when the moment turns outside it', () => {
    const { min, max } = momentExtremes(state, { from: 500, to: 2000 });
    exact(max.value, (20 * 2000 * (L - 2000)) / 2);
    expect(max.x).toBe(2000);
    exact(min.value, (20 * 500 * (L - 500)) / 2);
  });
});

describe('a load that changes sign', () => {
  it('has the greatest shear where it is zero', () => {
    const { state } = span([trapezoid(-10, 20)]);
    const { max } = shearExtremes(state, { from: 0, to: L });
    exact(max.x, L / 3);
    exact(max.value, (10 * L) / 6);
    const point = sectionPoints(state).find(({ x }) => x === max.x);
    expect(point).toMatchObject({ V: max.value, side: 'both' });
  });
});

describe('the supports of a member without overhangs', () => {
  it('have nothing beyond them and do not move', () => {
    const [first, last] = supportValues(span([uniform(20)]).state);
    expect(first).toMatchObject({ left: { V: 0, M: 0 }, deflection: 0 });
    expect(last).toMatchObject({ right: { V: 0, M: 0 }, deflection: 0 });
    const odd = span([trapezoid(4.1, 13.7), point(2.3e4, 1234)]).state;
    expect([...odd.supportDeflections]).toEqual([0, 0]);
    exact(first!.right.V, 10 * L);
    exact(last!.left.V, -10 * L);
  });
});

describe('a span fixed at one end', () => {
  it.each([
    [1, 1],
    [0, 1],
    [1, 0],
    [1, 2],
    [0.4, 1.3],
  ])('under a trapezoid from %f to %f: L²(7w1 + 8w2)/120 at the fixed end', (w1, w2) => {
    exact(valuesAt(propped([trapezoid(w1, w2)]), L).M, (-(L ** 2) * (7 * w1 + 8 * w2)) / 120);
  });

  it('under a point load: P a b (a + L) / 2L², reaction P b² (a + 2L) / 2L³', () => {
    const [a, b] = [2300, L - 2300];
    const state = propped([point(4e4, a)]);
    exact(valuesAt(state, L).M, (-4e4 * a * b * (a + L)) / (2 * L ** 2));
    exact(state.reactions[0]!, (4e4 * b ** 2 * (a + 2 * L)) / (2 * L ** 3));
  });
});

describe('a span fixed at both ends by moments', () => {
  it.each([
    ['uniform', uniform(12), (12 * L ** 2) / 12, (12 * L ** 2) / 12],
    [
      'trapezoid',
      trapezoid(4, 13),
      (L ** 2 * (3 * 4 + 2 * 13)) / 60,
      (L ** 2 * (2 * 4 + 3 * 13)) / 60,
    ],
    [
      'point',
      point(4e4, 2000),
      (4e4 * 2000 * 4000 ** 2) / L ** 2,
      (4e4 * 2000 ** 2 * 4000) / L ** 2,
    ],
  ] as const)(
    '%s load: the fixed-end moments leave no slope at the ends',
    (_, load, left, right) => {
      const { state } = span([
        load,
        { kind: 'moment', at: 0, value: -left },
        { kind: 'moment', at: L, value: right },
      ]);
      exact(valuesAt(state, L, 'left').M, -right);
      const free = valuesAt(span([load]).state, 0).theta;
      expect(Math.abs(valuesAt(state, 0).theta)).toBeLessThan(1e-12 * free);
      expect(Math.abs(valuesAt(state, L, 'left').theta)).toBeLessThan(1e-12 * free);
      if (load.kind === 'distributed' && load.start === load.end) {
        exact(valuesAt(state, L / 2).M, (12 * L ** 2) / 24);
        exact(valuesAt(state, L / 2).w, (12 * L ** 4) / (384 * EI));
      }
    },
  );
});

describe('overhangs', () => {
  it('W/2 on the end of each: Wa/2 throughout, a²(3L + 2a)W/12EI at the ends, WaL²/16EI between', () => {
    const [half, a] = [1.5e4, 1800];
    const solved = span([point(half, -a), point(half, L + a)], { start: a, end: a });
    exact(valuesAt(solved.state, L / 3).M, -half * a);
    exact(most(solved, 0).value, (2 * half * a ** 2 * (3 * L + 2 * a)) / (12 * EI));
    exact(most(solved, 0).x, -a);
    exact(most(solved, 2).value, (2 * half * a ** 2 * (3 * L + 2 * a)) / (12 * EI));
    exact(most(solved, 1).value, (-2 * half * a * L ** 2) / (16 * EI));
  });

  it('are numbered 0 and n + 1, and count as bays of their own', () => {
    const solved = span([uniform(3, -500, L + 700)], { start: 500, end: 700 });
    expect(solved.bays.map(({ span, kind, length }) => [span, kind, length])).toEqual([
      [0, 'overhang', 500],
      [1, 'span', L],
      [2, 'overhang', 700],
    ]);
    exact(valuesAt(solved.state, 0).M, (-3 * 500 ** 2) / 2);
    exact(valuesAt(solved.state, L).M, (-3 * 700 ** 2) / 2);
    expect(Math.abs(valuesAt(solved.state, L + 700).M)).toBeLessThan(1e-6);
  });
});

describe('deflection by shear', () => {
  const shearRigidity = 5e6;

  it('adds wL²/8GA under a uniform load', () => {
    const { state, bays } = span([uniform(20)]);
    const { max } = deflectionExtremes(state, bays[0]!, { shearRigidity });
    exact(max.value, (5 * 20 * L ** 4) / (384 * EI) + (20 * L ** 2) / (8 * shearRigidity));
  });

  it('adds M/GA everywhere in a simply supported span', () => {
    const { state, bays } = span([trapezoid(4, 13), point(2e4, 2000)]);
    const places = [700, 2000, 3100, 5500];
    const sheared = relativeDeflections(state, bays[0]!, places, { shearRigidity });
    relativeDeflections(state, bays[0]!, places).forEach((bent, i) => {
      exact(sheared[i]!, bent + valuesAt(state, places[i]!).M / shearRigidity);
    });
  });

  it('is the same on a start overhang', () => {
    const a = 1500;
    const { state, bays } = span([point(1e4, -a)], { start: a, end: 0 });
    const { max } = deflectionExtremes(state, bays[0]!, { shearRigidity });
    const bent = (1e4 * a ** 2 * (L + a)) / (3 * EI);
    exact(max.value, bent + (1e4 * a * (1 + a / L)) / shearRigidity);
    expect(relativeDeflections(state, bays[0]!, [0], { shearRigidity })[0]).toBeCloseTo(0, 12);
  });

  it('adds W a (1 + a/L) / GA at the end of an overhang: the span beside it leans too', () => {
    const a = 1500;
    const { state, bays } = span([point(1e4, L + a)], { start: 0, end: a });
    const { max } = deflectionExtremes(state, bays[1]!, { shearRigidity });
    const bent = (1e4 * a ** 2 * (L + a)) / (3 * EI);
    exact(max.value, bent + (1e4 * a * (1 + a / L)) / shearRigidity);
  });
});
