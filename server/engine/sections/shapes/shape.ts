import type { Forming } from './hollow';

/** Which buckling curves and shear area a section takes. */
export type Fabrication = 'rolled' | 'welded';

/** An I or H section with equal flanges; r is the root radius of a rolled one, the weld's leg of a welded one. */
export interface IShape {
  readonly shape: 'I';
  readonly h: number;
  readonly b: number;
  readonly t_w: number;
  readonly t_f: number;
  readonly r: number;
  readonly fabrication: Fabrication;
  readonly taper?: FlangeTaper;
}

/** A channel; the web at the left, toes towards y > 0. */
export interface ChannelShape {
  readonly shape: 'channel';
  readonly h: number;
  readonly b: number;
  readonly t_w: number;
  readonly t_f: number;
  readonly r: number;
  readonly taper?: FlangeTaper;
}

/** Flanges that thin towards their toes (IPN, UPN); t_f is then the thickness at `at` from the toe. */
export interface FlangeTaper {
  /** Rise of the inner face over its run, such as 0.14. */
  readonly slope: number;
  /** Distance in mm from the toe to where the flange is t_f thick. */
  readonly at: number;
  /** Radius of the toe in mm. */
  readonly r_2: number;
}

/** A rectangular or square hollow section with its corner radii. */
export interface RhsShape {
  readonly shape: 'RHS';
  readonly h: number;
  readonly b: number;
  readonly t: number;
  readonly r_o: number;
  readonly r_i: number;
  readonly forming: Forming;
}

export interface ChsShape {
  readonly shape: 'CHS';
  readonly d: number;
  readonly t: number;
  readonly forming: Forming;
}

/** An angle: leg h along z-z, leg b along y-y; heel at the lower left. */
export interface AngleShape {
  readonly shape: 'angle';
  readonly h: number;
  readonly b: number;
  readonly t: number;
  readonly r_1: number;
  readonly r_2: number;
}

export interface RectangleShape {
  readonly shape: 'rectangle';
  readonly b: number;
  readonly h: number;
}

export interface RoundShape {
  readonly shape: 'round';
  readonly d: number;
}

/** A cross-section by its dimensions in mm. A square hollow section is an RHS with h = b. */
export type SectionShape =
  IShape | ChannelShape | RhsShape | ChsShape | AngleShape | RectangleShape | RoundShape;

export type ShapeName = SectionShape['shape'];
export type ShapeOf<N extends ShapeName> = Extract<SectionShape, { readonly shape: N }>;
