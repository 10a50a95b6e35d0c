import { BandFactor } from './band-factor';
import type { BeamFrame, LoadVector } from './beam-frame';
import { BeamState } from './beam-state';
import {
  M,
  Q0,
  Q1,
  STRIDE,
  THETA,
  V,
  W,
  momentArea,
  momentAreaLever,
  momentIn,
  shearIn,
} from './piece';

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
    const { frame, nodes } = this;
    const state = new BeamState(frame, this.acting);
    const a = state.pieces;
    for (let i = 0; i < frame.pieces; i++) {
      a[i * STRIDE + Q0] = load.intensity[2 * i]!;
      a[i * STRIDE + Q1] = load.intensity[2 * i + 1]!;
    }
    const count = nodes.length;
    // Actions just left and just right of each acting support: of the overhangs, then of the spans.
    const momentLeft = new Float64Array(count);
    const momentRight = new Float64Array(count);
    const shearLeft = new Float64Array(count);
    const shearRight = new Float64Array(count);
    [shearLeft[0], momentLeft[0]] = this.marchStartOverhang(a, load);
    [shearRight[count - 1], momentRight[count - 1]] = this.marchEndOverhang(a, load);
    const simpleSlopes = new Float64Array(2 * (count - 1));
    for (let k = 0; k + 1 < count; k++) this.marchSimply(a, load, k, simpleSlopes);

    const x = this.rightHandSide(
      a,
      load,
      simpleSlopes,
      momentLeft,
      momentRight,
      shearLeft,
      shearRight,
    );
    this.factor.solve(x);
    this.supportMoments(x, load, simpleSlopes, momentLeft, momentRight);
    for (let k = 0; k + 1 < count; k++) {
      this.addEndMoments(a, k, momentRight[k]!, momentLeft[k + 1]!);
      const first = nodes[k]! * STRIDE;
      const last = nodes[k + 1]! - 1;
      shearRight[k] = a[first + V]!;
      shearLeft[k + 1] = shearIn(a, last * STRIDE, frame.lengths[last]!, frame.lengths[last]!);
      this.deflect(a, x, k, simpleSlopes);
    }
    for (let k = 0; k < count; k++) {
      state.reactions[this.acting[k]!] = shearRight[k]! - shearLeft[k]! + load.force[nodes[k]!]!;
    }
    this.deflectOverhangs(a, x);
    this.readSupportDeflections(state, x);
    return state;
  }

  private get rigidity(): number {
    return this.frame.geometry.flexuralRigidity;
  }

  private spanLength(k: number): number {
    return this.frame.breaks[this.nodes[k + 1]!]! - this.frame.breaks[this.nodes[k]!]!;
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

  /** Fills the start overhang from its free end; shear and moment just left of the first support. */
  private marchStartOverhang(a: Float64Array, load: LoadVector): [number, number] {
    const end = this.nodes[0]!;
    let shear = 0;
    let moment = 0;
    for (let i = 0; i < end; i++) {
      const [o, h] = [i * STRIDE, this.frame.lengths[i]!];
      a[o + V] = shear - load.force[i]!;
      a[o + M] = moment + load.moment[i]!;
      shear = shearIn(a, o, h, h);
      moment = momentIn(a, o, h, h);
    }
    return [shear, moment];
  }

  /** Fills the end overhang from its free end; shear and moment just right of the last support. */
  private marchEndOverhang(a: Float64Array, load: LoadVector): [number, number] {
    const start = this.nodes[this.nodes.length - 1]!;
    let shear = 0;
    let moment = 0;
    for (let i = this.frame.pieces - 1; i >= start; i--) {
      const [o, h] = [i * STRIDE, this.frame.lengths[i]!];
      const [q0, q1] = [a[o + Q0]!, a[o + Q1]!];
      shear += load.force[i + 1]! + ((q0 + q1) * h) / 2;
      moment += -load.moment[i + 1]! - h * (shear - h * (q0 / 2 + (q1 - q0) / 6));
      a[o + V] = shear;
      a[o + M] = moment;
    }
    return [shear, moment];
  }

  /** Fills span k as if simply supported, and its end slopes. */
  private marchSimply(a: Float64Array, load: LoadVector, k: number, slopes: Float64Array): void {
    const { breaks, lengths } = this.frame;
    const [first, last] = [this.nodes[k]!, this.nodes[k + 1]!];
    const [xa, xb] = [breaks[first]!, breaks[last]!];
    const length = xb - xa;
    let turning = 0;
    for (let i = first; i < last; i++) {
      const [o, h] = [i * STRIDE, lengths[i]!];
      const [q0, q1] = [a[o + Q0]!, a[o + Q1]!];
      turning += h * (((q0 + q1) / 2) * (xb - breaks[i]!) - (h * (q0 + 2 * q1)) / 6);
      if (i > first) turning += load.force[i]! * (xb - breaks[i]!) - load.moment[i]!;
    }
    let shear = turning / length;
    let moment = 0;
    let area = 0;
    let areaFromLeft = 0;
    for (let i = first; i < last; i++) {
      const [o, h] = [i * STRIDE, lengths[i]!];
      if (i > first) {
        shear -= load.force[i]!;
        moment += load.moment[i]!;
      }
      a[o + V] = shear;
      a[o + M] = moment;
      const part = momentArea(a, o, h, h);
      area += part;
      areaFromLeft += part * (breaks[i + 1]! - xa) - momentAreaLever(a, o, h, h);
      shear = shearIn(a, o, h, h);
      moment = momentIn(a, o, h, h);
    }
    const scale = length * this.rigidity;
    slopes[2 * k] = (area * length - areaFromLeft) / scale;
    slopes[2 * k + 1] = -areaFromLeft / scale;
  }

  private rightHandSide(
    a: Float64Array,
    load: LoadVector,
    slopes: Float64Array,
    momentLeft: Float64Array,
    momentRight: Float64Array,
    shearLeft: Float64Array,
    shearRight: Float64Array,
  ): Float64Array {
    const { nodes, slopeDof, deflectionDof } = this;
    const x = new Float64Array(this.factor.order);
    const last = nodes.length - 1;
    const push = (k: number, force: number) => {
      if (deflectionDof[k]! >= 0) x[deflectionDof[k]!]! += force;
    };
    for (let k = 0; k <= last; k++) {
      x[slopeDof[k]!]! += load.moment[nodes[k]!]!;
      push(k, load.force[nodes[k]!]!);
    }
    x[slopeDof[0]!]! += momentLeft[0]!;
    x[slopeDof[last]!]! -= momentRight[last]!;
    push(0, -shearLeft[0]!);
    push(last, shearRight[last]!);
    for (let k = 0; k < last; k++) {
      const length = this.spanLength(k);
      const [sa, sb] = [slopes[2 * k]!, slopes[2 * k + 1]!];
      const rotation = (2 * this.rigidity) / length;
      x[slopeDof[k]!]! += rotation * (2 * sa + sb);
      x[slopeDof[k + 1]!]! += rotation * (sa + 2 * sb);
      const shift = (3 * rotation * (sa + sb)) / length;
      const end = nodes[k + 1]! - 1;
      const h = this.frame.lengths[end]!;
      push(k, a[nodes[k]! * STRIDE + V]! + shift);
      push(k + 1, -shearIn(a, end * STRIDE, h, h) - shift);
    }
    return x;
  }

  /** Moments on both sides of the inner supports, and across moment loads at the outer ones. */
  private supportMoments(
    x: Float64Array,
    load: LoadVector,
    slopes: Float64Array,
    momentLeft: Float64Array,
    momentRight: Float64Array,
  ): void {
    const last = this.nodes.length - 1;
    momentRight[0] = momentLeft[0]! + load.moment[this.nodes[0]!]!;
    momentLeft[last] = momentRight[last]! - load.moment[this.nodes[last]!]!;
    for (let k = 0; k < last; k++) {
      const length = this.spanLength(k);
      const chord = (this.deflectionOf(x, k + 1) - this.deflectionOf(x, k)) / length;
      const left = x[this.slopeDof[k]!]! - chord - slopes[2 * k]!;
      const right = x[this.slopeDof[k + 1]!]! - chord - slopes[2 * k + 1]!;
      const rotation = (2 * this.rigidity) / length;
      // Both neighbours of an inner support give its moment; their mean keeps mirrored beams mirrored.
      if (k > 0) {
        const jump = load.moment[this.nodes[k]!]!;
        momentLeft[k] = (momentLeft[k]! + rotation * (2 * left + right) - jump) / 2;
        momentRight[k] = momentLeft[k]! + jump;
      }
      if (k + 1 < last) momentLeft[k + 1] = -rotation * (left + 2 * right);
    }
  }

  private addEndMoments(a: Float64Array, k: number, left: number, right: number): void {
    const { breaks } = this.frame;
    const first = this.nodes[k]!;
    const slope = (right - left) / this.spanLength(k);
    for (let i = first; i < this.nodes[k + 1]!; i++) {
      a[i * STRIDE + V]! += slope;
      a[i * STRIDE + M]! += left + slope * (breaks[i]! - breaks[first]!);
    }
  }

  /** Slopes and deflections of span k. The end slopes follow from the moments, so the span closes. */
  private deflect(a: Float64Array, x: Float64Array, k: number, slopes: Float64Array): void {
    const { lengths } = this.frame;
    const [first, last] = [this.nodes[k]!, this.nodes[k + 1]!];
    const length = this.spanLength(k);
    const start = this.deflectionOf(x, k);
    const left = a[first * STRIDE + M]!;
    const h = lengths[last - 1]!;
    const right = momentIn(a, (last - 1) * STRIDE, h, h);
    const chord = (this.deflectionOf(x, k + 1) - start) / length;
    const bend = length / (6 * this.rigidity);
    let slope = slopes[2 * k]! + chord + bend * (2 * left + right);
    let deflection = start;
    for (let i = first; i < last; i++) {
      const o = i * STRIDE;
      a[o + THETA] = slope;
      a[o + W] = deflection;
      deflection +=
        slope * lengths[i]! - momentAreaLever(a, o, lengths[i]!, lengths[i]!) / this.rigidity;
      slope -= momentArea(a, o, lengths[i]!, lengths[i]!) / this.rigidity;
    }
    if (k + 2 === this.nodes.length) {
      x[this.slopeDof[k + 1]!] = slopes[2 * k + 1]! + chord - bend * (left + 2 * right);
    }
    if (k === 0) x[this.slopeDof[0]!] = a[first * STRIDE + THETA]!;
  }

  private deflectOverhangs(a: Float64Array, x: Float64Array): void {
    const { lengths, pieces } = this.frame;
    const last = this.nodes.length - 1;
    let slope = x[this.slopeDof[0]!]!;
    let deflection = this.deflectionOf(x, 0);
    for (let i = this.nodes[0]! - 1; i >= 0; i--) {
      const [o, h] = [i * STRIDE, lengths[i]!];
      slope += momentArea(a, o, h, h) / this.rigidity;
      deflection += momentAreaLever(a, o, h, h) / this.rigidity - slope * h;
      a[o + THETA] = slope;
      a[o + W] = deflection;
    }
    slope = x[this.slopeDof[last]!]!;
    deflection = this.deflectionOf(x, last);
    for (let i = this.nodes[last]!; i < pieces; i++) {
      const [o, h] = [i * STRIDE, lengths[i]!];
      a[o + THETA] = slope;
      a[o + W] = deflection;
      deflection += slope * h - momentAreaLever(a, o, h, h) / this.rigidity;
      slope -= momentArea(a, o, h, h) / this.rigidity;
    }
  }

  private readSupportDeflections(state: BeamState, x: Float64Array): void {
    const { supportBreaks, lengths, pieces } = this.frame;
    const a = state.pieces;
    supportBreaks.forEach((node, s) => {
      if (node < pieces) state.supportDeflections[s] = a[node * STRIDE + W]!;
      else {
        const [o, h] = [(pieces - 1) * STRIDE, lengths[pieces - 1]!];
        state.supportDeflections[s] =
          a[o + W]! + a[o + THETA]! * h - momentAreaLever(a, o, h, h) / this.rigidity;
      }
    });
    this.acting.forEach((s, k) => (state.supportDeflections[s] = this.deflectionOf(x, k)));
  }
}
