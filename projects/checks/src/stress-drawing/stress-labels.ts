import type { StressPoint, StressWall } from '../contract';
import { textWidth } from '../member-drawing/scale';
import { fixed } from '../quantity/format';
import type { Fit } from '../section-drawing/fit-section';
import type { Place } from '../section-drawing/polygon';
import { OFF, REACH, type Station, type StressName } from './stations';

/** A value beside its point. */
export interface StressLabel {
  readonly x: number;
  readonly y: number;
  readonly text: string;
  /** From what it belongs to, where it had to move away. */
  readonly line?: string;
}

/** A stress with its sign: "+187", "−92.4"; shear is told by its size. */
export function stressText(value: number, of: StressName): string {
  const size = of === 'tau' ? Math.abs(value) : value;
  const text = fixed(size, Math.abs(value) >= 100 ? 0 : 1);
  return of === 'sigma' && size > 0 && Number(text) !== 0 ? `+${text}` : text;
}

const LINE = 14;

/** To a tenth of a px. */
export const px = (value: number): number => Math.round(value * 10) / 10;

/** A value that is to stand beside its place. */
interface Wish {
  /** Where the drawn stress ends, and which way is out. */
  readonly tip: Place;
  readonly x: number;
  readonly y: number;
  readonly text: string;
  readonly width: number;
  /** Whether it may not be left out. */
  readonly must: boolean;
}

/** Those that are the greatest of either sign. */
function extremes(values: readonly number[], of: StressName): ReadonlySet<number> {
  if (values.length === 0) return new Set();
  const sizes = of === 'tau' ? values.map(Math.abs) : values;
  return new Set([
    sizes.indexOf(Math.max(...sizes)),
    ...(of === 'sigma' ? [sizes.indexOf(Math.min(...sizes))] : []),
  ]);
}

/** The values of the named points, the greatest of either sign first. */
export function pointWishes(
  points: readonly StressPoint[],
  walls: readonly StressWall[],
  stations: readonly (readonly Station[])[],
  of: StressName,
  most: number,
  fit: Fit,
): Wish[] {
  const placed: Pick<StressPoint, 'y' | 'z' | StressName>[] = points.filter(
    ({ y, z }) => y !== null && z !== null,
  );
  // Between its named points a wall may be sheared the most: that is named as well.
  const named = Math.max(0, ...placed.map((point) => Math.abs(point[of])));
  const peak = stations.flat().find(({ value }) => Math.abs(value) === most);
  if (of === 'tau' && peak && most > named * 1.02)
    placed.push({ y: peak.y, z: peak.z, sigma: 0, tau: peak.value });
  const musts = extremes(
    placed.map((point) => point[of]),
    of,
  );
  const worth = placed
    .map((point, index) => ({ point, value: point[of], must: musts.has(index) }))
    .filter(({ value }) => Math.abs(value) > most * 0.02)
    .sort((a, b) => Number(b.must) - Number(a.must) || Math.abs(b.value) - Math.abs(a.value));
  return worth.flatMap(({ point, value, must }): Wish[] => {
    const near = nearest({ y: point.y ?? 0, z: point.z ?? 0 }, walls, stations);
    // What lies apart from the middle of its wall has another stress: it stands in the table alone.
    if (!near || (!must && Math.abs(near.station.value - value) > most * 0.06)) return [];
    const { out } = near.station;
    const text = stressText(value, of);
    const width = textWidth(text);
    const reach = (near.t / 2) * fit.scale + (Math.abs(value) / most) * REACH + 4;
    const [x, foot] = [fit.x(near.station.y) + out.y * reach, fit.y(near.station.z)];
    const flat = Math.abs(out.y) < 0.4;
    // Beside the end of an upright wall the next wall runs: the value stands a line nearer the middle.
    const middle = fit.y(0);
    const upright = Math.abs(out.y) > 0.9;
    const inwards = !upright || Math.abs(foot - middle) < 24 ? 0 : Math.sign(middle - foot) * 10;
    return [
      {
        tip: { y: x, z: foot + out.z * reach },
        x: flat ? x - width / 2 : out.y > 0 ? x : x - width,
        y: foot + out.z * (reach + 6) + 4 + inwards,
        text,
        width,
        must,
      },
    ];
  });
}

/** The greatest of either sign of each profile of a solid. */
export function profileWishes(
  stations: readonly (readonly Station[])[],
  of: StressName,
  most: number,
  fit: Fit,
): Wish[] {
  return stations.flatMap((line) => {
    const musts = extremes(
      line.map(({ value }) => value),
      of,
    );
    return [...musts].flatMap((first): Wish[] => {
      // Where many are alike, the one in the middle of them.
      const size = Math.abs(line[first]?.value ?? 0);
      const alike = line.filter(({ value }) => Math.abs(value) > size * (1 - 1e-6));
      const even = alike.length === line.length;
      const station = even ? alike[Math.floor(alike.length / 2)] : line[first];
      if (!station || Math.abs(station.value) < most * 0.02) return [];
      const { out, value } = station;
      const text = stressText(value, of);
      const width = textWidth(text);
      const reach = OFF + (Math.abs(value) / most) * REACH + 4;
      const [x, y] = [fit.x(station.y) + out.y * reach, fit.y(station.z) + out.z * reach];
      const flat = out.z === 1;
      return [
        {
          tip: { y: x, z: y },
          x: flat ? x - width / 2 : x,
          y: y + (flat ? 10 : 4),
          text,
          width,
          must: true,
        },
      ];
    });
  });
}

/** Each where it stands clear of the others; what may not be left out moves until it does. */
export function placed(wishes: readonly Wish[], width: number, height: number): StressLabel[] {
  const done: { readonly left: number; readonly right: number; readonly y: number }[] = [];
  return wishes.flatMap((wish): StressLabel[] => {
    const left = Math.max(0, Math.min(wish.x, width - wish.width));
    const right = left + wish.width;
    const clear = (y: number): boolean =>
      y >= 11 &&
      y <= height - 2 &&
      !done.some(
        (one) => one.left < right + 6 && left < one.right + 6 && Math.abs(one.y - y) < LINE,
      );
    const ways = wish.must ? [0, 1, -1, 2, -2, 3, -3, 4, -4] : [0];
    const move = ways.find((way) => clear(wish.y + way * LINE));
    if (move === undefined && !wish.must) return [];
    const y = wish.y + (move ?? 0) * LINE;
    done.push({ left, right, y });
    const { tip } = wish;
    const line = move
      ? `M${px(tip.y)} ${px(tip.z)}L${px(left + wish.width / 2)} ${px(y + (move > 0 ? -11 : 3))}`
      : undefined;
    return [{ x: px(left), y: px(y), text: wish.text, ...(line && { line }) }];
  });
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
