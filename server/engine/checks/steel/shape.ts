import {
  findSection,
  formingIsSaid,
  similarSections,
  type CatalogueEntry,
} from '../../sections/catalogue';
import { cornerRadii } from '../../sections/shapes/hollow';
import { impossibilityOf } from '../../sections/shapes/possible';
import type { SectionShape } from '../../sections/shapes/shape';
import { readQuantity } from '../../units/quantity';
import type { SectionInput } from '../contract';
import { refuse } from '../refuse';

type Named = Extract<SectionInput, { designation: string }>;
type Drawn = Extract<SectionInput, { shape: string }>;

/** A section as a request names it: from the catalogue or by its dimensions. */
export interface NamedShape {
  /** Designation, or the shape in words. */
  readonly name: string;
  readonly shape: SectionShape;
  /** Undefined for a section by its dimensions. */
  readonly entry?: CatalogueEntry;
  /** Hot-finished and cold-formed ones of this size exist, and the name does not say which. */
  readonly formingAssumed: boolean;
}

/** @throws {Refusal} `unknown-section`, `impossible-section` */
export function readShape(section: SectionInput): NamedShape {
  if (typeof section === 'string') return ofCatalogue({ designation: section }, '/section');
  if ('designation' in section) return ofCatalogue(section, '/section/designation');
  return drawn(section);
}

function ofCatalogue({ designation }: Named, pointer: string): NamedShape {
  const entry = findSection(designation);
  if (entry) {
    const formingAssumed = !formingIsSaid(designation);
    return { name: entry.designation, shape: entry, entry, formingAssumed };
  }
  const similar = similarSections(designation).join(', ');
  return refuse(
    'unknown-section',
    pointer,
    `"${designation}" is not in the catalogue. Near it: ${similar}.`,
  );
}

function drawn(section: Drawn): NamedShape {
  const shape = shapeOf(section);
  const impossible = impossibilityOf(shape);
  if (impossible) {
    refuse('impossible-section', `/section/${impossible.dimension}`, impossible.message);
  }
  return { name: nameOf(section), shape, formingAssumed: false };
}

const mm = (value: number | string | undefined): number =>
  value === undefined ? 0 : readQuantity(value, 'mm');

function shapeOf(section: Drawn): SectionShape {
  switch (section.shape) {
    case 'I': {
      const { h, b, tw, tf, r, fabrication = 'rolled' } = section;
      return {
        shape: 'I',
        h: mm(h),
        b: mm(b),
        t_w: mm(tw),
        t_f: mm(tf),
        r: mm(r),
        fabrication,
      };
    }
    case 'channel': {
      const { h, b, tw, tf, r } = section;
      return { shape: 'channel', h: mm(h), b: mm(b), t_w: mm(tw), t_f: mm(tf), r: mm(r) };
    }
    case 'RHS':
    case 'SHS': {
      const { t, forming } = section;
      const h = mm(section.h);
      const b = section.shape === 'RHS' ? mm(section.b) : h;
      return { shape: 'RHS', h, b, t: mm(t), ...cornerRadii(mm(t), forming), forming };
    }
    case 'CHS':
      return { shape: 'CHS', d: mm(section.d), t: mm(section.t), forming: section.forming };
    case 'angle': {
      const { h, b, t, r1, r2 } = section;
      return { shape: 'angle', h: mm(h), b: mm(b), t: mm(t), r_1: mm(r1), r_2: mm(r2) };
    }
    case 'rectangle':
      return { shape: 'rectangle', b: mm(section.b), h: mm(section.h) };
    case 'round':
      return { shape: 'round', d: mm(section.d) };
  }
}

function nameOf(section: Drawn): string {
  return section.shape === 'I' && section.fabrication === 'welded'
    ? 'The welded I section'
    : `The ${section.shape} section by its dimensions`;
}
