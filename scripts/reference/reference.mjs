/** What `POST /v1/checks/section` owes for a request, calculated apart from the engine. */
import { classAbout, worst } from './classes.mjs';
import { isPlastic, linearSum, momentWithAxial, plasticBiaxial } from './interaction.mjs';
import {
  bendingResistance,
  bucklingShear,
  compressionResistance,
  memberOf,
  plasticShear,
  shearReductions,
  shearWith,
  tensionResistance,
} from './resistances.mjs';

/** @typedef {import('./outline.mjs').Axis} Axis */
/** @typedef {import('./sections.mjs').Section} Section */
/** @typedef {import('./classes.mjs').SectionClass} SectionClass */
/** In kN and kN m. @typedef {{ compression?: number, tension?: number, My?: number, Mz?: number, Vy?: number, Vz?: number }} Effects */
/** @typedef {{ material: { type: 'steel', fy: number }, section: Section, effects: Effects }} SectionRequest */
/**
 * In kN and kN m, 1 for a sum. The effect has no sign, and is null for a sum with a resistance of
 * zero; the utilisation is null wherever a resistance is zero.
 * @typedef {{ effect: number | null, resistance: number, utilisation: number | null }} Expected
 */
/** @typedef {{ refused: false, section_class: SectionClass, verifications: Record<string, Expected> }} Answered */
/** @typedef {{ refused: true, why: string }} Refused */

/** @typedef {import('./interaction.mjs').Together & { shear: Record<Axis, number>, classes: Record<Axis, SectionClass> }} Case */

/** @type {readonly Axis[]} */
const AXES = ['y', 'z'];
const KILO = 1e3;
const MEGA = 1e6;

/** @param {number} effect @param {number} resistance @param {number} unit @returns {Expected} */
function against(effect, resistance, unit) {
  return {
    effect: effect / unit,
    resistance: resistance / unit,
    utilisation: resistance > 0 ? effect / resistance : null,
  };
}

/** @param {number | null} sum @returns {Expected} */
function summed(sum) {
  return { effect: sum, resistance: 1, utilisation: sum };
}

/** @param {SectionRequest} request @returns {Answered | Refused} */
export function expectedOf(request) {
  const given = caseOf(request);
  if (given.member.section.shape === 'CHS' && given.of === 4) {
    return { refused: true, why: 'A circular hollow section of class 4: EN 1993-1-6.' };
  }
  const verifications = { ...alone(given), ...bendingWithShear(given), ...withAxial(given) };
  return { refused: false, section_class: given.of, verifications };
}

/** @param {SectionRequest} request @returns {Case} */
function caseOf({ material: { fy }, section, effects }) {
  const member = memberOf(section, fy);
  const compression = (effects.compression ?? 0) * KILO;
  const axial = compression + (effects.tension ?? 0) * KILO;
  const moments = {
    y: Math.abs(effects.My ?? 0) * MEGA,
    z: Math.abs(effects.Mz ?? 0) * MEGA,
  };
  const shear = { y: Math.abs(effects.Vy ?? 0) * KILO, z: Math.abs(effects.Vz ?? 0) * KILO };
  const loaded = { section, fy, A: member.gross.A, compression };
  const classes = { y: classAbout(loaded, 'y'), z: classAbout(loaded, 'z') };
  const acting = AXES.filter((axis) => moments[axis] > 0);
  const of = worst((acting.length === 1 ? acting : AXES).map((axis) => classes[axis]));
  const rho = shearReductions(member, shear);
  return { member, of, rho, axial, compressed: compression > 0, moments, shear, classes };
}

/** Each effect by itself. @param {Case} given */
function alone({ member, axial, compressed, moments, shear, classes }) {
  /** @type {Record<string, Expected>} */
  const made = {};
  if (axial > 0) {
    if (compressed) made['compression'] = against(axial, compressionResistance(member), KILO);
    else made['tension'] = against(axial, tensionResistance(member), KILO);
  }
  for (const axis of AXES) {
    if (moments[axis] > 0) {
      const resistance = bendingResistance(member, axis, classes[axis], 0);
      made[`bending-${axis}`] = against(moments[axis], resistance, MEGA);
    }
    if (shear[axis] > 0) {
      made[`shear-${axis}`] = against(shear[axis], plasticShear(member, axis), KILO);
    }
  }
  const buckling = shear.z > 0 ? bucklingShear(member) : undefined;
  if (buckling !== undefined) made['web-buckling-shear'] = against(shear.z, buckling, KILO);
  return made;
}

/** @param {Case} given */
function bendingWithShear({ member, moments, rho, classes }) {
  /** @type {Record<string, Expected>} */
  const made = {};
  for (const axis of AXES) {
    const lost = rho[shearWith[axis]];
    if (moments[axis] === 0 || lost === 0) continue;
    const resistance = bendingResistance(member, axis, classes[axis], lost);
    made[`bending-shear-${axis}`] = against(moments[axis], resistance, MEGA);
  }
  return made;
}

/** @param {Case} given */
function withAxial(given) {
  const { axial, moments } = given;
  /** @type {Record<string, Expected>} */
  const made = {};
  for (const axis of AXES) {
    if (axial === 0 || moments[axis] === 0) continue;
    made[`bending-axial-${axis}`] = isPlastic(given)
      ? against(moments[axis], momentWithAxial(given, axis), MEGA)
      : summed(linearSum(given, [axis]));
  }
  if (moments.y > 0 && moments.z > 0) {
    made['biaxial'] = summed(isPlastic(given) ? plasticBiaxial(given) : linearSum(given, AXES));
  }
  return made;
}
