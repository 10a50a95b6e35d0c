import type { DrawnLoad } from './drawing-model';
import { textWidth, type Scale } from './scale';

/** A load with its place in px. */
export interface PlacedLoad {
  readonly shape: DrawnLoad['shape'];
  readonly label: string;
  readonly labelX: number;
  readonly labelY: number;
  /** Lines and outlines. */
  readonly line: string;
  /** Filled heads of arrows. */
  readonly heads: string;
}

interface Lane {
  readonly loads: { load: DrawnLoad; label: string; labelX: number }[];
  readonly taken: [number, number][];
}

const LABEL = 17;
const ARROW = 24;
/** Height of one lane of loads. */
export const LANE = LABEL + ARROW + 6;
const MOST_LANES = 7;

/** Stacks the loads over the member: what overlaps stands in its own lane, points above all. */
export function placeLoads(loads: readonly DrawnLoad[], scale: Scale, width: number, top: number) {
  const spread = loads.filter(({ from, to }) => to > from);
  const points = loads.filter(({ from, to }) => from === to);
  const lanes: Lane[] = [];
  const shafts = points.map(({ from }) => scale.x(from));
  for (const load of spread) enter(load, lanes, 0, scale, width, shafts);
  const above = lanes.length;
  for (const load of points) enter(load, lanes, above, scale, width, []);
  const shown = lanes.slice(0, MOST_LANES);
  const hidden = lanes.slice(MOST_LANES).reduce((sum, lane) => sum + lane.loads.length, 0);
  const member = top + shown.length * LANE;
  const placed = shown.flatMap((lane, index) => {
    const bottom = member - index * LANE;
    return lane.loads.map((one) => draw(one, scale, bottom, member));
  });
  return { placed, hidden, memberTop: member };
}

function enter(
  load: DrawnLoad,
  lanes: Lane[],
  lowest: number,
  scale: Scale,
  width: number,
  shafts: readonly number[],
): void {
  const label = fitted(load.label, width);
  const wide = textWidth(label);
  const at = scale.x(load.from);
  const labelX = labelPlace(load, at, wide, width, shafts);
  const taken: [number, number] = [
    Math.min(at, labelX) - 10,
    Math.max(scale.x(load.to), labelX + wide) + 10,
  ];
  for (let index = lowest; ; index += 1) {
    const lane = (lanes[index] ??= { loads: [], taken: [] });
    if (lane.taken.some(([from, to]) => from < taken[1] && taken[0] < to)) continue;
    lane.loads.push({ load, label, labelX });
    lane.taken.push(taken);
    return;
  }
}

/** Where the label begins: at the load's start, or beside a shaft that would run through it. */
function labelPlace(
  load: DrawnLoad,
  at: number,
  wide: number,
  width: number,
  shafts: readonly number[],
): number {
  const within = (x: number) => Math.max(2, Math.min(x, width - wide - 2));
  if (load.from === load.to) return within(at + 7);
  const free = (x: number) => shafts.every((shaft) => shaft < x - 4 || shaft > x + wide + 4);
  const places = [at + 1, ...shafts.flatMap((shaft) => [shaft + 8, shaft - wide - 8])];
  const found = places
    .filter((x) => x >= at)
    .sort((a, b) => a - b)
    .map(within)
    .find(free);
  return found ?? within(at + 1);
}

function fitted(label: string, width: number): string {
  const marks = Math.floor((width - 4) / textWidth('x'));
  return label.length > marks ? `${label.slice(0, marks - 1)}…` : label;
}

function draw(
  { load, label, labelX }: Lane['loads'][number],
  scale: Scale,
  bottom: number,
  member: number,
): PlacedLoad {
  const base = bottom - 3;
  const top = base - ARROW;
  const words = { shape: load.shape, label, labelX, labelY: top - 5 };
  const x = scale.x(load.from);
  if (load.shape === 'moment') return { ...words, ...moment(x, top, member, load.values[0]) };
  if (load.shape === 'point') {
    const down = load.values[0] >= 0;
    const [tail, tip] = down ? [top - 8, member - 3] : [member - 3, top - 8];
    return {
      ...words,
      labelY: top + 2,
      line: `M${x} ${tail}V${tip}`,
      heads: head(x, tip, down, 5),
    };
  }
  return { ...words, ...spread(load, scale, base) };
}

function head(x: number, tip: number, down: boolean, half = 3.5): string {
  const back = down ? tip - half * 1.9 : tip + half * 1.9;
  return `M${x - half} ${back}L${x} ${tip}L${x + half} ${back}Z`;
}

/** Arrows under a line; its height follows the value where that changes. */
function spread({ from, to, values }: DrawnLoad, scale: Scale, base: number) {
  const [x0, x1] = [scale.x(from), scale.x(to)];
  const greatest = Math.max(Math.abs(values[0]), Math.abs(values[1]), 1e-12);
  const height = (value: number) => (Math.abs(value) / greatest) * ARROW;
  const count = Math.max(1, Math.round((x1 - x0) / 42));
  let line = `M${x0} ${base - height(values[0])}L${x1} ${base - height(values[1])}`;
  let heads = '';
  for (let index = 0; index <= count; index += 1) {
    const part = index / count;
    const value = values[0] + (values[1] - values[0]) * part;
    const tall = (Math.abs(value) / greatest) * ARROW;
    if (tall < 8) continue;
    const x = Math.round((x0 + (x1 - x0) * part) * 10) / 10;
    line += `M${x} ${base - tall}V${base}`;
    heads += value >= 0 ? head(x, base, true) : head(x, base - tall, false);
  }
  return { line, heads };
}

/** Three quarters of a turn about the member; clockwise where the bending moment rises by it. */
function moment(x: number, top: number, member: number, value: number) {
  const middle = member + 6.5;
  const radius = 15;
  const turn = value >= 0 ? 1 : -1;
  const startX = x - turn * radius;
  const arc = `M${startX} ${middle}A${radius} ${radius} 0 1 ${turn > 0 ? 1 : 0} ${x} ${middle + radius}`;
  const tip = x - turn * 2;
  const y = middle + radius;
  const heads = `M${tip + turn * 7} ${y - 4}L${tip} ${y}L${tip + turn * 7} ${y + 4}Z`;
  return { line: `M${x} ${top}V${middle - radius}${arc}`, heads };
}
