import { bays } from './bays';
import type { BeamFrame } from './beam-frame';
import type { BeamState } from './beam-state';
import { type DeflectionOptions, deflectionExtremes, relativeDeflections } from './deflection';
import { momentExtremes, shearExtremes } from './extremes';
import { STRIDE, momentIn, shearIn } from './piece';
import type { Side } from './values-at';

/** Least and greatest value over the states at one place of a diagram. */
export interface EnvelopePoint {
  /** Number of the original span, 0 and n + 1 for overhangs. */
  readonly span: number;
  /** mm from the first support. */
  readonly x: number;
  /** Where the member is cut at a breakpoint, the side that the values hold on. */
  readonly side: Side;
  min: number;
  max: number;
}

/** Moment in N mm, shear in N, deflection relative to the chord of the supports in mm. */
export interface EnvelopeDiagrams {
  readonly moment: EnvelopePoint[];
  readonly shear: EnvelopePoint[];
  readonly deflection: EnvelopePoint[];
}

/** A point of a diagram at `s` mm into a piece that is `h` mm long. */
interface Station {
  readonly point: EnvelopePoint;
  readonly piece: number;
  readonly h: number;
  readonly s: number;
}

/** Interior stations of every span and overhang beside the breakpoints. */
const INTERIOR = 20;

/**
 * Envelope of states of one beam (lifted supports may differ). Stations are both sides of every
 * breakpoint, twenty points inside each panel and wherever a panel's least and greatest moment,
 * shear and deflection over all states lie, so that the diagrams show the true extremes.
 */
export function envelope(
  states: readonly BeamState[],
  options: DeflectionOptions = {},
): EnvelopeDiagrams {
  return { ...forceEnvelope(states), deflection: deflectionEnvelope(states, options) };
}

/** Moment and shear of {@link envelope} alone: deflections cost most. */
export function forceEnvelope(
  states: readonly BeamState[],
): Pick<EnvelopeDiagrams, 'moment' | 'shear'> {
  return {
    moment: ofForce(states, momentExtremes, momentIn),
    shear: ofForce(states, shearExtremes, shearIn),
  };
}

/** Deflection of {@link envelope} alone. */
export function deflectionEnvelope(
  states: readonly BeamState[],
  options: DeflectionOptions = {},
): EnvelopePoint[] {
  const frame = states[0]?.frame;
  if (!frame) return [];
  const points = stations(frame, deflectionPlaces(states, options)).map(({ point }) => point);
  for (const state of states) {
    let next = 0;
    for (const bay of bays(state)) {
      const start = next;
      while (next < points.length && points[next]!.x <= bay.to) next++;
      const inBay = points.slice(start, next);
      const positions = inBay.map(({ x }) => x);
      const values = relativeDeflections(state, bay, positions, options);
      inBay.forEach((point, i) => widen(point, values[i]!));
    }
  }
  return points;
}

function ofForce(
  states: readonly BeamState[],
  extremes: typeof momentExtremes,
  evaluate: typeof momentIn,
): EnvelopePoint[] {
  const frame = states[0]?.frame;
  if (!frame) return [];
  const list = stations(frame, extremePlaces(frame, states, extremes));
  for (const { pieces } of states) {
    for (const { point, piece, h, s } of list) {
      widen(point, evaluate(pieces, piece * STRIDE, h, s));
    }
  }
  return list.map(({ point }) => point);
}

function widen(point: EnvelopePoint, value: number): void {
  if (value < point.min) point.min = value;
  if (value > point.max) point.max = value;
}

/** Both sides of the breakpoints, interior points of the panels and the given places, in order. */
function stations(frame: BeamFrame, places: readonly number[]): Station[] {
  const inside = [...places];
  for (const { from, to } of frame.panels) {
    for (let i = 1; i <= INTERIOR; i++) inside.push(from + ((to - from) * i) / (INTERIOR + 1));
  }
  const list: Station[] = [];
  const add = (piece: number, x: number, side: Side) => {
    const h = frame.lengths[piece]!;
    const point = { span: frame.pieceSpans[piece]!, x, side, min: Infinity, max: -Infinity };
    list.push({ point, piece, h, s: Math.min(x - frame.breaks[piece]!, h) });
  };
  const sorted = [...new Set(inside)].sort((a, b) => a - b);
  let next = 0;
  for (let piece = 0; piece < frame.pieces; piece++) {
    const [from, to] = [frame.breaks[piece]!, frame.breaks[piece + 1]!];
    const near = 1e-9 * (to - from);
    add(piece, from, 'right');
    for (; next < sorted.length && sorted[next]! < to - near; next++) {
      if (sorted[next]! > from + near) add(piece, sorted[next]!, 'right');
    }
    while (next < sorted.length && sorted[next]! <= to + near) next++;
    add(piece, to, 'left');
  }
  return list;
}

function extremePlaces(
  frame: BeamFrame,
  states: readonly BeamState[],
  extremes: typeof momentExtremes,
): number[] {
  return frame.panels.flatMap((panel) => {
    const found = states.map((state) => extremes(state, panel));
    const min = found.reduce((a, b) => (b.min.value < a.min.value ? b : a)).min;
    const max = found.reduce((a, b) => (b.max.value > a.max.value ? b : a)).max;
    return [min.x, max.x];
  });
}

function deflectionPlaces(states: readonly BeamState[], options: DeflectionOptions): number[] {
  const least = new Map<number, { x: number; value: number }>();
  const most = new Map<number, { x: number; value: number }>();
  for (const state of states) {
    for (const bay of bays(state)) {
      const { min, max } = deflectionExtremes(state, bay, options);
      if (!(min.value >= (least.get(min.span)?.value ?? Infinity))) least.set(min.span, min);
      if (!(max.value <= (most.get(max.span)?.value ?? -Infinity))) most.set(max.span, max);
    }
  }
  return [...least.values(), ...most.values()].map(({ x }) => x);
}
