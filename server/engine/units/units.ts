/**
 * The units of the contract and what one of each is in the engine's own (N, mm, rad, K).
 *
 * Every name is also valid mathjs, so that a printed line with units evaluates anywhere.
 */
export const unitScale = {
  '1': 1,
  mm: 1,
  'mm^2': 1,
  'mm^3': 1,
  'mm^4': 1,
  'mm^6': 1,
  m: 1e3,
  N: 1,
  kN: 1e3,
  'N/mm': 1,
  'kN/m': 1,
  'kN/mm': 1e3,
  'kN/m^2': 1e-3,
  'N/mm^2': 1,
  'kN m': 1e6,
  'kN m^2': 1e9,
  deg: Math.PI / 180,
  K: 1,
} as const;

/** A unit that an answer, a formula or a field's default may have. */
export type UnitName = keyof typeof unitScale;

/** A number with its unit, as answers carry it. */
export interface Quantity {
  readonly value: number;
  readonly unit: UnitName;
}

export function isUnitName(text: string): text is UnitName {
  return Object.hasOwn(unitScale, text);
}

/** From the engine's own units to `unit`. */
export function toUnit(value: number, unit: UnitName): number {
  return value / unitScale[unit];
}

/** From `unit` to the engine's own units. */
export function fromUnit(value: number, unit: UnitName): number {
  return value * unitScale[unit];
}

/** A number in the engine's own units as an answer's quantity. */
export function quantity(value: number, unit: UnitName): Quantity {
  return { value: toUnit(value, unit), unit };
}
