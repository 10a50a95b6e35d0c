import type { Sheet } from '../../formula/sheet';
import type { ShapeOf } from '../../sections/shapes/shape';
import {
  bucklingFactorOfBentWeb,
  bucklingFactorOfWeb,
  channelShift,
  effectiveArea,
  effectiveInertia,
  effectiveInertiaZ,
  effectiveModulus as modulusOfPlates,
  effectiveModulusZ,
  effectiveModulusZOfWeb,
  lostLengthOfWeb,
  lostPlaceOfWeb,
  platesOfClass4,
  shiftUnderBending,
  stressRatioOfReducedWeb,
} from '../../steel/effective';
import { compressedFlangeLimits, epsilonFactor, outstandLimits } from '../../steel/classification';
import { refuse } from '../refuse';
import { isPlated, platesOf, type Plate } from './classes';
import type { SteelSection } from './section';

/** What counts of a class 4 section under compression alone. */
export interface EffectiveInCompression {
  /** mm², never more than the area that the caller gave. */
  readonly A_eff: number;
  /** Shift of the centroid that makes a moment about z-z, mm; 0 but for channels. */
  readonly e_N_z: number;
}

/** @throws {Refusal} `class-4` for shapes whose plates EN 1993-1-5 4.4 does not reduce here */
export function effectiveInCompression(
  section: SteelSection,
  sheet: Sheet,
): EffectiveInCompression {
  const shape = reducible(section);
  const { gross, properties } = section;
  const { flange, web } = platesOf(shape, 'y', sheet);
  const epsilon = sheet.evaluate(epsilonFactor, { f_y: section.f_y });
  const flangeLost = lostOf(flange, 'f', flange.count, 1, epsilon, sheet);
  const webLost = lostOf(web, 'w', web.count, 1, epsilon, sheet);
  const A_lost_f = flangeLost.area;
  const A_lost_w = webLost.area;
  const plates = sheet.evaluate(effectiveArea, { A: gross.A, A_lost_f, A_lost_w });
  const A_eff =
    properties.A < plates
      ? sheet.given(
          'A_eff',
          properties.A,
          'mm^2',
          'The caller’s area is the lesser',
          'Given by the caller',
        )
      : plates;
  if (shape.shape !== 'channel') return { A_eff, e_N_z: 0 };
  const y_f = shape.b - flangeLost.length / 2;
  const e_N_z = sheet.evaluate(channelShift, {
    y_c: gross.y_c ?? 0,
    A: gross.A,
    A_lost_f,
    y_f,
    A_lost_w,
    t_w: shape.t_w,
  });
  return { A_eff, e_N_z };
}

/** Area of one flange in bending about y-y, mm², less what class 4 takes of it in compression. */
export function effectiveFlange(section: SteelSection, sheet: Sheet): number {
  const shape = reducible(section);
  const { flange } = platesOf(shape, 'y', sheet);
  const epsilon = sheet.evaluate(epsilonFactor, { f_y: section.f_y });
  const [, , limit] = flange.kind === 'outstand' ? outstandLimits : compressedFlangeLimits;
  const slender = flange.c / flange.t > (limit?.compute({ epsilon }) ?? 0);
  const lost = slender ? lostOf(flange, 'f', flange.count / 2, 1, epsilon, sheet).area : 0;
  return sheet.given(
    'A_f',
    shape.b * flange.t - lost,
    'mm^2',
    'Area of one flange that counts',
    'EN 1993-1-5 7.1(1)',
  );
}

/** W_eff_y or W_eff_z in mm³ under that moment alone. */
export function effectiveModulus(section: SteelSection, axis: 'y' | 'z', sheet: Sheet): number {
  const shape = reducible(section);
  if (axis === 'y' || shape.shape === 'RHS') return bentPlates(section, shape, axis, sheet);
  return compressedToes(section, shape, sheet);
}

function reducible(section: SteelSection) {
  const { shape, name, f_y } = section;
  if (isPlated(shape)) return shape;
  return refuse(
    'class-4',
    '/section',
    `${name} is class 4 at f_y ${f_y} N/mm²; effective widths are made for I sections, channels and rectangular hollow sections only. A thicker one or a lower grade is within class 3.`,
    shape.shape === 'CHS' ? 'EN 1993-1-6' : 'EN 1993-1-5 4.4',
  );
}

export interface Lost {
  readonly area: number;
  /** Length of one strip, mm. */
  readonly length: number;
}

type Role = 'f' | 'w';

/** What a plate loses under a stress ratio psi; outstands always as uniformly compressed. */
export function lostOf(
  plate: Plate,
  role: Role,
  n: number,
  psi: number,
  epsilon: number,
  sheet: Sheet,
): Lost {
  const rho = reductionOf(plate, role, psi, epsilon, sheet);
  const { c, t } = plate;
  return {
    area: sheet.evaluate(platesOfClass4[role].lost, { n, rho_p: rho, c, t }),
    length: (1 - rho) * c,
  };
}

function reductionOf(plate: Plate, role: Role, psi: number, epsilon: number, sheet: Sheet): number {
  const { c, t, kind } = plate;
  const formulas = platesOfClass4[role];
  const k_sigma = bucklingFactor(kind, role, psi, sheet);
  const lambda_bar_p = sheet.evaluate(formulas.slenderness, { c, t, epsilon, k_sigma });
  const stocky = kind === 'outstand' ? 0.748 : 0.5 + Math.sqrt(0.085 - 0.055 * psi);
  if (lambda_bar_p <= stocky) {
    const title = `All of it counts up to ${stocky.toFixed(3)}`;
    return sheet.given(`rho_${role}`, 1, '1', title, CLAUSE);
  }
  return kind === 'outstand'
    ? sheet.evaluate(formulas.outstand, { lambda_bar_p })
    : sheet.evaluate(formulas.internal, { lambda_bar_p, psi });
}

