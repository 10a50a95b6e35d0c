import type { Sheet } from '../../formula/sheet';
import {
  axialWithShear,
  compressionResistance,
  effectiveCompressionResistance,
  grossTension,
} from '../../steel/axial';
import type { SectionClass } from '../../steel/classification';
import { bendingResistance, bendingWithShear, type Axis } from '../steel/bending';
import { classOf } from '../steel/classes';
import { effectiveInCompression } from '../steel/effective';
import type { SteelSection } from '../steel/section';
import { shearArea } from '../steel/shear';
import type { CrossEffects } from './effects';
import { isRound, reductionByShear } from './shear';

/** Class for bending about an axis, or the worse of both, from the compression alone. */
export function classFor(
  section: SteelSection,
  { compression }: CrossEffects,
  axes: readonly Axis[],
  sheet: Sheet,
): SectionClass {
  if (compression > 0) {
    sheet.given('N_Ed', compression, 'kN', 'Design compression', 'Given by the caller');
  }
  return Math.max(
    ...axes.map((axis) => classOf(section, axis, compression, sheet)),
  ) as SectionClass;
}

/** What uniform compression leaves: N_c_Rd in N and the shift of the centroid in mm. */
export function compressionOf(
  section: SteelSection,
  sheet: Sheet,
): { readonly N_c_Rd: number; readonly e_N_z: number } {
  const { f_y, gamma_M0, properties } = section;
  if (classOf(section, 'compression', 0, sheet) === 4) {
    const { A_eff, e_N_z } = effectiveInCompression(section, sheet);
    return {
      N_c_Rd: sheet.evaluate(effectiveCompressionResistance, { A_eff, f_y, gamma_M0 }),
      e_N_z,
    };
  }
  const { A } = properties;
  return { N_c_Rd: sheet.evaluate(compressionResistance, { A, f_y, gamma_M0 }), e_N_z: 0 };
}

/** The axial resistance that stands in a sum or in n, with what shear takes of it (6.2.10), N. */
export interface AxialResistance {
  readonly N_Rd: number;
  readonly rho_z: number;
  readonly A_v_z: number;
  /** mm; 0 unless class 4 shifts the centroid under compression. */
  readonly e_N_z: number;
}

/** @param plastic whether N_pl_Rd counts, class 1 and 2; else N_c_Rd, which class 4 lowers */
export function axialResistance(
  section: SteelSection,
  effects: CrossEffects,
  plastic: boolean,
  sheet: Sheet,
): AxialResistance {
  const { f_y, gamma_M0, properties } = section;
  const { A } = properties;
  const rho_z = reductionByShear(section, effects, 'z', sheet);
  // Of a round section it is one force, which takes its share of the area once.
  const rho_y = isRound(section) ? 0 : reductionByShear(section, effects, 'y', sheet);
  const sheared = rho_z > 0 || rho_y > 0;
  const A_v_z = sheared ? shearArea(section, 'z', sheet) : 0;
  const A_v_y = sheared ? shearArea(section, 'y', sheet) : 0;
  const whole = sheared
    ? sheet.evaluate(axialWithShear, { A, rho_z, A_v_z, rho_y, A_v_y, f_y, gamma_M0 })
    : sheet.evaluate(grossTension, { A, f_y, gamma_M0 });
  if (effects.compression === 0) return { N_Rd: whole, rho_z, A_v_z, e_N_z: 0 };
  // The gross area may count by class while the plates of a channel shift under compression.
  if (plastic && section.shape.shape !== 'channel') {
    return { N_Rd: whole, rho_z, A_v_z, e_N_z: 0 };
  }
  const { N_c_Rd, e_N_z } = compressionOf(section, sheet);
  if (plastic) return { N_Rd: whole, rho_z, A_v_z, e_N_z };
  return { N_Rd: Math.min(whole, N_c_Rd), rho_z, A_v_z, e_N_z };
}

/** Bending resistance about an axis beside the shear that acts, N mm. */
export function momentResistance(
  section: SteelSection,
  effects: CrossEffects,
  axis: Axis,
  sectionClass: SectionClass,
  sheet: Sheet,
): number {
  const M_c_Rd = bendingResistance(section, axis, sectionClass, sheet);
  const rho_z = reductionByShear(section, effects, 'z', sheet);
  const rho_y = reductionByShear(section, effects, 'y', sheet);
  return bendingWithShear(section, axis, sectionClass, { M_c_Rd, rho_z, rho_y }, sheet);
}

/** Shapes whose plastic interaction 6.2.9.1 gives; the rest take the linear sum. */
const plasticShapes = new Set(['I', 'RHS', 'CHS', 'rectangle']);

export function isPlastic({ shape }: SteelSection, sectionClass: SectionClass): boolean {
  return sectionClass <= 2 && plasticShapes.has(shape.shape);
}
