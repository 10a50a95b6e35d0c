import type { Sheet } from '../../formula/sheet';
import type { SectionProperties } from '../../sections/properties';
import { readQuantity } from '../../units/quantity';
import type { UnitName } from '../../units/units';
import type { SectionInput } from '../contract';
import { refuse } from '../refuse';

export type Overrides = NonNullable<Extract<SectionInput, { properties?: unknown }>['properties']>;

/** The contract's names of properties, the symbol and unit of each. */
const overridable = {
  A: ['A', 'mm^2'],
  Iy: ['I_y', 'mm^4'],
  Iz: ['I_z', 'mm^4'],
  Wely: ['W_el_y', 'mm^3'],
  Welz: ['W_el_z', 'mm^3'],
  Wply: ['W_pl_y', 'mm^3'],
  Wplz: ['W_pl_z', 'mm^3'],
  It: ['I_t', 'mm^4'],
  Iw: ['I_w', 'mm^6'],
} as const satisfies Partial<Record<keyof Overrides, readonly [keyof SectionProperties, UnitName]>>;

/** Properties with what the caller set in their place, each written to the sheet as theirs. */
export function overridden(
  computed: SectionProperties,
  given: Overrides,
  sheet: Sheet,
): SectionProperties {
  const result: Partial<Record<keyof SectionProperties, number>> = {};
  for (const [name, [symbol, unit]] of Object.entries(overridable)) {
    const value = given[name as keyof typeof overridable];
    if (value === undefined) continue;
    const number = readQuantity(value, unit);
    result[symbol] = sheet.given(
      symbol,
      number,
      unit,
      `${symbol} as the caller gave it`,
      'Given by the caller',
    );
  }
  const properties = { ...computed, ...result };
  refuseContradictions(properties, given);
  return properties;
}

/** Shear areas that the caller set in place of the formulas'. */
export function shearAreasOf({ Avz, Avy }: Overrides): {
  readonly z?: number;
  readonly y?: number;
} {
  return {
    ...(Avz === undefined ? {} : { z: readQuantity(Avz, 'mm^2') }),
    ...(Avy === undefined ? {} : { y: readQuantity(Avy, 'mm^2') }),
  };
}

/** Properties of the caller's that no section can have. */
function refuseContradictions(properties: SectionProperties, given: Overrides): void {
  const contradiction = (field: string, message: string): never =>
    refuse('contradiction', `/section/properties/${field}`, message);
  const { A, I_y, I_z, I_yz, W_el_y, W_el_z, W_pl_y, W_pl_z } = properties;
  if (W_pl_y !== undefined && W_pl_y < W_el_y)
    contradiction(given.Wply === undefined ? 'Wely' : 'Wply', 'Wply is below Wely.');
  if (W_pl_z !== undefined && W_pl_z < W_el_z)
    contradiction(given.Wplz === undefined ? 'Welz' : 'Wplz', 'Wplz is below Welz.');
  if (I_y * I_z <= I_yz ** 2)
    contradiction(given.Iy === undefined ? 'Iz' : 'Iy', 'No angle has such second moments.');
  const { z = 0, y = 0 } = shearAreasOf(given);
  if (z > A) contradiction('Avz', 'A shear area is no greater than the area.');
  if (y > A) contradiction('Avy', 'A shear area is no greater than the area.');
}
