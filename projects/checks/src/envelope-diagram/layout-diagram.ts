import type { DiagramPoint } from '../contract';
import { fixed } from '../quantity/format';
import { textWidth, type Scale } from '../member-drawing/scale';

/** A value written at its place. */
export interface ExtremeLabel {
  readonly x: number;
  readonly y: number;
  readonly text: string;
}

/** Least and greatest of one span. */
export interface SpanExtremes {
  readonly span: number;
  readonly max: DiagramPoint;
  readonly min: DiagramPoint;
}

/** A diagram in px, for one width. */
export interface DiagramLayout {
  readonly height: number;
  readonly zero: number;
  /** Outlines of greatest and least, each closed to the axis. */
  readonly greatest: string;
  readonly least: string;
  /** The two outlines alone, to be drawn over the fill. */
  readonly lines: string;
  readonly labels: readonly ExtremeLabel[];
}

const PLOT = 108;
const BAND = 18;

/** The span's greatest and least, span by span. */
export function extremesOf(points: readonly DiagramPoint[]): SpanExtremes[] {
  const spans = new Map<number, { max: DiagramPoint; min: DiagramPoint }>();
  for (const point of points) {
    const known = spans.get(point.span);
    if (!known) spans.set(point.span, { max: point, min: point });
    else {
      if (point.max > known.max.max) known.max = point;
      if (point.min < known.min.min) known.min = point;
    }
  }
  return [...spans].map(([span, found]) => ({ span, ...found }));
}

/** Lays an envelope out; `down` draws positive values below the axis, as moments are drawn. */
export function layoutDiagram(
  points: readonly DiagramPoint[],
  scale: Scale,
  width: number,
  down: boolean,
): DiagramLayout {
  const greatest = Math.max(0, ...points.map(({ max }) => max));
  const least = Math.min(0, ...points.map(({ min }) => min));
  const factor = PLOT / Math.max(greatest - least, 1e-12);
  const zero = BAND + (down ? -least : greatest) * factor;
  const y = (value: number) => Math.round((zero + (down ? value : -value) * factor) * 10) / 10;
  const path = (of: 'max' | 'min') =>
    points
      .map((point, index) => `${index === 0 ? 'M' : 'L'}${scale.x(point.x)} ${y(point[of])}`)
      .join('');
  const closed = (line: string) =>
    line === ''
      ? ''
      : `${line}L${scale.x(points.at(-1)?.x ?? 0)} ${zero}L${scale.x(points[0]?.x ?? 0)} ${zero}Z`;
  const [upper, lower] = [path('max'), path('min')];
  return {
    height: PLOT + 2 * BAND,
    zero,
    greatest: closed(upper),
    least: closed(lower),
    lines: upper + lower,
    labels: labelsOf(points, scale, width, y, down),
  };
}

interface Candidate {
  readonly x: number;
  readonly value: number;
}

function labelsOf(
  points: readonly DiagramPoint[],
  scale: Scale,
  width: number,
  y: (value: number) => number,
  down: boolean,
): ExtremeLabel[] {
  const candidates = extremesOf(points).flatMap(({ max, min }): Candidate[] => [
    { x: scale.x(max.x), value: max.max },
    { x: scale.x(min.x), value: min.min },
  ]);
  const size = Math.max(...candidates.map(({ value }) => Math.abs(value)), 0);
  const decimals = decimalsOf(size);
  const worth = candidates
    .filter(({ value }) => Math.abs(value) > size * 0.03)
    .sort((a, b) => Math.abs(b.value) - Math.abs(a.value));
  const placed: (ExtremeLabel & { from: number; to: number })[] = [];
  for (const { x, value } of worth) {
    const text = fixed(value, decimals);
    const wide = textWidth(text);
    const from = Math.max(0, Math.min(x - wide / 2, width - wide));
    const below = down === value > 0;
    const at = y(value) + (below ? 14 : -5);
    const clash = placed.some(
      (one) => one.from < from + wide + 5 && from < one.to + 5 && Math.abs(one.y - at) < 14,
    );
    if (!clash) placed.push({ x: from + wide / 2, y: at, text, from, to: from + wide });
  }
  return placed.map(({ x, y: at, text }) => ({ x, y: at, text }));
}

/** As many decimals as the greatest value needs to be read to three or four figures. */
export function decimalsOf(size: number): number {
  if (size >= 1000) return 0;
  if (size >= 10) return 1;
  return size >= 1 ? 2 : 3;
}
