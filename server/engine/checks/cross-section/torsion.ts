import { silentSheet, type Sheet } from '../../formula/sheet';
import {
  bimomentResistance,
  effectiveBimomentResistance,
  openTorsionModulus,
  sectorialMomentOfChannel,
  sectorialOfChannel,
  sectorialOfI,
  torsionBucklingResistance,
  torsionResistance,
  torsionStress,
  warpingShear,
  warpingShearOfI,
} from '../../steel/torsion';
import { classOf } from '../steel/classes';
import { effectiveModulus } from '../steel/effective';
import type { SteelSection } from '../steel/section';
import { webFactor } from './web-buckling';
import type { CrossEffects } from './effects';

const closedOrSolid = new Set(['RHS', 'CHS', 'rectangle', 'round']);

/** Whether torsion makes it warp, so that its parts must be told apart. */
export function isOpen({ shape }: SteelSection): boolean {
  return !closedOrSolid.has(shape.shape);
}

/** mm³: greatest St Venant shear stress is T_t over it. */
export function torsionModulus(section: SteelSection, sheet: Sheet): number {
  const { gross, properties, shape } = section;
  if (gross.W_t !== undefined) {
    const W_t = gross.W_t * Math.min(properties.I_t / gross.I_t, 1);
    return sheet.given('W_t', W_t, 'mm^3', 'Torsion modulus', 'By the dimensions');
  }
  if (!('t_f' in shape) && !('t' in shape)) throw new Error(`${shape.shape} has no open walls`);
  const t_max = 't_f' in shape ? Math.max(shape.t_f, shape.t_w) : shape.t;
  return sheet.evaluate(openTorsionModulus, { I_t: properties.I_t, t_max });
}

/** N/mm², 0 where no torsion acts. */
export function stVenantStress(section: SteelSection, { T_t }: CrossEffects, sheet: Sheet): number {
  if (T_t === 0) return 0;
  sheet.given('T_t_Ed', T_t, 'kN m', 'Design torsion, St Venant part', 'Given by the caller');
  const W_t = torsionModulus(section, sheet);
  return sheet.evaluate(torsionStress, { T_t_Ed: T_t, W_t });
}

/** N mm; less where the walls of a hollow section are so slender that shear buckles them. */
export function stVenantResistance(section: SteelSection, sheet: Sheet): number {
  const { f_y, gamma_M0, shape } = section;
  const W_t = torsionModulus(section, sheet);
  if (shape.shape !== 'RHS') return sheet.evaluate(torsionResistance, { W_t, f_y, gamma_M0 });
  const factors = (['z', 'y'] as const).map((direction) => ({
    direction,
    chi_w: webFactor(section, direction, silentSheet) ?? Infinity,
  }));
  const [least] = factors.sort((a, b) => a.chi_w - b.chi_w);
  if (!least || least.chi_w === Infinity) {
    return sheet.evaluate(torsionResistance, { W_t, f_y, gamma_M0 });
  }
  const chi_w = webFactor(section, least.direction, sheet) ?? least.chi_w;
  const { value, clause } = section.factor('gamma_M1');
  const gamma_M1 = sheet.given('gamma_M1', value, '1', 'Partial factor of instability', clause);
  const values = { W_t, f_y, gamma_M0, chi_w, gamma_M1 };
  return sheet.evaluate(torsionBucklingResistance, values);
}

/** Greatest shear stress from warping torsion in N/mm², in the flanges. */
export function warpingShearStress(
  section: SteelSection,
  { T_w }: CrossEffects,
  sheet: Sheet,
): number {
  if (T_w === 0) return 0;
  const { shape, gross, properties } = section;
  const T_w_Ed = sheet.given(
    'T_w_Ed',
    T_w,
    'kN m',
    'Design torsion, warping part',
    'Given by the caller',
  );
  if (shape.shape === 'I') {
    const { h, t_f, b } = shape;
    return sheet.evaluate(warpingShearOfI, { T_w_Ed, h, t_f, b });
  }
  if (shape.shape !== 'channel') throw new Error(`${shape.shape} does not warp`);
  const { h, b, t_w, t_f } = shape;
  const { e_0 = 0 } = gross;
  const S_omega_t = sheet.evaluate(sectorialMomentOfChannel, { h, t_f, b, t_w, e_0 });
  return sheet.evaluate(warpingShear, { T_w_Ed, S_omega_t, I_w: properties.I_w ?? 0 });
}

/** N mm²: the bimoment that makes the point of greatest warping yield. */
export function bimomentLimit(section: SteelSection, sheet: Sheet): number {
  const { shape, gross, properties, f_y, gamma_M0 } = section;
  const { I_w = 0 } = properties;
  if (shape.shape !== 'I' && shape.shape !== 'channel') {
    throw new Error(`${shape.shape} does not warp`);
  }
  const { h, b, t_w, t_f } = shape;
  const omega_max =
    shape.shape === 'I'
      ? sheet.evaluate(sectorialOfI, { b, h, t_f })
      : sheet.evaluate(sectorialOfChannel, { h, t_f, b, t_w, e_0: gross.e_0 ?? 0 });
  if (classOf(section, 'z', 0, silentSheet) < 4) {
    return sheet.evaluate(bimomentResistance, { I_w, omega_max, f_y, gamma_M0 });
  }
  const W_eff_z = effectiveModulus(section, 'z', sheet);
  const { W_el_z } = gross;
  const values = { I_w, omega_max, f_y, gamma_M0, W_eff_z, W_el_z };
  return sheet.evaluate(effectiveBimomentResistance, values);
}
