import type { Sheet } from '../../formula/sheet';
import { HIGHEST_STRENGTH, STEEL_E, STEEL_G, steelStrength } from '../../materials/steel';
import type { ProfileReader } from '../../profiles/reader';
import type { SectionShape } from '../../sections/shapes/shape';
import { readQuantity } from '../../units/quantity';
import type { MaterialInput, SectionRequest } from '../contract';
import { notCovered, refuse } from '../refuse';

/** Steel of one section, N/mm². */
export interface SteelStrength {
  readonly f_y: number;
  /** Records f_u as read, so that only a check that uses it depends on it. */
  readonly useUltimate: (sheet: Sheet) => number | undefined;
  readonly E: number;
  readonly G: number;
}

type AnyMaterial = MaterialInput | SectionRequest['material'];

/** @param thickness nominal thickness of the thickest part in mm; undefined where there is no section */
export function readSteel(
  material: AnyMaterial,
  thickness: number | undefined,
  profile: ProfileReader,
  sheet: Sheet,
): SteelStrength {
  if (material.type !== 'steel') return notCovered('/material/type', 'Timber', 'EN 1995-1-1 6.1');
  const E = material.E === undefined ? STEEL_E : readQuantity(material.E, 'N/mm^2');
  const G = material.G === undefined ? STEEL_G : readQuantity(material.G, 'N/mm^2');
  if ('fy' in material) return { ...ofCaller(material, sheet), E, G };
  const t = thickness ?? 0;
  const strength = steelStrength(material.grade, t, profile);
  const title = thickness === undefined ? 'Yield strength' : `Yield strength at ${t} mm`;
  return {
    f_y: sheet.given('f_y', strength.f_y, 'N/mm^2', title, strength.clause),
    useUltimate: (other) => {
      const ultimate = strength.ultimate();
      if (!ultimate) return undefined;
      const title = `Ultimate strength at ${t} mm`;
      return other.given('f_u', ultimate.f_u, 'N/mm^2', title, ultimate.clause);
    },
    E,
    G,
  };
}

function ofCaller(
  material: Extract<AnyMaterial, { fy: unknown }>,
  sheet: Sheet,
): Pick<SteelStrength, 'f_y' | 'useUltimate'> {
  const f_y = readQuantity(material.fy, 'N/mm^2');
  if (f_y > HIGHEST_STRENGTH) {
    notCovered('/material/fy', `Steel above ${HIGHEST_STRENGTH} N/mm²`, 'EN 1993-1-12');
  }
  const f_u = material.fu === undefined ? undefined : readQuantity(material.fu, 'N/mm^2');
  if (f_u !== undefined && f_u < f_y) refuse('contradiction', '/material/fu', 'fu is below fy.');
  return {
    f_y: sheet.given('f_y', f_y, 'N/mm^2', 'Yield strength', 'Given by the caller'),
    useUltimate: (other) =>
      f_u === undefined
        ? undefined
        : other.given('f_u', f_u, 'N/mm^2', 'Ultimate strength', 'Given by the caller'),
  };
}

/** The thickest part, which sets the strength of the whole. */
export function thickestPart(shape: SectionShape): number {
  switch (shape.shape) {
    case 'I':
    case 'channel':
      return Math.max(shape.t_f, shape.t_w);
    case 'RHS':
    case 'CHS':
    case 'angle':
      return shape.t;
    case 'rectangle':
      return Math.min(shape.b, shape.h);
    case 'round':
      return shape.d;
  }
}
