import type { BeamLoad } from './beam.types';
import type { LoadVector } from './beam-frame';
import { BeamState, superpose } from './beam-state';
import { type ContinuousBeam, supportKey } from './continuous-beam';
import { type Resultant, resultantOf } from './load-resultant';

/** A member's answer to a combination, or that it cannot stand. */
export type Solution =
  | { readonly kind: 'state'; readonly state: BeamState; readonly lifted: readonly number[] }
  | { readonly kind: 'mechanism' };

/** What a combination needs to know of a set of supports before it takes the whole state. */
export interface SupportSums {
  /** In N, one for each support. */
  readonly reactions: Float64Array;
  /** Of the member over each support in mm. */
  readonly deflections: Float64Array;
}

/**
 * Unit load cases of one beam: each is solved at most once for each set of acting supports, and
 * combinations are superposed from them.
 *
 * ```ts
 * const cases = new UnitCases(beam, loadsByPanel(earth, beam.frame.panels));
 * const solution = cases.combine([1.35, 1.35, 0]);
 * ```
 */
export class UnitCases {
  private readonly vectors: readonly LoadVector[];
  private readonly resultants: readonly Resultant[];
  private readonly solved = new Map<number, (BeamState | undefined)[]>();

  /** @param cases the loads of each case; a combination has one factor for each. */
  constructor(
    readonly beam: ContinuousBeam,
    cases: readonly (readonly BeamLoad[])[],
  ) {
    this.vectors = cases.map((loads) => beam.frame.loadVector(loads));
    this.resultants = this.vectors.map((vector) => resultantOf(beam.frame, vector));
  }

  get count(): number {
    return this.vectors.length;
  }

  /** State of one case by itself; null: a mechanism on these supports. */
  unit(index: number, acting: readonly number[] = this.beam.allSupports): BeamState | null {
    const system = this.beam.system(acting);
    if (!system) return null;
    const key = supportKey(acting);
    let states = this.solved.get(key);
    if (!states) this.solved.set(key, (states = []));
    return (states[index] ??= system.solve(this.vectors[index]!));
  }

  /**
   * Σ factor × case on supports that act both ways.
   *
   * @param factors one for each case, without unit; those of 0 cost nothing.
   * @param acting indices of the supports that are there, ascending; all by default.
   */
  combine(factors: ArrayLike<number>, acting: readonly number[] = this.beam.allSupports): Solution {
    const used = this.used(factors, acting);
    if (!used) return { kind: 'mechanism' };
    const state =
      used.states.length === 0
        ? new BeamState(this.beam.frame, acting)
        : superpose(used.states, used.factors);
    return { kind: 'state', state, lifted: [] };
  }

  /** Reactions and deflections at the supports of Σ factor × case; null: a mechanism. */
  supportSums(factors: ArrayLike<number>, acting: readonly number[]): SupportSums | null {
    const used = this.used(factors, acting);
    if (!used) return null;
    const count = this.beam.allSupports.length;
    const reactions = new Float64Array(count);
    const deflections = new Float64Array(count);
    used.states.forEach((state, i) => {
      const factor = used.factors[i]!;
      for (let s = 0; s < count; s++) {
        reactions[s]! += factor * state.reactions[s]!;
        deflections[s]! += factor * state.supportDeflections[s]!;
      }
    });
    return { reactions, deflections };
  }

  /** Resultant of Σ factor × case. */
  resultant(factors: ArrayLike<number>): Resultant {
    const sum = { force: 0, moment: 0, size: 0 };
    this.resultants.forEach(({ force, moment, size }, i) => {
      sum.force += factors[i]! * force;
      sum.moment += factors[i]! * moment;
      sum.size += Math.abs(factors[i]!) * size;
    });
    return sum;
  }

  private used(factors: ArrayLike<number>, acting: readonly number[]) {
    if (!this.beam.system(acting)) return null;
    const states: BeamState[] = [];
    const kept: number[] = [];
    for (let i = 0; i < this.count; i++) {
      const state = factors[i] === 0 ? null : this.unit(i, acting);
      if (!state) continue;
      states.push(state);
      kept.push(factors[i]!);
    }
    return { states, factors: kept };
  }
}
