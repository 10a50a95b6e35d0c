import { silentSheet } from '../../formula/sheet';
import {
  compressionCriterion,
  grossTension,
  lesserTension,
  netTension,
  tensionCriterion,
} from '../../steel/axial';
import { bendingYCriterion, bendingZCriterion } from '../../steel/bending';
import { shearYCriterion, shearZCriterion } from '../../steel/shear';
import { webBucklingCriterion } from '../../steel/shear-buckling';
import {
  mixedTorsionCriterion,
  shearTorsionCriterion,
  torsionCriterion,
} from '../../steel/torsion';
import { bendingResistance, type Axis } from '../steel/bending';
import { shearResistance, type Direction } from '../steel/shear';
import type { SteelSection } from '../steel/section';
import type { Finding } from '../verification';
import type { CrossEffects } from './effects';
import { finding, side } from './finding';
import { classFor, compressionOf } from './resistances';
import { shearAlong, shearLeftByTorsion, webBuckling } from './shear';
import { stVenantResistance, warpingShearStress } from './torsion';

const GIVEN = 'Given by the caller';

/** @param netArea mm² at holes for fasteners; undefined where there are none, or no f_u for them */
export function tension(
  section: SteelSection,
  { tension: N }: CrossEffects,
  netArea: number | undefined,
  withSteps: boolean,
): Finding {
  return finding('tension', tensionCriterion, withSteps, (sheet) => {
    const N_Ed = sheet.given('N_Ed', N, 'kN', 'Design tension', GIVEN);
    const { f_y, gamma_M0, properties } = section;
    const N_pl_Rd = sheet.evaluate(grossTension, { A: properties.A, f_y, gamma_M0 });
    const N_u_Rd = netArea === undefined ? undefined : netResistance(section, netArea, sheet);
    const N_t_Rd =
      N_u_Rd === undefined
        ? sheet.given(
            'N_t_Rd',
            N_pl_Rd,
            'kN',
            'Tension resistance, no holes',
            'EN 1993-1-1 6.2.3(2)',
          )
        : sheet.evaluate(lesserTension, { N_pl_Rd, N_u_Rd });
    sheet.evaluate(tensionCriterion, { N_Ed, N_t_Rd });
    return { effect: side('N_Ed', N_Ed, 'kN'), resistance: side('N_t_Rd', N_t_Rd, 'kN') };
  });
}

function netResistance(
  section: SteelSection,
  netArea: number,
  sheet: Parameters<SteelSection['useUltimate']>[0],
): number | undefined {
  const f_u = section.useUltimate(sheet);
  if (f_u === undefined) return undefined;
  const { value, clause } = section.factor('gamma_M2');
  const gamma_M2 = sheet.given('gamma_M2', value, '1', 'Partial factor of net sections', clause);
  const A_net = sheet.given('A_net', netArea, 'mm^2', 'Net area at holes', GIVEN);
  return sheet.evaluate(netTension, { A_net, f_u, gamma_M2 });
}

export function compression(
  section: SteelSection,
  effects: CrossEffects,
  withSteps: boolean,
): Finding {
  return finding('compression', compressionCriterion, withSteps, (sheet) => {
    const N_Ed = effects.compression;
    // Whatever bends it, so that more moment never makes the class lower.
    const sectionClass = classFor(section, effects, ['y', 'z'], sheet);
    const { N_c_Rd } = compressionOf(section, effects, sectionClass, sheet);
    sheet.evaluate(compressionCriterion, { N_Ed, N_c_Rd });
    return { effect: side('N_Ed', N_Ed, 'kN'), resistance: side('N_c_Rd', N_c_Rd, 'kN') };
  });
}

export function bending(
  section: SteelSection,
  effects: CrossEffects,
  axis: Axis,
  withSteps: boolean,
): Finding {
  const criterion = axis === 'y' ? bendingYCriterion : bendingZCriterion;
  return finding(`bending-${axis}`, criterion, withSteps, (sheet) => {
    const M = axis === 'y' ? effects.M_y : effects.M_z;
    const title = `Design moment about ${axis}-${axis}`;
    sheet.given(`M_${axis}_Ed`, M, 'kN m', title, GIVEN);
    const sectionClass = classFor(section, effects, [axis], sheet);
    const M_c_Rd = bendingResistance(section, axis, sectionClass, sheet);
    if (axis === 'y') sheet.evaluate(bendingYCriterion, { M_y_Ed: M, M_c_y_Rd: M_c_Rd });
    else sheet.evaluate(bendingZCriterion, { M_z_Ed: M, M_c_z_Rd: M_c_Rd });
    return {
      effect: side(`M_${axis}_Ed`, M, 'kN m'),
      resistance: side(`M_c_${axis}_Rd`, M_c_Rd, 'kN m'),
    };
  });
}

