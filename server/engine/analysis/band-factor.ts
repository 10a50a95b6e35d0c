/**
 * A symmetric positive definite matrix in lower band storage, factorised in place as L D Lᵀ.
 *
 * Row r holds its entries of columns r - width … r at `r * (width + 1)`, the diagonal last.
 */
export class BandFactor {
  private readonly rows: Float64Array;

  /** @param width entries of a row left of the diagonal that may differ from zero. */
  constructor(
    readonly order: number,
    readonly width: number,
  ) {
    this.rows = new Float64Array(order * (width + 1));
  }

  /** Adds to the entry in row `r`, column `c` (`r >= c`, `r - c <= width`). */
  add(r: number, c: number, value: number): void {
    this.rows[this.index(r, c)]! += value;
  }

  /** Factorises what was added. False when the matrix is singular: the structure can move freely. */
  factorise(): boolean {
    const { rows, order, width } = this;
    for (let r = 0; r < order; r++) {
      const diagonal = rows[this.index(r, r)]!;
      let pivot = diagonal;
      for (let c = Math.max(0, r - width); c < r; c++) {
        let entry = rows[this.index(r, c)]!;
        for (let k = Math.max(0, r - width); k < c; k++) {
          entry -= rows[this.index(r, k)]! * rows[this.index(c, k)]! * rows[this.index(k, k)]!;
        }
        const ratio = entry / rows[this.index(c, c)]!;
        rows[this.index(r, c)] = ratio;
        pivot -= ratio * entry;
      }
      if (!(pivot > SINGULAR * diagonal)) return false;
      rows[this.index(r, r)] = pivot;
    }
    return true;
  }

  /** Solves in place for one right hand side of length `order`. */
  solve(x: Float64Array): void {
    const { rows, order, width } = this;
    for (let r = 1; r < order; r++) {
      let sum = x[r]!;
      for (let c = Math.max(0, r - width); c < r; c++) sum -= rows[this.index(r, c)]! * x[c]!;
      x[r] = sum;
    }
    for (let r = 0; r < order; r++) x[r]! /= rows[this.index(r, r)]!;
    for (let r = order - 1; r > 0; r--) {
      const value = x[r]!;
      for (let c = Math.max(0, r - width); c < r; c++) x[c]! -= rows[this.index(r, c)]! * value;
    }
  }

  private index(r: number, c: number): number {
    return r * (this.width + 1) + this.width + c - r;
  }
}

/** A pivot below this share of its diagonal is what rounding leaves of zero. */
const SINGULAR = 1e-14;
