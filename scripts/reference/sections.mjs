/** Outlines of the shapes and the properties of their gross areas, in mm. */
import { area, centroid, loop, plasticModulus, rectangle, secondMoment } from './outline.mjs';

/** @typedef {import('./outline.mjs').Axis} Axis */
/** @typedef {import('./outline.mjs').Corner} Corner */
/** @typedef {import('./outline.mjs').Interval} Interval */
/** @typedef {import('./outline.mjs').Outline} Outline */

/** @typedef {{ shape: 'I', h: number, b: number, tw: number, tf: number, r: number, fabrication: 'rolled' | 'welded' }} SectionI */
/** @typedef {{ shape: 'channel', h: number, b: number, tw: number, tf: number, r: number }} SectionChannel */
/** @typedef {{ shape: 'RHS', h: number, b: number, t: number, forming: 'hot-finished' | 'cold-formed' }} SectionRhs */
/** @typedef {{ shape: 'CHS', d: number, t: number, forming: 'hot-finished' | 'cold-formed' }} SectionChs */
/** @typedef {SectionI | SectionChannel | SectionRhs | SectionChs} Section */

/**
 * By the axis of bending: `y` is bending about y-y, so its distances run along z.
 * @typedef {{ A: number, I: Record<Axis, number>, Wel: Record<Axis, number>, Wpl: Record<Axis, number> }} Properties
 */

/** The coordinate along which the distances of bending about an axis run. @type {Record<Axis, Axis>} */
export const across = { y: 'z', z: 'y' };

/** Radii of the corners of a hollow section. @param {SectionRhs} section */
export function cornerRadii({ t, forming }) {
  if (forming === 'hot-finished') return { outer: 1.5 * t, inner: t };
  if (t <= 6) return { outer: 2 * t, inner: t };
  return t <= 10 ? { outer: 2.5 * t, inner: 1.5 * t } : { outer: 3 * t, inner: 2 * t };
}

/** The box around a section: y from 0 at the back of a channel, else both from the middle. @param {Section} section @returns {Record<Axis, Interval>} */
export function extents(section) {
  if (section.shape === 'CHS') {
    return { y: [-section.d / 2, section.d / 2], z: [-section.d / 2, section.d / 2] };
  }
  const { shape, h, b } = section;
  return { y: shape === 'channel' ? [0, b] : [-b / 2, b / 2], z: [-h / 2, h / 2] };
}

/** @param {Section} section @returns {Outline} */
export function outlineOf(section) {
  switch (section.shape) {
    case 'I':
      return loop(cornersOfI(section));
    case 'channel':
      return loop(cornersOfChannel(section));
    case 'RHS':
      return hollow(section.b, section.h, section.t, cornerRadii(section));
    case 'CHS': {
      const { d, t } = section;
      return hollow(d, d, t, { outer: d / 2, inner: d / 2 - t });
    }
  }
}

/** @param {SectionI} section @returns {Corner[]} */
function cornersOfI({ h, b, tw, tf, r }) {
  const inside = h / 2 - tf;
  /** @type {Corner[]} */
  const right = [
    { y: b / 2, z: -h / 2 },
    { y: b / 2, z: -inside },
    { y: tw / 2, z: -inside, radius: r },
    { y: tw / 2, z: inside, radius: r },
    { y: b / 2, z: inside },
    { y: b / 2, z: h / 2 },
  ];
  return [...right, ...right.map((corner) => ({ ...corner, y: -corner.y, z: -corner.z }))];
}

/** @param {SectionChannel} section @returns {Corner[]} */
function cornersOfChannel({ h, b, tw, tf, r }) {
  const inside = h / 2 - tf;
  return [
    { y: 0, z: -h / 2 },
    { y: b, z: -h / 2 },
    { y: b, z: -inside },
    { y: tw, z: -inside, radius: r },
    { y: tw, z: inside, radius: r },
    { y: b, z: inside },
    { y: b, z: h / 2 },
    { y: 0, z: h / 2 },
  ];
}

/** @param {number} b @param {number} h @param {number} t @param {{ outer: number, inner: number }} radii @returns {Outline} */
function hollow(b, h, t, { outer, inner }) {
  const round = (/** @type {number} */ radius) => (/** @type {Corner} */ corner) => ({
    ...corner,
    radius,
  });
  const outside = rectangle([-b / 2, b / 2], [-h / 2, h / 2]);
  const inside = rectangle([t - b / 2, b / 2 - t], [t - h / 2, h / 2 - t]);
  return [...loop(outside.map(round(outer))), ...loop(inside.map(round(inner)).reverse())];
}

/**
 * The least elastic modulus of an area about an axis.
 * @param {Outline} outline @param {Axis} axis @param {Interval} extent of the distances
 */
export function elasticModulus(outline, axis, [low, high]) {
  const middle = centroid(outline, across[axis]);
  return secondMoment(outline, across[axis]) / Math.max(high - middle, middle - low);
}

/** @param {Section} section @returns {Properties} */
export function propertiesOf(section) {
  const outline = outlineOf(section);
  const box = extents(section);
  /** @param {(axis: Axis) => number} one */
  const both = (one) => ({ y: one('y'), z: one('z') });
  return {
    A: area(outline),
    I: both((axis) => secondMoment(outline, across[axis])),
    Wel: both((axis) => elasticModulus(outline, axis, box[across[axis]])),
    Wpl: both((axis) => plasticModulus(outline, across[axis], box[across[axis]])),
  };
}
