import type { StressPoint, StressWall } from '../contract';
import { fitSection, type Fit } from '../section-drawing/fit-section';
import type { Place } from '../section-drawing/polygon';
import type { SectionModel } from '../section-drawing/section-model';
import {
  cleared,
  isRing,
  isSolid,
  OFF,
  profilesOf,
  REACH,
  runsOf,
  wallsOf,
  type Station,
  type StressName,
} from './stations';
import { placed, pointWishes, profileWishes, px, type StressLabel } from './stress-labels';

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
  /** The lines that the profiles of a solid stand on. */
  readonly bases: string;
  /** Where the profiles of a solid are taken. */
  readonly titles: readonly StressLabel[];
  readonly dots: readonly { readonly x: number; readonly y: number; readonly governs: boolean }[];
  readonly labels: readonly StressLabel[];
}

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
  const solid = isSolid(model.shape);
  const fit = fitSection(model.bounds, width, {
    left: solid ? 20 : REACH + 50,
    right: REACH + (solid ? OFF + 54 : 50),
    top: solid ? 32 : REACH + 22,
    bottom: REACH + (solid ? OFF + 22 : 24),
  });
  const rough = solid ? profilesOf(model, walls, of) : wallsOf(model, walls, of);
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
    const base = solid ? OFF : (t / 2) * fit.scale;
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
    ...(solid ? basesOf(stations, fit, of, most) : { bases: '', titles: [] }),
    labels: placed(
      solid
        ? profileWishes(stations, of, most, fit)
        : pointWishes(points, walls, stations, of, most, fit),
      width,
      fit.height,
    ),
  };
}

/** The lines that profiles stand on and where they are taken. */
function basesOf(
  stations: readonly (readonly Station[])[],
  fit: Fit,
  of: StressName,
  most: number,
): Pick<StressLayout, 'bases' | 'titles'> {
  const drawn = stations.filter((line) => line.some(({ value }) => Math.abs(value) > most * 1e-6));
  const ends = drawn.flatMap((line) => {
    const [start, end] = [line[0], line.at(-1)];
    return start && end ? [{ start, end }] : [];
  });
  const at = ({ y, z, out }: Station): Place => ({
    y: px(fit.x(y) + out.y * OFF),
    z: px(fit.y(z) + out.z * OFF),
  });
  return {
    bases: ends
      .map(({ start, end }) => `M${at(start).y} ${at(start).z}L${at(end).y} ${at(end).z}`)
      .join(''),
    titles: ends.map(({ start, end }) =>
      start.out.y === 1
        ? { x: at(start).y, y: at(start).z - 16, text: `${NAMES[of]} at y = 0` }
        : { x: at(end).y + 8, y: at(end).z + 14, text: `${NAMES[of]} at z = 0` },
    ),
  };
}

const NAMES = { sigma: 'σ', tau: 'τ' } as const;

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

const pathOf = (places: readonly Place[]): string =>
  `${places.map(({ y, z }, index) => `${index === 0 ? 'M' : 'L'}${px(y)} ${px(z)}`).join('')}Z`;
