import { silentSheet, type Sheet } from '../../formula/sheet';
import { plasticAxialYCriterion, plasticAxialZCriterion } from '../../steel/bending-axial';
import { bendingShearYCriterion, bendingShearZCriterion } from '../../steel/bending-shear';
import { biaxialCriterion } from '../../steel/biaxial';
import type { SectionClass } from '../../steel/classification';
import { clauseOfSum } from '../../steel/linear-sum';
import {
  bendingWithWebBuckling,
  flangesAlone,
  plasticWithWholeWeb,
} from '../../steel/shear-buckling';
import type { Axis } from '../steel/bending';
import { isPlated, platesOf } from '../steel/classes';
import { effectiveFlange } from '../steel/effective';
import type { SteelSection } from '../steel/section';
import { websOf } from '../steel/shear';
import type { Finding } from '../verification';
import { axialOf, type CrossEffects } from './effects';
import { finding, side, sumSides, type Sides } from './finding';
import { kindOfSum, reducedByAxial, sumOfRatios, together } from './interaction';
import { classFor, compressionOf, isPlastic, momentResistance } from './resistances';
import { reductionByShear, webBuckling } from './shear';

const GIVEN = 'Given by the caller';

/** Bending about an axis with shear, where that takes from it (6.2.8). */
export function bendingShear(
  section: SteelSection,
  effects: CrossEffects,
  axis: Axis,
  withSteps: boolean,
): Finding[] {
  const M = axis === 'y' ? effects.M_y : effects.M_z;
  if (M === 0 || !isSheared(section, effects)) return [];
  const V_bw_Rd = axis === 'y' ? webBuckling(section, effects, 'z', silentSheet) : undefined;
  if (V_bw_Rd !== undefined && effects.V_z > 0.5 * V_bw_Rd) {
    return [withWebBuckling(section, effects, withSteps)];
  }
  const criterion = axis === 'y' ? bendingShearYCriterion : bendingShearZCriterion;
  return [
    finding(`bending-shear-${axis}`, criterion, withSteps, (sheet) => {
      sheet.given(`M_${axis}_Ed`, M, 'kN m', `Design moment about ${axis}-${axis}`, GIVEN);
      const sectionClass = classFor(section, effects, [axis], sheet);
      const M_V_Rd = momentResistance(section, effects, axis, sectionClass, sheet);
      if (M_V_Rd > 0 && axis === 'y') {
        sheet.evaluate(bendingShearYCriterion, { M_y_Ed: M, M_V_y_Rd: M_V_Rd });
      } else if (M_V_Rd > 0) {
        sheet.evaluate(bendingShearZCriterion, { M_z_Ed: M, M_V_z_Rd: M_V_Rd });
      }
      return {
        effect: side(`M_${axis}_Ed`, M, 'kN m'),
        resistance: side(`M_V_${axis}_Rd`, M_V_Rd, 'kN m'),
      };
    }),
  ];
}

/** A web that buckles in shear: EN 1993-1-5 7.1, the flanges as far as they count. */
function withWebBuckling(
  section: SteelSection,
  effects: CrossEffects,
  withSteps: boolean,
): Finding {
  return finding('bending-shear-y', bendingWithWebBuckling, withSteps, (sheet) => {
    const { shape, f_y, gamma_M0 } = section;
    const webs = websOf(section, 'z', sheet);
    if (!webs || !isPlated(shape)) throw new Error('a web that buckles is meant');
    const { h_w, t_w, n_w } = webs;
    const { h } = shape;
    const t_f = platesOf(shape, 'y', silentSheet).flange.t;
    const A_f =
      effectiveFlange(section, sheet) * (1 - reductionByShear(section, effects, 'y', sheet));
    const M_y_Ed = sheet.given('M_y_Ed', effects.M_y, 'kN m', 'Design moment about y-y', GIVEN);
    const V_z_Ed = sheet.given('V_z_Ed', effects.V_z, 'kN', 'Design shear along z-z', GIVEN);
    const N_Ed = axialOf(effects);
    const M_f_Rd = sheet.evaluate(flangesAlone, { A_f, h, t_f, f_y, gamma_M0, N_Ed });
    const M_pl_Rd = sheet.evaluate(plasticWithWholeWeb, {
      A_f,
      h,
      t_f,
      n_w,
      t_w,
      h_w,
      f_y,
      gamma_M0,
    });
    const V_bw_Rd = webBuckling(section, effects, 'z', sheet) ?? 0;
    if (V_bw_Rd === 0) return sumSides({ value: 1, zero: 'V_bw_Rd' });
    const values = { M_y_Ed, M_pl_Rd, M_f_Rd, V_z_Ed, V_bw_Rd };
    return sumSides({ value: sheet.evaluate(bendingWithWebBuckling, values) });
  });
}

