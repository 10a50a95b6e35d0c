import type { Sheet } from '../../formula/sheet';
import {
  GRAVITY,
  HIGHEST_STRENGTH,
  STEEL_DENSITY,
  STEEL_E,
  yieldStrength,
} from '../../materials/steel';
import type { ProfileReader } from '../../profiles/reader';
import { findSection, similarSections, type CatalogueEntry } from '../../sections/catalogue';
import { propertiesOf, type SectionProperties } from '../../sections/properties';
import { classifyIBending, type SectionClass } from '../../steel/classification';
import { readQuantity } from '../../units/quantity';
import type { UnitName } from '../../units/units';
import type { MaterialInput, SectionInput } from '../contract';
import { notCovered, refuse } from '../refuse';

/** A rolled I or H section with its steel and the factors that its resistances need. */
export interface SteelISection {
  readonly entry: CatalogueEntry;
  readonly properties: SectionProperties;
  /** Shear areas that the caller set in place of the formulas'. */
  readonly shearAreas: { readonly z?: number; readonly y?: number };
  readonly f_y: number;
  readonly E: number;
  readonly sectionClass: SectionClass;
  readonly gamma_M0: number;
  readonly eta: number;
  /** Members side by side, and the part of loads and effects that one of them carries. */
  readonly count: number;
  readonly share: number;
  readonly connected: boolean;
  /** Names of the properties that the caller set. */
  readonly overridden: readonly string[];
  /** Weight of one member in N/mm. */
  readonly weight: number;
}

type ByDesignation = Extract<SectionInput, { designation: string }>;
type Overrides = NonNullable<ByDesignation['properties']>;

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

/** Reads section and material, and writes what depends on them alone to the sheet. */
export function readSteelISection(
  section: SectionInput,
  material: MaterialInput,
  profile: ProfileReader,
  sheet: Sheet,
): SteelISection {
  const input = byDesignation(section);
  const entry = entryOf(input);
  const computed = propertiesOf(entry, sheet);
  const properties = { ...computed, ...overridesOf(input.properties ?? {}, sheet) };
  const { f_y, E } = strengthOf(material, entry, profile, sheet);
  const gamma_M0 = profile.number('steel.gamma_M0');
  sheet.given(
    'gamma_M0',
    gamma_M0,
    '1',
    'Partial factor of cross-sections',
    profile.leaf('steel.gamma_M0').clause,
  );
  const sectionClass = classifyIBending(entry, f_y, sheet);
  if (sectionClass === 4) {
    refuse(
      'class-4',
      typeof section === 'string' ? '/section' : '/section/designation',
      `${entry.designation} is class 4 in bending at f_y ${f_y} N/mm²; effective sections are not covered by this version of the check.`,
      'EN 1993-1-5 4.4',
    );
  }
  refuseContradictions(properties, input.properties ?? {});
  const count = input.count ?? 1;
  return {
    entry,
    properties,
    shearAreas: shearAreasOf(input.properties ?? {}),
    f_y,
    E,
    sectionClass,
    gamma_M0,
    eta: profile.number('steel.eta'),
    count,
    share: shareOf(input, count),
    connected: input.connected ?? false,
    overridden: Object.keys(input.properties ?? {}),
    weight: (entry.mass ?? computed.A * STEEL_DENSITY * 1e3) * GRAVITY * 1e-3,
  };
}

function byDesignation(section: SectionInput): ByDesignation {
  if (typeof section === 'string') return { designation: section };
  if ('designation' in section) return section;
  return notCovered(
    '/section/shape',
    `A section of shape "${section.shape}" by its dimensions`,
    'EN 1993-1-1 6.2',
  );
}

function entryOf({ designation }: ByDesignation): CatalogueEntry {
  const entry = findSection(designation);
  if (entry) return entry;
  const similar = similarSections(designation).join(', ');
  return refuse(
    'unknown-section',
    '/section',
    `"${designation}" is not in the catalogue of rolled I and H sections. Near it: ${similar}.`,
  );
}

function overridesOf(given: Overrides, sheet: Sheet): Partial<SectionProperties> {
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
  return result;
}

function shearAreasOf({ Avz, Avy }: Overrides): { z?: number; y?: number } {
  return {
    ...(Avz === undefined ? {} : { z: readQuantity(Avz, 'mm^2') }),
    ...(Avy === undefined ? {} : { y: readQuantity(Avy, 'mm^2') }),
  };
}

function strengthOf(
  material: MaterialInput,
  entry: CatalogueEntry,
  profile: ProfileReader,
  sheet: Sheet,
): { f_y: number; E: number } {
  if (material.type !== 'steel') return notCovered('/material/type', 'Timber', 'EN 1995-1-1 6.1');
  const E = material.E === undefined ? STEEL_E : readQuantity(material.E, 'N/mm^2');
  if ('fy' in material) {
    const f_y = readQuantity(material.fy, 'N/mm^2');
    if (f_y > HIGHEST_STRENGTH) {
      notCovered('/material/fy', `Steel above ${HIGHEST_STRENGTH} N/mm²`, 'EN 1993-1-12');
    }
    return { f_y: sheet.given('f_y', f_y, 'N/mm^2', 'Yield strength', 'Given by the caller'), E };
  }
  const thickness = Math.max(entry.t_f, entry.t_w);
  const { f_y, clause } = yieldStrength(material.grade, thickness, profile);
  return { f_y: sheet.given('f_y', f_y, 'N/mm^2', `Yield strength at ${thickness} mm`, clause), E };
}

/** Properties of the caller's that no section can have. */
function refuseContradictions(properties: SectionProperties, given: Overrides): void {
  const contradiction = (field: string, message: string): never =>
    refuse('contradiction', `/section/properties/${field}`, message);
  const { A, W_el_y, W_el_z, W_pl_y, W_pl_z } = properties;
  if (given.Wply !== undefined && W_pl_y < W_el_y) contradiction('Wply', 'Wply is below Wely.');
  if (given.Wplz !== undefined && W_pl_z < W_el_z) contradiction('Wplz', 'Wplz is below Welz.');
  const { z = 0, y = 0 } = shearAreasOf(given);
  if (z > A) contradiction('Avz', 'A shear area is no greater than the area.');
  if (y > A) contradiction('Avy', 'A shear area is no greater than the area.');
}

function shareOf(input: ByDesignation, count: number): number {
  if (input.share === undefined) return 1 / count;
  if (input.share < 1 / count) {
    refuse(
      'share-too-small',
      '/section/share',
      `The most loaded of ${count} members carries at least ${1 / count} of the whole.`,
    );
  }
  return input.share;
}
