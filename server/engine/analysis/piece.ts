/**
 * A piece is the stretch of the member between two neighbouring breakpoints, where the load is
 * linear. Its state is six numbers, all at the piece's start:
 *
 * | offset | what | unit |
 * | --- | --- | --- |
 * | Q0, Q1 | load intensity at the start and the end, positive towards the supports | N/mm |
 * | V | shear dM/dx | N |
 * | M | bending moment, sagging positive | N mm |
 * | THETA | slope dw/dx | rad |
 * | W | deflection, positive with the load | mm |
 *
 * With s from the start and h the length: V' = -q, M' = V, θ' = -M / EI, w' = θ.
 */
export const STRIDE = 6;
export const Q0 = 0;
export const Q1 = 1;
export const V = 2;
export const M = 3;
export const THETA = 4;
export const W = 5;

/** Shear in N at `s` mm into the piece whose state starts at `o` in `a` and is `h` mm long. */
export function shearIn(a: Float64Array, o: number, h: number, s: number): number {
  const q0 = a[o]!;
  return a[o + V]! - s * (q0 + ((a[o + Q1]! - q0) * s) / (2 * h));
}

/** Bending moment in N mm at `s`; arguments as {@link shearIn}. */
export function momentIn(a: Float64Array, o: number, h: number, s: number): number {
  const q0 = a[o]!;
  return a[o + M]! + s * (a[o + V]! - s * (q0 / 2 + ((a[o + Q1]! - q0) * s) / (6 * h)));
}

/** ∫ M ds from the start to `s`, in N mm². */
export function momentArea(a: Float64Array, o: number, h: number, s: number): number {
  const q0 = a[o]!;
  const dq = (a[o + Q1]! - q0) / h;
  return s * (a[o + M]! + s * (a[o + V]! / 2 - s * (q0 / 6 + (dq * s) / 24)));
}

/** ∫ M (s - t) dt from the start to `s`, in N mm³: what bending alone adds to the deflection, times -EI. */
export function momentAreaLever(a: Float64Array, o: number, h: number, s: number): number {
  const q0 = a[o]!;
  const dq = (a[o + Q1]! - q0) / h;
  return s * s * (a[o + M]! / 2 + s * (a[o + V]! / 6 - s * (q0 / 24 + (dq * s) / 120)));
}
