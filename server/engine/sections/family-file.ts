import type { SectionShape } from './shapes/shape';

/** A section of the catalogue: dimensions in mm, mass in kg/m (null where none is published). */
export type CatalogueEntry = SectionShape & {
  readonly designation: string;
  readonly family: string;
  readonly source: string;
  readonly mass: number | null;
};

type Cell = string | number | null;

/** A family as its file holds it: a row for each section, in the order of `columns`. */
export interface FamilyFile {
  readonly family: string;
  /** One for all rows, or several to which the column `source` points. */
  readonly source: string | readonly string[];
  readonly columns: readonly string[];
  readonly rows: readonly (readonly Cell[])[];
}

/** A section's shape from its row, whose numbers are asked for by the name of their column. */
export type ShapeReader = (of: (column: string) => number) => SectionShape;

/** @throws {Error} at start-up where a row lacks what its shape needs. */
export function entriesOf(file: FamilyFile, shapeOf: ShapeReader): CatalogueEntry[] {
  const { family, columns } = file;
  return file.rows.map((row) => {
    const cell = (column: string): Cell => row[columns.indexOf(column)] ?? null;
    const designation = String(cell('designation'));
    const number = (column: string): number => {
      const value = cell(column);
      if (typeof value !== 'number') throw new Error(`${designation} has no ${column}.`);
      return value;
    };
    const source = typeof file.source === 'string' ? file.source : file.source[number('source')];
    if (source === undefined) throw new Error(`${designation} has no source.`);
    const mass = cell('mass');
    return {
      ...shapeOf(number),
      designation,
      family,
      source,
      mass: typeof mass === 'number' ? mass : null,
    };
  });
}
