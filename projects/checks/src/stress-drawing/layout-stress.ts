import type { StressPoint, StressWall } from '../contract';
import { textWidth } from '../member-drawing/scale';
import { fixed } from '../quantity/format';
import { fitSection, type Fit } from '../section-drawing/fit-section';
import type { Place } from '../section-drawing/polygon';
import type { SectionModel } from '../section-drawing/section-model';

/** Which stress is drawn: along the member, or shear along the walls. */
export type StressName = 'sigma' | 'tau';

/** A value beside its point. */
export interface StressLabel {
  readonly x: number;
  readonly y: number;
  readonly text: string;
  readonly anchor: 'start' | 'middle' | 'end';
}

/** Stress along the walls in px, for one width. */
export interface StressLayout {
  readonly width: number;
  readonly height: number;
  readonly outline: string;
  /** What is filled: tension, and the size of shear. */
  readonly filled: string;
  /** What is edged and lined across: compression. */
  readonly edged: string;
  readonly lines: string;
  readonly dots: readonly { readonly x: number; readonly y: number; readonly governs: boolean }[];
  readonly labels: readonly StressLabel[];
}

/** A point of a wall with its value and the way out of the section. */
interface Station extends Place {
  readonly value: number;
  readonly out: Place;
}

/** How far the greatest stress stands out, in px. */
const REACH = 30;
const TICK = 5;

/** Draws the stress outwards from each wall, to one scale. */
export function layoutStress(
  model: SectionModel,
  walls: readonly StressWall[],
  points: readonly StressPoint[],
  of: StressName,
  width: number,
  governing: string | undefined,
): StressLayout {
  const fit = fitSection(model.bounds, width, {
    left: REACH + 50,
    right: REACH + 50,
    top: REACH + 22,
    bottom: REACH + 24,
  });
  const rough = walls.map((wall) => stationsOf(wall, of));
  const most = Math.max(...rough.flat().map(({ value }) => Math.abs(value)), 1e-12);
  const stations = rough.map((wall) => wall.map((station) => cleared(station, most)));
  const put = (station: Station, size: number): Place => ({
    y: fit.x(station.y) + station.out.y * size,
    z: fit.y(station.z) + station.out.z * size,
  });
  const filled: string[] = [];
  const edged: string[] = [];
  const lines: string[] = [];
  walls.forEach(({ t }, index) => {
    const base = (t / 2) * fit.scale;
    const size = ({ value }: Station): number => base + (Math.abs(value) / most) * REACH;
    for (const run of runsOf(stations[index] ?? [])) {
      const edge = run.map((station) => put(station, size(station)));
      const foot = run.map((station) => put(station, base)).reverse();
      // A ring has no ends: its edge and its foot are two lines, not one that turns back at a seam.
      const shape = isRing(run) ? pathOf(edge) + pathOf(foot) : pathOf([...edge, ...foot]);
      if (of === 'sigma' && run.some(({ value }) => value < 0)) {
        edged.push(shape);
        lines.push(
          linesAcross(run, fit, (station) => [put(station, base), put(station, size(station))]),
        );
      } else filled.push(shape);
    }
  });
  return {
    width,
    height: fit.height,
    outline: model.outlines.map((outline) => fit.path(outline)).join(''),
    filled: filled.join(''),
    edged: edged.join(''),
    lines: lines.join(''),
    dots: points.flatMap(({ id, y, z }) =>
      y === null || z === null ? [] : [{ x: fit.x(y), y: fit.y(z), governs: id === governing }],
    ),
    labels: labelsOf(points, walls, stations, of, most, fit, width),
  };
}

/** The points of a wall with the way outwards; a wall through the centroid is drawn to the right. */
function stationsOf({ points }: StressWall, of: StressName): Station[] {
  const ring = isRing(points);
  const last = points.length - 1;
  const normals = points.map((_, index) => {
    const before = points[index === 0 ? (ring ? last - 1 : 0) : index - 1];
    const after = points[index === last ? (ring ? 1 : last) : index + 1];
    const [y, z] = [(after?.y ?? 0) - (before?.y ?? 0), (after?.z ?? 0) - (before?.z ?? 0)];
    const length = Math.hypot(y, z) || 1;
    return { y: -z / length, z: y / length };
  });
  const away = points.reduce((sum, { y, z }, index) => {
    const normal = normals[index] ?? { y: 0, z: 0 };
    return sum + normal.y * y + normal.z * z;
  }, 0);
  const size = points.reduce((sum, { y, z }) => sum + Math.hypot(y, z), 0);
  const right = normals.reduce((sum, { y, z }) => sum + y - z, 0);
  const side = (Math.abs(away) > size * 0.02 ? away : right) < 0 ? -1 : 1;
  return points.map((point, index) => {
    const normal = normals[index] ?? { y: 0, z: 0 };
    const out = { y: normal.y * side, z: normal.z * side };
    return { y: point.y, z: point.z, value: point[of], out };
  });
}

