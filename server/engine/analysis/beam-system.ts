import { BandFactor } from './band-factor';
import type { BeamFrame, LoadVector } from './beam-frame';
import { BeamState } from './beam-state';
import { Q0, Q1, STRIDE, THETA, V, W, shearIn } from './piece';
import {
  addEndMoments,
  deflectRightwards,
  deflectStartOverhang,
  marchEndOverhang,
  marchSimply,
  marchStartOverhang,
} from './piece-march';

/** What acts at each acting support, and the spans' end slopes when simply supported (rad). */
interface SupportActions {
  /** Just left and just right of the supports, in N and N mm. */
  readonly shearLeft: Float64Array;
  readonly shearRight: Float64Array;
  readonly momentLeft: Float64Array;
  readonly momentRight: Float64Array;
  /** Left and right end of each span. */
  readonly simpleLeft: Float64Array;
  readonly simpleRight: Float64Array;
}

/**
 * A beam on a fixed set of acting supports, factorised once and solved for any load.
 *
 * The unknowns are the slope at every acting support and the deflection at every elastic one.
 * With ψ the turn of a span's chord and θ₀ the end slopes of the span simply supported,
 * M_left = 2EI/L (2a + b) and M_right = -2EI/L (a + 2b), where a = θ_left - ψ - θ₀_left and
 * b = θ_right - ψ - θ₀_right. Overhangs are cantilevers and bring their moment and shear only.
 */
export class BeamSystem {
  private readonly nodes: readonly number[];
  private readonly slopeDof: Int32Array;
  /** -1 at a rigid support. */
  private readonly deflectionDof: Int32Array;
  private readonly factor: BandFactor;

  private constructor(
    readonly frame: BeamFrame,
    readonly acting: readonly number[],
  ) {
    this.nodes = acting.map((s) => frame.supportBreaks[s]!);
    this.slopeDof = new Int32Array(acting.length);
    this.deflectionDof = new Int32Array(acting.length).fill(-1);
    let dofs = 0;
    acting.forEach((s, k) => {
      if (frame.geometry.supportStiffness[s] !== null) this.deflectionDof[k] = dofs++;
      this.slopeDof[k] = dofs++;
    });
    this.factor = new BandFactor(dofs, Math.min(3, dofs - 1));
  }

  /**
   * Null when the member is a mechanism on these supports.
   *
   * @param acting indices of the acting supports, ascending.
   */
  static build(frame: BeamFrame, acting: readonly number[]): BeamSystem | null {
    if (acting.length < 2) return null;
    const system = new BeamSystem(frame, acting);
    return system.assemble() ? system : null;
  }

  solve(load: LoadVector): BeamState {
    const { frame, nodes, acting } = this;
    const state = new BeamState(frame, acting);
    const a = state.pieces;
    for (let i = 0; i < frame.pieces; i++) {
      a[i * STRIDE + Q0] = load.intensity[2 * i]!;
      a[i * STRIDE + Q1] = load.intensity[2 * i + 1]!;
    }
    const actions = this.unrestrained(a, load);
    const x = this.rightHandSide(load, actions);
    this.factor.solve(x);
    this.findMoments(x, load, actions);
    for (let k = 0; k + 1 < nodes.length; k++) {
      const [left, right] = [actions.momentRight[k]!, actions.momentLeft[k + 1]!];
      addEndMoments(frame, a, this.spanBreaks(k), left, right);
    }
    this.findShears(a, actions);
    for (let k = 0; k < nodes.length; k++) {
      const jump = actions.shearRight[k]! - actions.shearLeft[k]!;
      state.reactions[acting[k]!] = jump + load.force[nodes[k]!]!;
    }
    const endDeflection = this.deflect(a, x, actions);
    frame.supportBreaks.forEach((node, s) => {
      state.supportDeflections[s] = node < frame.pieces ? a[node * STRIDE + W]! : endDeflection;
    });
    acting.forEach((s, k) => (state.supportDeflections[s] = this.deflectionOf(x, k)));
    return state;
  }

  private get rigidity(): number {
    return this.frame.geometry.flexuralRigidity;
  }

  private spanLength(k: number): number {
    return this.frame.breaks[this.nodes[k + 1]!]! - this.frame.breaks[this.nodes[k]!]!;
  }

  /** First and last breakpoint of span k. */
  private spanBreaks(k: number): [number, number] {
    return [this.nodes[k]!, this.nodes[k + 1]!];
  }

  private deflectionOf(x: Float64Array, k: number): number {
    const dof = this.deflectionDof[k]!;
    return dof < 0 ? 0 : x[dof]!;
  }

  private assemble(): boolean {
    const { acting, factor, slopeDof, deflectionDof } = this;
    const add = (r: number, c: number, value: number) => {
      if (r >= 0 && c >= 0) factor.add(Math.max(r, c), Math.min(r, c), value);
    };
    acting.forEach((s, k) => {
      add(deflectionDof[k]!, deflectionDof[k]!, this.frame.geometry.supportStiffness[s] ?? 0);
      if (k + 1 === acting.length) return;
      const length = this.spanLength(k);
      const rotation = this.rigidity / length;
      const [wa, ta, wb, tb] = [
        deflectionDof[k]!,
        slopeDof[k]!,
        deflectionDof[k + 1]!,
        slopeDof[k + 1]!,
      ];
      add(ta, ta, 4 * rotation);
      add(tb, tb, 4 * rotation);
      add(ta, tb, 2 * rotation);
      const mixed = (6 * rotation) / length;
      add(wa, ta, mixed);
      add(wa, tb, mixed);
      add(wb, ta, -mixed);
      add(wb, tb, -mixed);
      const shear = (2 * mixed) / length;
      add(wa, wa, shear);
      add(wb, wb, shear);
      add(wa, wb, -shear);
    });
    return factor.factorise();
  }

