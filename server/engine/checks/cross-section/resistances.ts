import { silentSheet, type Sheet } from '../../formula/sheet';
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

/** What compression leaves: N_c_Rd in N and the shift of the centroid in mm. */
export interface CompressionResistance {
  readonly N_c_Rd: number;
  readonly e_N_z: number;
}

/**
 * By the class that N_Ed gives: the whole area up to class 3. A web that class 3 takes for bent may
 * be squashed all the same: what uniform compression leaves of class 4 plates is the most that any
 * N_Ed finds.
 */
export function compressionOf(
  section: SteelSection,
  { compression }: CrossEffects,
  sectionClass: SectionClass,
  sheet: Sheet,
): CompressionResistance {
  const { f_y, gamma_M0, properties } = section;
  const whole = (): CompressionResistance => {
    const N_c_Rd = sheet.evaluate(compressionResistance, { A: properties.A, f_y, gamma_M0 });
    return { N_c_Rd, e_N_z: 0 };
  };
  const squashed = (to: Sheet): CompressionResistance => {
    const { A_eff, e_N_z } = effectiveInCompression(section, to);
    const N_c_Rd = to.evaluate(effectiveCompressionResistance, { A_eff, f_y, gamma_M0 });
    return { N_c_Rd, e_N_z };
  };
  if (sectionClass === 4) return squashed(sheet);
  if (classOf(section, 'compression', 0, sheet) < 4) return whole();
  return compression > squashed(silentSheet).N_c_Rd ? squashed(sheet) : whole();
}

/** The axial resistance that stands in a sum or in n, with what shear takes of it (6.2.10), N. */
export interface AxialResistance {
  readonly N_Rd: number;
  readonly rho_z: number;
  readonly A_v_z: number;
  /** mm; 0 unless class 4 shifts the centroid under compression. */
  readonly e_N_z: number;
}

/** Share of the whole below which a difference is rounding. */
const DUST = 1e-12;

export function axialResistance(
  section: SteelSection,
  effects: CrossEffects,
  sectionClass: SectionClass,
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
  const left = sheared
    ? sheet.evaluate(axialWithShear, { A, rho_z, A_v_z, rho_y, A_v_y, f_y, gamma_M0 })
    : sheet.evaluate(grossTension, { A, f_y, gamma_M0 });
  // What subtraction leaves of nothing is nothing.
  const whole = left < (DUST * A * f_y) / gamma_M0 ? 0 : left;
  if (effects.compression === 0 || sectionClass <= 2) {
    return { N_Rd: whole, rho_z, A_v_z, e_N_z: 0 };
  }
  const { N_c_Rd, e_N_z } = compressionOf(section, effects, sectionClass, sheet);
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
