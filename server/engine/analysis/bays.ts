import type { BeamState } from './beam-state';

/**
 * A stretch of the member between neighbouring supports that act, or between the last of them and
 * the member's end. Where no support is lifted the bays are the spans and overhangs as entered.
 */
export interface Bay {
  /** Number of the first original span (0 or n + 1: overhang) in the bay. */
  readonly span: number;
  readonly kind: 'span' | 'overhang';
  /** Ends in mm from the first support. */
  readonly from: number;
  readonly to: number;
  /** `to - from`. A deflection ratio counts an overhang's length twice. */
  readonly length: number;
  /** Indices of the acting supports at `from` and `to`; null at a free end. */
  readonly supports: readonly [number | null, number | null];
}

/** The bays of a state from left to right. */
export function bays(state: BeamState): Bay[] {
  const { frame, acting } = state;
  const start = frame.breaks[0]!;
  const end = frame.breaks[frame.breaks.length - 1]!;
  const list: Bay[] = [];
  const add = (from: number, to: number, left: number | null, right: number | null) => {
    if (to <= from) return;
    const kind = left === null || right === null ? 'overhang' : 'span';
    const span = frame.pieceSpans[frame.breakAt(from)]!;
    list.push({ span, kind, from, to, length: to - from, supports: [left, right] });
  };
  let from = start;
  let left: number | null = null;
  for (const support of acting) {
    const x = frame.supports[support]!;
    add(from, x, left, support);
    from = x;
    left = support;
  }
  add(from, end, left, null);
  return list;
}
