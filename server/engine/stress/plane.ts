import type { SectionProperties } from '../sections/properties';
import type { SectionShape } from '../sections/shapes/shape';

/** Second moments about axes through the centroid, y right and z down, mm⁴. */
export interface Plane {
  readonly A: number;
  readonly I_y: number;
  readonly I_z: number;
  readonly I_yz: number;
  /** I_y I_z less I_yz². */
  readonly D: number;
}

/**
 * What turns effects into stress. An elastic modulus that the caller gave below that of the
 * dimensions lowers the second moment with it, so that the edge is stressed as they say.
 */
export function sectionPlane(
  shape: SectionShape,
  gross: SectionProperties,
  properties: SectionProperties = gross,
): Plane {
  const I_y = properties.I_y * Math.min(properties.W_el_y / gross.W_el_y, 1);
  const I_z = properties.I_z * Math.min(properties.W_el_z / gross.W_el_z, 1);
  // The product of area of an angle is by its legs, upwards; here z is down.
  const I_yz = shape.shape === 'angle' ? -gross.I_yz : 0;
  return { A: properties.A, I_y, I_z, I_yz, D: I_y * I_z - I_yz ** 2 };
}
