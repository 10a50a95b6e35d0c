/**
 * A root fillet of radius r is a square of side r less a quarter circle, or, with the sign turned,
 * what a rounded corner takes away. Texts for formulas; all derived from the geometry:
 * area (1 - pi/4) r², centroid (10 - 3 pi)/(12 - 3 pi) r from the corner along each side, second
 * moment about its own centroid r⁴ (1/3 - pi/16 - 1/(9 (4 - pi))), product of area about the same
 * r⁴ (19/24 - pi/4) less area × centroid².
 */
export function fillet(r: string): {
  readonly area: string;
  readonly centroid: string;
  readonly inertia: string;
  readonly product: string;
} {
  const area = `(1 - pi / 4) * ${r}^2`;
  const centroid = `(10 - 3 * pi) / (12 - 3 * pi) * ${r}`;
  return {
    area,
    centroid,
    inertia: `${r}^4 * (1 / 3 - pi / 16 - 1 / (9 * (4 - pi)))`,
    product: `(${r}^4 * (19 / 24 - pi / 4) - ${area} * (${centroid})^2)`,
  };
}

/** Declares symbols that are all lengths in mm. */
export function lengths<D extends string>(...names: D[]): Record<D, 'mm'> {
  return Object.fromEntries(names.map((name) => [name, 'mm'])) as Record<D, 'mm'>;
}

/** Where the properties of a shape come from. */
export const GEOMETRY = 'Geometry of the dimensions';