/** Axial force with bending about one axis, or with the shear that takes from it. */
export function bendingAxial(
  section: SteelSection,
  effects: CrossEffects,
  axis: Axis,
  withSteps: boolean,
): Finding[] {
  if (axialOf(effects) === 0 || !isOwed(section, effects, axis)) return [];
  const alone = only(effects, axis);
  const axes = axesOf(effects, axis);
  const sectionClass = classFor(section, effects, axes, silentSheet);
  const M = axis === 'y' ? alone.M_y : alone.M_z;
  if (!isPlastic(section, sectionClass) || M === 0) {
    const title =
      M === 0 && axis === 'y'
        ? 'Axial force with shear'
        : `Bending about ${axis}-${axis} with axial force`;
    const heading = { title, clause: clauseOfSum(kindOfSum(sectionClass, false)) };
    return [
      finding(`bending-axial-${axis}`, heading, withSteps, (sheet) => {
        writeEffects(effects, sheet);
        classFor(section, effects, axes, sheet);
        return sumSides(sumOfRatios(section, { ...effects, B: 0 }, alone, sectionClass, sheet));
      }),
    ];
  }
  const criterion = axis === 'y' ? plasticAxialYCriterion : plasticAxialZCriterion;
  return [
    finding(`bending-axial-${axis}`, criterion, withSteps, (sheet) => {
      writeEffects(effects, sheet);
      classFor(section, effects, axes, sheet);
      return plasticSides(section, effects, axis, sectionClass, sheet);
    }),
  ];
}

function plasticSides(
  section: SteelSection,
  effects: CrossEffects,
  axis: Axis,
  sectionClass: SectionClass,
  sheet: Sheet,
): Sides {
  const M_N_Rd = reducedByAxial(section, effects, axis, sectionClass, sheet);
  const M = axis === 'y' ? effects.M_y : effects.M_z;
  if (M_N_Rd > 0 && axis === 'y') {
    sheet.evaluate(plasticAxialYCriterion, { M_y_Ed: M, M_N_y_Rd: M_N_Rd });
  } else if (M_N_Rd > 0) {
    sheet.evaluate(plasticAxialZCriterion, { M_z_Ed: M, M_N_z_Rd: M_N_Rd });
  }
  return {
    effect: side(`M_${axis}_Ed`, M, 'kN m'),
    resistance: side(`M_N_${axis}_Rd`, M_N_Rd, 'kN m'),
  };
}

/** Its own moment acts; about z-z also what a shifted centroid makes; about y-y shear beside N alone. */
function isOwed(section: SteelSection, effects: CrossEffects, axis: Axis): boolean {
  if (axis === 'z') {
    if (effects.M_z > 0) return true;
    if (effects.compression === 0) return false;
    const sectionClass = classFor(section, effects, ['y', 'z'], silentSheet);
    return compressionOf(section, effects, sectionClass, silentSheet).e_N_z > 0;
  }
  if (effects.M_y > 0) return true;
  return effects.M_z === 0 && isSheared(section, effects);
}

/** Whether shear along either axis takes from the yield of its area. */
function isSheared(section: SteelSection, effects: CrossEffects): boolean {
  return (['z', 'y'] as const).some(
    (direction) => reductionByShear(section, effects, direction, silentSheet) > 0,
  );
}

/** Where one moment alone acts its axis sets the class, else the worse of both. */
function axesOf({ M_y, M_z }: CrossEffects, axis: Axis): readonly Axis[] {
  if (M_y > 0 && M_z === 0 && axis === 'y') return ['y'];
  return M_z > 0 && M_y === 0 && axis === 'z' ? ['z'] : ['y', 'z'];
}

function only({ M_y, M_z }: CrossEffects, axis: Axis): { M_y: number; M_z: number } {
  return axis === 'y' ? { M_y, M_z: 0 } : { M_y: 0, M_z };
}

/** Both moments together, with whatever axial force and bimoment act. */
export function biaxial(
  section: SteelSection,
  effects: CrossEffects,
  withSteps: boolean,
): Finding[] {
  const { M_y, M_z, B } = effects;
  if (B === 0 && (M_y === 0 || M_z === 0)) return [];
  const sectionClass = classFor(section, effects, ['y', 'z'], silentSheet);
  const plastic = isPlastic(section, sectionClass) && B === 0;
  const clause = plastic ? biaxialCriterion.clause : clauseOfSum(kindOfSum(sectionClass, B > 0));
  const what = B > 0 ? 'Bending and warping' : 'Bending about both axes';
  const title = axialOf(effects) > 0 ? `${what} with axial force` : what;
  return [
    finding('biaxial', { title, clause }, withSteps, (sheet) => {
      writeEffects(effects, sheet);
      classFor(section, effects, ['y', 'z'], sheet);
      return sumSides(together(section, effects, sectionClass, sheet));
    }),
  ];
}

function writeEffects({ compression, tension, M_y, M_z, B }: CrossEffects, sheet: Sheet): void {
  const N = compression + tension;
  const kind = tension > 0 ? 'tension' : 'compression';
  if (N > 0) sheet.given('N_Ed', N, 'kN', `Design ${kind}`, GIVEN);
  if (M_y > 0) sheet.given('M_y_Ed', M_y, 'kN m', 'Design moment about y-y', GIVEN);
  if (M_z > 0) sheet.given('M_z_Ed', M_z, 'kN m', 'Design moment about z-z', GIVEN);
  if (B > 0) sheet.given('B_Ed', B, 'kN m^2', 'Design bimoment', GIVEN);
}
