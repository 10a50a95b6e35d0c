import { silentSheet } from '../../formula/sheet';
import { biaxialCriterion } from '../../steel/biaxial';
import type { SectionClass } from '../../steel/classification';
import { toUnit } from '../../units/units';
import type { CheckAnswer } from '../contract';
import { axialOf, type CrossEffects } from '../cross-section/effects';
import { plasticTerms, reducedByAxial } from '../cross-section/interaction';
import {
  axialResistance,
  classFor,
  isPlastic,
  momentResistance,
} from '../cross-section/resistances';
import type { Axis } from '../steel/bending';
import type { SteelSection } from '../steel/section';

type Curve = NonNullable<CheckAnswer['interaction']>[number];

const STEPS = 24;
const parts = Array.from({ length: STEPS + 1 }, (_, index) => index / STEPS);

/** What the section carries together, shear and torsion as they act, with the point that acts. */
export function curvesOf(section: SteelSection, effects: CrossEffects): Curve[] {
  const { M_y, M_z } = effects;
  const N = axialOf(effects);
  return [
    ...(N > 0 && M_y > 0 ? [axialCurve(section, effects, 'y')] : []),
    ...(N > 0 && M_z > 0 ? [axialCurve(section, effects, 'z')] : []),
    ...(M_y > 0 && M_z > 0 ? [biaxialCurve(section, effects)] : []),
  ];
}

/** Greatest moment about one axis for each axial force, the other moment absent. */
function axialCurve(section: SteelSection, effects: CrossEffects, axis: Axis): Curve {
  const N_Rd = mostAxial(section, effects);
  const curve = parts.map((part) => {
    const N = N_Rd * part;
    const loaded =
      effects.tension > 0 ? { ...effects, tension: N } : { ...effects, compression: N };
    const sectionClass = classFor(section, loaded, [axis], silentSheet);
    const M = isPlastic(section, sectionClass)
      ? reducedByAxial(section, loaded, axis, sectionClass, silentSheet)
      : leftByAxial(section, loaded, axis, sectionClass);
    return { x: toUnit(M, 'kN m'), y: toUnit(N, 'kN') };
  });
  const M = axis === 'y' ? effects.M_y : effects.M_z;
  return {
    verification: `bending-axial-${axis}`,
    x: { symbol: `M_${axis}_Ed`, unit: 'kN m' },
    y: { symbol: 'N_Ed', unit: 'kN' },
    curve,
    point: { x: toUnit(M, 'kN m'), y: toUnit(axialOf(effects), 'kN') },
  };
}

/** The axial force that leaves nothing for moments, N. */
function mostAxial(section: SteelSection, effects: CrossEffects): number {
  const { N_Rd } = axialResistance(section, effects, 2, silentSheet);
  if (effects.tension > 0) return N_Rd;
  const squashed = { ...effects, compression: N_Rd };
  const sectionClass = classFor(section, squashed, ['y', 'z'], silentSheet);
  return axialResistance(section, squashed, sectionClass, silentSheet).N_Rd;
}

/** The moment that a sum of ratios leaves beside the axial force and its shift, N mm. */
function leftByAxial(
  section: SteelSection,
  effects: CrossEffects,
  axis: Axis,
  sectionClass: SectionClass,
): number {
  const { N_Rd, e_N_z } = axialResistance(section, effects, sectionClass, silentSheet);
  const M_z_Rd = momentResistance(section, effects, 'z', sectionClass, silentSheet);
  const M_Rd =
    axis === 'z' ? M_z_Rd : momentResistance(section, effects, 'y', sectionClass, silentSheet);
  if (N_Rd === 0 || M_z_Rd === 0) return 0;
  const used = axialOf(effects) / N_Rd + (effects.compression * e_N_z) / M_z_Rd;
  return Math.max(1 - used, 0) * M_Rd;
}

/** Both moments at the axial force that acts, along rays from one axis to the other. */
function biaxialCurve(section: SteelSection, effects: CrossEffects): Curve {
  const sectionClass = classFor(section, effects, ['y', 'z'], silentSheet);
  const curve = isPlastic(section, sectionClass)
    ? plasticCurve(plasticTerms(section, effects, sectionClass, silentSheet))
    : [
        { x: leftByAxial(section, effects, 'y', sectionClass), y: 0 },
        { x: 0, y: leftByAxial(section, effects, 'z', sectionClass) },
      ];
  return {
    verification: 'biaxial',
    x: { symbol: 'M_y_Ed', unit: 'kN m' },
    y: { symbol: 'M_z_Ed', unit: 'kN m' },
    curve: curve.map(({ x, y }) => ({ x: toUnit(x, 'kN m'), y: toUnit(y, 'kN m') })),
    point: { x: toUnit(effects.M_y, 'kN m'), y: toUnit(effects.M_z, 'kN m') },
  };
}

/** (6.41) at its limit, by halving along each ray. */
function plasticCurve(terms: ReturnType<typeof plasticTerms>): { x: number; y: number }[] {
  const { M_N_y_Rd, M_N_z_Rd } = terms;
  if (M_N_y_Rd === 0 || M_N_z_Rd === 0) return [{ x: 0, y: 0 }];
  return parts.map((part) => {
    const ray = {
      M_y_Ed: M_N_y_Rd * Math.cos((part * Math.PI) / 2),
      M_z_Ed: M_N_z_Rd * Math.sin((part * Math.PI) / 2),
    };
    let [low, high] = [0, 2];
    for (let round = 0; round < 30; round += 1) {
      const middle = (low + high) / 2;
      const { M_y_Ed, M_z_Ed } = ray;
      const scaled = { M_y_Ed: M_y_Ed * middle, M_z_Ed: M_z_Ed * middle };
      if (biaxialCriterion.compute({ ...terms, ...scaled }) <= 1) low = middle;
      else high = middle;
    }
    return { x: ray.M_y_Ed * low, y: ray.M_z_Ed * low };
  });
}
