/**
 * Properties of one member by its gross dimensions, in mm, mm², mm³, mm⁴, mm⁶, about the centroid.
 * Axes y-y and z-z are parallel to the flanges and to the web, not principal ones for an angle.
 */
export interface SectionProperties {
  readonly A: number;
  readonly I_y: number;
  readonly I_z: number;
  /** Product of area; 0 but for angles. */
  readonly I_yz: number;
  /** Principal second moments; I_y and I_z but for angles. */
  readonly I_u: number;
  readonly I_v: number;
  readonly W_el_y: number;
  readonly W_el_z: number;
  /** Undefined for angles: bent freely they reach no plastic moment about a geometric axis. */
  readonly W_pl_y?: number;
  readonly W_pl_z?: number;
  readonly I_t: number;
  /** Undefined where warping is not what carries torsion: hollow sections, solids. */
  readonly I_w?: number;
  /** Torsion modulus: tau = T / W_t at the worst point; hollow sections and solids only. */
  readonly W_t?: number;
  /** Centroid from the back of the web (channel) or from the backs of the legs (angle). */
  readonly y_c?: number;
  readonly z_c?: number;
  /** Shear centre of a channel from the web's centre line, away from the flanges. */
  readonly e_0?: number;
}
