import type { SectionProperties } from '../sections/properties';
import type { SectionShape, ShapeOf } from '../sections/shapes/shape';
import { sectionPlane, type Plane } from './plane';
import { angleStresses } from './shapes/angle';
import { channelStresses } from './shapes/channel';
import { chsStresses, rhsStresses } from './shapes/hollow';
import { iStresses } from './shapes/i';
import { rectangleStresses, roundStresses } from './shapes/solid';
import { flowPerForce } from './shear-flow';
import type { Gross, NamedStation, Station, StressShape } from './station';

/** Effects at one cross-section in N and N mm; N tension positive, M_y stretches z > 0, M_z y > 0. */
export interface ElasticEffects {
  readonly N: number;
  readonly M_y: number;
  readonly M_z: number;
  readonly V_z: number;
  readonly V_y: number;
  /** Greatest St Venant shear stress, N/mm², with the sign of the torque. */
  readonly tau_t: number;
  /** Stress along the member where omega is greatest, over omega, N/mm⁴. */
  readonly warpingPerOmega: number;
  readonly tau_w: number;
}

/** N/mm², tension positive. */
export interface Stress {
  readonly sigma: number;
  readonly tau: number;
  readonly sigma_v: number;
}

export interface NamedStress extends Stress {
  readonly station: NamedStation;
}

export function stressShapeOf(shape: SectionShape, gross: Gross): StressShape {
  switch (shape.shape) {
    case 'I':
      return iStresses(shape, gross);
    case 'channel':
      return channelStresses(shape, gross);
    case 'RHS':
      return rhsStresses(shape, gross);
    case 'CHS':
      return chsStresses(shape, gross);
    case 'angle':
      return angleStresses(shape, gross);
    case 'rectangle':
      return rectangleStresses(shape);
    case 'round':
      return roundStresses(shape);
  }
}

const closed: ReadonlySet<SectionShape['shape']> = new Set(['RHS', 'CHS']);
const solid: ReadonlySet<SectionShape['shape']> = new Set(['rectangle', 'round']);

/** Stress at a station: everything at the same point. */
export function stressAt(
  station: Station,
  shape: SectionShape,
  plane: Plane,
  effects: ElasticEffects,
): Stress {
  const sigma = normalStress(station, plane, effects);
  const tau = shearStress(station, shape, plane, effects);
  return { sigma, tau, sigma_v: Math.sqrt(sigma ** 2 + 3 * tau ** 2) };
}

function normalStress(
  { y, z, omega }: Station,
  { A, I_y, I_z, I_yz, D }: Plane,
  { N, M_y, M_z, warpingPerOmega }: ElasticEffects,
): number {
  const bent = (M_y * (I_z * z - I_yz * y) + M_z * (I_y * y - I_yz * z)) / D;
  const straight = N / A + bent;
  // The sign of a bimoment follows no convention that is shared: it adds to what acts.
  return straight + Math.sign(straight || 1) * Math.abs(warpingPerOmega) * omega;
}

function shearStress(
  station: Station,
  { shape }: SectionShape,
  plane: Plane,
  { V_z, V_y, tau_t, tau_w }: ElasticEffects,
): number {
  const fromZ = (V_z * flowPerForce(station, plane, 'z')) / station.t;
  const fromY = (V_y * flowPerForce(station, plane, 'y')) / station.t;
  const torsion = tau_t * station.torsion;
  if (closed.has(shape)) return fromZ + fromY + torsion;
  if (solid.has(shape)) return Math.hypot(fromZ, fromY) + Math.abs(torsion);
  // Both faces of an open wall are sheared either way: the size is what counts.
  const warping = station.warpingShear ? Math.abs(tau_w) : 0;
  return Math.abs(fromZ) + Math.abs(fromY) + Math.abs(torsion) + warping;
}

/** Stress at every named point, the worse where a point has two sides. */
export function namedStresses(
  shape: SectionShape,
  gross: Gross,
  plane: Plane,
  effects: ElasticEffects,
): NamedStress[] {
  const worst = new Map<string, NamedStress>();
  for (const station of stressShapeOf(shape, gross).named) {
    const stress = { ...stressAt(station, shape, plane, effects), station };
    const known = worst.get(station.id);
    if (!known || stress.sigma_v > known.sigma_v) worst.set(station.id, stress);
  }
  return [...worst.values()];
}

/** mm³: the moment about one geometric axis over the greatest stress of an angle free to bend sideways. */
export function freeModulus(
  shape: ShapeOf<'angle'>,
  gross: SectionProperties,
  axis: 'y' | 'z',
): number {
  const { I_y, I_z, I_yz, D } = sectionPlane(shape, gross);
  const greatest = Math.max(
    ...angleStresses(shape, gross).named.map(({ y, z }) =>
      Math.abs(axis === 'y' ? I_z * z - I_yz * y : I_y * y - I_yz * z),
    ),
  );
  return D / greatest;
}
