/**
 * Bending with axial force: EN 1993-1-1 6.2.9 and 6.2.10, as clauses.md has them. N and mm.
 */
import { isSlender } from './classes.mjs';
import { effectiveArea } from './effective.mjs';
import {
  bendingResistance,
  compressionResistance,
  shearAreas,
  shearWith,
  webHeight,
} from './resistances.mjs';

/** @typedef {import('./outline.mjs').Axis} Axis */
/** @typedef {import('./resistances.mjs').ByDirection} ByDirection */
/** @typedef {import('./resistances.mjs').Member} Member */
/** @typedef {import('./sections.mjs').Section} Section */
/** @typedef {import('./classes.mjs').SectionClass} SectionClass */
/**
 * What acts together, all without sign, and what the shear takes.
 * @typedef {object} Together
 * @property {Member} member
 * @property {SectionClass} of the class of the section
 * @property {ByDirection} rho
 * @property {number} axial
 * @property {boolean} compressed
 * @property {Record<Axis, number>} moments
 */

/** Whether 6.2.9.1 has a formula for the section; the others take linear sums. @param {Together} together */
export function isPlastic({ member, of }) {
  return of <= 2 && member.section.shape !== 'channel';
}

/** The axial resistance that shear leaves: 6.2.10. @param {Together} together */
function axialWithShear({ member, rho }) {
  const areas = shearAreas(member);
  return Math.max(0, member.gross.A - rho.z * areas.z - rho.y * areas.y) * member.fy;
}

/** @param {Together} together @param {Axis} axis */
function bendingWithShear({ member, of, rho }, axis) {
  return bendingResistance(member, axis, of, rho[shearWith[axis]]);
}

/** @param {Together} together */
function axialRatio(together) {
  return together.axial === 0 ? 0 : together.axial / axialWithShear(together);
}

/**
 * The plastic moment that the axial force leaves; 0 where it leaves none.
 * @param {Together} together @param {Axis} axis
 */
export function momentWithAxial(together, axis) {
  const whole = bendingWithShear(together, axis);
  const n = axialRatio(together);
  if (n >= 1) return 0;
  return Math.min(whole, whole * factor(together, axis, n));
}

/** @param {Together} together @param {Axis} axis @param {number} n */
function factor(together, axis, n) {
  const { section, gross } = together.member;
  switch (section.shape) {
    case 'I':
      return factorOfI(together, section, axis, n);
    case 'RHS': {
      const { h, b, t } = section;
      const side = axis === 'y' ? b : h;
      const a = Math.min(0.5, (gross.A - 2 * side * t) / gross.A);
      return (1 - n) / (1 - 0.5 * a);
    }
    case 'CHS':
      return 1 - n ** 1.7;
    case 'channel':
      throw new Error('A channel has no plastic interaction here.');
  }
}

/** @param {Together} together @param {import('./sections.mjs').SectionI} section @param {Axis} axis @param {number} n */
function factorOfI({ member, rho, axial }, section, axis, n) {
  const reduced = member.gross.A - rho.z * shearAreas(member).z;
  const a = Math.min(0.5, (reduced - 2 * section.b * section.tf) / reduced);
  const web = webHeight(section) * section.tw * member.fy * (1 - rho.z);
  if (axis === 'y') {
    return n <= 0.25 && axial <= 0.5 * web ? 1 : (1 - n) / (1 - 0.5 * a);
  }
  return n <= a || axial <= web ? 1 : 1 - ((n - a) / (1 - a)) ** 2;
}

/**
 * The left side of (6.41), or nothing where the axial force leaves no moment.
 * @param {Together} together
 */
export function plasticBiaxial(together) {
  const resistances = { y: momentWithAxial(together, 'y'), z: momentWithAxial(together, 'z') };
  if (resistances.y <= 0 || resistances.z <= 0) return null;
  const { alpha, beta } = exponents(together.member.section, axialRatio(together));
  const { y, z } = together.moments;
  return (y / resistances.y) ** alpha + (z / resistances.z) ** beta;
}

/** @param {Section} section @param {number} n */
function exponents(section, n) {
  if (section.shape === 'I') return { alpha: 2, beta: Math.max(1, 5 * n) };
  if (section.shape !== 'RHS') return { alpha: 2, beta: 2 };
  const left = 1 - 1.13 * n * n;
  const both = left > 0 ? Math.min(6, 1.66 / left) : 6;
  return { alpha: both, beta: both };
}

/**
 * The linear sum over the axial force and the moments about the given axes, or nothing where a
 * resistance is zero.
 * @param {Together} together @param {readonly Axis[]} axes
 */
export function linearSum(together, axes) {
  const { member, of, axial, compressed, moments } = together;
  const elastic = of >= 3;
  const withShear = axialWithShear(together);
  const resistance =
    elastic && compressed ? Math.min(withShear, compressionResistance(member)) : withShear;
  const shifts =
    elastic && compressed && isSlender(member.section, member.fy)
      ? effectiveArea(member.section, member.fy).e
      : { y: 0, z: 0 };

  /** @type {[effect: number, resistance: number][]} */
  const terms = axes.map((axis) => [
    moments[axis] + axial * shifts[axis],
    bendingWithShear(together, axis),
  ]);
  if (axial > 0) terms.push([axial, resistance]);
  if (terms.some(([, right]) => right <= 0)) return null;
  return terms.reduce((sum, [left, right]) => sum + left / right, 0);
}
