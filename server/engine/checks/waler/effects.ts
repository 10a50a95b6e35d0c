import type { BeamState } from '../../analysis/beam-state';
import { sectionPoints } from '../../analysis/section-points';
import { valuesAt } from '../../analysis/values-at';
import { SELF_WEIGHT } from '../continuous/loads';
import type { SolvedCase } from '../continuous/solve';
import type { OwnWeight } from './own-weight';

/** The effects that act together at one place of one member, amounts in N and N mm. */
export interface Effects {
  readonly solved: SolvedCase;
  readonly span: number;
  /** mm from the first support. */
  readonly x: number;
  readonly M_y: number;
  readonly V_z: number;
  readonly M_z: number;
  readonly V_y: number;
}

/** Places inside a piece that are looked at beside its ends: shear and moment may govern together. */
const INSIDE = 8;

/**
 * Every place of every strength combination where a cross-section may govern: supports, jumps,
 * extremes, the extremes of the own weight, and places in between.
 */
export function* strengthEffects(
  cases: readonly SolvedCase[],
  share: number,
  weight: OwnWeight,
): Generator<Effects> {
  for (const solved of cases) {
    const { state, combination } = solved;
    if (!state || combination.situation === 'serviceability') continue;
    const factor = combination.factors[SELF_WEIGHT] ?? 0;
    for (const { span, x, M, V } of placesOf(state, weight)) {
      const { M_z, V_y } = weight.at(x);
      yield {
        solved,
        span,
        x,
        M_y: Math.abs(M) * share,
        V_z: Math.abs(V) * share,
        M_z: M_z * factor,
        V_y: V_y * factor,
      };
    }
  }
}

function* placesOf(state: BeamState, weight: OwnWeight) {
  yield* sectionPoints(state);
  const { frame } = state;
  const inside: number[] = [...weight.places];
  frame.lengths.forEach((length, piece) => {
    const from = frame.breaks[piece] ?? 0;
    for (let i = 1; i < INSIDE; i += 1) inside.push(from + (length * i) / INSIDE);
  });
  // Where something jumps both sides were seen above.
  for (const x of inside) {
    const { M, V } = valuesAt(state, x);
    yield { span: frame.pieceSpans[frame.pieceAt(x)] ?? 0, x, M, V };
  }
}
