import type { Sheet } from '../../formula/sheet';
import {
  addedMoment,
  axialRatio,
  quarterLimit,
  reducedPlastic,
  reducedPlasticY,
  reducedPlasticZ,
  flangeShareOfHollow,
  webLimitY,
  webLimitZ,
  webShare,
  webShareOfHollow,
} from '../../steel/bending-axial';
import { biaxialCriterion, exponentOfHollow, exponentZOfI } from '../../steel/biaxial';
import type { SectionClass } from '../../steel/classification';
import { linearSum, type SumKind, type SumTerm } from '../../steel/linear-sum';
import { webHeight } from '../../steel/shear';
import type { Axis } from '../steel/bending';
import type { SteelSection } from '../steel/section';
import { axialOf, type CrossEffects } from './effects';
import { axialResistance, isPlastic, momentResistance, type AxialResistance } from './resistances';
import { bimomentLimit } from './torsion';

/** M_N_y_Rd or M_N_z_Rd of class 1 and 2 in N mm (6.2.9.1), shear taken off first (6.2.10). */
export function reducedByAxial(
  section: SteelSection,
  effects: CrossEffects,
  axis: Axis,
  sectionClass: SectionClass,
  sheet: Sheet,
): number {
  const M_pl_Rd = momentResistance(section, effects, axis, sectionClass, sheet);
  const N_Ed = axialOf(effects);
  if (N_Ed === 0) return M_pl_Rd;
  const axial = axialResistance(section, effects, 1, sheet);
  if (axial.N_Rd === 0) return 0;
  const n = sheet.evaluate(axialRatio, { N_Ed, N_pl_Rd: axial.N_Rd });
  const { shape, properties } = section;
  switch (shape.shape) {
    case 'I':
      return reducedOfI(section, { N_Ed, n, M_pl_Rd, axial }, axis, sheet);
    case 'RHS': {
      const { h, b, t } = shape;
      const { A } = properties;
      if (axis === 'y') {
        const a_w = sheet.evaluate(webShareOfHollow, { A, b, t });
        return sheet.evaluate(reducedPlastic.rhs.y, { M_pl_Rd, n, a_w });
      }
      const a_f = sheet.evaluate(flangeShareOfHollow, { A, h, t });
      return sheet.evaluate(reducedPlastic.rhs.z, { M_pl_Rd, n, a_f });
    }
    case 'CHS':
      return sheet.evaluate(reducedPlastic.tube[axis], { M_pl_Rd, n });
    case 'rectangle':
      return sheet.evaluate(reducedPlastic.rectangle[axis], { M_pl_Rd, n });
    default:
      throw new Error(`${shape.shape} has no plastic interaction`);
  }
}

function reducedOfI(
  section: SteelSection,
  reduced: {
    readonly N_Ed: number;
    readonly n: number;
    readonly M_pl_Rd: number;
    readonly axial: AxialResistance;
  },
  axis: Axis,
  sheet: Sheet,
): number {
  const { shape, properties, f_y, gamma_M0 } = section;
  if (shape.shape !== 'I') throw new Error('an I section is meant');
  const { N_Ed, n, M_pl_Rd, axial } = reduced;
  const { rho_z, A_v_z, N_Rd: N_pl_Rd } = axial;
  const { h, b, t_w, t_f } = shape;
  const h_w = sheet.evaluate(webHeight, { h, t_f });
  const web = { h_w, t_w, rho_z, f_y, gamma_M0 };
  const symbol = axis === 'y' ? 'M_N_y_Rd' : 'M_N_z_Rd';
  const limit =
    axis === 'y'
      ? Math.min(sheet.evaluate(quarterLimit, { N_pl_Rd }), sheet.evaluate(webLimitY, web))
      : sheet.evaluate(webLimitZ, web);
  if (N_Ed <= limit) {
    return sheet.given(symbol, M_pl_Rd, 'kN m', 'N_Ed is too small to count', LIMITS);
  }
  const a = sheet.evaluate(webShare, { A: properties.A, rho_z, A_v_z, b, t_f });
  return axis === 'y'
    ? sheet.evaluate(reducedPlasticY, { M_pl_y_Rd: M_pl_Rd, n, a })
    : sheet.evaluate(reducedPlasticZ, { M_pl_z_Rd: M_pl_Rd, n, a });
}

const LIMITS = 'EN 1993-1-1 6.2.9.1(4)';

/** A sum of ratios and whether any of its resistances is zero, so that there is no sum. */
export interface Sum {
  readonly value: number;
  readonly zero?: string;
}

/** What (6.41) is made of at the axial force that acts. */
export function plasticTerms(
  section: SteelSection,
  effects: CrossEffects,
  sectionClass: SectionClass,
  sheet: Sheet,
) {
  const M_N_y_Rd = reducedByAxial(section, effects, 'y', sectionClass, sheet);
  const M_N_z_Rd = reducedByAxial(section, effects, 'z', sectionClass, sheet);
  if (M_N_y_Rd === 0 || M_N_z_Rd === 0) return { M_N_y_Rd, M_N_z_Rd, alpha: 1, beta: 1 };
  return { M_N_y_Rd, M_N_z_Rd, ...exponents(section, effects, sheet) };
}