const CLAUSE = 'EN 1993-1-5 4.4(2)';

function bucklingFactor(kind: Plate['kind'], role: Role, psi: number, sheet: Sheet): number {
  const title = `Buckling factor of the ${role === 'f' ? 'flange' : 'web'}`;
  const given = (value: number, table: string): number =>
    sheet.given(`k_sigma_${role}`, value, '1', title, `EN 1993-1-5 ${table}`);
  if (kind === 'outstand') return given(0.43, 'Table 4.2');
  if (psi === 1) return given(4, 'Table 4.1');
  if (psi === -1) return given(23.9, 'Table 4.1');
  return psi > -1
    ? sheet.evaluate(bucklingFactorOfWeb, { psi })
    : sheet.evaluate(bucklingFactorOfBentWeb, { psi });
}

/** What bending about an axis leaves out of flange and web. */
export interface LostInBending {
  readonly flange: Plate;
  readonly web: Plate;
  /** Area lost of the compressed flange, its middle from the centroid. */
  readonly A_lost_f: number;
  readonly z_f: number;
  /** Length lost of each web, its middle from mid-depth towards the compressed flange. */
  readonly l_w: number;
  readonly z_w: number;
}

/** The compressed flange first, then the web with the axis that leaves; not repeated (4.4(3)). */
export function lostInBending(section: SteelSection, axis: 'y' | 'z', sheet: Sheet): LostInBending {
  const shape = reducible(section);
  const { flange, web } = platesOf(shape, axis, sheet);
  const epsilon = sheet.evaluate(epsilonFactor, { f_y: section.f_y });
  const z_f = ((axis === 'y' ? shape.h : shape.b) - flange.t) / 2;
  const { A } = section.gross;
  const A_lost_f = lostOf(flange, 'f', flange.count / 2, 1, epsilon, sheet).area;
  const psi = sheet.evaluate(stressRatioOfReducedWeb, { c_w: web.c, A_lost_f, z_f, A });
  const rho_p = reductionOf(web, 'w', psi, epsilon, sheet);
  const l_w = sheet.evaluate(lostLengthOfWeb, { rho_p, c_w: web.c, psi });
  const z_w = sheet.evaluate(lostPlaceOfWeb, { c_w: web.c, rho_p, psi, l_w });
  return { flange, web, A_lost_f, z_f, l_w, z_w };
}

function bentPlates(
  section: SteelSection,
  shape: ShapeOf<'I'> | ShapeOf<'channel'> | ShapeOf<'RHS'>,
  axis: 'y' | 'z',
  sheet: Sheet,
): number {
  const { gross, properties } = section;
  const { flange, web, A_lost_f, z_f, l_w, z_w } = lostInBending(section, axis, sheet);
  const holes = { A: gross.A, A_lost_f, z_f, A_lost_w: web.count * web.t * l_w, z_w };
  const e_M = sheet.evaluate(shiftUnderBending, holes);
  const I_eff = sheet.evaluate(effectiveInertia, {
    ...holes,
    I: axis === 'y' ? gross.I_y : gross.I_z,
    t_f: flange.t,
    l_w,
    e_M,
  });
  const h = axis === 'y' ? shape.h : shape.b;
  const W_eff = sheet.evaluate(modulusOfPlates, { I_eff, h, e_M });
  const symbol = axis === 'y' ? 'W_eff_y' : 'W_eff_z';
  return lesser(symbol, W_eff, axis === 'y' ? properties.W_el_y : properties.W_el_z, sheet);
}

/** About z-z: outstands cut back from compressed toes; of a channel also its web compressed. */
function compressedToes(
  section: SteelSection,
  shape: ShapeOf<'I'> | ShapeOf<'channel'>,
  sheet: Sheet,
): number {
  const { gross, properties, f_y } = section;
  const { flange, web } = platesOf(shape, 'z', sheet);
  const epsilon = sheet.evaluate(epsilonFactor, { f_y });
  const { A, I_z, y_c = shape.b / 2 } = gross;
  const lost = lostOf(flange, 'f', 2, 1, epsilon, sheet);
  const y_max = shape.shape === 'I' ? shape.b / 2 : shape.b - y_c;
  const strip = { A_lost_f: lost.area, y_f: y_max - lost.length / 2, A };
  const l_f = lost.length;
  const I_eff_z = sheet.evaluate(effectiveInertiaZ, { ...strip, I_z, l_f });
  const y_other = shape.b - y_max;
  const toes = sheet.evaluate(effectiveModulusZ, { ...strip, I_eff_z, l_f, y_other });
  if (shape.shape === 'I') return lesser('W_eff_z', toes, properties.W_el_z, sheet);
  const A_lost_w = lostOf(web, 'w', 1, 1, epsilon, sheet).area;
  const { b, t_w } = shape;
  const y_w = y_c - t_w / 2;
  const back = sheet.evaluate(effectiveModulusZOfWeb, { I_z, A_lost_w, y_w, t_w, A, y_c, b });
  return lesser('W_eff_z', Math.min(toes, back), properties.W_el_z, sheet);
}

/** Never above the modulus of the whole section or what the caller gave in its place. */
function lesser(
  symbol: 'W_eff_y' | 'W_eff_z',
  effective: number,
  whole: number,
  sheet: Sheet,
): number {
  const value = Math.min(effective, whole);
  return sheet.given(symbol, value, 'mm^3', 'The lesser of effective and whole', CLAUSE);
}
