import fc from 'fast-check';
import { superpose } from './beam-state';
import type { BeamGeometry, BeamLoad } from './beam.types';
import { ContinuousBeam } from './continuous-beam';
import { deflectionThrough, momentIntegral } from './macaulay.reference';
import { valuesAt } from './values-at';

/** A random beam and loads on it, for property specs; positions are whole multiples of 1/40 of the length. */
interface RandomBeam {
  readonly geometry: BeamGeometry;
  readonly loads: readonly BeamLoad[];
}

/** Plain decimals: the extremes of floating point are no beams. */
const number = (min: number, max: number) =>
  fc.integer({ min: 0, max: 9973 }).map((i) => min + ((max - min) * i) / 9973);

/** @param elastic whether supports may be springs. */
function geometries(elastic: boolean): fc.Arbitrary<BeamGeometry> {
  return fc.integer({ min: 1, max: 6 }).chain((n) =>
    fc.record({
      spans: fc.array(number(300, 9000), { minLength: n, maxLength: n }),
      overhangs: fc.record({
        start: fc.oneof(fc.constant(0), number(200, 2000)),
        end: fc.oneof(fc.constant(0), number(200, 2000)),
      }),
      flexuralRigidity: number(1e12, 1e14),
      supportStiffness: fc.array(elastic ? fc.option(number(500, 5e5)) : fc.constant(null), {
        minLength: n + 1,
        maxLength: n + 1,
      }),
    }),
  );
}

function beams(elastic: boolean): fc.Arbitrary<RandomBeam> {
  return geometries(elastic).chain((geometry) => {
    const start = -geometry.overhangs.start;
    const end = geometry.spans.reduce((a, b) => a + b, 0) + geometry.overhangs.end;
    const place = fc.integer({ min: 0, max: 40 }).map((i) => start + ((end - start) * i) / 40);
    const distributed = fc
      .record({ a: place, b: place, start: number(-100, 100), end: number(-100, 100) })
      .filter(({ a, b }) => a !== b)
      .map(({ a, b, ...rest }): BeamLoad => ({
        kind: 'distributed',
        from: Math.min(a, b),
        to: Math.max(a, b),
        ...rest,
      }));
    const point = fc
      .record({ at: place, value: number(-1e5, 1e5) })
      .map((load): BeamLoad => ({ kind: 'point', ...load }));
    const moment = fc
      .record({ at: place, value: number(-1e8, 1e8) })
      .map((load): BeamLoad => ({ kind: 'moment', ...load }));
    const load = fc.oneof(distributed, point, moment);
    return fc.record({
      geometry: fc.constant(geometry),
      loads: fc.array(load, { minLength: 1, maxLength: 4 }),
    });
  });
}

/** Sum of the loads' amounts times the length, in N mm: what an error in a moment is measured by. */
function momentScale({ geometry, loads }: RandomBeam): number {
  const length =
    geometry.spans.reduce((a, b) => a + b, 0) + geometry.overhangs.start + geometry.overhangs.end;
  return loads.reduce((sum, load) => {
    if (load.kind === 'moment') return sum + Math.abs(load.value);
    if (load.kind === 'point') return sum + Math.abs(load.value) * length;
    return sum + ((Math.abs(load.start) + Math.abs(load.end)) / 2) * (load.to - load.from) * length;
  }, 0);
}

const solve = ({ geometry, loads }: RandomBeam) => new ContinuousBeam(geometry, loads).solve(loads);

const within = (value: number, expected: number, tolerance: number) => {
  if (!(Math.abs(value - expected) <= tolerance)) {
    throw new Error(`${value} is not ${expected} within ${tolerance}`);
  }
};

/** The member seen with the reactions alone. */
function known(beam: RandomBeam) {
  const state = solve(beam);
  const { breaks, supports } = state.frame;
  const view = {
    start: breaks[0]!,
    supports: [...supports],
    reactions: [...state.reactions],
    loads: beam.loads,
  };
  return { state, view, end: breaks[breaks.length - 1]! };
}

/** Places between the breakpoints, so that no side has to be chosen. */
function places(breaks: Float64Array): number[] {
  return Array.from(breaks.subarray(1), (x, i) =>
    [0.21, 0.5, 0.83].map((t) => x + t * (breaks[i]! - x)),
  ).flat();
}

