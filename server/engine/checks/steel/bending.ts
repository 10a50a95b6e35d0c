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
  webArea,
  wholeBendingWithShear,
} from '../../steel/bending-shear';
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

/**
 * Bending resistance beside shear, N mm.
 *
 * @param M_c_Rd without shear, N mm
 * @param rho reduction of the yield of the shear area across this axis, 0 to 1
 */
export function bendingWithShear(
  section: SteelSection,
  axis: Axis,
  sectionClass: SectionClass,
  { M_c_Rd, rho }: { readonly M_c_Rd: number; readonly rho: number },
  sheet: Sheet,
): number {
  if (rho === 0) return M_c_Rd;
  const { shape, f_y, gamma_M0, properties } = section;
  const { W_pl_y, W_pl_z, W_el_y, I_y } = properties;
  const flanged = shape.shape === 'I' || shape.shape === 'channel';
  if (flanged && axis === 'y' && sectionClass <= 3) {
    const { h, t_f, t_w } = shape;
    const h_w = sheet.evaluate(webHeight, { h, t_f });
    if (sectionClass === 3 || W_pl_y === undefined) {
      return sheet.evaluate(elasticBendingWithShear, { W_el_y, rho, I_y, h_w, f_y, gamma_M0 });
    }
    const A_w = sheet.evaluate(webArea, { h_w, t_w });
    return sheet.evaluate(plasticBendingWithShear, {
      W_pl_y,
      rho,
      A_w,
      t_w,
      f_y,
      gamma_M0,
      M_c_y_Rd: M_c_Rd,
    });
  }
  const W_pl = axis === 'y' ? W_pl_y : W_pl_z;
  if (shape.shape === 'RHS' && sectionClass <= 2 && W_pl !== undefined) {
    const A_v = shearArea(section, axis === 'y' ? 'z' : 'y', sheet);
    const { t } = shape;
    return sheet.evaluate(hollowBendingWithShear[axis], { W_pl, rho, A_v, t, f_y, gamma_M0 });
  }
  return sheet.evaluate(wholeBendingWithShear[axis], { rho, M_c_Rd });
}
