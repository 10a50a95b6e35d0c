import { circleOf, outlineOf, type Corner, type Place } from './polygon';

/** Dimensions in mm by the names of a request and of an answer's sketch. */
export type Sizes = Readonly<Record<string, number>>;

/** A dimension that is named beside the drawing, and the place on the section that it points at. */
export interface Mark extends Place {
  readonly text: string;
}

/** The outlines of a section, the outer one first. */
export type Outlines = readonly (readonly Place[])[];

const given = (...sizes: (number | undefined)[]): boolean =>
  sizes.every((size) => size !== undefined && Number.isFinite(size) && size > 0);

/** How a section is drawn: `welded` has welds in place of root fillets. */
export interface Drawable {
  readonly shape: string;
  readonly sizes: Sizes;
  readonly welded?: boolean;
  readonly coldFormed?: boolean;
}

/**
 * The outlines of a section about any origin; null while its dimensions make none. Where an answer
 * gives no corner radii of a hollow section they are those of EN 10210-2 and EN 10219-2.
 */
export function outlinesOf(section: Drawable): Outlines | null {
  const { shape, sizes } = section;
  const { h = 0, b = 0, d = 0, t = 0, tw = 0, tf = 0 } = sizes;
  switch (shape) {
    case 'I':
      return given(h, b, tw, tf) && h > 2 * tf && b > tw ? [outlineOf(iCorners(section))] : null;
    case 'channel':
      return given(h, b, tw, tf) && h > 2 * tf && b > tw
        ? [outlineOf(channelCorners(sizes))]
        : null;
    case 'RHS':
    case 'SHS': {
      const width = shape === 'SHS' ? h : b;
      return given(h, width, t) && Math.min(h, width) > 2 * t ? hollow(section, h, width, t) : null;
    }
    case 'CHS':
      return given(d, t) && d > 2 * t ? [circleOf(d / 2), circleOf(d / 2 - t)] : null;
    case 'angle':
      return given(h, b, t) && Math.min(h, b) > t ? [outlineOf(angleCorners(sizes))] : null;
    case 'rectangle':
      return given(h, b) ? [box(b, h, 0)] : null;
    case 'round':
      return given(d) ? [circleOf(d / 2)] : null;
    default:
      return null;
  }
}

/** One flange's edge: outer corner, toe, and the root where its inner face meets the web. */
function iCorners({ sizes, welded }: Drawable): Corner[] {
  const { h = 0, b = 0, tw = 0 } = sizes;
  const { root, toe, toeRadius } = flange(sizes, (b - tw) / 2, b / 4);
  const r = sizes.r ?? 0;
  const weld = welded ? { cut: true as const } : {};
  const [x, w, top] = [b / 2, tw / 2, h / 2];
  const quarter: Corner[] = [
    { y: x, z: -top },
    { y: x, z: -top + toe, r: toeRadius },
    { y: w, z: -top + root, r, ...weld },
  ];
  const right = [...quarter, ...mirrored(quarter, 1, -1)];
  return [...right, ...mirrored(right, -1, 1)];
}

function channelCorners(sizes: Sizes): Corner[] {
  const { h = 0, b = 0, tw = 0, r = 0 } = sizes;
  const { root, toe, toeRadius } = flange(sizes, b - tw, h > 300 ? (b - tw) / 2 : b / 2);
  const upper: Corner[] = [
    { y: 0, z: -h / 2 },
    { y: b, z: -h / 2 },
    { y: b, z: -h / 2 + toe, r: toeRadius },
    { y: tw, z: -h / 2 + root, r },
  ];
  return [...upper, ...mirrored(upper, 1, -1)];
}

/**
 * How thick a flange is at its root and at its toe. That of a tapered one is t_f at a distance from
 * the toe which its standard sets: b/4 of an I; b/2 of a channel, (b - t_w)/2 where it is over 300 deep.
 */
function flange({ tf = 0, slope = 0, r2 = 0, at }: Sizes, run: number, usual: number) {
  const from = at ?? usual;
  return {
    root: tf + slope * (run - from),
    toe: Math.max(tf - slope * from, tf / 10),
    toeRadius: slope > 0 ? r2 : 0,
  };
}

/** The heel at the lower left, the leg h upwards, the leg b to the right. */
function angleCorners({ h = 0, b = 0, t = 0, r1 = 0, r2 = 0 }: Sizes): Corner[] {
  return [
    { y: 0, z: 0 },
    { y: 0, z: -h },
    { y: t, z: -h, r: r2 },
    { y: t, z: -t, r: r1 },
    { y: b, z: -t, r: r2 },
    { y: b, z: 0 },
  ];
}

function hollow({ sizes, coldFormed }: Drawable, h: number, b: number, t: number): Outlines {
  const [outer, inner] = cornerFactors(t, coldFormed ?? false);
  const { ro = outer * t, ri = inner * t } = sizes;
  return [box(b, h, ro), box(b - 2 * t, h - 2 * t, ri)];
}

function cornerFactors(t: number, coldFormed: boolean): readonly [number, number] {
  if (!coldFormed) return [1.5, 1];
  if (t <= 6) return [2, 1];
  return t <= 10 ? [2.5, 1.5] : [3, 2];
}

function box(b: number, h: number, r: number): Place[] {
  const quarter: Corner[] = [{ y: b / 2, z: -h / 2, r }];
  const right = [...quarter, ...mirrored(quarter, 1, -1)];
  return outlineOf([...right, ...mirrored(right, -1, 1)]);
}

/** The same corners turned over an axis, in the order that goes on round the outline. */
function mirrored(corners: readonly Corner[], y: 1 | -1, z: 1 | -1): Corner[] {
  return corners.map((corner) => ({ ...corner, y: y * corner.y, z: z * corner.z })).reverse();
}
