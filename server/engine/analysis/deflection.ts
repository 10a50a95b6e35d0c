import { type Bay, bays } from './bays';
import type { BeamState } from './beam-state';
import type { Extreme, Extremes } from './extremes';
import { piecesOf } from './extremes';
import { M, Q0, Q1, STRIDE, THETA, V, W, shearIn } from './piece';
import { polynomial, unitRoots } from './roots';
import { valuesAt } from './values-at';

export interface DeflectionOptions {
  /**
   * G A_v in N: adds the deflection by shear, ∫ V / (G A_v) dx, the moments being those without
   * it. Absent: bending alone.
   */
  readonly shearRigidity?: number;
}

/** Deflection of one piece relative to the bay's chord, a polynomial of s / h in mm. */
interface Curve {
  readonly piece: number;
  readonly coefficients: readonly number[];
}

/**
 * Least and greatest deflection in a bay in mm, positive with the load: relative to the straight
 * line through the displaced supports of a span, or to the displaced support of an overhang.
 *
 * The positions come from the zeros of the slope, to rounding.
 */
export function deflectionExtremes(
  state: BeamState,
  bay: Bay,
  options: DeflectionOptions = {},
): Extremes {
  const { frame } = state;
  let min: Extreme | undefined;
  let max: Extreme | undefined;
  for (const { piece, coefficients } of relativeCurves(state, bay, options)) {
    const slope = coefficients.slice(1).map((c, i) => c * (i + 1));
    for (const t of [0, ...unitRoots(slope), 1]) {
      const value = polynomial(coefficients, t);
      if (min && max && value >= min.value && value <= max.value) continue;
      const x =
        t === 1 ? frame.breaks[piece + 1]! : frame.breaks[piece]! + t * frame.lengths[piece]!;
      const point = { span: frame.pieceSpans[piece]!, x, value };
      if (!min || value < min.value) min = point;
      if (!max || value > max.value) max = point;
    }
  }
  if (!min || !max) throw new RangeError('a bay without length');
  return { min, max };
}

/** Deflection at each x (mm, inside the bay) as {@link deflectionExtremes} counts it. */
export function relativeDeflections(
  state: BeamState,
  bay: Bay,
  positions: readonly number[],
  options: DeflectionOptions = {},
): number[] {
  const { frame } = state;
  const curves = relativeCurves(state, bay, options);
  const first = curves[0]!.piece;
  return positions.map((x) => {
    const i = Math.min(Math.max(frame.pieceAt(x) - first, 0), curves.length - 1);
    const { piece, coefficients } = curves[i]!;
    return polynomial(coefficients, (x - frame.breaks[piece]!) / frame.lengths[piece]!);
  });
}

function relativeCurves(state: BeamState, bay: Bay, options: DeflectionOptions): Curve[] {
  const { frame, pieces: a } = state;
  const rigidity = frame.geometry.flexuralRigidity;
  const shearing = options.shearRigidity === undefined ? 0 : 1 / options.shearRigidity;
  const sheared = shearing === 0 ? null : shearAreas(state, bay);
  const atFrom = valuesAt(state, bay.from, 'right').w;
  const atTo = valuesAt(state, bay.to, 'left').w + shearing * (sheared?.total ?? 0);
  const [left, right] = bay.supports;
  const overhang = left === null || right === null;
  const slope = overhang
    ? sheared
      ? shearing * turnOfNeighbour(state, bay)
      : 0
    : (atTo - atFrom) / bay.length;
  const start = left === null ? atTo - slope * bay.length : atFrom;
  const curves: Curve[] = [];
  for (const { piece } of piecesOf(state, bay)) {
    const o = piece * STRIDE;
    const h = frame.lengths[piece]!;
    const [q0, dq] = [a[o + Q0]!, a[o + Q1]! - a[o + Q0]!];
    const [shear, moment] = [a[o + V]!, a[o + M]!];
    const bend = (h * h) / rigidity;
    const chord = start + slope * (frame.breaks[piece]! - bay.from);
    curves.push({
      piece,
      coefficients: [
        a[o + W]! + shearing * (sheared?.before[curves.length] ?? 0) - chord,
        (a[o + THETA]! - slope + shearing * shear) * h,
        -(bend * moment) / 2 - (shearing * q0 * h * h) / 2,
        -(bend * shear * h) / 6 - (shearing * dq * h * h) / 6,
        (bend * q0 * h * h) / 24,
        (bend * dq * h * h) / 120,
      ],
    });
  }
  return curves;
}

/**
 * Mean shear in N of the span beside an overhang: shear flexibility turns that span's chord, and
 * the overhang with it.
 */
function turnOfNeighbour(state: BeamState, overhang: Bay): number {
  const neighbour = bays(state).find(
    ({ kind, from, to }) => kind === 'span' && (from === overhang.to || to === overhang.from),
  );
  return neighbour ? shearAreas(state, neighbour).total / neighbour.length : 0;
}

/** ∫ V dx in N mm from the bay's start to each of its pieces, and over the whole bay. */
function shearAreas(state: BeamState, bay: Bay): { before: number[]; total: number } {
  const { frame, pieces: a } = state;
  const before: number[] = [];
  let total = 0;
  for (const { piece } of piecesOf(state, bay)) {
    before.push(total);
    const o = piece * STRIDE;
    const h = frame.lengths[piece]!;
    // Simpson's rule is exact for a parabola.
    total += (h / 6) * (a[o + V]! + 4 * shearIn(a, o, h, h / 2) + shearIn(a, o, h, h));
  }
  return { before, total };
}
