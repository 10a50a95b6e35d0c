import type { BeamFrame, LoadVector } from './beam-frame';
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

/*
 * Walks over the pieces of `a` (see piece.ts), whose load intensities are filled in. Breakpoints
 * and pieces are named by index; shear in N, moments in N mm, slopes in rad, deflections in mm.
 */

/** Fills V and M up to the first support, from the free end. Returns both just left of it. */
export function marchStartOverhang(
  { lengths }: BeamFrame,
  a: Float64Array,
  load: LoadVector,
  support: number,
): { shear: number; moment: number } {
  let shear = 0;
  let moment = 0;
  for (let i = 0; i < support; i++) {
    const o = i * STRIDE;
    const h = lengths[i]!;
    a[o + V] = shear - load.force[i]!;
    a[o + M] = moment + load.moment[i]!;
    shear = shearIn(a, o, h, h);
    moment = momentIn(a, o, h, h);
  }
  return { shear, moment };
}

/** Fills V and M from the free end back to the last support. Returns both just right of it. */
export function marchEndOverhang(
  { lengths, pieces }: BeamFrame,
  a: Float64Array,
  load: LoadVector,
  support: number,
): { shear: number; moment: number } {
  let shear = 0;
  let moment = 0;
  for (let i = pieces - 1; i >= support; i--) {
    const o = i * STRIDE;
    const h = lengths[i]!;
    const q0 = a[o + Q0]!;
    const q1 = a[o + Q1]!;
    shear += load.force[i + 1]! + ((q0 + q1) * h) / 2;
    moment -= load.moment[i + 1]! + h * (shear - h * (q0 / 2 + (q1 - q0) / 6));
    a[o + V] = shear;
    a[o + M] = moment;
  }
  return { shear, moment };
}

/** Fills V and M from one breakpoint to another as of a simply supported span; its end slopes × EI. */
export function marchSimply(
  { breaks, lengths }: BeamFrame,
  a: Float64Array,
  load: LoadVector,
  first: number,
  last: number,
): { left: number; right: number } {
  const xa = breaks[first]!;
  const xb = breaks[last]!;
  let turning = 0;
  for (let i = first; i < last; i++) {
    const h = lengths[i]!;
    const q0 = a[i * STRIDE + Q0]!;
    const q1 = a[i * STRIDE + Q1]!;
    turning += h * (((q0 + q1) / 2) * (xb - breaks[i]!) - (h * (q0 + 2 * q1)) / 6);
    if (i > first) turning += load.force[i]! * (xb - breaks[i]!) - load.moment[i]!;
  }
  let shear = turning / (xb - xa);
  let moment = 0;
  let area = 0;
  let areaFromLeft = 0;
  for (let i = first; i < last; i++) {
    const o = i * STRIDE;
    const h = lengths[i]!;
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
  const right = -areaFromLeft / (xb - xa);
  return { left: area + right, right };
}

/** Adds to V and M of a simply supported span what moments at its ends make. */
export function addEndMoments(
  { breaks }: BeamFrame,
  a: Float64Array,
  [first, last]: readonly [number, number],
  left: number,
  right: number,
): void {
  const slope = (right - left) / (breaks[last]! - breaks[first]!);
  for (let i = first; i < last; i++) {
    a[i * STRIDE + V]! += slope;
    a[i * STRIDE + M]! += left + slope * (breaks[i]! - breaks[first]!);
  }
}

/** Fills slopes and deflections to the right of a known pair. Returns the pair at the far end. */
export function deflectRightwards(
  { lengths, geometry: { flexuralRigidity } }: BeamFrame,
  a: Float64Array,
  [first, last]: readonly [number, number],
  slope: number,
  deflection: number,
): { slope: number; deflection: number } {
  for (let i = first; i < last; i++) {
    const o = i * STRIDE;
    const h = lengths[i]!;
    a[o + THETA] = slope;
    a[o + W] = deflection;
    deflection += slope * h - momentAreaLever(a, o, h, h) / flexuralRigidity;
    slope -= momentArea(a, o, h, h) / flexuralRigidity;
  }
  return { slope, deflection };
}

/** Fills slopes and deflections of the start overhang, leftwards from the pair at its support. */
export function deflectStartOverhang(
  { lengths, geometry: { flexuralRigidity } }: BeamFrame,
  a: Float64Array,
  support: number,
  slope: number,
  deflection: number,
): void {
  for (let i = support - 1; i >= 0; i--) {
    const o = i * STRIDE;
    const h = lengths[i]!;
    slope += momentArea(a, o, h, h) / flexuralRigidity;
    deflection += momentAreaLever(a, o, h, h) / flexuralRigidity - slope * h;
    a[o + THETA] = slope;
    a[o + W] = deflection;
  }
}
