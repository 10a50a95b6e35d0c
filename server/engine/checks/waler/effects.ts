import type { BeamState } from '../../analysis/beam-state';
import { sectionPoints } from '../../analysis/section-points';
import { valuesAt } from '../../analysis/values-at';
import { factorOf } from '../../actions/action';
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

/** The effects of one strength combination along the member. */
export class CaseEffects {
  private readonly factor: number;
  private places: readonly Effects[] | undefined;

  constructor(
    readonly solved: SolvedCase,
    private readonly state: BeamState,
    private readonly share: number,
    private readonly weight: OwnWeight,
  ) {
    this.factor = factorOf(solved.combination, SELF_WEIGHT);
  }

  /**
   * Every place where a cross-section may govern: supports, jumps, extremes, the extremes of the
   * own weight, and places in between.
   */
  all(): readonly Effects[] {
    return (this.places ??= [...this.look()]);
  }

  private *look(): Generator<Effects> {
    for (const { span, x, M, V } of sectionPoints(this.state)) yield this.effects(span, x, M, V);
    const { frame } = this.state;
    for (const x of this.weight.places) yield this.at(x);
    for (const [piece, length] of frame.lengths.entries()) {
      const from = frame.breaks[piece] ?? 0;
      for (let i = 1; i < INSIDE; i += 1) yield this.at(from + (length * i) / INSIDE);
    }
  }

  /** Where something jumps, the right side; both sides of a jump are among all places. */
  at(x: number): Effects {
    const { M, V } = valuesAt(this.state, x);
    return this.effects(this.state.frame.pieceSpans[this.state.frame.pieceAt(x)] ?? 0, x, M, V);
  }

  /** The stretch around a place, inside its piece, that its nearest neighbours leave unseen. */
  around(x: number): { readonly from: number; readonly to: number } {
    const { frame } = this.state;
    const piece = frame.pieceAt(x);
    const from = frame.breaks[piece] ?? x;
    const length = frame.lengths[piece] ?? 0;
    const step = length / INSIDE;
    return { from: Math.max(from, x - step), to: Math.min(from + length, x + step) };
  }

  private effects(span: number, x: number, M: number, V: number): Effects {
    const { M_z, V_y } = this.weight.at(x);
    return {
      solved: this.solved,
      span,
      x,
      M_y: Math.abs(M) * this.share,
      V_z: Math.abs(V) * this.share,
      M_z: M_z * this.factor,
      V_y: V_y * this.factor,
    };
  }
}

/** One for each strength combination that the member stands under. */
export function strengthEffects(
  cases: readonly SolvedCase[],
  share: number,
  weight: OwnWeight,
): CaseEffects[] {
  return cases.flatMap((solved) =>
    solved.state && solved.combination.situation !== 'serviceability'
      ? [new CaseEffects(solved, solved.state, share, weight)]
      : [],
  );
}
