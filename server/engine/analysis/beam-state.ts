import type { BeamFrame } from './beam-frame';
import { STRIDE } from './piece';

/**
 * One solution of a continuous beam: everything about it follows from its numbers exactly, since
 * every piece is a polynomial.
 *
 * All numbers lie in one array, so that solutions of the same beam on the same supports are
 * superposed by one loop.
 */
export class BeamState {
  /** Six numbers a piece, see `piece.ts`. */
  readonly pieces: Float64Array;
  /** One for each support in N, positive pushing against the member; 0 where the support is lifted. */
  readonly reactions: Float64Array;
  /** Of the member over each support in mm, positive with the load; lifted supports too. */
  readonly supportDeflections: Float64Array;

  constructor(
    readonly frame: BeamFrame,
    /** Indices of the supports that act, ascending. */
    readonly acting: readonly number[],
    readonly values: Float64Array = new Float64Array(BeamState.size(frame)),
  ) {
    const pieces = frame.pieces * STRIDE;
    const supports = frame.supports.length;
    this.pieces = values.subarray(0, pieces);
    this.reactions = values.subarray(pieces, pieces + supports);
    this.supportDeflections = values.subarray(pieces + supports);
  }

  static size(frame: BeamFrame): number {
    return frame.pieces * STRIDE + 2 * frame.supports.length;
  }
}

/**
 * Σ factor × state. All states are of the same beam on the same acting supports.
 *
 * @param factors one for each state, without unit.
 */
export function superpose(states: readonly BeamState[], factors: ArrayLike<number>): BeamState {
  const first = states[0];
  if (!first) throw new RangeError('nothing to superpose');
  const sum = new Float64Array(first.values.length);
  states.forEach((state, i) => {
    if (state.acting !== first.acting && state.acting.join() !== first.acting.join()) {
      throw new RangeError('states on different supports cannot be superposed');
    }
    const factor = factors[i]!;
    if (factor === 0) return;
    const { values } = state;
    for (let k = 0; k < sum.length; k++) sum[k]! += factor * values[k]!;
  });
  return new BeamState(first.frame, first.acting, sum);
}
