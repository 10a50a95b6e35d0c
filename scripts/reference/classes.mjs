/** Classification: EN 1993-1-1 5.5 and Table 5.2, as clauses.md has it. N in newtons. */

/** @typedef {import('./outline.mjs').Axis} Axis */
/** @typedef {import('./sections.mjs').Section} Section */
/** @typedef {1 | 2 | 3 | 4} SectionClass */
/** @typedef {[class1: number, class2: number, class3: number]} Limits */
/** A wall with both edges held. @typedef {{ c: number, t: number, count: number }} Wall */
/** @typedef {{ section: Section, fy: number, A: number, compression: number }} Loaded */

/** @type {Limits} */
const OUTSTAND = [9, 10, 14];
/** @type {Limits} */
const SQUASHED = [33, 38, 42];
/** @type {Limits} */
const TUBE = [50, 70, 90];

/** @param {number} fy */
export function epsilonOf(fy) {
  return Math.sqrt(235 / fy);
}

/**
 * Width and thickness of one outstand, or none.
 * @param {Section} section
 */
export function outstandOf(section) {
  if (section.shape === 'I') {
    return { c: (section.b - section.tw - 2 * section.r) / 2, t: section.tf };
  }
  if (section.shape === 'channel') return { c: section.b - section.tw - section.r, t: section.tf };
  return undefined;
}

/**
 * The walls square to an axis of bending, that is what serves as its webs: for y-y those along z.
 * @param {Section} section @param {Axis} axis @returns {Wall | undefined}
 */
export function websOf(section, axis) {
  if (section.shape === 'CHS') return undefined;
  if (section.shape === 'RHS') {
    const { t } = section;
    const side = axis === 'y' ? section.h : section.b;
    return { c: side - 3 * t, t, count: 2 };
  }
  if (axis === 'z') return undefined;
  return { c: section.h - 2 * section.tf - 2 * section.r, t: section.tw, count: 1 };
}

/** @param {number} slenderness @param {Limits} limits @returns {SectionClass} */
function classBy(slenderness, [first, second, third]) {
  if (slenderness <= first) return 1;
  if (slenderness <= second) return 2;
  return slenderness <= third ? 3 : 4;
}

/**
 * Limits of a web by the compression that goes with its bending.
 * @param {Wall} web @param {Loaded} loaded @returns {Limits}
 */
function webLimits({ c, t, count }, { fy, A, compression }) {
  const alpha = Math.min(1, 0.5 * (1 + compression / (count * c * t * fy)));
  const psi = Math.min(1, (2 * compression) / (A * fy) - 1);
  const third = psi > -1 ? 42 / (0.67 + 0.33 * psi) : 124;
  if (alpha <= 0.5) return [72, 83, third];
  return [396 / (13 * alpha - 1), 456 / (13 * alpha - 1), third];
}

/**
 * The class for bending about one axis, with the compression there is.
 * @param {Loaded} loaded @param {Axis} axis @returns {SectionClass}
 */
export function classAbout(loaded, axis) {
  const { section, fy } = loaded;
  const epsilon = epsilonOf(fy);
  if (section.shape === 'CHS') return classBy(section.d / section.t / epsilon ** 2, TUBE);

  /** @type {SectionClass[]} */
  const classes = [];
  const outstand = outstandOf(section);
  if (outstand) classes.push(classBy(outstand.c / outstand.t / epsilon, OUTSTAND));
  // The web of an I counts about both axes.
  const webs = websOf(section, section.shape === 'I' ? 'y' : axis);
  if (webs) classes.push(classBy(webs.c / webs.t / epsilon, webLimits(webs, loaded)));
  const squashed = squashedBy(section, axis);
  if (squashed) classes.push(classBy(squashed.c / squashed.t / epsilon, SQUASHED));
  return worst(classes);
}

/** What the bending compresses uniformly: the far walls of a hollow section, the web of a channel. @param {Section} section @param {Axis} axis */
function squashedBy(section, axis) {
  if (section.shape === 'RHS') return websOf(section, axis === 'y' ? 'z' : 'y');
  return section.shape === 'channel' && axis === 'z' ? websOf(section, 'y') : undefined;
}

/** @param {readonly SectionClass[]} classes */
export function worst(classes) {
  return classes.reduce((one, other) => (one > other ? one : other), 1);
}

/** Whether a flange is of class 4 where it is compressed. @param {Section} section @param {number} fy */
export function hasSlenderFlange(section, fy) {
  const epsilon = epsilonOf(fy);
  const outstand = outstandOf(section);
  if (outstand) return outstand.c / outstand.t > OUTSTAND[2] * epsilon;
  const wall = websOf(section, 'z');
  return wall !== undefined && wall.c / wall.t > SQUASHED[2] * epsilon;
}

/** Whether any part is of class 4 under compression alone. @param {Section} section @param {number} fy */
export function isSlender(section, fy) {
  const epsilon = epsilonOf(fy);
  if (section.shape === 'CHS') return section.d / section.t > TUBE[2] * epsilon ** 2;
  const web = websOf(section, 'y');
  return (
    hasSlenderFlange(section, fy) || (web !== undefined && web.c / web.t > SQUASHED[2] * epsilon)
  );
}