/** (6.41) of class 1 and 2. */
function plasticBiaxial(
  section: SteelSection,
  effects: CrossEffects,
  sectionClass: SectionClass,
  sheet: Sheet,
): Sum {
  const { M_y: M_y_Ed, M_z: M_z_Ed } = effects;
  const terms = plasticTerms(section, effects, sectionClass, sheet);
  if (terms.M_N_y_Rd === 0) return { value: 1, zero: 'M_N_y_Rd' };
  if (terms.M_N_z_Rd === 0) return { value: 1, zero: 'M_N_z_Rd' };
  return { value: sheet.evaluate(biaxialCriterion, { M_y_Ed, M_z_Ed, ...terms }) };
}

function exponents(
  section: SteelSection,
  effects: CrossEffects,
  sheet: Sheet,
): { alpha: number; beta: number } {
  const given = (symbol: 'alpha' | 'beta', value: number): number =>
    sheet.given(symbol, value, '1', 'Exponent', 'EN 1993-1-1 6.2.9.1(6)');
  const { shape } = section;
  if (shape.shape === 'CHS') return { alpha: given('alpha', 2), beta: given('beta', 2) };
  if (shape.shape === 'rectangle') return { alpha: given('alpha', 1), beta: given('beta', 1) };
  const N_Ed = axialOf(effects);
  const { N_Rd: N_pl_Rd } = axialResistance(section, effects, 1, sheet);
  const n = N_Ed === 0 ? 0 : sheet.evaluate(axialRatio, { N_Ed, N_pl_Rd });
  if (shape.shape === 'RHS') {
    const alpha = sheet.evaluate(exponentOfHollow, { n });
    return { alpha, beta: given('beta', alpha) };
  }
  return { alpha: given('alpha', 2), beta: sheet.evaluate(exponentZOfI, { n }) };
}

/**
 * The sum of ratios: class 3 and 4, shapes without plastic interaction, and everything under a
 * bimoment. Compression of a shifted effective section adds its moment about z-z.
 *
 * @param bent the moments that are in it
 */
export function sumOfRatios(
  section: SteelSection,
  effects: CrossEffects,
  bent: { readonly M_y: number; readonly M_z: number },
  sectionClass: SectionClass,
  sheet: Sheet,
): Sum {
  // Warping is elastic, and so is what stands beside it.
  const graded = effects.B > 0 ? (Math.max(sectionClass, 3) as SectionClass) : sectionClass;
  const N_Ed = axialOf(effects);
  const { N_Rd, e_N_z } = axialResistance(section, effects, graded, sheet);
  const added =
    e_N_z > 0 ? sheet.evaluate(addedMoment, { N_Ed: effects.compression, e_N: e_N_z }) : 0;
  const kind = kindOfSum(graded, effects.B > 0);
  const terms: readonly Term[] = [
    { term: 'N', effect: N_Ed, resistance: () => N_Rd },
    {
      term: 'M_y',
      effect: bent.M_y,
      resistance: () => momentResistance(section, effects, 'y', graded, sheet),
    },
    {
      term: 'M_z',
      effect: bent.M_z + added,
      resistance: () => momentResistance(section, effects, 'z', graded, sheet),
    },
    { term: 'B', effect: effects.B, resistance: () => bimomentLimit(section, sheet) },
  ];
  return summed(kind, terms, sheet);
}

interface Term {
  readonly term: SumTerm;
  readonly effect: number;
  /** Worked out only where its effect acts. */
  readonly resistance: () => number;
}

function summed(kind: SumKind, terms: readonly Term[], sheet: Sheet): Sum {
  const acting = terms.filter(({ effect }) => effect > 0);
  const values: Record<string, number> = {};
  for (const { term, effect, resistance } of acting) {
    const limit = resistance();
    if (!(limit > 0)) return { value: 1, zero: `${term}_Rd` };
    values[`${term}_Ed`] = effect;
    values[`${term}_Rd`] = limit;
  }
  const formula = linearSum(
    kind,
    acting.map(({ term }) => term),
  );
  return { value: sheet.evaluate(formula, values) };
}

/** Which resistances a sum has, by the class. */
export function kindOfSum(sectionClass: SectionClass, warped: boolean): SumKind {
  if (warped) return 'warped';
  if (sectionClass <= 2) return 'plastic';
  return sectionClass === 3 ? 'elastic' : 'effective';
}

/** Everything that N, M_y and M_z do together over what they may, about the axes that are bent. */
export function together(
  section: SteelSection,
  effects: CrossEffects,
  sectionClass: SectionClass,
  sheet: Sheet,
): Sum {
  return isPlastic(section, sectionClass) && effects.B === 0
    ? plasticBiaxial(section, effects, sectionClass, sheet)
    : sumOfRatios(section, effects, effects, sectionClass, sheet);
}
