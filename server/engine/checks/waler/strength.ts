import { WorkingSheet, silentSheet, type Sheet } from '../../formula/sheet';
import { bendingYCriterion, bendingZCriterion } from '../../steel/bending';
import { bendingShearYCriterion } from '../../steel/bending-shear';
import { biaxialCriterion, elasticBiaxialCriterion } from '../../steel/biaxial';
import { shearYCriterion, shearZCriterion } from '../../steel/shear';
import type { UnitName } from '../../units/units';
import type { VerificationId } from '../contract';
import { refuse } from '../refuse';
import { bendingResistance } from '../steel/bending';
import { shearResistance } from '../steel/shear';
import type { Finding } from '../verification';
import type { CaseEffects, Effects } from './effects';
import { bendingResistanceWithShear, type WalerSection } from './section';

interface Side {
  readonly symbol: string;
  readonly value: number;
  readonly unit: UnitName;
}

/** One criterion of the cross-section: how to find where it governs, and how to write it down. */
interface Criterion {
  readonly id: VerificationId;
  /** Left over right side; undefined where the criterion does not apply at this place. */
  utilisation(effects: Effects): number | undefined;
  /** Writes the working and gives both sides. */
  write(effects: Effects, sheet: Sheet): { effect: Side; resistance: Side };
  readonly title: string;
  readonly clause: string;
  /** Its effects have extremes at unlike places, so that their sum may peak between them. */
  readonly mayPeakBetween?: true;
}

interface Governing {
  readonly utilisation: number;
  readonly effects: Effects;
}

/** Searches all places for the worst of each criterion, then writes those down. */
export function verifyStrength(
  section: WalerSection,
  cases: readonly CaseEffects[],
  withSteps: boolean,
): Finding[] {
  return criteriaOf(section).flatMap((criterion) => {
    const worst = worstOf(criterion, cases);
    return worst ? [findingOf(criterion, worst.effects, withSteps)] : [];
  });
}

/** A place this near to the worst seen may hide a worse one between it and its neighbours. */
const NEAR = 0.97;

function worstOf(criterion: Criterion, cases: readonly CaseEffects[]): Governing | undefined {
  let worst: Governing | undefined;
  const seen: (Governing & { readonly one: CaseEffects })[] = [];
  const look = (effects: Effects, one: CaseEffects): void => {
    const utilisation = criterion.utilisation(effects);
    if (utilisation === undefined) return;
    if (Number.isNaN(utilisation)) throw new Error(`${criterion.id} has no number at ${effects.x}`);
    const bar = worst?.utilisation ?? -1;
    if (criterion.mayPeakBetween && utilisation >= NEAR * bar)
      seen.push({ utilisation, effects, one });
    if (utilisation > bar) worst = { utilisation, effects };
  };
  for (const one of cases) for (const effects of one.all()) look(effects, one);
  const bar = NEAR * (worst?.utilisation ?? 0);
  for (const { effects, one } of seen.filter(({ utilisation }) => utilisation >= bar)) {
    look(peakNear(one, effects.x, criterion), one);
  }
  return worst;
}

const GOLDEN = (Math.sqrt(5) - 1) / 2;

/** Golden section search for the greatest value around x; to 1e-5 of the stretch. */
function peakNear(one: CaseEffects, x: number, criterion: Criterion): Effects {
  const value = (at: number): number => criterion.utilisation(one.at(at)) ?? 0;
  let { from, to } = one.around(x);
  let left = to - GOLDEN * (to - from);
  let right = from + GOLDEN * (to - from);
  let [atLeft, atRight] = [value(left), value(right)];
  for (let round = 0; round < 24; round += 1) {
    if (atLeft >= atRight) {
      to = right;
      right = left;
      atRight = atLeft;
      left = to - GOLDEN * (to - from);
      atLeft = value(left);
    } else {
      from = left;
      left = right;
      atLeft = atRight;
      right = from + GOLDEN * (to - from);
      atRight = value(right);
    }
  }
  return one.at((from + to) / 2);
}

