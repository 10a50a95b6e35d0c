import type { BeamState } from '../../analysis/beam-state';
import { ContinuousBeam } from '../../analysis/continuous-beam';
import { sectionPoints } from '../../analysis/section-points';
import { valuesAt } from '../../analysis/values-at';
import { readQuantity } from '../../units/quantity';
import type { WalerRequest } from '../contract';
import { memberEnds, type SupportLayout } from '../continuous/geometry';
import type { SteelSection } from '../steel/section';

/** Bending about z-z and shear along the flanges, N mm and N, for one member. */
export interface SideEffect {
  readonly M_z: number;
  readonly V_y: number;
}

/** What a waler's own weight, by a factor of 1, does across the plane of its loads. */
export interface OwnWeight {
  at(x: number): SideEffect;
  /** Places where it is greatest, mm from the first support. */
  readonly places: readonly number[];
}

const none: OwnWeight = { at: () => ({ M_z: 0, V_y: 0 }), places: [] };

/**
 * The waler hangs on its props, or on supports at a spacing of their own. Those may stand anywhere
 * along it, so that the greatest effect of a two-span or simple beam is taken all along: w s²/8
 * and 5/8 w s (G_beams of the handbooks: two equal spans), and w c²/2 on an overhang c.
 */
export function ownWeight(
  request: Pick<WalerRequest, 'selfWeight' | 'verticalSupports'>,
  layout: SupportLayout,
  section: SteelSection,
): OwnWeight {
  if (request.selfWeight === false) return none;
  const { weight } = section;
  if (request.verticalSupports) {
    const spacing = readQuantity(request.verticalSupports.spacing, 'm');
    const overhang = Math.min(spacing, Math.max(layout.overhangs.start, layout.overhangs.end));
    const effect = {
      M_z: Math.max((weight * spacing ** 2) / 8, (weight * overhang ** 2) / 2),
      V_y: Math.max((5 / 8) * weight * spacing, weight * overhang),
    };
    return { at: () => effect, places: [] };
  }
  return betweenProps(layout, section);
}

function betweenProps(layout: SupportLayout, section: SteelSection): OwnWeight {
  const { weight, E, properties } = section;
  const ends = memberEnds(layout);
  const load = {
    kind: 'distributed',
    from: ends.start,
    to: ends.end,
    start: weight,
    end: weight,
  } as const;
  const rigid = layout.supportStiffness.map(() => null);
  const geometry = { ...layout, flexuralRigidity: E * properties.I_z, supportStiffness: rigid };
  const state = new ContinuousBeam(geometry, [load]).solve([load]);
  // The same places come again with every combination.
  const known = new Map<number, SideEffect>();
  const at = (x: number): SideEffect => {
    const effect = known.get(x) ?? effectAt(state, x);
    known.set(x, effect);
    return effect;
  };
  return { at, places: [...new Set(sectionPoints(state).map((point) => point.x))] };
}

/** The greater of both sides, where the reaction makes the shear jump. */
function effectAt(state: BeamState, x: number): SideEffect {
  const left = valuesAt(state, x, 'left');
  const right = valuesAt(state, x, 'right');
  return {
    M_z: Math.max(Math.abs(left.M), Math.abs(right.M)),
    V_y: Math.max(Math.abs(left.V), Math.abs(right.V)),
  };
}
