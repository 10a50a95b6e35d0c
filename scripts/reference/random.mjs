/** Requests for `POST /v1/checks/section` by chance, the same ones every time. */
import { epsilonOf } from './classes.mjs';
import { memberOf, plasticShear } from './resistances.mjs';
import { cornerRadii } from './sections.mjs';

/** @typedef {import('./sections.mjs').Section} Section */
/** @typedef {import('./reference.mjs').Effects} Effects */
/** @typedef {import('./reference.mjs').SectionRequest} SectionRequest */
/** @typedef {[low: number, high: number]} Range */

/** A small generator of even chances (mulberry32). @param {number} seed @returns {() => number} from 0 to 1 */
function chances(seed) {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

const STEELS = [235, 275, 355, 420, 460];
const KINDS = ['rolled', 'welded', 'channel', 'hot-finished', 'cold-formed', 'CHS'];

/** Slendernesses by epsilon, from stocky to class 4. @type {Record<'outstand' | 'web' | 'wall' | 'tube', Range[]>} */
const BANDS = {
  outstand: [
    [4, 9],
    [9, 10],
    [10, 14],
    [14, 24],
  ],
  web: [
    [15, 45],
    [35, 72],
    [65, 124],
    [100, 190],
  ],
  wall: [
    [12, 33],
    [33, 38],
    [38, 42],
    [42, 90],
  ],
  tube: [
    [15, 50],
    [50, 70],
    [70, 90],
    [90, 120],
  ],
};
/** Few tubes of class 4: they are refused. */
const TUBE_CHANCES = [0.4, 0.65, 0.9, 1];

/**
 * Requests in turn over the shapes; those of a shape are spread over the classes.
 * @param {number} [count] @param {number} [seed]
 * @returns {SectionRequest[]}
 */
export function randomRequests(count = 500, seed = 19931105) {
  const chance = chances(seed);
  return Array.from({ length: count }, (_, index) => {
    const kind = KINDS[index % KINDS.length] ?? 'rolled';
    const fy = pick(chance, chance() < 0.8 ? STEELS : [250 + Math.round(chance() * 200)]);
    const section = sectionOf(chance, kind, fy);
    return { material: { type: 'steel', fy }, section, effects: effectsOn(chance, section, fy) };
  });
}

/** @template T @param {() => number} chance @param {readonly T[]} list @returns {T} */
function pick(chance, list) {
  const one = list[Math.floor(chance() * list.length)];
  if (one === undefined) throw new Error('There is nothing to pick from.');
  return one;
}

/** @param {() => number} chance @param {Range} range */
function within(chance, [low, high]) {
  return low + chance() * (high - low);
}

/**
 * A slenderness of one of the first bands, half the time of the last of them.
 * @param {() => number} chance @param {readonly Range[]} bands @param {number} level
 */
function slendernessOf(chance, bands, level) {
  const upTo = bands.slice(0, level + 1);
  return within(chance, (chance() < 0.5 ? upTo.at(-1) : undefined) ?? pick(chance, upTo));
}

/** @param {number} value */
function toTenth(value) {
  return Math.round(value * 10) / 10;
}

/** @param {() => number} chance @param {string} kind @param {number} fy @returns {Section} */
function sectionOf(chance, kind, fy) {
  for (;;) {
    const section = draft(chance, kind, epsilonOf(fy));
    if (isSound(section)) return section;
  }
}

/** @param {() => number} chance @param {string} kind @param {number} epsilon @returns {Section} */
function draft(chance, kind, epsilon) {
  const level = Math.floor(chance() * 4);
  if (kind === 'rolled' || kind === 'welded') {
    const h = Math.round(within(chance, kind === 'rolled' ? [100, 700] : [250, 1400]));
    const b = Math.round(h * within(chance, [0.3, 1]));
    const tf = toTenth(b / 2.3 / (epsilon * slendernessOf(chance, BANDS.outstand, level)));
    const tw = toTenth((0.9 * h) / (epsilon * slendernessOf(chance, BANDS.web, level)));
    const r = kind === 'rolled' ? tf * within(chance, [0.5, 1.4]) : within(chance, [0, 10]);
    return { shape: 'I', h, b, tw, tf, r: toTenth(r), fabrication: kind };
  }
  if (kind === 'channel') {
    const h = Math.round(within(chance, [80, 500]));
    const b = Math.round(h * within(chance, [0.25, 0.6]));
    const tf = toTenth((0.8 * b) / (epsilon * slendernessOf(chance, BANDS.outstand, level)));
    const bands = chance() < 0.4 ? BANDS.web : BANDS.wall;
    const tw = toTenth((0.85 * h) / (epsilon * slendernessOf(chance, bands, level)));
    return { shape: 'channel', h, b, tw, tf, r: toTenth(tf * within(chance, [0, 1.3])) };
  }
  if (kind === 'CHS') {
    const d = toTenth(within(chance, [40, 800]));
    const place = chance();
    const band = BANDS.tube[TUBE_CHANCES.findIndex((limit) => place < limit)] ?? [15, 50];
    const t = toTenth(d / (epsilon ** 2 * within(chance, band)));
    return { shape: 'CHS', d, t, forming: pick(chance, ['hot-finished', 'cold-formed']) };
  }
  const forming = kind === 'cold-formed' ? kind : 'hot-finished';
  const h = Math.round(within(chance, [50, 500]));
  const b = chance() < 0.25 ? h : Math.round(h * within(chance, [0.4, 1.3]));
  const side = chance() < 0.6 ? Math.max(h, b) : b;
  const slenderness = epsilon * within(chance, pick(chance, BANDS.wall));
  return { shape: 'RHS', h, b, t: toTenth(side / (slenderness + 4)), forming };
}

/** Whether the dimensions make a section that could be bought or welded. @param {Section} section */
function isSound(section) {
  switch (section.shape) {
    case 'I':
    case 'channel': {
      const { h, b, tw, tf, r } = section;
      const outstand = section.shape === 'I' ? (b - tw) / 2 - r : b - tw - r;
      const thick = tw >= 2 && tf >= 2 && tw <= 40 && tf <= 60;
      return thick && outstand > 1.5 * tw && h - 2 * tf - 2 * r > 4 * tw;
    }
    case 'RHS': {
      const { h, b, t } = section;
      return t >= 2 && t <= 40 && Math.min(h, b) - 2 * t - 2 * cornerRadii(section).inner > 2 * t;
    }
    case 'CHS':
      return section.t >= 2 && section.t <= 60 && section.d > 4 * section.t;
  }
}

/**
 * Effects from small to over capacity, some left out.
 * @param {() => number} chance @param {Section} section @param {number} fy @returns {Effects}
 */
function effectsOn(chance, section, fy) {
  const member = memberOf(section, fy);
  const { A, Wpl } = member.gross;
  const level = within(
    chance,
    pick(chance, [
      [0.1, 0.4],
      [0.3, 0.8],
      [0.7, 1.3],
    ]),
  );
  const share = () => level * within(chance, [0.1, 1]);
  const sign = () => (chance() < 0.15 ? -1 : 1);
  const axial = (A * fy * share()) / 1e3;
  const isTension = chance() < 0.25;
  /** @type {[name: keyof Effects, often: number, value: number][]} */
  const all = [
    [isTension ? 'tension' : 'compression', 0.7, axial],
    ['My', 0.75, (sign() * Wpl.y * fy * share()) / 1e6],
    ['Mz', 0.55, (sign() * Wpl.z * fy * share()) / 1e6],
    ['Vz', 0.55, (sign() * plasticShear(member, 'z') * within(chance, [0.1, 1.05])) / 1e3],
    ['Vy', 0.4, (sign() * plasticShear(member, 'y') * within(chance, [0.1, 1.05])) / 1e3],
  ];
  const acting = all.filter(([, often]) => chance() < often);
  const kept = acting.length > 0 ? acting : [pick(chance, all)];
  return Object.fromEntries(kept.map(([name, , value]) => [name, Number(value.toPrecision(4))]));
}