function findingOf(criterion: Criterion, effects: Effects, withSteps: boolean): Finding {
  const sheet = new WorkingSheet(criterion.id, withSteps);
  const { effect, resistance } = criterion.write(effects, sheet);
  const { solved, span, x } = effects;
  return {
    id: criterion.id,
    title: criterion.title,
    clause: criterion.clause,
    effect,
    resistance,
    combination: solved.id,
    place: { span, x },
    sheet,
  };
}

const kNm = (symbol: string, value: number): Side => ({ symbol, value, unit: 'kN m' });
const kN = (symbol: string, value: number): Side => ({ symbol, value, unit: 'kN' });

function criteriaOf(section: WalerSection): Criterion[] {
  const M_c_y_Rd = bendingResistance(section, 'y', section.sectionClass, silentSheet);
  const M_c_z_Rd = bendingResistance(section, 'z', section.sectionClass, silentSheet);
  const V_pl_z_Rd = shearResistance(section, 'z', silentSheet);
  const V_pl_y_Rd = shearResistance(section, 'y', silentSheet);
  const reduced = (V_z: number): number =>
    V_z > 0.5 * V_pl_z_Rd ? bendingResistanceWithShear(section, V_z, silentSheet) : M_c_y_Rd;
  return [
    {
      id: 'bending-y',
      title: bendingYCriterion.title,
      clause: bendingYCriterion.clause,
      utilisation: ({ M_y }) => M_y / M_c_y_Rd,
      write: ({ M_y }, sheet) => {
        const M_y_Ed = sheet.given('M_y_Ed', M_y, 'kN m', 'Design moment about y-y', 'Analysis');
        const resistance = bendingResistance(section, 'y', section.sectionClass, sheet);
        sheet.evaluate(bendingYCriterion, { M_y_Ed, M_c_y_Rd: resistance });
        return { effect: kNm('M_y_Ed', M_y), resistance: kNm('M_c_y_Rd', resistance) };
      },
    },
    {
      id: 'shear-z',
      title: shearZCriterion.title,
      clause: shearZCriterion.clause,
      utilisation: ({ V_z }) => V_z / V_pl_z_Rd,
      write: ({ V_z }, sheet) => {
        const V_z_Ed = sheet.given(
          'V_z_Ed',
          V_z,
          'kN',
          'Design shear force along the web',
          'Analysis',
        );
        const resistance = shearResistance(section, 'z', sheet);
        sheet.evaluate(shearZCriterion, { V_z_Ed, V_pl_z_Rd: resistance });
        return { effect: kN('V_z_Ed', V_z), resistance: kN('V_pl_z_Rd', resistance) };
      },
    },
    {
      id: 'bending-shear-y',
      mayPeakBetween: true,
      title: bendingShearYCriterion.title,
      clause: bendingShearYCriterion.clause,
      utilisation: ({ M_y, V_z }) =>
        V_z > 0.5 * V_pl_z_Rd && M_y > 0 ? M_y / reduced(V_z) : undefined,
      write: ({ M_y, V_z }, sheet) => {
        const M_y_Ed = sheet.given('M_y_Ed', M_y, 'kN m', 'Design moment about y-y', 'Analysis');
        sheet.given('V_z_Ed', V_z, 'kN', 'Design shear force at the same place', 'Analysis');
        const M_V_y_Rd = bendingResistanceWithShear(section, V_z, sheet);
        if (M_V_y_Rd > 0) sheet.evaluate(bendingShearYCriterion, { M_y_Ed, M_V_y_Rd });
        return { effect: kNm('M_y_Ed', M_y), resistance: kNm('M_V_y_Rd', M_V_y_Rd) };
      },
    },
    {
      id: 'bending-z',
      title: bendingZCriterion.title,
      clause: bendingZCriterion.clause,
      utilisation: ({ M_z }) => (M_z > 0 ? M_z / M_c_z_Rd : undefined),
      write: ({ M_z }, sheet) => {
        const M_z_Ed = sheet.given(
          'M_z_Ed',
          M_z,
          'kN m',
          'Design moment about z-z from own weight',
          'Analysis',
        );
        const resistance = bendingResistance(section, 'z', section.sectionClass, sheet);
        sheet.evaluate(bendingZCriterion, { M_z_Ed, M_c_z_Rd: resistance });
        return { effect: kNm('M_z_Ed', M_z), resistance: kNm('M_c_z_Rd', resistance) };
      },
    },
    {
      id: 'shear-y',
      title: shearYCriterion.title,
      clause: shearYCriterion.clause,
      utilisation: ({ V_y, M_z }) => {
        if (V_y > 0.5 * V_pl_y_Rd && M_z > 0) refuseSideShear();
        return V_y > 0 ? V_y / V_pl_y_Rd : undefined;
      },
      write: ({ V_y }, sheet) => {
        const V_y_Ed = sheet.given(
          'V_y_Ed',
          V_y,
          'kN',
          'Design shear force along the flanges',
          'Analysis',
        );
        const resistance = shearResistance(section, 'y', sheet);
        sheet.evaluate(shearYCriterion, { V_y_Ed, V_pl_y_Rd: resistance });
        return { effect: kN('V_y_Ed', V_y), resistance: kN('V_pl_y_Rd', resistance) };
      },
    },
    biaxial(section, reduced, M_c_z_Rd),
  ];
}

