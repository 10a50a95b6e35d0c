/**
 * Bending with axial force: EN 1993-1-1 6.2.9 and 6.2.10, and with the shear of webs that buckle:
 * EN 1993-1-5 7.1, as clauses.md has them. N and mm.
 */
import { isSlender } from './classes.mjs';
import { effectiveArea, flangeArea, flangeThickness } from './effective.mjs';
import {
  bendingResistance,
  bucklingShear,
  compressionResistance,
  shearAreas,
  webHeight,
  websAlong,
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
 * @property {Record<Axis, SectionClass>} classes about each axis
 * @property {ByDirection} rho
 * @property {number} axial
 * @property {boolean} compressed
 * @property {Record<Axis, number>} moments
 * @property {ByDirection} shear
 */

/** @type {readonly Axis[]} */
const AXES = ['y', 'z'];

/** Whether 6.2.9.1 has a formula for the section; the others take linear sums. @param {Together} together */
export function isPlastic({ member, of }) {
  return of <= 2 && member.section.shape !== 'channel';
}

/** The axial resistance that shear leaves: 6.2.10. @param {Together} together */
function axialWithShear({ member, rho }) {
  const areas = shearAreas(member);
  // The one force on a tube takes its area once.
  const along = member.section.shape === 'CHS' ? 0 : rho.y * areas.y;
  return Math.max(0, member.gross.A - rho.z * areas.z - along) * member.fy;
}

/** @param {Together} together @param {Axis} axis */
function bendingWithShear({ member, of, rho }, axis) {
  return bendingResistance(member, axis, of, rho);
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
      const a = webShare(gross.A, 2 * side * t);
      return (1 - n) / (1 - 0.5 * a);
    }
    case 'CHS':
      return Math.max(0, Math.min(1 - n ** 1.7, Math.cos((Math.PI / 2) * n)));
    case 'channel':
      throw new Error('A channel has no plastic interaction here.');
  }
}

/** The a of 6.2.9.1(5). @param {number} whole area @param {number} flanges */
function webShare(whole, flanges) {
  return Math.max(0, Math.min(0.5, (whole - flanges) / whole));
}

/** @param {Together} together @param {import('./sections.mjs').SectionI} section @param {Axis} axis @param {number} n */
function factorOfI({ member, rho, axial }, section, axis, n) {
  const reduced = member.gross.A - rho.z * shearAreas(member).z;
  const a = webShare(reduced, 2 * section.b * section.tf);
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
 * The eccentricities that compression has of the effective area; only a channel's is not zero.
 * @param {Together} together @returns {Record<Axis, number>}
 */
function shiftsOf({ member, of, axial, compressed }) {
  const { section, fy, gross } = member;
  const none = { y: 0, z: 0 };
  if (!compressed || of <= 2 || !isSlender(section, fy)) return none;
  const isSquashed = compressionResistance(member, of, axial) < gross.A * fy;
  return isSquashed ? effectiveArea(section, fy).e : none;
}

/** Whether the axial force bends about an axis by itself. @param {Together} together @param {Axis} axis */
export function isShifted(together, axis) {
  return shiftsOf(together)[axis] > 0;
}

/** The axial force over what shear and buckling leave for it. @param {Together} together */
function axialSum(together) {
  const { member, of, axial, compressed } = together;
  if (axial === 0) return 0;
  const withShear = axialWithShear(together);
  const resistance =
    of >= 3 && compressed
      ? Math.min(withShear, compressionResistance(member, of, axial))
      : withShear;
  return resistance > 0 ? axial / resistance : null;
}

/**
 * The linear sum over the axial force, what it bends by its eccentricity, and the moments about the
 * given axes, or nothing where a resistance is zero.
 * @param {Together} together @param {readonly Axis[]} axes
 */
export function linearSum(together, axes) {
  const { axial, moments } = together;
  const shifts = shiftsOf(together);
  let sum = axialSum(together);
  for (const axis of AXES) {
    const moment = (axes.includes(axis) ? moments[axis] : 0) + axial * shifts[axis];
    if (moment === 0) continue;
    const resistance = bendingWithShear(together, axis);
    if (sum === null || resistance <= 0) return null;
    sum += moment / resistance;
  }
  return sum;
}

/**
 * EN 1993-1-5 7.1: the sum for bending about y-y with the shear of webs that buckle, or nothing where
 * it does not apply.
 * @param {Together} together
 */
export function bucklingSum({ member, axial, moments, shear, rho }) {
  const { section, fy } = member;
  const resistance = bucklingShear(member, 'z');
  if (section.shape === 'CHS' || resistance === undefined) return undefined;
  if (shear.z <= 0.5 * resistance) return undefined;
  const one = flangeArea(section, fy) * (1 - rho.y);
  const arm = section.h - flangeThickness(section);
  const { thickness, webs } = websAlong(section);
  const flanges = one > 0 ? one * arm * fy * Math.max(0, 1 - axial / (2 * one * fy)) : 0;
  const plastic = (one * arm + (webs * thickness * webHeight(section) ** 2) / 4) * fy;
  return moments.y / plastic + (1 - flanges / plastic) * ((2 * shear.z) / resistance - 1) ** 2;
}
