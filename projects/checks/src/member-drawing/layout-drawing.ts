import { fixed, readable } from '../quantity/format';
import type { DrawingModel } from './drawing-model';
import { placeLoads, type PlacedLoad } from './load-lanes';
import { scaleOf, textWidth, type Scale } from './scale';

/** A prop with its place in px. */
export interface PlacedProp {
  readonly x: number;
  readonly number: string;
  readonly half: number;
  readonly lifted: boolean;
}

/** A text with its place in px. */
export interface PlacedText {
  readonly x: number;
  readonly text: string;
}

/** The drawing in px, for one width. */
export interface DrawingLayout {
  readonly width: number;
  readonly height: number;
  readonly loads: readonly PlacedLoad[];
  readonly hidden: number;
  readonly member: { x: number; y: number; width: number; height: number };
  readonly props: readonly PlacedProp[];
  readonly thrust: { line: string; heads: string; label: string; y: number } | null;
  readonly dimensions: { y: number; line: string; texts: readonly PlacedText[] };
}

const DEPTH = 13;
const STEM = 34;

/** Margins of the drawing, and of the diagrams that stand in line with it. */
export function margins(model: DrawingModel): { left: number; right: number } {
  const thrust = Math.max(0, ...model.thrust.map(({ label }) => textWidth(label)));
  return { left: thrust > 0 ? Math.min(thrust, 90) + 18 : 18, right: 18 };
}

/** From m along the member to px, for a width. */
export function drawingScale(model: DrawingModel, width: number): Scale {
  const { left, right } = margins(model);
  const length = model.spans.reduce((sum, span) => sum + span, 0);
  return scaleOf(width, -model.start, length + model.end, left, right);
}

/** Places of the supports in m. */
export function supportPlaces(spans: readonly number[]): number[] {
  const places = [0];
  for (const span of spans) places.push((places.at(-1) ?? 0) + span);
  return places;
}

/** Draws the member for a width: lengths to scale, texts always 12 px. */
export function layoutDrawing(model: DrawingModel, width: number): DrawingLayout {
  const scale = drawingScale(model, width);
  const { placed, hidden, memberTop } = placeLoads(model.loads, scale, width, 4);
  const top = model.loads.length === 0 ? 10 : memberTop;
  const bottom = top + DEPTH;
  const places = supportPlaces(model.spans).map((at) => scale.x(at));
  const gap = Math.min(...places.slice(1).map((x, index) => x - (places[index] ?? 0)));
  const half = Math.max(3, Math.min(12, gap * 0.3));
  const every = Math.max(1, Math.ceil(20 / gap));
  const props = places.map((x, index) => ({
    x,
    number: index % every === 0 || index === places.length - 1 ? String(index + 1) : '',
    half,
    lifted: model.lifted.includes(index + 1),
  }));
  const dimensionY = bottom + STEM + 36;
  return {
    width,
    height: dimensionY + 26,
    loads: placed,
    hidden,
    member: { x: scale.left, y: top, width: scale.right - scale.left, height: DEPTH },
    props,
    thrust: thrustOf(model, scale, top),
    dimensions: dimensionsOf(model, scale, dimensionY),
  };
}

function thrustOf({ thrust }: DrawingModel, { left }: Scale, top: number) {
  if (thrust.length === 0) return null;
  const middle = top + DEPTH / 2;
  const tip = left - 3;
  const label = thrust.length === 1 ? (thrust[0]?.label ?? '') : `${thrust.length} thrusts`;
  const most = Math.floor((left - 16) / textWidth('x'));
  return {
    line: `M${tip - 24} ${middle}H${tip}`,
    heads: `M${tip - 8} ${middle - 4}L${tip} ${middle}L${tip - 8} ${middle + 4}Z`,
    label: label.length > most ? `${label.slice(0, most - 1)}…` : label,
    y: middle + 20,
  };
}

/** Each length between its ticks where it fits, else what they come to together. */
function dimensionsOf({ spans, start, end }: DrawingModel, scale: Scale, y: number) {
  const length = spans.reduce((sum, span) => sum + span, 0);
  const ends = supportPlaces(spans);
  const bounds = [...(start > 0 ? [-start] : []), ...ends, ...(end > 0 ? [length + end] : [])];
  const xs = bounds.map((at) => scale.x(at));
  const ticks = xs.map((x) => `M${x} ${y - 5}v10`).join('');
  const line = `M${xs[0]} ${y}H${xs.at(-1)}${ticks}`;
  const parts = bounds.slice(1).map((at, index) => {
    const from = bounds[index] ?? 0;
    return { size: at - from, from: scale.x(from), to: scale.x(at) };
  });
  const inner = parts.slice(start > 0 ? 1 : 0, start > 0 ? spans.length + 1 : spans.length);
  const fits = (unit: string) => (part: { size: number; from: number; to: number }) =>
    textWidth(sizeText(part.size) + unit) + 4 <= part.to - part.from;
  const unit = [' m', ''].find((name) => inner.every(fits(name)));
  const middle = (from: number, to: number) => Math.round((from + to) * 5) / 10;
  if (unit !== undefined) {
    const texts = parts
      .map((part) => ({ ...part, name: fits(unit)(part) ? unit : '' }))
      .filter((part) => fits(part.name)(part))
      .map(({ from, to, size, name }) => ({ x: middle(from, to), text: sizeText(size) + name }));
    return { y, line, texts };
  }
  const alike = spans.every((span) => Math.abs(span - (spans[0] ?? 0)) < 1e-9);
  const sum = `${readable(length)} m`;
  const text = alike
    ? `${spans.length} × ${sizeText(spans[0] ?? 0)} = ${sum}`
    : `${spans.length} spans, ${sum}`;
  return { y, line, texts: [{ x: middle(scale.x(0), scale.x(length)), text }] };
}

function sizeText(size: number): string {
  return Math.abs(size * 100 - Math.round(size * 100)) < 1e-6 ? fixed(size, 2) : fixed(size, 3);
}