interface Moments {
  readonly M_y_Ed: number;
  readonly M_y_Rd: number;
  readonly M_z_Ed: number;
  readonly M_z_Rd: number;
}

/** Bending about both axes; shear along the web reduces the resistance about y-y. */
function biaxial(
  section: WalerSection,
  reduced: (V_z: number) => number,
  M_c_z_Rd: number,
): Criterion {
  const plastic = section.sectionClass <= 2;
  const { title, clause } = plastic ? biaxialCriterion : elasticBiaxialCriterion;
  // Without axial force n is 0, so that alpha is 2 and beta, 5 n but not below 1, is 1.
  const sumOf = (moments: Moments, sheet: Sheet): number => {
    const { M_y_Ed, M_y_Rd, M_z_Ed, M_z_Rd } = moments;
    return plastic
      ? sheet.evaluate(biaxialCriterion, {
          M_y_Ed,
          M_N_y_Rd: M_y_Rd,
          M_z_Ed,
          M_N_z_Rd: M_z_Rd,
          alpha: 2,
          beta: 1,
        })
      : sheet.evaluate(elasticBiaxialCriterion, moments);
  };
  return {
    id: 'biaxial',
    mayPeakBetween: true,
    title,
    clause,
    utilisation: ({ M_y, V_z, M_z }) => {
      if (!(M_z > 0)) return undefined;
      const M_y_Rd = reduced(V_z);
      if (M_y_Rd === 0) return M_y === 0 ? M_z / M_c_z_Rd : Infinity;
      return sumOf({ M_y_Ed: M_y, M_y_Rd, M_z_Ed: M_z, M_z_Rd: M_c_z_Rd }, silentSheet);
    },
    write: ({ M_y, V_z, M_z }, sheet) => {
      const M_y_Ed = sheet.given('M_y_Ed', M_y, 'kN m', 'Design moment about y-y', 'Analysis');
      sheet.given('V_z_Ed', V_z, 'kN', 'Design shear force along the web', 'Analysis');
      const M_z_Ed = sheet.given(
        'M_z_Ed',
        M_z,
        'kN m',
        'Design moment about z-z from own weight',
        'Analysis',
      );
      const M_y_Rd = bendingResistanceWithShear(section, V_z, sheet);
      const M_z_Rd = bendingResistance(section, 'z', section.sectionClass, sheet);
      const one: Side = { symbol: 'limit', value: M_y_Rd > 0 ? 1 : 0, unit: '1' };
      const sum = M_y_Rd > 0 ? sumOf({ M_y_Ed, M_y_Rd, M_z_Ed, M_z_Rd }, sheet) : 1;
      return { effect: { symbol: 'utilisation', value: sum, unit: '1' }, resistance: one };
    },
  };
}

function refuseSideShear(): never {
  return refuse(
    'shear-about-z',
    '/verticalSupports',
    'Own weight shears the flanges beyond half of their resistance; its reduction of bending about z-z is not covered by this version of the check.',
    'EN 1993-1-1 6.2.10',
  );
}
