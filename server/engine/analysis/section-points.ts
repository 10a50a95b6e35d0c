import type { BeamState } from './beam-state';
import { momentTurns, shearTurns } from './extremes';
import { STRIDE, momentIn, shearIn } from './piece';
import type { Side } from './values-at';

/** Moment and shear that act together at one place. */
export interface SectionPoint {
  /** Number of the original span, 0 and n + 1 for overhangs. */
  readonly span: number;
  /** mm from the first support. */
  readonly x: number;
  /** The side of the place on which the values hold; 'both' where nothing jumps. */
  readonly side: Side | 'both';
  readonly M: number;
  readonly V: number;
}

/** A jump smaller than this share of the greatest value is rounding. */
const NO_JUMP = 1e-12;

/**
 * The places where bending with shear can govern, from left to right: both sides of every support
 * and of every jump, other breakpoints once, and every extreme of moment and shear between them.
 */
export function sectionPoints(state: BeamState): SectionPoint[] {
  const { frame, pieces: a } = state;
  const supports = new Set(frame.supportBreaks);
  let largestV = 0;
  let largestM = 0;
  for (let i = 0; i < frame.pieces; i++) {
    const h = frame.lengths[i]!;
    largestV = Math.max(
      largestV,
      Math.abs(shearIn(a, i * STRIDE, h, 0)),
      Math.abs(shearIn(a, i * STRIDE, h, h)),
    );
    largestM = Math.max(
      largestM,
      Math.abs(momentIn(a, i * STRIDE, h, 0)),
      Math.abs(momentIn(a, i * STRIDE, h, h)),
    );
  }
  const points: SectionPoint[] = [];
  const point = (i: number, s: number, side: Side | 'both'): SectionPoint => ({
    span: frame.pieceSpans[i]!,
    x: s === frame.lengths[i]! ? frame.breaks[i + 1]! : frame.breaks[i]! + s,
    side,
    M: momentIn(a, i * STRIDE, frame.lengths[i]!, s),
    V: shearIn(a, i * STRIDE, frame.lengths[i]!, s),
  });
  for (let i = 0; i < frame.pieces; i++) {
    const start = point(i, 0, 'right');
    const before = points[points.length - 1];
    const smooth =
      before !== undefined &&
      !supports.has(i) &&
      Math.abs(start.V - before.V) <= NO_JUMP * largestV &&
      Math.abs(start.M - before.M) <= NO_JUMP * largestM;
    if (smooth) points[points.length - 1] = { ...before, side: 'both' };
    else points.push(start);
    const turns = [...momentTurns(state, i), ...shearTurns(state, i)].sort((p, q) => p - q);
    points.push(...turns.map((s) => point(i, s, 'both')));
    points.push(point(i, frame.lengths[i]!, 'left'));
  }
  return points;
}
