/** What `POST /v1/checks/section` owes for a request, calculated apart from the engine. */
import { classAbout, worst } from './classes.mjs';
import {
  bucklingSum,
  isPlastic,
  isShifted,
  linearSum,
  momentWithAxial,
  plasticBiaxial,
} from './interaction.mjs';
import { randomRequests } from './random.mjs';
import {
  bendingResistance,
  bucklingShear,
  compressionResistance,
  memberOf,
  plasticShear,
  shearReductions,
  shearWith,
  tensionResistance,
  unsheared,
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

/** @typedef {import('./interaction.mjs').Together} Case */

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

/** Requests at random with what is expected of each. @param {number} [count] */
export function casesAtRandom(count) {
  return randomRequests(count).map((request) => ({ request, expected: expectedOf(request) }));
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
  const shear = shearOf(section, effects);
  const loaded = { section, fy, A: member.gross.A, compression };
  const classes = { y: classAbout(loaded, 'y'), z: classAbout(loaded, 'z') };
  const acting = AXES.filter((axis) => moments[axis] > 0);
  const of = worst((acting.length === 1 ? acting : AXES).map((axis) => classes[axis]));
  const rho = shearReductions(member, shear);
  return { member, of, classes, rho, axial, compressed: compression > 0, moments, shear };
}

/** Two forces on a tube are one, which goes as that along z. @param {Section} section @param {Effects} effects */
function shearOf({ shape }, effects) {
  const shear = { y: Math.abs(effects.Vy ?? 0) * KILO, z: Math.abs(effects.Vz ?? 0) * KILO };
  if (shape !== 'CHS' || shear.y === 0 || shear.z === 0) return shear;
  return { y: 0, z: Math.hypot(shear.y, shear.z) };
}

/** Each effect by itself. @param {Case} given */
function alone({ member, axial, compressed, moments, shear, classes }) {
  /** @type {Record<string, Expected>} */
  const made = {};
  if (axial > 0) {
    if (compressed)
      made['compression'] = against(axial, squashOf({ member, axial, classes }), KILO);
    else made['tension'] = against(axial, tensionResistance(member), KILO);
  }
  for (const axis of AXES) {
    if (moments[axis] > 0) {
      const resistance = bendingResistance(member, axis, classes[axis], unsheared);
      made[`bending-${axis}`] = against(moments[axis], resistance, MEGA);
    }
    if (shear[axis] > 0) {
      made[`shear-${axis}`] = against(shear[axis], plasticShear(member, axis), KILO);
    }
  }
  const buckling = webBuckling({ member, shear });
  if (buckling) made['web-buckling-shear'] = buckling;
  return made;
}

/** The worse of the directions in which webs buckle. @param {Pick<Case, 'member' | 'shear'>} given */
function webBuckling({ member, shear }) {
  return AXES.flatMap((axis) => {
    const resistance = shear[axis] > 0 ? bucklingShear(member, axis) : undefined;
    return resistance === undefined ? [] : [against(shear[axis], resistance, KILO)];
  })
    .sort((one, other) => (other.utilisation ?? 0) - (one.utilisation ?? 0))
    .at(0);
}

/** @param {Case} given */
function bendingWithShear(given) {
  const { member, moments, rho, classes } = given;
  /** @type {Record<string, Expected>} */
  const made = {};
  for (const axis of AXES) {
    if (moments[axis] === 0) continue;
    const sum = axis === 'y' ? bucklingSum(given) : undefined;
    if (sum !== undefined) made['bending-shear-y'] = summed(sum);
    if (sum !== undefined || (rho.y === 0 && rho.z === 0)) continue;
    const resistance = bendingResistance(member, axis, classes[axis], rho);
    made[`bending-shear-${axis}`] = against(moments[axis], resistance, MEGA);
  }
  return made;
}

/** Against compression the worse of both classes counts, whatever bends. @param {Pick<Case, 'member' | 'axial' | 'classes'>} given */
function squashOf({ member, axial, classes }) {
  return compressionResistance(member, worst([classes.y, classes.z]), axial);
}

/** The class of one axis where its moment acts alone, else the worse of both. @param {Case} given @param {Axis} axis @returns {Case} */
function seenFrom(given, axis) {
  const { moments, classes } = given;
  const isAlone = moments[axis] > 0 && moments[shearWith[axis]] === 0;
  return { ...given, of: isAlone ? classes[axis] : worst([classes.y, classes.z]) };
}

/** @param {Case} given */
function withAxial(given) {
  const { axial, moments, rho } = given;
  /** @type {Record<string, Expected>} */
  const made = {};
  for (const axis of AXES) {
    const seen = seenFrom(given, axis);
    if (axial === 0 || (moments[axis] === 0 && !isShifted(seen, axis))) continue;
    made[`bending-axial-${axis}`] =
      isPlastic(seen) && moments[axis] > 0
        ? against(moments[axis], momentWithAxial(seen, axis), MEGA)
        : summed(linearSum(seen, [axis]));
  }
  const isBent = moments.y > 0 || moments.z > 0;
  if (axial > 0 && !isBent && (rho.y > 0 || rho.z > 0)) {
    made['bending-axial-y'] = summed(linearSum(given, []));
  }
  if (moments.y > 0 && moments.z > 0) {
    made['biaxial'] = summed(isPlastic(given) ? plasticBiaxial(given) : linearSum(given, AXES));
  }
  return made;
}
