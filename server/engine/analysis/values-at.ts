import type { BeamState } from './beam-state';
import { STRIDE, THETA, W, momentArea, momentAreaLever, momentIn, shearIn } from './piece';

/** Which side of a jump: the face towards smaller or larger x. */
export type Side = 'left' | 'right';

export interface BeamValues {
  /** Shear dM/dx in N. */
  readonly V: number;
  /** Bending moment in N mm, sagging positive. */
  readonly M: number;
  /** Slope of the deflection in rad. */
  readonly theta: number;
  /** Deflection in mm, positive with the load, not relative to the supports. */
  readonly w: number;
}

/** Everything at x mm from the first support, on the given side of a jump. */
export function valuesAt(state: BeamState, x: number, side: Side = 'right'): BeamValues {
  const { frame, pieces: a } = state;
  const i = frame.pieceAt(x, side);
  const o = i * STRIDE;
  const h = frame.lengths[i]!;
  const s = Math.min(Math.max(x - frame.breaks[i]!, 0), h);
  const rigidity = frame.geometry.flexuralRigidity;
  return {
    V: shearIn(a, o, h, s),
    M: momentIn(a, o, h, s),
    theta: a[o + THETA]! - momentArea(a, o, h, s) / rigidity,
    w: a[o + W]! + a[o + THETA]! * s - momentAreaLever(a, o, h, s) / rigidity,
  };
}

/** Actions at one support: shear and moment on both sides, 0 beyond a free end. */
export interface SupportValues {
  readonly support: number;
  readonly x: number;
  /** In N, positive pushing against the member. */
  readonly reaction: number;
  readonly deflection: number;
  readonly left: { readonly V: number; readonly M: number };
  readonly right: { readonly V: number; readonly M: number };
}

/** One for each support that was entered, lifted ones too. */
export function supportValues(state: BeamState): SupportValues[] {
  const { frame } = state;
  const nothing = { V: 0, M: 0 };
  return Array.from(frame.supports, (x, support) => {
    const node = frame.supportBreaks[support]!;
    return {
      support,
      x,
      reaction: state.reactions[support]!,
      deflection: state.supportDeflections[support]!,
      left: node === 0 ? nothing : valuesAt(state, x, 'left'),
      right: node === frame.pieces ? nothing : valuesAt(state, x, 'right'),
    };
  });
}
