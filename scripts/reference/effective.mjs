/** Effective areas of class 4: EN 1993-1-5 4.4, as clauses.md has it. */
import { epsilonOf, hasSlenderFlange, isSlender, outstandOf, websOf } from './classes.mjs';
import { area, centroid, hole } from './outline.mjs';
import { elasticModulus, extents, outlineOf } from './sections.mjs';

/** @typedef {import('./outline.mjs').Axis} Axis */
/** @typedef {import('./outline.mjs').Interval} Interval */
/** @typedef {import('./outline.mjs').Outline} Outline */
/** @typedef {import('./sections.mjs').Section} Section */
/** What is taken away, and which way its neighbours lie. @typedef {{ y: Interval, z: Interval }} Cut */

/** @param {number} psi */
export function bucklingFactor(psi) {
  if (psi >= 0) return psi === 1 ? 4 : 8.2 / (1.05 + psi);
  // Table 4.1 gives the round value that both branches meet at.
  if (Math.abs(psi + 1) < 1e-9) return 23.9;
  return psi > -1 ? 7.81 - 6.29 * psi + 9.78 * psi * psi : 5.98 * (1 - psi) ** 2;
}

/** @param {{ c: number, t: number }} wall @param {number} fy @param {number} psi */
export function reductionOfWall({ c, t }, fy, psi) {
  const lambda = c / t / (28.4 * epsilonOf(fy) * Math.sqrt(bucklingFactor(psi)));
  if (lambda <= 0.5 + Math.sqrt(0.085 - 0.055 * psi)) return 1;
  return Math.min(1, (lambda - 0.055 * (3 + psi)) / lambda ** 2);
}

/** Under uniform compression. @param {{ c: number, t: number }} outstand @param {number} fy */
export function reductionOfOutstand({ c, t }, fy) {
  const lambda = c / t / (28.4 * epsilonOf(fy) * Math.sqrt(0.43));
  return lambda <= 0.748 ? 1 : Math.min(1, (lambda - 0.188) / lambda ** 2);
}

/** @param {Outline} outline @param {readonly Cut[]} cuts @returns {Outline} */
function without(outline, cuts) {
  return [...outline, ...cuts.flatMap(({ y, z }) => hole(y, z))];
}

/** The same on the other side of y-y. @param {Cut} cut @returns {Cut} */
function below({ y, z: [low, high] }) {
  return { y, z: [-high, -low] };
}

/** How thick what carries the flange forces is. @param {Section} section */
export function flangeThickness(section) {
  return 'tf' in section ? section.tf : section.t;
}

/** What uniform compression takes from the upper flange. @param {Section} section @param {number} fy @returns {Cut[]} */
function flangeCuts(section, fy) {
  if (section.shape === 'CHS') return [];
  /** @type {Interval} */
  const z = [section.h / 2 - flangeThickness(section), section.h / 2];
  const { b } = section;
  const outstand = outstandOf(section);
  if (!outstand) {
    const wall = websOf(section, 'z');
    if (!wall) return [];
    const half = ((1 - reductionOfWall(wall, fy, 1)) * wall.c) / 2;
    return half > 0 ? [{ y: [-half, half], z }] : [];
  }
  const lost = (1 - reductionOfOutstand(outstand, fy)) * outstand.c;
  if (lost <= 0) return [];
  if (section.shape === 'channel') return [{ y: [b - lost, b], z }];
  return [
    { y: [b / 2 - lost, b / 2], z },
    { y: [-b / 2, lost - b / 2], z },
  ];
}

/**
 * The area of one flange, less what buckling takes of one of class 4.
 * @param {Exclude<Section, { shape: 'CHS' }>} section @param {number} fy
 */
export function flangeArea(section, fy) {
  const gross = section.b * flangeThickness(section);
  const cuts = hasSlenderFlange(section, fy) ? flangeCuts(section, fy) : [];
  return cuts.reduce((left, { y, z }) => left - (y[1] - y[0]) * (z[1] - z[0]), gross);
}

