import { readQuantity } from '../../units/quantity';
import { toUnit, type UnitName } from '../../units/units';
import type { SectionEffects } from '../contract';
import type { CrossEffects } from '../cross-section/effects';
import { isOpen } from '../cross-section/torsion';
import { Refusal } from '../../refusal';
import { refuse } from '../refuse';
import type { SteelSection } from '../steel/section';

/** Effects with their signs: M_y stretches z > 0, M_z y > 0, T turns y towards z. */
export type SignedEffects = CrossEffects;

/** @throws {Refusal} about torsion whose parts are wanting or do not agree */
export function readEffects(given: SectionEffects, section: SteelSection): SignedEffects {
  const read = (field: keyof SectionEffects, unit: UnitName): number => {
    const value = given[field];
    return value === undefined ? 0 : readQuantity(value, unit);
  };
  return {
    compression: read('compression', 'kN'),
    tension: read('tension', 'kN'),
    M_y: read('My', 'kN m'),
    M_z: read('Mz', 'kN m'),
    V_z: read('Vz', 'kN'),
    V_y: read('Vy', 'kN'),
    ...torsionOf(given, section, read),
  };
}

/** What a resistance looks at: sizes. */
export function sizes(effects: SignedEffects): CrossEffects {
  const { compression, tension, M_y, M_z, V_z, V_y, T_t, T_w, B } = effects;
  const size = Math.abs;
  return {
    compression,
    tension,
    M_y: size(M_y),
    M_z: size(M_z),
    V_z: size(V_z),
    V_y: size(V_y),
    T_t: size(T_t),
    T_w: size(T_w),
    B: size(B),
  };
}

type Read = (field: keyof SectionEffects, unit: UnitName) => number;
type Torsion = Pick<SignedEffects, 'T_t' | 'T_w' | 'B'>;

const CLAUSE = 'EN 1993-1-1 6.2.7(2)';

function torsionOf(given: SectionEffects, section: SteelSection, read: Read): Torsion {
  const T = read('T', 'kN m');
  const T_t = read('stVenant', 'kN m');
  const T_w = read('warping', 'kN m');
  const B = read('bimoment', 'kN m^2');
  if (!isOpen(section)) return ofClosed(given, section, { T, T_t, T_w, B });
  if (section.shape.shape === 'angle') return ofAngle(given, section, { T, T_t, T_w, B });
  if (T !== 0 || T_t !== 0 || T_w !== 0) wantParts(given, section);
  if (given.T !== undefined) agree(T, T_t + T_w);
  return { T_t, T_w, B };
}

/** An open section carries torsion two ways, and only the member's analysis tells them apart. */
function wantParts(given: SectionEffects, { name }: SteelSection): void {
  const parts = [
    ['stVenant', 'St Venant part'],
    ['warping', 'warping part'],
    ['bimoment', 'bimoment'],
  ] as const;
  const items = parts
    .filter(([field]) => given[field] === undefined)
    .map(([field, words]) => ({
      pointer: `/effects/${field}`,
      code: 'torsion-parts-wanting',
      message: `${name} is open: give the ${words} of its torsion (${field}), 0 where there is none.`,
      clause: CLAUSE,
    }));
  const [first] = items;
  if (first) throw new Refusal(first.code, first.message, items);
}

/** Rounded parts may miss their sum by this much of it. */
const ROUNDING = 0.005;

function agree(T: number, sum: number): void {
  if (Math.abs(T - sum) <= ROUNDING * Math.max(Math.abs(T), Math.abs(sum))) return;
  const [whole, parts] = [T, sum].map((value) => toUnit(value, 'kN m'));
  refuse('contradiction', '/effects/T', `T is ${whole} kN m, but its parts add to ${parts} kN m.`);
}

interface Parts extends Torsion {
  readonly T: number;
}

/** Warping of closed sections may be left out (6.2.7(7)); solids have none that counts. */
function ofClosed(given: SectionEffects, { name }: SteelSection, parts: Parts): Torsion {
  const { T, T_t, T_w, B } = parts;
  const field = T_w !== 0 ? 'warping' : 'bimoment';
  if (T_w !== 0 || B !== 0) {
    refuse(
      'contradiction',
      `/effects/${field}`,
      `${name} is closed or solid: it carries torsion by St Venant alone.`,
      'EN 1993-1-1 6.2.7(7)',
    );
  }
  if (given.stVenant === undefined) return { T_t: T, T_w: 0, B: 0 };
  if (given.T !== undefined) agree(T, T_t);
  return { T_t, T_w: 0, B: 0 };
}

/** Its legs meet in a line, so that it hardly warps. */
function ofAngle(given: SectionEffects, section: SteelSection, parts: Parts): Torsion {
  const { T, T_t, T_w, B } = parts;
  if (T_w !== 0 || B !== 0) {
    refuse(
      'contradiction',
      `/effects/${T_w !== 0 ? 'warping' : 'bimoment'}`,
      `${section.name} does not warp: its legs meet in one line.`,
      CLAUSE,
    );
  }
  if (T !== 0 && given.stVenant === undefined) {
    refuse(
      'torsion-parts-wanting',
      '/effects/stVenant',
      `${section.name} is open: give its torsion as St Venant's part (stVenant).`,
      CLAUSE,
    );
  }
  if (given.T !== undefined && T !== 0) agree(T, T_t);
  return { T_t, T_w: 0, B: 0 };
}
