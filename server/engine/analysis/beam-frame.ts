import type { BeamGeometry, BeamLoad } from './beam.types';

/** A span or an overhang as it was entered; `span` is 1 to n, 0 and n + 1 for overhangs. */
export interface Panel {
  readonly span: number;
  readonly kind: 'span' | 'overhang';
  /** Ends in mm from the first support. */
  readonly from: number;
  readonly to: number;
}

/** A load spread over the breakpoints: intensities of the pieces, actions at the breakpoints. */
export interface LoadVector {
  /** Start and end intensity of each piece in N/mm, two numbers a piece. */
  readonly intensity: Float64Array;
  /** Point load in N and moment load in N mm at each breakpoint. */
  readonly force: Float64Array;
  readonly moment: Float64Array;
}

/** Positions this close, as a share of the whole length, are the same position. */
const SAME = 1e-9;

/**
 * The fixed part of a continuous beam: supports, panels and the breakpoints that all its
 * solutions have in common, so that they can be superposed number by number.
 *
 * A load position within 1e-9 of the whole length from a support or an end is taken to be there.
 */
export class BeamFrame {
  /** x of the supports in mm, the first at 0. */
  readonly supports: Float64Array;
  /** Start overhang (if any), spans, end overhang (if any). */
  readonly panels: readonly Panel[];
  /** x of the breakpoints in mm, ascending. */
  readonly breaks: Float64Array;
  /** Lengths of the pieces in mm; piece i runs from breakpoint i to i + 1. */
  readonly lengths: Float64Array;
  /** Breakpoint of each support. */
  readonly supportBreaks: Int32Array;
  /** Number of the span (or overhang) that each piece lies in: `Panel.span`. */
  readonly pieceSpans: Int32Array;
  private readonly tolerance: number;

  constructor(
    readonly geometry: BeamGeometry,
    loads: readonly BeamLoad[],
  ) {
    this.supports = supportPositions(geometry);
    this.panels = panelsOf(geometry, this.supports);
    const start = this.panels[0]!.from;
    const end = this.panels[this.panels.length - 1]!.to;
    this.tolerance = SAME * (end - start);
    this.breaks = this.mergeBreaks([start, ...this.supports, end], loads);
    const pieces = this.breaks.length - 1;
    this.lengths = new Float64Array(pieces);
    this.pieceSpans = new Int32Array(pieces);
    let panel = 0;
    for (let i = 0; i < pieces; i++) {
      this.lengths[i] = this.breaks[i + 1]! - this.breaks[i]!;
      while (this.panels[panel]!.to <= this.breaks[i]!) panel++;
      this.pieceSpans[i] = this.panels[panel]!.span;
    }
    this.supportBreaks = Int32Array.from(this.supports, (x) => this.breakAt(x));
  }

  get pieces(): number {
    return this.lengths.length;
  }

  /** Index of the breakpoint at x. @throws RangeError when there is none. */
  breakAt(x: number): number {
    const i = lowerBound(this.breaks, x - this.tolerance);
    if (!(i < this.breaks.length && Math.abs(this.breaks[i]! - x) <= this.tolerance)) {
      throw new RangeError(`no breakpoint of the beam at x = ${x} mm`);
    }
    return i;
  }

  /** Index of the piece that holds x; at a breakpoint the piece on the given side, if there is one. */
  pieceAt(x: number, side: 'left' | 'right' = 'right'): number {
    const i = lowerBound(this.breaks, x - this.tolerance);
    const atBreak = i < this.breaks.length && this.breaks[i]! - x <= this.tolerance;
    const piece = atBreak && side === 'right' ? i : i - 1;
    return Math.min(Math.max(piece, 0), this.pieces - 1);
  }

  /** The load spread over the breakpoints. @throws RangeError on a position that is no breakpoint. */
  loadVector(loads: readonly BeamLoad[]): LoadVector {
    const intensity = new Float64Array(2 * this.pieces);
    const force = new Float64Array(this.breaks.length);
    const moment = new Float64Array(this.breaks.length);
    for (const load of loads) {
      if (load.kind === 'point') force[this.breakAt(load.at)]! += load.value;
      else if (load.kind === 'moment') moment[this.breakAt(load.at)]! += load.value;
      else {
        const first = this.breakAt(load.from);
        const last = this.breakAt(load.to);
        const slope = (load.end - load.start) / (load.to - load.from);
        for (let i = first; i < last; i++) {
          intensity[2 * i]! += load.start + slope * (this.breaks[i]! - load.from);
          intensity[2 * i + 1]! += load.start + slope * (this.breaks[i + 1]! - load.from);
        }
      }
    }
    return { intensity, force, moment };
  }

  private mergeBreaks(fixed: readonly number[], loads: readonly BeamLoad[]): Float64Array {
    const breaks = [...new Set(fixed)];
    const start = Math.min(...fixed) - this.tolerance;
    const end = Math.max(...fixed) + this.tolerance;
    for (const load of loads) {
      const positions = load.kind === 'distributed' ? [load.from, load.to] : [load.at];
      for (const x of positions) {
        if (!(x >= start && x <= end)) throw new RangeError(`load beyond the beam: x = ${x} mm`);
        if (!breaks.some((b) => Math.abs(b - x) <= this.tolerance)) breaks.push(x);
      }
    }
    return Float64Array.from(breaks).sort();
  }
}

function supportPositions(geometry: BeamGeometry): Float64Array {
  const { spans, supportStiffness } = geometry;
  if (spans.length === 0 || supportStiffness.length !== spans.length + 1) {
    throw new RangeError('a beam has one span or more, and one support more than spans');
  }
  const x = new Float64Array(spans.length + 1);
  spans.forEach((span, i) => {
    if (!(span > 0)) throw new RangeError(`span ${i + 1} has no length`);
    x[i + 1] = x[i]! + span;
  });
  return x;
}

function panelsOf(geometry: BeamGeometry, supports: Float64Array): Panel[] {
  const { start, end } = geometry.overhangs;
  const last = supports[supports.length - 1]!;
  const panels: Panel[] = [];
  if (start > 0) panels.push({ span: 0, kind: 'overhang', from: -start, to: 0 });
  for (let i = 1; i < supports.length; i++) {
    panels.push({ span: i, kind: 'span', from: supports[i - 1]!, to: supports[i]! });
  }
  if (end > 0) panels.push({ span: supports.length, kind: 'overhang', from: last, to: last + end });
  return panels;
}

/** First index whose value is not below x. */
function lowerBound(values: Float64Array, x: number): number {
  let low = 0;
  let high = values.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (values[middle]! < x) low = middle + 1;
    else high = middle;
  }
  return low;
}
