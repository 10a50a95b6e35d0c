import type { Sheet } from '../../formula/sheet';
import type { ProfileReader } from '../../profiles/reader';
import type { ShapeOf } from '../../sections/shapes/shape';
import type { SectionProperties } from '../../sections/properties';
import { classifyIBending, type SectionClass } from '../../steel/classification';
import type { MaterialInput, SectionInput } from '../contract';
import { notCovered, refuse } from '../refuse';
import { readSteelSection, type SteelSection } from '../steel/section';

/** A rolled I or H section in bending without axial force. */
export interface SteelISection extends SteelSection {
  readonly shape: ShapeOf<'I'>;
  readonly properties: SectionProperties & { readonly W_pl_y: number; readonly W_pl_z: number };
  readonly sectionClass: SectionClass;
}

/** @throws {Refusal} `not-covered` for other shapes, `class-4` */
export function readSteelISection(
  section: SectionInput,
  material: MaterialInput,
  profile: ProfileReader,
  sheet: Sheet,
): SteelISection {
  const read = readSteelSection(section, material, profile, sheet);
  const { shape, properties, name, f_y } = read;
  const pointer = typeof section === 'string' ? '/section' : '/section/designation';
  if (shape.shape !== 'I' || shape.fabrication === 'welded') {
    return notCovered(
      typeof section === 'object' && 'shape' in section ? '/section/shape' : pointer,
      `${name}, which is no rolled I or H section,`,
      'EN 1993-1-1 6.2',
    );
  }
  const { W_pl_y, W_pl_z } = properties;
  if (W_pl_y === undefined || W_pl_z === undefined) throw new Error(`${name} has no plastic modulus`);
  const sectionClass = classifyIBending(shape, f_y, sheet);
  if (sectionClass === 4) {
    refuse(
      'class-4',
      typeof section === 'string' ? '/section' : '/section/designation',
      `${name} is class 4 in bending at f_y ${f_y} N/mm²; effective sections are not covered by this version of the check.`,
      'EN 1993-1-5 4.4',
    );
  }
  return { ...read, shape, properties: { ...properties, W_pl_y, W_pl_z }, sectionClass };
}
