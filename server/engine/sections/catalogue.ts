import { designationKey, formingIn, nearest } from './designation';
import { familyFiles } from './families';
import { entriesOf, type CatalogueEntry } from './family-file';

export type { CatalogueEntry } from './family-file';

export const catalogue: readonly CatalogueEntry[] = familyFiles.flatMap(([file, shapeOf]) =>
  entriesOf(file, shapeOf),
);

const HOT = 'HF ';
const COLD = 'CF ';

/** A hollow section's key says how it was formed, whether its name does or not. */
function keyOf(entry: CatalogueEntry): string {
  const key = designationKey(entry.designation);
  const hot = 'forming' in entry && entry.forming === 'hot-finished';
  return hot ? HOT + key : key;
}

const byKey = new Map<string, CatalogueEntry>();
for (const entry of catalogue) {
  const key = keyOf(entry);
  if (byKey.has(key)) throw new Error(`Two sections answer to ${entry.designation}.`);
  byKey.set(key, entry);
}

/**
 * The entry that a designation names in any usual spelling: `457 x 191 x 67 UB`, `HEB200`.
 * A hollow section whose forming is not said is the hot-finished one where both are made.
 */
export function findSection(designation: string): CatalogueEntry | undefined {
  const key = designationKey(designation);
  return byKey.get(key) ?? byKey.get(HOT + key) ?? byKey.get(COLD + key);
}

/**
 * Whether a hollow section's forming follows from its designation: said there, or the size is made
 * in one way only. True of all that is not hollow.
 */
export function formingIsSaid(designation: string): boolean {
  const key = designationKey(designation);
  return formingIn(designation) !== undefined || !(byKey.has(HOT + key) && byKey.has(COLD + key));
}

/** "CF SHS" of "CF SHS 150x150x8". */
const familyIn = (key: string): string => key.slice(0, key.lastIndexOf(' '));

const keysOfFamily = new Map<string, Map<string, CatalogueEntry>>();
for (const entry of catalogue) {
  const key = designationKey(entry.designation);
  const keys = keysOfFamily.get(familyIn(key)) ?? new Map<string, CatalogueEntry>();
  keysOfFamily.set(familyIn(key), keys.set(key, entry));
}

/**
 * Up to three designations that look most like one that is not in the catalogue: of its family
 * where there is such a family.
 */
export function similarSections(designation: string): string[] {
  const key = designationKey(designation).replace(HOT, '');
  const family = keysOfFamily.get(familyIn(key));
  const candidates = family ?? new Map([...keysOfFamily.values()].flatMap((keys) => [...keys]));
  const turned = turnedRound(key);
  const near = nearest(key, [...candidates.keys()], 3);
  return [...new Set(candidates.has(turned) ? [turned, ...near] : near)]
    .slice(0, 3)
    .map((found) => candidates.get(found)?.designation ?? found);
}

/** "L 150x100x12" for "L 100x150x12": never taken for it, as its axes are others, but likely meant. */
function turnedRound(key: string): string {
  return key.replace(/ (\d[\d.]*)x(\d[\d.]*)/, ' $2x$1');
}
