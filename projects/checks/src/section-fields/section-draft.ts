import type { SectionInput, SectionLine } from '../contract';
import type { FieldReader } from '../form/field-reader';
import { writeSection } from '../form/write-draft';
import { writeQuantity, readQuantity } from '../quantity/read-quantity';
import { writeNumber } from '../quantity/read-number';
import {
  choiceOf,
  dimensionFields,
  wayOf,
  type DimensionName,
  type SectionWay,
} from './section-shapes';

/** A section as it is typed. */
export interface SectionDraft {
  /** What came from outside; its overrides count while it is not changed. */
  readonly kept: SectionInput | undefined;
  readonly way: SectionWay;
  readonly designation: string;
  /** Each dimension as it is typed; those of another shape are kept for when it comes back. */
  readonly sizes: Readonly<Partial<Record<DimensionName, string>>>;
}

const NAMES: readonly DimensionName[] = ['h', 'b', 'd', 't', 'tw', 'tf', 'r', 'r1', 'r2'];

/** A request's section as the form shows it. */
export function writeSectionDraft(kept: SectionInput | undefined): SectionDraft {
  const empty = { kept, way: 'designation' as const, designation: '', sizes: {} };
  if (kept === undefined) return empty;
  if (typeof kept === 'string' || 'designation' in kept)
    return { ...empty, designation: writeSection(kept) };
  const given = kept as Readonly<Partial<Record<DimensionName, number | string>>>;
  const sizes = Object.fromEntries(
    NAMES.filter((name) => given[name] !== undefined).map((name) => [
      name,
      writeQuantity(given[name]),
    ]),
  );
  const { fabrication, forming } = kept as { fabrication?: string; forming?: string };
  return { ...empty, way: wayOf(kept.shape, fabrication ?? forming), sizes };
}

/** The section as a request names it; undefined while it is not given or cannot be read. */
export function readSectionDraft(
  draft: SectionDraft,
  reader: FieldReader,
): SectionInput | undefined {
  const { kept, way, designation, sizes } = draft;
  if (!isSectionGiven(draft)) return undefined;
  const shown = writeSectionDraft(kept);
  const fields = dimensionFields(way);
  const same =
    way === shown.way &&
    designation.trim() === shown.designation &&
    fields.every(({ name }) => sizes[name] === shown.sizes[name]);
  if (kept && same) return kept;
  // Overrides belong to the section they were given for; side by side stays side by side.
  const { count, connected, share } = (typeof kept === 'object' ? kept : {}) as TwinFields;
  const twin = {
    ...(count !== undefined && { count }),
    ...(connected !== undefined && { connected }),
    ...(share !== undefined && { share }),
  };
  const choice = choiceOf(way);
  if (!choice) {
    const name = designation.trim();
    return Object.keys(twin).length === 0 ? name : { designation: name, ...twin };
  }
  const { shape, fabrication, forming } = choice;
  const made: Record<string, unknown> = { shape };
  for (const { name, optional } of fields) {
    const text = sizes[name] ?? '';
    const pointer = `/section/${name}`;
    const size = optional
      ? reader.quantity(pointer, text, 'mm')
      : reader.needed(pointer, text, 'mm');
    if (size !== undefined) made[name] = size;
  }
  if (fabrication === 'welded') made.fabrication = fabrication;
  if (forming) made.forming = forming;
  return { ...made, ...twin } as unknown as SectionInput;
}

interface TwinFields {
  readonly count?: number;
  readonly connected?: boolean;
  readonly share?: number;
}

/** Whether enough is typed to be read: a form that waits for it is not at fault. */
export function isSectionGiven({ way, designation, sizes }: SectionDraft): boolean {
  if (way === 'designation') return designation.trim() !== '';
  return dimensionFields(way).some(({ name }) => (sizes[name] ?? '').trim() !== '');
}

/** The pointers of the fields that the form shows of a section. */
export function sectionPointers({ way }: SectionDraft): string[] {
  return ['/section', ...dimensionFields(way).map(({ name }) => `/section/${name}`)];
}

/** The dimensions in mm that can be read as they stand. */
export function sizesOf({ way, sizes }: SectionDraft): Readonly<Record<string, number>> {
  const read = dimensionFields(way).flatMap(({ name }): [string, number][] => {
    const reading = readQuantity(sizes[name] ?? '', 'mm');
    return reading.state === 'ok' ? [[name, reading.value.number]] : [];
  });
  return Object.fromEntries(read);
}

/** The dimensions of a section of the catalogue as texts, to begin from when one is changed. */
export function sizesFrom({ dimensions = {} }: SectionLine): SectionDraft['sizes'] {
  const known = NAMES.filter((name) => dimensions[name] !== undefined);
  return Object.fromEntries(known.map((name) => [name, writeNumber(dimensions[name]?.value ?? 0)]));
}
