/** Lengths in mm from the first support (negative on the start overhang), forces in N. */
export interface BeamGeometry {
  readonly spans: readonly number[];
  readonly overhangs: { readonly start: number; readonly end: number };
  /** Flexural rigidity E I in N mm². */
  readonly flexuralRigidity: number;
  /** One for each support in N/mm; null is rigid. */
  readonly supportStiffness: readonly (number | null)[];
}

/** Positive towards the supports. A positive moment load makes M jump up by its value along x. */
export type BeamLoad =
  | {
      readonly kind: 'distributed';
      readonly from: number;
      readonly to: number;
      /** Intensity in N/mm at `from` and at `to`, linear between. */
      readonly start: number;
      readonly end: number;
    }
  | { readonly kind: 'point'; readonly at: number; readonly value: number }
  | { readonly kind: 'moment'; readonly at: number; readonly value: number };
