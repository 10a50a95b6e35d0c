import type { Sheet } from '../../formula/sheet';
import {
  elasticBendingY,
  elasticBendingZ,
  plasticBendingY,
  plasticBendingZ,
} from '../../steel/bending';
import {
  elasticBendingWithShear,
  plasticBendingWithShear,
  shearReduction,
  webArea,
} from '../../steel/bending-shear';
import { epsilonFactor } from '../../steel/classification';
import {
  shearAreaY,
  shearAreaZ,
  shearBucklingRatio,
  shearResistanceY,
  shearResistanceZ,
  webHeight,
} from '../../steel/shear';
import { refuse } from '../refuse';
import type { SteelISection } from './section';

/** N mm. */
export function bendingResistanceY(section: SteelISection, sheet: Sheet): number {
  const { f_y, gamma_M0, sectionClass } = section;
  const { W_pl_y, W_el_y } = section.properties;
  return sectionClass <= 2
    ? sheet.evaluate(plasticBendingY, { W_pl_y, f_y, gamma_M0 })
    : sheet.evaluate(elasticBendingY, { W_el_y, f_y, gamma_M0 });
}

/** N mm. */
export function bendingResistanceZ(section: SteelISection, sheet: Sheet): number {
  const { f_y, gamma_M0, sectionClass } = section;
  const { W_pl_z, W_el_z } = section.properties;
  return sectionClass <= 2
    ? sheet.evaluate(plasticBendingZ, { W_pl_z, f_y, gamma_M0 })
    : sheet.evaluate(elasticBendingZ, { W_el_z, f_y, gamma_M0 });
}

/** N, along the web. */
export function shearResistanceAlongWeb(section: SteelISection, sheet: Sheet): number {
  const { f_y, gamma_M0 } = section;
  return sheet.evaluate(shearResistanceZ, { A_v_z: areaAlongWeb(section, sheet), f_y, gamma_M0 });
}

function areaAlongWeb(section: SteelISection, sheet: Sheet): number {
  const { shape, eta, properties, shearAreas } = section;
  if (shearAreas.z !== undefined) {
    return sheet.given('A_v_z', shearAreas.z, 'mm^2', 'Shear area', 'Given by the caller');
  }
  const { h, b, t_f, t_w, r } = shape;
  const h_w = sheet.evaluate(webHeight, { h, t_f });
  return sheet.evaluate(shearAreaZ, { A: properties.A, b, t_f, t_w, r, eta, h_w });
}

/** N, along the flanges. */
export function shearResistanceAlongFlanges(section: SteelISection, sheet: Sheet): number {
  const { shape, f_y, gamma_M0, shearAreas } = section;
  const A_v_y =
    shearAreas.y === undefined
      ? sheet.evaluate(shearAreaY, { b: shape.b, t_f: shape.t_f })
      : sheet.given('A_v_y', shearAreas.y, 'mm^2', 'Shear area', 'Given by the caller');
  return sheet.evaluate(shearResistanceY, { A_v_y, f_y, gamma_M0 });
}

/**
 * Bending resistance about y-y beside a shear force along the web, N mm.
 *
 * @param V_z_Ed N; up to half of the shear resistance nothing is reduced (6.2.8(2))
 */
export function bendingResistanceWithShear(
  section: SteelISection,
  V_z_Ed: number,
  sheet: Sheet,
): number {
  const V_pl_z_Rd = shearResistanceAlongWeb(section, sheet);
  const M_c_y_Rd = bendingResistanceY(section, sheet);
  if (V_z_Ed <= 0.5 * V_pl_z_Rd) return M_c_y_Rd;
  const { shape, f_y, gamma_M0, properties, sectionClass } = section;
  const { h, t_f, t_w } = shape;
  const rho = sheet.evaluate(shearReduction, { V_z_Ed, V_pl_z_Rd });
  const h_w = sheet.evaluate(webHeight, { h, t_f });
  if (sectionClass > 2) {
    const { W_el_y, I_y } = properties;
    return sheet.evaluate(elasticBendingWithShear, { W_el_y, rho, I_y, h_w, f_y, gamma_M0 });
  }
  const A_w = sheet.evaluate(webArea, { h_w, t_w });
  const { W_pl_y } = properties;
  return sheet.evaluate(plasticBendingWithShear, {
    W_pl_y,
    rho,
    A_w,
    t_w,
    f_y,
    gamma_M0,
    M_c_y_Rd,
  });
}

/** @throws {Refusal} `shear-buckling` where the web is too slender for 6.2.6 alone. */
export function refuseSlenderWeb(section: SteelISection, sheet: Sheet): void {
  const { shape, eta, f_y } = section;
  const h_w = sheet.evaluate(webHeight, { h: shape.h, t_f: shape.t_f });
  const epsilon = sheet.evaluate(epsilonFactor, { f_y });
  const ratio = sheet.evaluate(shearBucklingRatio, { h_w, t_w: shape.t_w, epsilon, eta });
  if (ratio <= 1) return;
  refuse(
    'shear-buckling',
    '/section',
    `The web of ${section.name} is ${ratio.toFixed(2)} times as slender as 6.2.6(6) allows without a verification of shear buckling, which this version of the check does not make.`,
    'EN 1993-1-5 5',
  );
}
