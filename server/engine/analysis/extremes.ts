import type { BeamState } from './beam-state';
import { Q0, Q1, STRIDE, V, momentIn, shearIn } from './piece';
import { unitRoots } from './roots';

/** A value and where it is; `span` numbers the original span, 0 and n + 1 for overhangs. */
export interface Extreme {
  readonly span: number;
  /** mm from the first support. */
  readonly x: number;
  /** Moment in N mm, shear in N or deflection in mm. */
  readonly value: number;
}

export interface Extremes {
  readonly min: Extreme;
  readonly max: Extreme;
}

/** A stretch of the member in mm from the first support: a bay, a panel, a segment of restraint. */
export interface Stretch {
  readonly from: number;
  readonly to: number;
}

/** The whole member. */
export function wholeMember(state: BeamState): Stretch {
  const { breaks } = state.frame;
  return { from: breaks[0]!, to: breaks[breaks.length - 1]! };
}

/** Positions in mm from the piece's start, between its ends, where the moment turns (V = 0). */
export function momentTurns(state: BeamState, piece: number): number[] {
  const a = state.pieces;
  const o = piece * STRIDE;
  const h = state.frame.lengths[piece]!;
  const q0 = a[o + Q0]!;
  const turns = unitRoots([a[o + V]!, -q0 * h, (-(a[o + Q1]! - q0) * h) / 2]);
  return turns.map((t) => t * h);
}

/** As {@link momentTurns} for the shear (q = 0). */
export function shearTurns(state: BeamState, piece: number): number[] {
  const a = state.pieces;
  const [q0, q1] = [a[piece * STRIDE + Q0]!, a[piece * STRIDE + Q1]!];
  return q0 * q1 < 0 ? [(q0 / (q0 - q1)) * state.frame.lengths[piece]!] : [];
}

/** Least and greatest bending moment in a stretch; at its ends the values inside it count. */
export function momentExtremes(state: BeamState, stretch: Stretch): Extremes {
  return scan(state, stretch, momentIn, momentTurns);
}

/** Least and greatest shear in a stretch; at its ends the values inside it count. */
export function shearExtremes(state: BeamState, stretch: Stretch): Extremes {
  return scan(state, stretch, shearIn, shearTurns);
}

/** The extreme of the greater amount; the positive one if they are equal. */
export function greatest({ min, max }: Extremes): Extreme {
  return -min.value > max.value ? min : max;
}

/** The pieces that a stretch cuts, with the part of each that it holds (mm from the piece's start). */
export function* piecesOf(
  state: BeamState,
  stretch: Stretch,
): Generator<{ piece: number; start: number; end: number }> {
  const { frame } = state;
  const last = frame.pieceAt(stretch.to, 'left');
  for (let piece = frame.pieceAt(stretch.from, 'right'); piece <= last; piece++) {
    const x = frame.breaks[piece]!;
    const start = Math.max(stretch.from - x, 0);
    yield { piece, start, end: Math.min(stretch.to - x, frame.lengths[piece]!) };
  }
}

function scan(
  state: BeamState,
  stretch: Stretch,
  evaluate: (a: Float64Array, o: number, h: number, s: number) => number,
  turns: (state: BeamState, piece: number) => number[],
): Extremes {
  const { frame, pieces: a } = state;
  let min: Extreme | undefined;
  let max: Extreme | undefined;
  for (const { piece, start, end } of piecesOf(state, stretch)) {
    for (const s of [start, ...turns(state, piece), end]) {
      if (s < start || s > end) continue;
      const value = evaluate(a, piece * STRIDE, frame.lengths[piece]!, s);
      if (min && max && value >= min.value && value <= max.value) continue;
      const x = s === frame.lengths[piece]! ? frame.breaks[piece + 1]! : frame.breaks[piece]! + s;
      const point = { span: frame.pieceSpans[piece]!, x, value };
      if (!min || value < min.value) min = point;
      if (!max || value > max.value) max = point;
    }
  }
  if (!min || !max) throw new RangeError(`no member from ${stretch.from} to ${stretch.to} mm`);
  return { min, max };
}
