import type { Sheet } from '../../formula/sheet';
import {
  effectiveBendingY,
  effectiveBendingZ,
  elasticBendingY,
  elasticBendingZ,
  plasticBendingY,
  plasticBendingZ,
} from '../../steel/bending';
import {
  elasticBendingWithShear,
  hollowBendingWithShear,
  plasticBendingWithShear,
  plasticBendingWithShears,
  webArea,
  wholeBendingWithShear,
} from '../../steel/bending-shear';
import type { ShapeOf } from '../../sections/shapes/shape';
import type { SectionClass } from '../../steel/classification';
import { webHeight } from '../../steel/shear';
import { freeModulus } from '../../stress/elastic-stress';
import { effectiveModulus } from './effective';
import type { SteelSection } from './section';
import { shearArea } from './shear';

export type Axis = 'y' | 'z';

/** M_c_y_Rd or M_c_z_Rd in N mm: plastic, elastic or of the effective section by its class. */
export function bendingResistance(
  section: SteelSection,
  axis: Axis,
  sectionClass: SectionClass,
  sheet: Sheet,
): number {
  return axis === 'y'
    ? resistanceY(section, sectionClass, sheet)
    : resistanceZ(section, sectionClass, sheet);
}

function resistanceY(section: SteelSection, sectionClass: SectionClass, sheet: Sheet): number {
  const { f_y, gamma_M0, properties } = section;
  const { W_pl_y } = properties;
  if (sectionClass <= 2 && W_pl_y !== undefined) {
    return sheet.evaluate(plasticBendingY, { W_pl_y, f_y, gamma_M0 });
  }
  if (sectionClass === 4) {
    const W_eff_y = effectiveModulus(section, 'y', sheet);
    return sheet.evaluate(effectiveBendingY, { W_eff_y, f_y, gamma_M0 });
  }
  const W_el_y = elasticModulus(section, 'y', sheet);
  return sheet.evaluate(elasticBendingY, { W_el_y, f_y, gamma_M0 });
}

function resistanceZ(section: SteelSection, sectionClass: SectionClass, sheet: Sheet): number {
  const { f_y, gamma_M0, properties } = section;
  const { W_pl_z } = properties;
  if (sectionClass <= 2 && W_pl_z !== undefined) {
    return sheet.evaluate(plasticBendingZ, { W_pl_z, f_y, gamma_M0 });
  }
  if (sectionClass === 4) {
    const W_eff_z = effectiveModulus(section, 'z', sheet);
    return sheet.evaluate(effectiveBendingZ, { W_eff_z, f_y, gamma_M0 });
  }
  const W_el_z = elasticModulus(section, 'z', sheet);
  return sheet.evaluate(elasticBendingZ, { W_el_z, f_y, gamma_M0 });
}

/** An angle that may bend sideways yields at its toes or heel sooner than I/z says. */
function elasticModulus(section: SteelSection, axis: Axis, sheet: Sheet): number {
  const { shape, properties, gross } = section;
  const given = axis === 'y' ? properties.W_el_y : properties.W_el_z;
  if (shape.shape !== 'angle') return given;
  const free = freeModulus(shape, gross, axis);
  return sheet.given(
    `W_el_${axis}`,
    Math.min(free, given),
    'mm^3',
    'Elastic modulus at the point of greatest stress, free to bend sideways',
    'Unsymmetrical bending about principal axes',
  );
}

/** Reduction of the yield of each shear area, 0 to 1: along z-z and along y-y. */
export interface Reductions {
  readonly rho_z: number;
  readonly rho_y: number;
}

/**
 * Bending resistance beside shear along either axis, N mm: each shear area bends with what yield it
 * has left (6.2.8(3)). Where its share of the modulus is not told apart the whole is reduced.
 *
 * @param M_c_Rd without shear, N mm
 */
export function bendingWithShear(
  section: SteelSection,
  axis: Axis,
  sectionClass: SectionClass,
  { M_c_Rd, rho_z, rho_y }: Reductions & { readonly M_c_Rd: number },
  sheet: Sheet,
): number {
  if (rho_z === 0 && rho_y === 0) return M_c_Rd;
  const { shape } = section;
  if ((shape.shape === 'I' || shape.shape === 'channel') && axis === 'y' && sectionClass <= 3) {
    return flangedWithShear(section, shape, sectionClass, { M_c_Rd, rho_z, rho_y }, sheet);
  }
  const { W_pl_y, W_pl_z } = section.properties;
  const W_pl = axis === 'y' ? W_pl_y : W_pl_z;
  if (shape.shape === 'RHS' && sectionClass <= 2 && W_pl !== undefined) {
    const { f_y, gamma_M0 } = section;
    const along = { z: shearArea(section, 'z', sheet), y: shearArea(section, 'y', sheet) };
    const [A_v, A_f, d] = axis === 'y' ? [along.z, along.y, shape.h] : [along.y, along.z, shape.b];
    const [rho_w, rho_f] = axis === 'y' ? [rho_z, rho_y] : [rho_y, rho_z];
    const { t } = shape;
    const walls = { W_pl, rho_w, A_v, t, rho_f, A_f, d, f_y, gamma_M0 };
    return sheet.evaluate(hollowBendingWithShear[axis], walls);
  }
  // Shear along the web of an I section hardly touches what bends about z-z.
  const rho = shape.shape === 'I' && axis === 'z' ? rho_y : Math.max(rho_z, rho_y);
  return rho === 0 ? M_c_Rd : sheet.evaluate(wholeBendingWithShear[axis], { rho, M_c_Rd });
}

function flangedWithShear(
  section: SteelSection,
  { h, b, t_f, t_w }: ShapeOf<'I'> | ShapeOf<'channel'>,
  sectionClass: SectionClass,
  { M_c_Rd, rho_z, rho_y }: Reductions & { readonly M_c_Rd: number },
  sheet: Sheet,
): number {
  const { f_y, gamma_M0, properties } = section;
  const { W_pl_y, W_el_y, I_y } = properties;
  const h_w = sheet.evaluate(webHeight, { h, t_f });
  if (sectionClass === 3 || W_pl_y === undefined) {
    const values = { W_el_y, rho_z, rho_y, I_y, h_w, f_y, gamma_M0 };
    return sheet.evaluate(elasticBendingWithShear, values);
  }
  if (rho_y > 0) {
    const values = { W_pl_y, rho_z, h_w, t_w, rho_y, b, t_f, h, f_y, gamma_M0 };
    return sheet.evaluate(plasticBendingWithShears, values);
  }
  const A_w = sheet.evaluate(webArea, { h_w, t_w });
  const values = { W_pl_y, rho: rho_z, A_w, t_w, f_y, gamma_M0, M_c_y_Rd: M_c_Rd };
  return sheet.evaluate(plasticBendingWithShear, values);
}
