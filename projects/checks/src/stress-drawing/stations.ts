import type { StressWall } from '../contract';
import type { Place } from '../section-drawing/polygon';
import type { SectionModel } from '../section-drawing/section-model';

/** Which stress is drawn: along the member, or shear along the walls. */
export type StressName = 'sigma' | 'tau';

/** A point of a wall with its value and the way out of the section. */
export interface Station extends Place {
  readonly value: number;
  readonly out: Place;
}

/** How far the greatest stress stands out, in px. */
export const REACH = 30;
/** How far the profiles of a solid stand off it, in px. */
export const OFF = 18;
/** Whether a section has no walls, so that stress runs over its depth and its width. */
export const isSolid = (shape: string): boolean => shape === 'rectangle' || shape === 'round';

/** The stress over the depth beside a solid, that over the width beneath it. */
export function profilesOf(
  { bounds }: SectionModel,
  walls: readonly StressWall[],
  of: StressName,
): Station[][] {
  return walls.map(({ points }) => {
    const [first, last] = [points[0], points.at(-1)];
    const upright = Math.abs((last?.z ?? 0) - (first?.z ?? 0)) > 1e-9;
    return points.map((point) => ({
      y: upright ? bounds.right : point.y,
      z: upright ? point.z : bounds.bottom,
      value: point[of],
      out: upright ? { y: 1, z: 0 } : { y: 0, z: 1 },
    }));
  });
}

/** The stress outwards from each wall; the legs of an angle run to its heel. */
export function wallsOf(
  model: SectionModel,
  walls: readonly StressWall[],
  of: StressName,
): Station[][] {
  return walls.map((wall) => {
    const stations = stationsOf(wall, of);
    if (model.shape !== 'angle') return stations;
    const heel = { y: model.bounds.left, z: model.bounds.bottom };
    const far = (place: Place): number => Math.hypot(place.y - heel.y, place.z - heel.z);
    const [start, end] = [stations[0], stations.at(-1)];
    if (!start || !end) return stations;
    return far(start) < far(end)
      ? [beyond(start, stations[1] ?? end, wall.t / 2, of), ...stations]
      : [...stations, beyond(end, stations.at(-2) ?? start, wall.t / 2, of)];
  });
}

/** So far beyond the end of a wall: stress along the member goes on as it was, shear stays. */
function beyond(end: Station, before: Station, length: number, of: StressName): Station {
  const share = length / (Math.hypot(end.y - before.y, end.z - before.z) || 1);
  return {
    y: end.y + (end.y - before.y) * share,
    z: end.z + (end.z - before.z) * share,
    value: of === 'sigma' ? end.value + (end.value - before.value) * share : end.value,
    out: end.out,
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
export function runsOf(stations: readonly Station[]): Station[][] {
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
export function isRing(places: readonly Place[]): boolean {
  const [first, last] = [places[0], places.at(-1)];
  return (
    places.length > 3 &&
    first !== undefined &&
    last !== undefined &&
    Math.hypot(first.y - last.y, first.z - last.z) < 1e-6
  );
}

/** What is left of a reckoning at the neutral axis is nothing. */
export const cleared = (station: Station, most: number): Station =>
  Math.abs(station.value) < most * 1e-6 ? { ...station, value: 0 } : station;