export function shear(
  section: SteelSection,
  effects: CrossEffects,
  direction: Direction,
  withSteps: boolean,
): Finding {
  const criterion = direction === 'z' ? shearZCriterion : shearYCriterion;
  return finding(`shear-${direction}`, criterion, withSteps, (sheet) => {
    const V = shearAlong(section, effects, direction);
    sheet.given(
      `V_${direction}_Ed`,
      V,
      'kN',
      `Design shear along ${direction}-${direction}`,
      GIVEN,
    );
    const V_pl_Rd = shearResistance(section, direction, sheet);
    if (direction === 'z') sheet.evaluate(shearZCriterion, { V_z_Ed: V, V_pl_z_Rd: V_pl_Rd });
    else sheet.evaluate(shearYCriterion, { V_y_Ed: V, V_pl_y_Rd: V_pl_Rd });
    return {
      effect: side(`V_${direction}_Ed`, V, 'kN'),
      resistance: side(`V_pl_${direction}_Rd`, V_pl_Rd, 'kN'),
    };
  });
}

/** The worse direction of those whose webs buckle before they yield. */
export function shearBuckling(
  section: SteelSection,
  effects: CrossEffects,
  withSteps: boolean,
): Finding[] {
  const made = (['z', 'y'] as const).flatMap((direction) => {
    const V = shearAlong(section, effects, direction);
    if (V === 0 || webBuckling(section, effects, direction, silentSheet) === undefined) return [];
    return [bucklingAlong(section, effects, V, direction, withSteps)];
  });
  return worst(made);
}

function bucklingAlong(
  section: SteelSection,
  effects: CrossEffects,
  V: number,
  direction: Direction,
  withSteps: boolean,
): Finding {
  return finding('web-buckling-shear', webBucklingCriterion, withSteps, (sheet) => {
    const V_Ed = sheet.given(
      `V_${direction}_Ed`,
      V,
      'kN',
      `Design shear along ${direction}-${direction}`,
      GIVEN,
    );
    const V_bw_Rd = webBuckling(section, effects, direction, sheet) ?? 0;
    if (V_bw_Rd > 0) sheet.evaluate(webBucklingCriterion, { V_Ed, V_bw_Rd });
    return {
      effect: side(`V_${direction}_Ed`, V_Ed, 'kN'),
      resistance: side('V_bw_Rd', V_bw_Rd, 'kN'),
    };
  });
}

/** The finding with the greatest utilisation; nothing from nothing. */
function worst(findings: readonly Finding[]): Finding[] {
  const rank = ({ effect, resistance }: Finding): number =>
    resistance.value > 0 ? effect.value / resistance.value : Infinity;
  return [...findings].sort((a, b) => rank(b) - rank(a)).slice(0, 1);
}

export function torsion(section: SteelSection, effects: CrossEffects, withSteps: boolean): Finding {
  const { T_t, T_w } = effects;
  const criterion = T_w > 0 ? mixedTorsionCriterion : torsionCriterion;
  return finding('torsion', criterion, withSteps, (sheet) => {
    const T_t_Ed = sheet.given('T_t_Ed', T_t, 'kN m', 'Design torsion, St Venant part', GIVEN);
    const T_t_Rd = stVenantResistance(section, sheet);
    if (T_w === 0) {
      sheet.evaluate(torsionCriterion, { T_t_Ed, T_t_Rd });
      return { effect: side('T_Ed', T_t_Ed, 'kN m'), resistance: side('T_t_Rd', T_t_Rd, 'kN m') };
    }
    const { f_y, gamma_M0 } = section;
    const tau_w_Ed = warpingShearStress(section, effects, sheet);
    const value = sheet.evaluate(mixedTorsionCriterion, {
      T_t_Ed,
      T_t_Rd,
      tau_w_Ed,
      gamma_M0,
      f_y,
    });
    return { effect: side('utilisation', value, '1'), resistance: side('limit', 1, '1') };
  });
}

/** Shear with torsion, the worse direction. */
export function shearTorsion(
  section: SteelSection,
  effects: CrossEffects,
  withSteps: boolean,
): Finding[] {
  const made = (['z', 'y'] as const).flatMap((direction) => {
    const V_Ed = shearAlong(section, effects, direction);
    if (V_Ed === 0) return [];
    return [
      finding('shear-torsion', shearTorsionCriterion, withSteps, (sheet) => {
        const symbol = `V_${direction}_Ed`;
        sheet.given(symbol, V_Ed, 'kN', `Design shear along ${direction}-${direction}`, GIVEN);
        const V_pl_T_Rd = shearLeftByTorsion(section, effects, direction, sheet);
        if (V_pl_T_Rd > 0) sheet.evaluate(shearTorsionCriterion, { V_Ed, V_pl_T_Rd });
        return {
          effect: side(symbol, V_Ed, 'kN'),
          resistance: side(`V_pl_T_${direction}_Rd`, V_pl_T_Rd, 'kN'),
        };
      }),
    ];
  });
  return worst(made);
}
