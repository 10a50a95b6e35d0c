/**
 * Effects that act together at one cross-section of one member, in N, N mm, N mm². Resistances take
 * them by size, as which way they act makes no difference; stresses with their signs.
 */
export interface CrossEffects {
  readonly compression: number;
  readonly tension: number;
  readonly M_y: number;
  readonly M_z: number;
  readonly V_z: number;
  readonly V_y: number;
  /** Torsion by its St Venant and its warping part. */
  readonly T_t: number;
  readonly T_w: number;
  /** Bimoment. */
  readonly B: number;
}

export function axialOf({ compression, tension }: CrossEffects): number {
  return compression + tension;
}