/** A height taken from every web. @param {Section} section @param {Interval} z @returns {Cut[]} */
function webCuts(section, z) {
  if (z[1] <= z[0]) return [];
  switch (section.shape) {
    case 'I':
      return [{ y: [-section.tw / 2, section.tw / 2], z }];
    case 'channel':
      return [{ y: [0, section.tw], z }];
    case 'RHS': {
      const { b, t } = section;
      return [
        { y: [b / 2 - t, b / 2], z },
        { y: [-b / 2, t - b / 2], z },
      ];
    }
    case 'CHS':
      return [];
  }
}

/** @param {Section} section @param {number} fy @returns {Cut[]} */
function squashedWebCuts(section, fy) {
  const web = websOf(section, 'y');
  if (!web) return [];
  const half = ((1 - reductionOfWall(web, fy, 1)) * web.c) / 2;
  return webCuts(section, [-half, half]);
}

/**
 * The area that carries compression alone, and how far its centroid has moved: `e.z` is the shift
 * along y, which bends about z-z.
 * @param {Section} section @param {number} fy
 */
export function effectiveArea(section, fy) {
  const gross = outlineOf(section);
  if (!isSlender(section, fy)) return { A: area(gross), e: { y: 0, z: 0 } };
  const flange = flangeCuts(section, fy);
  const cuts = [...flange, ...flange.map(below), ...squashedWebCuts(section, fy)];
  const left = without(gross, cuts);
  const shift = Math.abs(centroid(left, 'y') - centroid(gross, 'y'));
  return { A: area(left), e: { y: 0, z: section.shape === 'channel' ? shift : 0 } };
}

/** @param {Section} section @param {number} fy @param {Axis} axis */
export function effectiveModulus(section, fy, axis) {
  if (axis === 'y') return modulusAboutY(section, fy);
  switch (section.shape) {
    case 'I':
      return modulusOfIAboutZ(section, fy);
    case 'channel':
      return modulusOfChannelAboutZ(section, fy);
    case 'RHS':
      return modulusAboutY({ ...section, h: section.b, b: section.h }, fy);
    case 'CHS':
      throw new Error('A tube of class 4 has no effective section here.');
  }
}

/** The compressed flange first, then the web by the stresses of what is left. @param {Section} section @param {number} fy */
function modulusAboutY(section, fy) {
  const gross = outlineOf(section);
  const { z: box } = extents(section);
  const flange = flangeCuts(section, fy);
  const web = websOf(section, 'y');
  if (!web) throw new Error('There is no web.');

  const axis = centroid(without(gross, flange), 'z');
  const top = web.c / 2;
  const psi = (-top - axis) / (top - axis);
  if (psi >= 0) throw new Error('The web is compressed throughout: outside of the brief.');
  const kept = (reductionOfWall(web, fy, psi) * web.c) / (1 - psi);
  const cuts = webCuts(section, [axis + 0.6 * kept, top - 0.4 * kept]);
  return elasticModulus(without(gross, [...flange, ...cuts]), 'y', box);
}

/** @param {import('./sections.mjs').SectionI} section @param {number} fy */
function modulusOfIAboutZ(section, fy) {
  const tips = flangeCuts(section, fy).filter(({ y }) => y[1] > 0);
  const { b } = section;
  const edge = Math.min(b / 2, ...tips.map(({ y }) => y[0]));
  const left = without(outlineOf(section), [...tips, ...tips.map(below)]);
  return elasticModulus(left, 'z', [-b / 2, edge]);
}

/** Either the tips are compressed or the web is. @param {import('./sections.mjs').SectionChannel} section @param {number} fy */
function modulusOfChannelAboutZ(section, fy) {
  const gross = outlineOf(section);
  const tips = flangeCuts(section, fy);
  const edge = Math.min(section.b, ...tips.map(({ y }) => y[0]));
  const byTips = elasticModulus(without(gross, [...tips, ...tips.map(below)]), 'z', [0, edge]);
  const byWeb = without(gross, squashedWebCuts(section, fy));
  return Math.min(byTips, elasticModulus(byWeb, 'z', [0, section.b]));
}
