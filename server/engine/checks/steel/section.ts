import type { Sheet } from '../../formula/sheet';
import { GRAVITY, STEEL_DENSITY } from '../../materials/steel';
import type { ProfileReader } from '../../profiles/reader';
import { propertiesOf, type SectionProperties } from '../../sections/properties';
import type { SectionShape } from '../../sections/shapes/shape';
import type { MaterialInput, SectionInput, SectionRequest } from '../contract';
import { refuse } from '../refuse';
import { readSteel, thickestPart, type SteelStrength } from './material';
import { overridden, shearAreasOf, type Overrides } from './overrides';
import { readShape } from './shape';

/** A steel section of any shape with its strength and the factors that its resistances need. */
export interface SteelSection extends SteelStrength {
  /** Designation, or the shape in words. */
  readonly name: string;
  readonly shape: SectionShape;
  /** By the dimensions, less what the caller set in place of it. */
  readonly properties: SectionProperties;
  /** By the dimensions alone: what plates can be taken away from. */
  readonly gross: SectionProperties;
  /** Shear areas that the caller set in place of the formulas'. */
  readonly shearAreas: { readonly z?: number; readonly y?: number };
  readonly gamma_M0: number;
  readonly eta: number;
  /** Partial factors that only some verifications use, read when they are. */
  factor(name: 'gamma_M1' | 'gamma_M2'): { readonly value: number; readonly clause: string };
  /** Members side by side, and the part of loads and effects that one of them carries. */
  readonly count: number;
  readonly share: number;
  readonly connected: boolean;
  /** Names of the properties that the caller set. */
  readonly overridden: readonly string[];
  /** The caller's section did not say how it was formed. */
  readonly formingAssumed: boolean;
  /** Weight of one member in N/mm. */
  readonly weight: number;
}

/** What a request may say of a section beside its shape. */
interface SetOfMembers {
  readonly count?: number;
  readonly share?: number;
  readonly connected?: boolean;
  readonly properties?: Overrides;
}

/** Reads section and material, and writes what depends on them alone to the sheet. */
export function readSteelSection(
  section: SectionInput,
  material: MaterialInput | SectionRequest['material'],
  profile: ProfileReader,
  sheet: Sheet,
): SteelSection {
  const { name, shape, entry, formingAssumed } = readShape(section);
  if (entry?.family === 'timber') {
    refuse('contradiction', '/section', `${name} is a size of timber, and the material is steel.`);
  }
  const input: SetOfMembers = typeof section === 'string' ? {} : section;
  const given = input.properties ?? {};
  const gross = propertiesOf(shape, sheet);
  const properties = overridden(gross, given, sheet);
  const strength = readSteel(material, thickestPart(shape), profile, sheet);
  const gamma_M0 = profile.number('steel.gamma_M0');
  const { clause } = profile.leaf('steel.gamma_M0');
  sheet.given('gamma_M0', gamma_M0, '1', 'Partial factor of cross-sections', clause);
  const count = input.count ?? 1;
  return {
    ...strength,
    name,
    shape,
    gross,
    properties,
    shearAreas: shearAreasOf(given),
    gamma_M0,
    eta: profile.number('steel.eta'),
    factor: (factorName) => {
      const path = `steel.${factorName}`;
      return { value: profile.number(path), clause: profile.leaf(path).clause };
    },
    count,
    share: shareOf(input.share, count),
    connected: input.connected ?? false,
    overridden: Object.keys(given),
    formingAssumed,
    weight: (entry?.mass ?? gross.A * STEEL_DENSITY * 1e3) * GRAVITY * 1e-3,
  };
}

function shareOf(share: number | undefined, count: number): number {
  if (share === undefined) return 1 / count;
  if (share < 1 / count) {
    refuse(
      'share-too-small',
      '/section/share',
      `The most loaded of ${count} members carries at least ${1 / count} of the whole.`,
    );
  }
  return share;
}
