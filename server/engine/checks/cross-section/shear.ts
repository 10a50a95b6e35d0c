import { silentSheet, type Sheet } from '../../formula/sheet';
import { shearReduction } from '../../steel/bending-shear';
import { webBucklingResistance, webBucklingWithTorsion } from '../../steel/shear-buckling';
import { shearWithTorsion, torsionReduction } from '../../steel/torsion';
import type { SteelSection } from '../steel/section';
import { shearResistance, websOf, type Direction } from '../steel/shear';
import type { CrossEffects } from './effects';
import { stVenantResistance, stVenantStress, warpingShearStress } from './torsion';
import { webFactor } from './web-buckling';

/** Whether any axis is as good as any other. */
export function isRound({ shape }: SteelSection): boolean {
  return shape.shape === 'CHS' || shape.shape === 'round';
}

/** The shear force along an axis; of a round section the resultant, whichever axis is asked for. */
export function shearAlong(
  section: SteelSection,
  { V_z, V_y }: CrossEffects,
  direction: Direction,
): number {
  if (isRound(section)) return Math.hypot(V_z, V_y);
  return direction === 'z' ? V_z : V_y;
}

/** V_pl_Rd less what torsion takes first (6.2.7(9)), N. */
export function shearLeftByTorsion(
  section: SteelSection,
  effects: CrossEffects,
  direction: Direction,
  sheet: Sheet,
): number {
  const V_pl_Rd = shearResistance(section, direction, sheet);
  if (effects.T_t === 0 && effects.T_w === 0) return V_pl_Rd;
  const { shape, f_y, gamma_M0 } = section;
  const tau_t_Ed = stVenantStress(section, effects, sheet);
  const formulas = shearWithTorsion[direction];
  const values = { V_pl_Rd, tau_t_Ed, f_y, gamma_M0 };
  if (shape.shape === 'I' && direction === 'z') return sheet.evaluate(formulas.flanged, values);
  if (shape.shape === 'I' || shape.shape === 'channel') {
    const tau_w_Ed = warpingShearStress(section, effects, sheet);
    return sheet.evaluate(formulas.warped, { ...values, tau_w_Ed });
  }
  return sheet.evaluate(formulas.hollow, values);
}

/**
 * V_bw_Rd in N, less what torsion takes of the same webs; undefined where no web is so slender that it
 * buckles in shear.
 */
export function webBuckling(
  section: SteelSection,
  effects: CrossEffects,
  direction: Direction,
  sheet: Sheet,
): number | undefined {
  const webs = websOf(section, direction, sheet);
  const chi_w = webFactor(section, direction, sheet);
  if (!webs || chi_w === undefined) return undefined;
  const { f_y } = section;
  const { h_w, t_w, n_w } = webs;
  const { value, clause } = section.factor('gamma_M1');
  const gamma_M1 = sheet.given('gamma_M1', value, '1', 'Partial factor of instability', clause);
  const values = { chi_w, n_w, h_w, t_w, f_y, gamma_M1 };
  if (effects.T_t === 0) return sheet.evaluate(webBucklingResistance, values);
  const tau_t_Ed = stVenantStress(section, effects, sheet);
  return sheet.evaluate(webBucklingWithTorsion, { ...values, tau_t_Ed });
}

/**
 * Reduction of the yield of the shear area along an axis, 0 up to half of what shear may be: of
 * yield, of what torsion leaves, or of a web that buckles (6.2.8(3), (4)); or by torsion itself.
 */
export function reductionByShear(
  section: SteelSection,
  effects: CrossEffects,
  direction: Direction,
  sheet: Sheet,
): number {
  const byForce = reductionByForce(section, effects, direction, sheet);
  const byTorsion = reductionByTorsion(section, effects, sheet);
  return Math.max(byForce, byTorsion);
}

function reductionByTorsion(
  section: SteelSection,
  { T_t: T_t_Ed }: CrossEffects,
  sheet: Sheet,
): number {
  if (T_t_Ed === 0) return 0;
  const T_t_Rd = stVenantResistance(section, silentSheet);
  if (T_t_Ed <= 0.5 * T_t_Rd) return 0;
  stVenantResistance(section, sheet);
  return sheet.evaluate(torsionReduction, { T_t_Ed, T_t_Rd });
}

function reductionByForce(
  section: SteelSection,
  effects: CrossEffects,
  direction: Direction,
  sheet: Sheet,
): number {
  const V_Ed = shearAlong(section, effects, direction);
  if (V_Ed === 0) return 0;
  const V_Rd = shearLimit(section, effects, direction, sheet);
  if (V_Ed <= 0.5 * V_Rd) return 0;
  sheet.given(`V_${direction}_Ed`, V_Ed, 'kN', 'Design shear force', 'Given by the caller');
  if (V_Rd === 0) {
    return sheet.given('rho', 1, '1', 'Torsion leaves nothing to shear', 'EN 1993-1-1 6.2.7(9)');
  }
  return sheet.evaluate(shearReduction, { V_Ed, V_Rd });
}

function shearLimit(
  section: SteelSection,
  effects: CrossEffects,
  direction: Direction,
  sheet: Sheet,
): number {
  const left = shearLeftByTorsion(section, effects, direction, sheet);
  const buckling = webBuckling(section, effects, direction, sheet);
  if (buckling === undefined || buckling >= left) return left;
  return sheet.given(
    'V_Rd',
    buckling,
    'kN',
    'The web buckles first: its resistance stands in place of yield',
    'EN 1993-1-1 6.2.8(2)',
  );
}
