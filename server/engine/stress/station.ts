import type { SectionProperties } from '../sections/properties';

/**
 * A point of a section where stress is looked at. Lengths in mm from the centroid of the gross
 * section; y to the right, z downwards, so that a positive M_y stretches z > 0.
 */
export interface Station {
  readonly y: number;
  readonly z: number;
  /** Thickness that the shear flow crosses. */
  readonly t: number;
  /**
   * First moments of the part that a cut across the wall takes off, ∫z dA and ∫y dA in mm³, signed
   * along the wall's own direction; 0 at a free edge.
   */
  readonly S_y: number;
  readonly S_z: number;
  /** Share of the greatest St Venant shear stress: t over the greatest t of open walls, 1 of closed. */
  readonly torsion: number;
  /** Sectorial coordinate in mm², by its size: warping adds to whatever acts. */
  readonly omega: number;
  /** Whether the wall's shear stress from warping torsion is greatest about here. */
  readonly warpingShear: boolean;
}

/** A point that the answer names. */
export interface NamedStation extends Station {
  readonly id: string;
  readonly title: string;
}

/** A wall from end to end, for a drawing. */
export interface Wall {
  readonly id: string;
  readonly title: string;
  readonly t: number;
  readonly stations: readonly Station[];
}

/** What stress is made from: named points and walls of one section. */
export interface StressShape {
  readonly named: readonly NamedStation[];
  readonly walls: readonly Wall[];
}

export type Gross = SectionProperties;

/** 0 to 1 in n equal steps, ends included. */
export function steps(n: number): readonly number[] {
  return Array.from({ length: n + 1 }, (_, index) => index / n);
}

/** Each side of a symmetrical shape. */
export const SIDES = [
  { sign: -1, vertical: 'top', horizontal: 'left' },
  { sign: 1, vertical: 'bottom', horizontal: 'right' },
] as const;

/** A station of a wall without warping. */
export function plain(station: Omit<Station, 'omega' | 'warpingShear'>): Station {
  return { ...station, omega: 0, warpingShear: false };
}
