import fc from 'fast-check';
import { runWaler, verification } from '../../testing/waler';
import type { CheckAnswer, LoadInput, WalerRequest } from '../contract';

const SEED = { seed: 20261201, numRuns: 60 };
const length = fc.double({ min: 1, max: 6, noNaN: true });
const spans = fc.array(length, { minLength: 1, maxLength: 4 });
const line = fc.double({ min: 1, max: 150, noNaN: true });

const loadsOf = (permanent: number, variable: number): LoadInput[] => [
  { name: 'earth', nature: 'permanent', kind: 'uniform', value: permanent },
  {
    name: 'surcharge',
    nature: 'variable',
    category: 'surcharge',
    kind: 'uniform',
    value: variable,
  },
];

const by = (loads: LoadInput[], k: number): LoadInput[] =>
  loads.map((load) => ('value' in load ? { ...load, value: Number(load.value) * k } : load));

const utilisations = (answer: CheckAnswer): Record<string, number> =>
  Object.fromEntries(
    answer.verifications.map(({ id, utilisation }) => [id, utilisation ?? Infinity]),
  );

function run(change: Partial<WalerRequest>): CheckAnswer {
  return runWaler(change, 'en-recommended', 'summary');
}

describe('what must always hold for a waler', () => {
  test('scaling all actions up never lowers a utilisation', () => {
    fc.assert(
      fc.property(
        spans,
        line,
        line,
        fc.double({ min: 1, max: 3, noNaN: true }),
        (lengths, g, q, k) => {
          const loads = loadsOf(g, q);
          const before = utilisations(run({ spans: lengths, loads }));
          const after = utilisations(run({ spans: lengths, loads: by(loads, k) }));
          for (const [id, utilisation] of Object.entries(before)) {
            expect(after[id]).toBeGreaterThanOrEqual(utilisation * (1 - 1e-9));
          }
        },
      ),
      SEED,
    );
  });

  test('a mirrored waler has the same utilisations', () => {
    fc.assert(
      fc.property(spans, line, line, (lengths, g, q) => {
        const loads = loadsOf(g, q);
        const one = utilisations(run({ spans: lengths, loads }));
        const mirrored = utilisations(run({ spans: [...lengths].reverse(), loads }));
        for (const [id, utilisation] of Object.entries(one)) {
          expect(Math.abs((mirrored[id] ?? NaN) - utilisation)).toBeLessThan(
            1e-7 * utilisation + 1e-12,
          );
        }
      }),
      SEED,
    );
  });

  test('lengths × k with line loads × k leave shear over k² as it was (forces × k²)', () => {
    fc.assert(
      fc.property(spans, line, fc.double({ min: 0.5, max: 2, noNaN: true }), (lengths, g, k) => {
        const effects = (scale: number) => {
          const answer = run({
            spans: lengths.map((span) => span * scale),
            loads: by(loadsOf(g, g / 3), scale),
            selfWeight: false,
          });
          const moment = verification(answer, 'bending-y').effect.value / scale ** 3;
          return [verification(answer, 'shear-z').effect.value / scale ** 2, moment];
        };
        const [shear, moment] = effects(1);
        const [scaledShear, scaledMoment] = effects(k);
        expect(scaledShear).toBeCloseTo(shear ?? NaN, 6);
        expect(scaledMoment).toBeCloseTo(moment ?? NaN, 6);
      }),
      SEED,
    );
  });

  test('span-by-span loading is never more favourable than all spans at once', () => {
    fc.assert(
      fc.property(spans, line, line, (lengths, g, q) => {
        const loads = loadsOf(g, q);
        const whole = utilisations(run({ spans: lengths, loads, patternLoading: false }));
        const patterned = utilisations(run({ spans: lengths, loads }));
        for (const [id, utilisation] of Object.entries(whole)) {
          expect(patterned[id]).toBeGreaterThanOrEqual(utilisation * (1 - 1e-9));
        }
      }),
      SEED,
    );
  });

  test('no answer that misses something is a pass, and no number is without value', () => {
    fc.assert(
      fc.property(spans, line, line, (lengths, g, q) => {
        const answer = run({
          spans: lengths,
          loads: loadsOf(g, q),
          waive: [],
          restraint: 'at-supports',
        });
        expect(['fail', 'incomplete']).toContain(answer.status);
        expect(JSON.stringify(answer)).not.toMatch(/NaN|Infinity/);
      }),
      SEED,
    );
  });

  test('where props lift, no arrangement of the variable load does more than the check found', () => {
    const oneSpan = (lengths: readonly number[], index: number, value: number): LoadInput => {
      const from = lengths.slice(0, index).reduce((sum, span) => sum + span, 0);
      return {
        name: `span ${index + 1}`,
        nature: 'permanent',
        kind: 'uniform',
        value,
        from,
        to: from + (lengths[index] ?? 0),
      };
    };
    const base = { selfWeight: false, loadBasis: 'design' } as const;
    const momentOf = (answer: CheckAnswer) => verification(answer, 'bending-y').effect.value;
    fc.assert(
      fc.property(fc.array(length, { minLength: 3, maxLength: 5 }), line, (lengths, q) => {
        const loads: LoadInput[] = [
          {
            name: 'surcharge',
            nature: 'variable',
            category: 'surcharge',
            kind: 'uniform',
            value: q,
          },
        ];
        const found = momentOf(run({ ...base, spans: lengths, loads }));
        for (let mask = 1; mask < 2 ** lengths.length; mask += 1) {
          const on = lengths.flatMap((_, index) =>
            (mask & (1 << index)) === 0 ? [] : [oneSpan(lengths, index, q)],
          );
          // Six permanent sources are the most that a request may name; five spans are within it.
          const one = momentOf(run({ ...base, spans: lengths, loads: on }));
          expect(found).toBeGreaterThanOrEqual(one * (1 - 1e-9));
        }
      }),
      { ...SEED, numRuns: 12 },
    );
  });
});