/** Stretches of one sign, each ending where the stress is nothing. */
function runsOf(stations: readonly Station[]): Station[][] {
  const runs: Station[][] = [[]];
  stations.forEach((station, index) => {
    const before = stations[index - 1];
    if (before && before.value * station.value < 0) {
      const share = before.value / (before.value - station.value);
      const zero: Station = {
        y: before.y + (station.y - before.y) * share,
        z: before.z + (station.z - before.z) * share,
        value: 0,
        out: station.out,
      };
      runs.at(-1)?.push(zero);
      runs.push([zero]);
    }
    runs.at(-1)?.push(station);
    if (station.value === 0) runs.push([station]);
  });
  const [first, last] = [runs[0], runs.at(-1)];
  // Where a ring begins is no end of what runs over it.
  if (first && last && first !== last && isRing(stations) && stations[0]?.value !== 0)
    runs.splice(0, runs.length, ...runs.slice(1, -1), [...last, ...first.slice(1)]);
  return runs.filter((run) => run.some(({ value }) => value !== 0));
}

/** Whether a line ends where it began. */
function isRing(places: readonly Place[]): boolean {
  const [first, last] = [places[0], places.at(-1)];
  return (
    places.length > 3 &&
    first !== undefined &&
    last !== undefined &&
    Math.hypot(first.y - last.y, first.z - last.z) < 1e-6
  );
}

/** What is left of a reckoning at the neutral axis is nothing. */
const cleared = (station: Station, most: number): Station =>
  Math.abs(station.value) < most * 1e-6 ? { ...station, value: 0 } : station;

/** Lines across a stretch every few px of its length. */
function linesAcross(
  run: readonly Station[],
  fit: Fit,
  across: (station: Station) => readonly [Place, Place],
): string {
  const parts: string[] = [];
  let rest = TICK / 2;
  run.slice(1).forEach((to, index) => {
    const from = run[index] ?? to;
    const length = Math.hypot(to.y - from.y, to.z - from.z) * fit.scale;
    for (; rest < length; rest += TICK) {
      const mix = (a: number, b: number): number => a + ((b - a) * rest) / length;
      const [foot, tip] = across({
        y: mix(from.y, to.y),
        z: mix(from.z, to.z),
        value: mix(from.value, to.value),
        out: { y: mix(from.out.y, to.out.y), z: mix(from.out.z, to.out.z) },
      });
      parts.push(`M${px(foot.y)} ${px(foot.z)}L${px(tip.y)} ${px(tip.z)}`);
    }
    rest -= length;
  });
  return parts.join('');
}

const px = (value: number): number => Math.round(value * 10) / 10;

const pathOf = (places: readonly Place[]): string =>
  `${places.map(({ y, z }, index) => `${index === 0 ? 'M' : 'L'}${px(y)} ${px(z)}`).join('')}Z`;

/** A stress with its sign: "+187", "−92.4"; shear is told by its size. */
export function stressText(value: number, of: StressName): string {
  const size = of === 'tau' ? Math.abs(value) : value;
  const text = fixed(size, Math.abs(value) >= 100 ? 0 : 1);
  return of === 'sigma' && size > 0 && Number(text) !== 0 ? `+${text}` : text;
}

/** The values of the named points, the greatest first, each only where it stands clear of the others. */
function labelsOf(
  points: readonly StressPoint[],
  walls: readonly StressWall[],
  stations: readonly (readonly Station[])[],
  of: StressName,
  most: number,
  fit: Fit,
  width: number,
): StressLabel[] {
  const placed: (StressLabel & { readonly left: number; readonly right: number })[] = [];
  const worth = points
    .filter((point) => Math.abs(point[of]) > most * 0.02)
    .sort((a, b) => Math.abs(b[of]) - Math.abs(a[of]));
  for (const point of worth) {
    const { y, z } = point;
    if (y === null || z === null) continue;
    const near = nearest({ y, z }, walls, stations);
    // The corner of a solid lies on none of its lines: its value stands in the table alone.
    if (!near || Math.abs(near.station.value - point[of]) > most * 0.06) continue;
    const out = near.station.out;
    const text = stressText(point[of], of);
    const wide = textWidth(text);
    const reach = (near.t / 2) * fit.scale + (Math.abs(point[of]) / most) * REACH + 4;
    const x = fit.x(near.station.y) + out.y * reach;
    const flat = Math.abs(out.y) < 0.4;
    // Beside the end of an upright wall the next wall runs: the value stands a line nearer the middle.
    const middle = fit.y(0);
    const foot = fit.y(near.station.z);
    const inwards = flat || Math.abs(foot - middle) < 24 ? 0 : Math.sign(middle - foot) * 10;
    const at = foot + out.z * (reach + 6) + 4 + inwards;
    const left = flat ? x - wide / 2 : out.y > 0 ? x : x - wide;
    const begin = Math.max(0, Math.min(left, width - wide));
    const clash = placed.some(
      (one) => one.left < begin + wide + 6 && begin < one.right + 6 && Math.abs(one.y - at) < 14,
    );
    if (clash) continue;
    placed.push({ x: begin, y: px(at), text, anchor: 'start', left: begin, right: begin + wide });
  }
  return placed.map(({ x, y, text, anchor }) => ({ x: px(x), y, text, anchor }));
}

function nearest(
  place: Place,
  walls: readonly StressWall[],
  stations: readonly (readonly Station[])[],
): { readonly station: Station; readonly t: number } | undefined {
  let best: { station: Station; t: number; far: number } | undefined;
  walls.forEach(({ t }, index) => {
    for (const station of stations[index] ?? []) {
      const far = Math.hypot(station.y - place.y, station.z - place.z);
      if (!best || far < best.far - 1e-9) best = { station, t, far };
    }
  });
  return best;
}
