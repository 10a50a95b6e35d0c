import fc from 'fast-check';
import { Refusal } from '../../refusal';
import { loaded, requestOf, runSection, utilisations, type Loaded } from '../../testing/sections';
import type { CheckAnswer, SectionEffects } from '../contract';

const SEED = { seed: 19930301, numRuns: 400 };
const factor = fc.double({ min: 1, max: 2, noNaN: true });

/** Undefined where the section is refused, as a tube of class 4 is. */
function answered(one: Loaded): CheckAnswer | undefined {
  try {
    return runSection(requestOf(one));
  } catch (error) {
    if (error instanceof Refusal && error.code === 'class-4') return undefined;
    throw error;
  }
}

const most = (of: Record<string, number>): number => Math.max(0, ...Object.values(of));

/** Every effect by its own factor. */
function scaled(effects: SectionEffects, by: (name: string) => number): SectionEffects {
  return Object.fromEntries(
    Object.entries(effects).map(([name, value]) => [name, Number(value) * by(name)]),
  );
}

function same(one: CheckAnswer, other: CheckAnswer, tolerance = 1e-9): void {
  const [a, b] = [utilisations(one), utilisations(other)];
  expect(Object.keys(b)).toEqual(Object.keys(a));
  for (const [id, utilisation] of Object.entries(a)) {
    if (utilisation === Infinity) expect(b[id]).toBe(Infinity);
    else
      expect(Math.abs((b[id] ?? NaN) - utilisation)).toBeLessThanOrEqual(tolerance * utilisation);
  }
}

describe('what must always hold for a cross-section', () => {
  test('multiplying all effects by k > 1 never lowers a utilisation', () => {
    fc.assert(
      fc.property(loaded, factor, (one, k) => {
        const before = answered(one);
        const after = answered({ ...one, effects: scaled(one.effects, () => k) });
        if (!before || !after) return;
        const [less, more] = [utilisations(before), utilisations(after)];
        for (const [id, utilisation] of Object.entries(less)) {
          // The exponents of (6.41) grow with n, so that its sum of small ratios may shrink.
          if (id === 'biaxial') continue;
          expect([id, (more[id] ?? NaN) >= utilisation * (1 - 1e-9)]).toEqual([id, true]);
        }
        expect(most(more)).toBeGreaterThanOrEqual(most(less) * (1 - 1e-9));
      }),
      SEED,
    );
  });

  test('all lengths by k with forces by k² leave every utilisation as it is', () => {
    const power: Readonly<Record<string, number>> = { My: 3, Mz: 3, T: 3 };
    fc.assert(
      fc.property(loaded, factor, (one, k) => {
        const before = answered(one);
        const { section, ...rest } = one;
        const larger = Object.fromEntries(
          Object.entries(section).map(([name, value]) => [
            name,
            typeof value === 'number' ? value * k : value,
          ]),
        ) as unknown as Loaded['section'];
        const effects = scaled(one.effects, (name) => k ** (power[name] ?? 2));
        // Corner radii of cold-formed walls step with their thickness in mm.
        if ('forming' in section && section.forming === 'cold-formed') return;
        const after = answered({ ...rest, section: larger, effects });
        expect(after === undefined).toBe(before === undefined);
        if (before && after) same(before, after);
      }),
      SEED,
    );
  });

  test('effects the other way round are as much', () => {
    fc.assert(
      fc.property(loaded, (one) => {
        const before = answered(one);
        const turned = scaled(one.effects, (name) => (/^[MVT]/.test(name) ? -1 : 1));
        const after = answered({ ...one, effects: turned });
        if (before && after) same(before, after);
      }),
      SEED,
    );
  });

  test('a section on its side carries about z-z what it carried about y-y', () => {
    const side = (id: string): string => id.replace(/[yz]$/, (axis) => (axis === 'y' ? 'z' : 'y'));
    fc.assert(
      fc.property(loaded, (one) => {
        const { section } = one;
        if (!['RHS', 'rectangle', 'angle'].includes(section.shape)) return;
        if (!('b' in section)) return;
        const turned = { ...section, h: section.b, b: section.h } as Loaded['section'];
        const { My = 0, Mz = 0, Vy = 0, Vz = 0, ...axial } = one.effects;
        const effects = { ...axial, My: Mz, Mz: My, Vy: Vz, Vz: Vy };
        const before = answered(one);
        const after = answered({ ...one, section: turned, effects });
        expect(after === undefined).toBe(before === undefined);
        if (!before || !after) return;
        const [upright, lying] = [utilisations(before), utilisations(after)];
        for (const [id, utilisation] of Object.entries(upright)) {
          // 7.1 of EN 1993-1-5 is of webs along z-z; along y-y 6.2.8 stands for it.
          if (section.shape === 'RHS' && id.startsWith('bending-shear')) continue;
          // N beside shear alone stands under one name, whichever way the section lies.
          const other = lying[side(id)] ?? lying[id] ?? NaN;
          if (utilisation === Infinity) expect(other).toBe(Infinity);
          else expect(Math.abs(other - utilisation)).toBeLessThanOrEqual(1e-9 * utilisation);
        }
      }),
      SEED,
    );
  });

  test('inches, kips and feet give the same answer', () => {
    const INCH = 25.4;
    const KIP = 4.4482216152605;
    const units: Readonly<Record<string, readonly [number, string]>> = {
      My: [KIP * 0.3048, 'kip ft'],
      Mz: [KIP * 0.3048, 'kip ft'],
      T: [KIP * 0.3048, 'kip ft'],
      Vz: [KIP, 'kip'],
      Vy: [KIP, 'kip'],
      compression: [KIP, 'kip'],
      tension: [KIP, 'kip'],
    };
    fc.assert(
      fc.property(loaded, (one) => {
        if ('forming' in one.section && one.section.forming === 'cold-formed') return;
        const before = answered(one);
        const section = Object.fromEntries(
          Object.entries(one.section).map(([name, value]) => [
            name,
            typeof value === 'number' ? `${value / INCH} in` : value,
          ]),
        ) as unknown as Loaded['section'];
        const effects = Object.fromEntries(
          Object.entries(one.effects).map(([name, value]) => {
            const [size, unit] = units[name] ?? [1, ''];
            return [name, `${Number(value) / size} ${unit}`];
          }),
        );
        const after = answered({ ...one, section, effects });
        if (before && after) same(before, after);
      }),
      { ...SEED, numRuns: 200 },
    );
  });

  test('no number of an answer is anything but a number', () => {
    fc.assert(
      fc.property(loaded, (one) => {
        const answer = answered(one);
        if (!answer) return;
        expect(
          JSON.stringify(answer, (_, value: unknown) =>
            typeof value === 'number' && !Number.isFinite(value) ? 'no number' : value,
          ),
        ).not.toContain('no number');
      }),
      SEED,
    );
  });
});