  /** Fills the pieces with the overhangs' shears and moments and those of simply supported spans. */
  private unrestrained(a: Float64Array, load: LoadVector): SupportActions {
    const { frame, nodes } = this;
    const last = nodes.length - 1;
    const actions: SupportActions = {
      shearLeft: new Float64Array(nodes.length),
      shearRight: new Float64Array(nodes.length),
      momentLeft: new Float64Array(nodes.length),
      momentRight: new Float64Array(nodes.length),
      simpleLeft: new Float64Array(last),
      simpleRight: new Float64Array(last),
    };
    const start = marchStartOverhang(frame, a, load, nodes[0]!);
    actions.shearLeft[0] = start.shear;
    actions.momentLeft[0] = start.moment;
    const end = marchEndOverhang(frame, a, load, nodes[last]!);
    actions.shearRight[last] = end.shear;
    actions.momentRight[last] = end.moment;
    for (let k = 0; k < last; k++) {
      const slopes = marchSimply(frame, a, load, nodes[k]!, nodes[k + 1]!);
      actions.simpleLeft[k] = slopes.left / this.rigidity;
      actions.simpleRight[k] = slopes.right / this.rigidity;
    }
    this.findShears(a, actions);
    return actions;
  }

  /** Reads the shears at the ends of the spans from the pieces. */
  private findShears(a: Float64Array, { shearLeft, shearRight }: SupportActions): void {
    for (let k = 0; k + 1 < this.nodes.length; k++) {
      const [first, last] = this.spanBreaks(k);
      const h = this.frame.lengths[last - 1]!;
      shearRight[k] = a[first * STRIDE + V]!;
      shearLeft[k + 1] = shearIn(a, (last - 1) * STRIDE, h, h);
    }
  }

  private rightHandSide(load: LoadVector, actions: SupportActions): Float64Array {
    const { nodes, slopeDof, deflectionDof } = this;
    const x = new Float64Array(this.factor.order);
    const last = nodes.length - 1;
    const push = (k: number, force: number) => {
      if (deflectionDof[k]! >= 0) x[deflectionDof[k]!]! += force;
    };
    for (let k = 0; k <= last; k++) {
      x[slopeDof[k]!]! += load.moment[nodes[k]!]!;
      push(k, load.force[nodes[k]!]! + actions.shearRight[k]! - actions.shearLeft[k]!);
    }
    x[slopeDof[0]!]! += actions.momentLeft[0]!;
    x[slopeDof[last]!]! -= actions.momentRight[last]!;
    for (let k = 0; k < last; k++) {
      const length = this.spanLength(k);
      const left = actions.simpleLeft[k]!;
      const right = actions.simpleRight[k]!;
      const rotation = (2 * this.rigidity) / length;
      x[slopeDof[k]!]! += rotation * (2 * left + right);
      x[slopeDof[k + 1]!]! += rotation * (left + 2 * right);
      const shift = (3 * rotation * (left + right)) / length;
      push(k, shift);
      push(k + 1, -shift);
    }
    return x;
  }

  /** Moments on both sides of each support; the outermost follow from the overhangs alone. */
  private findMoments(x: Float64Array, load: LoadVector, actions: SupportActions): void {
    const { momentLeft, momentRight } = actions;
    const last = this.nodes.length - 1;
    momentRight[0] = momentLeft[0]! + load.moment[this.nodes[0]!]!;
    momentLeft[last] = momentRight[last]! - load.moment[this.nodes[last]!]!;
    for (let k = 0; k < last; k++) {
      const chord = this.chordSlope(x, k);
      const left = x[this.slopeDof[k]!]! - chord - actions.simpleLeft[k]!;
      const right = x[this.slopeDof[k + 1]!]! - chord - actions.simpleRight[k]!;
      const rotation = (2 * this.rigidity) / this.spanLength(k);
      // Both neighbours of an inner support give its moment; their mean keeps mirrored beams mirrored.
      if (k > 0) {
        const jump = load.moment[this.nodes[k]!]!;
        momentLeft[k] = (momentLeft[k]! + rotation * (2 * left + right) - jump) / 2;
        momentRight[k] = momentLeft[k]! + jump;
      }
      if (k + 1 < last) momentLeft[k + 1] = -rotation * (left + 2 * right);
    }
  }

  private chordSlope(x: Float64Array, k: number): number {
    return (this.deflectionOf(x, k + 1) - this.deflectionOf(x, k)) / this.spanLength(k);
  }

  /**
   * Slopes and deflections everywhere. Each span starts with the slope that its end moments give,
   * so that it closes on its far support. Returns the deflection at the member's right end.
   */
  private deflect(a: Float64Array, x: Float64Array, actions: SupportActions): number {
    const { frame, nodes } = this;
    const last = nodes.length - 1;
    let slope = 0;
    for (let k = 0; k < last; k++) {
      const [left, right] = [actions.momentRight[k]!, actions.momentLeft[k + 1]!];
      const bent = (this.spanLength(k) * (2 * left + right)) / (6 * this.rigidity);
      const start = actions.simpleLeft[k]! + this.chordSlope(x, k) + bent;
      ({ slope } = deflectRightwards(frame, a, this.spanBreaks(k), start, this.deflectionOf(x, k)));
    }
    const first = nodes[0]!;
    deflectStartOverhang(frame, a, first, a[first * STRIDE + THETA]!, this.deflectionOf(x, 0));
    const overhang: [number, number] = [nodes[last]!, frame.pieces];
    return deflectRightwards(frame, a, overhang, slope, this.deflectionOf(x, last)).deflection;
  }
}
