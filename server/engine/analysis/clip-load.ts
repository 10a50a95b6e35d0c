import type { Panel } from './beam-frame';
import type { BeamLoad } from './beam.types';

/**
 * The part of a load that lies on a panel, or null. A distributed load is cut linearly.
 *
 * A point or moment load on the border of two panels belongs to the right one alone, so that it
 * is never counted twice: `to` is not of the panel unless `closed`, for the last panel.
 *
 * @param from start of the panel, as the load's positions in mm.
 */
export function clipLoad(
  load: BeamLoad,
  from: number,
  to: number,
  closed = false,
): BeamLoad | null {
  if (load.kind !== 'distributed') {
    return load.at >= from && (load.at < to || (closed && load.at === to)) ? load : null;
  }
  const start = Math.max(load.from, from);
  const end = Math.min(load.to, to);
  if (!(start < end)) return null;
  if (start === load.from && end === load.to) return load;
  const slope = (load.end - load.start) / (load.to - load.from);
  return {
    kind: 'distributed',
    from: start,
    to: end,
    start: load.start + slope * (start - load.from),
    end: end === load.to ? load.end : load.start + slope * (end - load.from),
  };
}

/**
 * A load cut by panels: one list for each, in order; together they are the load, each part on
 * exactly one panel. Loads at the member's outer ends, or beyond them by rounding, stay whole.
 */
export function loadsByPanel(loads: readonly BeamLoad[], panels: readonly Panel[]): BeamLoad[][] {
  const last = panels.length - 1;
  return panels.map(({ from, to }, i) =>
    loads
      .map((load) => clipLoad(load, i === 0 ? -Infinity : from, i === last ? Infinity : to))
      .filter((load) => load !== null),
  );
}
