import fc from 'fast-check';
import { publishedRevision } from '../../testing/profiles';
import { loaded, requestOf } from '../../testing/sections';
import type { CheckAnswer, StressRequest } from '../contract';
import { stress } from './stress';

function check(request: Omit<StressRequest, 'profile' | 'material'>, fy = 275): CheckAnswer {
  return stress.run(
    { material: { type: 'steel', fy }, ...request },
    { profile: publishedRevision('en-recommended'), detail: 'full' },
  );
}

const pointOf = (answer: CheckAnswer, id: string) => {
  const found = answer.points?.find((one) => one.id === id);
  if (!found) throw new Error(`${id} is not among ${answer.points?.map((one) => one.id).join()}`);
  return found;
};

describe('states of stress', () => {
  test('the worst state governs and is named', () => {
    const answer = check({
      states: [{ sigmaX: 100 }, { sigmaX: 80, sigmaZ: -40, tau: 25 }, { tau: 20 }],
    });
    expect(answer.verifications[0]).toMatchObject({ id: 'von-mises', point: 'state-2' });
    expect(answer.utilisation).toBeCloseTo(114.3 / 275, 3);
  });

  test('equal stresses all round yield at f_y, opposite ones sooner', () => {
    expect(check({ states: [{ sigmaX: 275, sigmaZ: 275 }] }).utilisation).toBeCloseTo(1, 12);
    expect(check({ states: [{ sigmaX: 275, sigmaZ: -275 }] }).utilisation).toBeCloseTo(
      Math.sqrt(3),
      12,
    );
  });
});

describe('named points of a section', () => {
  test('a positive M_y stretches the bottom flange, a positive M_z the right side', () => {
    const bent = check({ section: 'UB 457x191x67', effects: { My: 100, Mz: 10 } });
    expect(pointOf(bent, 'flange-tip-bottom-right').sigma).toBeGreaterThan(0);
    expect(pointOf(bent, 'flange-tip-top-left').sigma).toBeLessThan(0);
    expect(pointOf(bent, 'flange-centre-bottom').sigma).toBeCloseTo(100e6 / 1296e3, 0);
  });

  test('shear in the middle of a web is V S / (I t)', () => {
    const sheared = check({ section: 'HE 300 B', effects: { Vz: 300 } });
    const S = 934.5e3;
    expect(pointOf(sheared, 'web-centre').tau).toBeCloseTo((300e3 * S) / (25165e4 * 11), 0);
    expect(pointOf(sheared, 'flange-tip-top-left').tau).toBe(0);
  });

  test('torsion and shear of a box add on one side and take off on the other', () => {
    const twisted = check({ section: 'RHS 200x100x8', effects: { Vz: 200, T: 10 } });
    const right = pointOf(twisted, 'mid-wall-right').tau;
    const left = pointOf(twisted, 'mid-wall-left').tau;
    const torsion = (right + left) / 2;
    expect(right - torsion).toBeCloseTo(torsion - left, 9);
    expect(Math.abs(right)).toBeGreaterThan(Math.abs(left));
  });

  test('an angle that may bend sideways is stressed more than I/z says', () => {
    const L = { shape: 'angle', h: 100, b: 100, t: 12, r1: 12, r2: 6 } as const;
    const bent = check({ section: L, effects: { My: 2 } });
    const W = bent.values.I_y?.value ?? NaN;
    const heelToToe = 100 - 29;
    expect(Math.abs(pointOf(bent, 'toe-vertical').sigma)).toBeGreaterThan((2e6 * heelToToe) / W);
  });

  test('moment and force along the member come back from the stress in its walls', () => {
    const { walls = [] } = check({ section: 'CHS 219.1x10', effects: { My: 40, tension: 100 } });
    const [wall] = walls;
    const points = wall?.points.slice(1) ?? [];
    const dA = (Math.PI * 209.1 * 10) / points.length;
    const N = points.reduce((sum, { sigma }) => sum + sigma * dA, 0);
    const M = points.reduce((sum, { sigma, z }) => sum + sigma * z * dA, 0);
    expect(N / 1e3).toBeCloseTo(100, 6);
    expect(M / 1e6 / 40).toBeCloseTo(1, 2);
  });

  test('of a class 4 section stress alone is no pass', () => {
    const thin = { shape: 'RHS', h: 300, b: 200, t: 3, forming: 'hot-finished' } as const;
    const answer = check({ section: thin, effects: { compression: 10 } }, 355);
    expect([answer.status, answer.missing[0]?.verification]).toEqual(['incomplete', 'von-mises']);
  });

  test('mirrored effects give mirrored stresses', () => {
    const mirror: Readonly<Record<string, string>> = { top: 'bottom', bottom: 'top' };
    fc.assert(
      fc.property(loaded, (one) => {
        const { section, effects } = requestOf(one);
        if (typeof section === 'object' && 'shape' in section && section.shape === 'angle') return;
        const { My = 0, Vy = 0 } = effects;
        const down = check({ section, effects }, one.fy);
        const up = check(
          { section, effects: { ...effects, My: -Number(My), Vy: -Number(Vy) } },
          one.fy,
        );
        for (const point of down.points ?? []) {
          const id = point.id.replace(/top|bottom/, (side) => mirror[side] ?? side);
          const other = pointOf(up, id);
          expect(other.sigma).toBeCloseTo(point.sigma, 6);
          expect(Math.abs(other.tau)).toBeCloseTo(Math.abs(point.tau), 6);
        }
      }),
      { seed: 20261201, numRuns: 200 },
    );
  });
});