describe('any continuous beam', () => {
  it('is in equilibrium: the moments that the reactions and loads make vanish beyond its end', () => {
    fc.assert(
      fc.property(beams(true), (beam) => {
        const { view, end } = known(beam);
        const scale = momentScale(beam);
        within(momentIntegral(view, end + 1e-6 * end, 0), 0, 1e-11 * scale + 1e-6);
        within(momentIntegral(view, 2 * end, 0), 0, 1e-10 * scale + 1e-6);
      }),
    );
  });

  it('has the moment that its reactions and loads make, everywhere', () => {
    fc.assert(
      fc.property(beams(true), (beam) => {
        const { state, view } = known(beam);
        for (const x of places(state.frame.breaks)) {
          within(valuesAt(state, x).M, momentIntegral(view, x, 0), 1e-10 * momentScale(beam));
        }
      }),
    );
  });

  it('fits its supports: M/EI integrated twice gives 0, or reaction over stiffness, at each', () => {
    fc.assert(
      fc.property(beams(true), (beam) => {
        const { state, view } = known(beam);
        const { supportStiffness, flexuralRigidity } = beam.geometry;
        const expected = view.supports.map((_, i) => {
          const stiffness = supportStiffness[i];
          return stiffness === null ? 0 : view.reactions[i]! / stiffness!;
        });
        const last = expected.length - 1;
        const w = deflectionThrough(
          view,
          flexuralRigidity,
          [view.supports[0]!, expected[0]!],
          [view.supports[last]!, expected[last]!],
        );
        const length = state.frame.breaks.at(-1)! - view.start;
        const scale = (momentScale(beam) * length ** 2) / flexuralRigidity;
        const settled = Math.max(...expected.map(Math.abs));
        expected.forEach((value, i) => {
          within(w(view.supports[i]!), value, 1e-11 * scale + 1e-9 * settled);
          within(state.supportDeflections[i]!, value, 1e-9 * settled);
        });
        for (const x of places(state.frame.breaks)) {
          within(valuesAt(state, x).w, w(x), 1e-10 * scale + 1e-9 * settled);
        }
      }),
    );
  });

  it('is the mirror image of its mirror image', () => {
    fc.assert(
      fc.property(beams(true), (beam) => {
        const [one, other] = [solve(beam), solve(mirrored(beam))];
        const scale = momentScale(beam);
        const n = one.reactions.length - 1;
        const length = beam.geometry.spans.reduce((a, b) => a + b, 0);
        const shortest = Math.min(...beam.geometry.spans);
        one.reactions.forEach((r, i) =>
          within(other.reactions[n - i]!, r, (1e-9 * scale) / shortest),
        );
        for (const x of places(one.frame.breaks)) {
          within(valuesAt(other, length - x).M, valuesAt(one, x).M, 1e-9 * scale);
        }
      }),
    );
  });

  it('answers a sum of loads with the sum of the answers', () => {
    fc.assert(
      fc.property(beams(true), number(-2, 2), (beam, factor) => {
        const solver = new ContinuousBeam(beam.geometry, beam.loads);
        const units = beam.loads.map((load) => solver.solve([load]));
        const sum = superpose(
          units,
          beam.loads.map(() => factor),
        );
        const whole = solver.solve(beam.loads.map((load) => scaled(load, 1, factor)));
        const scale = momentScale(beam);
        for (const x of places(sum.frame.breaks)) {
          within(valuesAt(sum, x).M, valuesAt(whole, x).M, 1e-10 * scale);
        }
      }),
    );
  });

  it('grown by k with forces by k² has reactions by k², moments by k³ and deflections by k', () => {
    // Sections grow too: EI by k⁴, springs by k.
    fc.assert(
      fc.property(beams(true), number(0.2, 5), (beam, k) => {
        const { geometry } = beam;
        const large: RandomBeam = {
          geometry: {
            spans: geometry.spans.map((span) => k * span),
            overhangs: { start: k * geometry.overhangs.start, end: k * geometry.overhangs.end },
            flexuralRigidity: k ** 4 * geometry.flexuralRigidity,
            supportStiffness: geometry.supportStiffness.map((s) => (s === null ? null : k * s)),
          },
          loads: beam.loads.map((load) => scaled(load, k, k ** 2)),
        };
        const [one, other] = [solve(beam), solve(large)];
        const scale = momentScale(beam);
        const deflection = Math.max(
          ...places(one.frame.breaks).map((x) => Math.abs(valuesAt(one, x).w)),
        );
        for (const x of places(one.frame.breaks)) {
          within(valuesAt(other, k * x).M / k ** 3, valuesAt(one, x).M, 1e-9 * scale);
          within(valuesAt(other, k * x).w / k, valuesAt(one, x).w, 1e-8 * deflection);
        }
      }),
    );
  });

  it('stays as it is when an inner reaction is put on as a load instead', () => {
    fc.assert(
      fc.property(beams(false), (beam) => {
        fc.pre(beam.geometry.spans.length > 1);
        const solver = new ContinuousBeam(beam.geometry, beam.loads);
        const state = solver.solve(beam.loads);
        const at = solver.frame.supports[1]!;
        const push: BeamLoad = { kind: 'point', at, value: -state.reactions[1]! };
        const without = solver.solve(
          [...beam.loads, push],
          solver.allSupports.filter((s) => s !== 1),
        );
        const length = solver.frame.breaks.at(-1)! - solver.frame.breaks[0]!;
        const scale = (momentScale(beam) * length ** 2) / beam.geometry.flexuralRigidity;
        within(without.supportDeflections[1]!, 0, 1e-11 * scale);
        without.reactions.forEach((r, i) => {
          const shortest = Math.min(...beam.geometry.spans);
          if (i !== 1) within(r, state.reactions[i]!, (1e-9 * momentScale(beam)) / shortest);
        });
      }),
    );
  });
});

function scaled(load: BeamLoad, k: number, forces: number): BeamLoad {
  if (load.kind === 'point') return { ...load, at: k * load.at, value: forces * load.value };
  if (load.kind === 'moment') return { ...load, at: k * load.at, value: k * forces * load.value };
  const [start, end] = [(forces * load.start) / k, (forces * load.end) / k];
  return { ...load, from: k * load.from, to: k * load.to, start, end };
}

function mirrored({ geometry, loads }: RandomBeam): RandomBeam {
  const length = geometry.spans.reduce((a, b) => a + b, 0);
  return {
    geometry: {
      ...geometry,
      spans: [...geometry.spans].reverse(),
      overhangs: { start: geometry.overhangs.end, end: geometry.overhangs.start },
      supportStiffness: [...geometry.supportStiffness].reverse(),
    },
    loads: loads.map((load) => {
      if (load.kind === 'point') return { ...load, at: length - load.at };
      if (load.kind === 'moment') return { ...load, at: length - load.at, value: -load.value };
      return {
        kind: 'distributed',
        from: length - load.to,
        to: length - load.from,
        start: load.end,
        end: load.start,
      };
    }),
  };
}
