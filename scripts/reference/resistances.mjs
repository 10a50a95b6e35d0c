/**
 * Resistances of a cross-section to one effect, and to bending with shear: EN 1993-1-1 6.2.3 to
 * 6.2.8 and EN 1993-1-5 5, as clauses.md has them. N and mm; both partial factors are 1.
 */
import { epsilonOf, isSlender } from './classes.mjs';
import { effectiveArea, effectiveModulus } from './effective.mjs';
import { propertiesOf } from './sections.mjs';

/** @typedef {import('./outline.mjs').Axis} Axis */
/** @typedef {import('./sections.mjs').Properties} Properties */
/** @typedef {import('./sections.mjs').Section} Section */
/** @typedef {import('./classes.mjs').SectionClass} SectionClass */
/** Shear by its direction, or what follows from it. @typedef {Record<Axis, number>} ByDirection */
/** @typedef {{ section: Section, fy: number, gross: Properties }} Member */

/** EN 1993-1-5 5.1, for steels up to S460. */
const ETA = 1.2;

/** The shear that goes with bending about an axis. @type {Record<Axis, Axis>} */
export const shearWith = { y: 'z', z: 'y' };

/** @param {Section} section @param {number} fy @returns {Member} */
export function memberOf(section, fy) {
  return { section, fy, gross: propertiesOf(section) };
}

/** @param {Member} member */
export function tensionResistance({ gross, fy }) {
  return gross.A * fy;
}

/**
 * The whole area up to class 3, what uniform compression leaves of class 4 plates beyond; that is also
 * the most that any force finds.
 * @param {Member} member @param {SectionClass} of @param {number} compression
 */
export function compressionResistance({ section, fy, gross }, of, compression) {
  const squashed = isSlender(section, fy) ? effectiveArea(section, fy).A * fy : gross.A * fy;
  return of === 4 || compression > squashed ? squashed : gross.A * fy;
}

/** Clear height of the webs along a direction. @param {Section} section @param {Axis} [direction] */
export function webHeight(section, direction = 'z') {
  switch (section.shape) {
    case 'I':
    case 'channel':
      return section.h - 2 * section.tf;
    case 'RHS':
      return (direction === 'z' ? section.h : section.b) - 2 * section.t;
    case 'CHS':
      return 0;
  }
}

/** @param {Member} member @returns {ByDirection} */
export function shearAreas({ section, gross: { A } }) {
  switch (section.shape) {
    case 'I': {
      const { b, tw, tf, r } = section;
      const least = ETA * webHeight(section) * tw;
      const rolled = Math.max(A - 2 * b * tf + (tw + 2 * r) * tf, least);
      return { z: section.fabrication === 'rolled' ? rolled : least, y: 2 * b * tf };
    }
    case 'channel': {
      const { b, tw, tf, r } = section;
      return { z: A - 2 * b * tf + (tw + r) * tf, y: 2 * b * tf };
    }
    case 'RHS': {
      const { h, b } = section;
      return { z: (A * h) / (b + h), y: (A * b) / (b + h) };
    }
    case 'CHS':
      return { z: (2 * A) / Math.PI, y: (2 * A) / Math.PI };
  }
}

/** @param {Member} member @param {Axis} direction */
export function plasticShear(member, direction) {
  return (shearAreas(member)[direction] * member.fy) / Math.sqrt(3);
}

/** How many webs there are, and how thick. @param {Exclude<Section, { shape: 'CHS' }>} section */
export function websAlong(section) {
  return section.shape === 'RHS'
    ? { thickness: section.t, webs: 2 }
    : { thickness: section.tw, webs: 1 };
}

/**
 * The resistance of the webs along a direction to shear buckling, where they are slender enough for
 * it to count; only a hollow section has any along y.
 * @param {Member} member @param {Axis} direction
 */
export function bucklingShear({ section, fy }, direction) {
  if (section.shape === 'CHS' || (direction === 'y' && section.shape !== 'RHS')) return undefined;
  const { thickness, webs } = websAlong(section);
  const height = webHeight(section, direction);
  const epsilon = epsilonOf(fy);
  if (height / thickness <= (72 * epsilon) / ETA) return undefined;
  const lambda = height / (86.4 * thickness * epsilon);
  const chi = lambda < 0.83 / ETA ? ETA : 0.83 / lambda;
  return (chi * fy * height * thickness * webs) / Math.sqrt(3);
}

/**
 * By how much shear lowers the yield strength of its area: 6.2.8(3), by the lesser of the plastic
 * resistance and that to buckling. On a tube both forces are one, and take from bending about both axes.
 * @param {Member} member @param {ByDirection} shear @returns {ByDirection}
 */
export function shearReductions(member, shear) {
  /** @param {Axis} direction */
  const one = (direction) => {
    const resistance = Math.min(
      plasticShear(member, direction),
      bucklingShear(member, direction) ?? Infinity,
    );
    const isTube = member.section.shape === 'CHS';
    const ratio = (isTube ? Math.hypot(shear.y, shear.z) : shear[direction]) / resistance;
    return ratio > 0.5 ? Math.min(1, (2 * ratio - 1) ** 2) : 0;
  };
  return { y: one('y'), z: one('z') };
}

/** No shear that takes from bending. @type {ByDirection} */
export const unsheared = { y: 0, z: 0 };

/**
 * Bending about an axis, lowered by the shear that acts along either.
 * @param {Member} member @param {Axis} axis @param {SectionClass} of @param {ByDirection} rho
 */
export function bendingResistance(member, axis, of, rho) {
  return Math.max(0, modulus(member, axis, of, rho)) * member.fy;
}

/** @param {Member} member @param {Axis} axis @param {SectionClass} of @param {ByDirection} rho */
function modulus(member, axis, of, rho) {
  const { section, fy, gross } = member;
  const left = 1 - (section.shape === 'I' && axis === 'z' ? rho.y : Math.max(rho.y, rho.z));
  switch (of) {
    case 1:
    case 2:
      return plasticModulus(member, axis, rho, left);
    case 3:
      if (axis === 'z' || section.shape === 'RHS' || section.shape === 'CHS') {
        return gross.Wel[axis] * left;
      }
      return Math.min(
        (1 - rho.y) * gross.Wel.y,
        ((1 - rho.z) * 2 * gross.I.y) / webHeight(section),
      );
    case 4:
      return effectiveModulus(section, fy, axis) * left;
  }
}

/** @param {Member} member @param {Axis} axis @param {ByDirection} rho @param {number} left */
function plasticModulus(member, axis, rho, left) {
  const { section, gross } = member;
  const whole = gross.Wpl[axis];
  if (section.shape === 'RHS') {
    const across = shearWith[axis];
    const areas = shearAreas(member);
    const depth = axis === 'y' ? section.h : section.b;
    const { t } = section;
    const webs = (rho[across] * areas[across] ** 2) / (8 * t);
    return whole - webs - (rho[axis] * areas[axis] * (depth - t)) / 2;
  }
  if (section.shape === 'CHS' || axis === 'z') return whole * left;
  const { h, b, tf, tw } = section;
  const web = webHeight(section) * tw;
  return whole - (rho.z * web ** 2) / (4 * tw) - rho.y * b * tf * (h - tf);
}
