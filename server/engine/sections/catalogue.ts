import hd from './catalogue/hd.json';
import heX from './catalogue/he-x.json';
import hea from './catalogue/hea.json';
import heaa from './catalogue/heaa.json';
import heb from './catalogue/heb.json';
import hem from './catalogue/hem.json';
import hl from './catalogue/hl.json';
import hp from './catalogue/hp.json';
import ipe from './catalogue/ipe.json';
import ipea from './catalogue/ipea.json';
import ipeaa from './catalogue/ipeaa.json';
import ipeo from './catalogue/ipeo.json';
import iper from './catalogue/iper.json';
import ipev from './catalogue/ipev.json';
import ub from './catalogue/ub.json';
import ubp from './catalogue/ubp.json';
import uc from './catalogue/uc.json';
import { designationKey, nearest } from './designation';
import type { SectionShape } from './shapes/shape';

/** A section of the catalogue: dimensions in mm, mass in kg/m (null where none is published). */
export type CatalogueEntry = SectionShape & {
  readonly designation: string;
  readonly family: string;
  readonly source: string;
  readonly mass: number | null;
};

interface FamilyFile {
  readonly family: string;
  readonly source: string;
  readonly rows: readonly (readonly (string | number | null)[])[];
}

const files: readonly FamilyFile[] = [
  ub,
  uc,
  ubp,
  hea,
  heb,
  hem,
  heaa,
  heX,
  hd,
  hl,
  hp,
  ipe,
  ipea,
  ipeaa,
  ipeo,
  iper,
  ipev,
];

function entriesOf(file: FamilyFile): CatalogueEntry[] {
  return file.rows.map((row) => {
    const [designation, h, b, t_w, t_f, r, mass] = row as [
      string,
      number,
      number,
      number,
      number,
      number,
      number | null,
    ];
    const { family, source } = file;
    const shape = { shape: 'I', fabrication: 'rolled', h, b, t_w, t_f, r } as const;
    return { ...shape, designation, family, source, mass };
  });
}

export const catalogue: readonly CatalogueEntry[] = files.flatMap(entriesOf);

const byKey = new Map<string, CatalogueEntry>();
for (const entry of catalogue) {
  const key = designationKey(entry.designation);
  if (byKey.has(key)) throw new Error(`Two sections answer to ${entry.designation}.`);
  byKey.set(key, entry);
}

/** The entry that a designation names in any usual spelling: `457 x 191 x 67 UB`, `HEB200`. */
export function findSection(designation: string): CatalogueEntry | undefined {
  return byKey.get(designationKey(designation));
}

/** Up to three designations that look most like one that is not in the catalogue. */
export function similarSections(designation: string): string[] {
  return nearest(designationKey(designation), [...byKey.keys()], 3).map(
    (key) => byKey.get(key)?.designation ?? key,
  );
}
