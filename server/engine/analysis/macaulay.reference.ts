import type { BeamLoad } from './beam.types';

/**
 * An independent view of a beam for the specs: bending moment and deflection written down with
 * Macaulay brackets from the reactions alone. Nothing of the solver is used.
 */
export interface KnownBeam {
  readonly start: number;
  readonly supports: readonly number[];
  readonly reactions: readonly number[];
  readonly loads: readonly BeamLoad[];
}

const bracket = (x: number, a: number, n: number) => (x > a ? (x - a) ** n : 0);
const factorial = (n: number): number => (n < 2 ? 1 : n * factorial(n - 1));

/** The moment at x integrated `times` over, from the member's start: 0 gives M, 2 gives -EI w. */
export function momentIntegral(beam: KnownBeam, x: number, times: number): number {
  const power = (a: number, n: number) => bracket(x, a, n + times) / factorial(n + times);
  let sum = 0;
  beam.supports.forEach((a, i) => (sum += beam.reactions[i]! * power(a, 1)));
  for (const load of beam.loads) {
    if (load.kind === 'point') sum -= load.value * power(load.at, 1);
    else if (load.kind === 'moment') sum += load.value * power(load.at, 0);
    else {
      const slope = (load.end - load.start) / (load.to - load.from);
      sum -= load.start * power(load.from, 2) + slope * power(load.from, 3);
      sum += load.end * power(load.to, 2) + slope * power(load.to, 3);
    }
  }
  return sum;
}

/** Deflection that has the given values at two places. */
export function deflectionThrough(
  beam: KnownBeam,
  rigidity: number,
  [xa, wa]: readonly [number, number],
  [xb, wb]: readonly [number, number],
): (x: number) => number {
  const bent = (x: number) => -momentIntegral(beam, x, 2) / rigidity;
  const slope = (wb - bent(xb) - (wa - bent(xa))) / (xb - xa);
  return (x) => bent(x) + wa - bent(xa) + slope * (x - xa);
}
