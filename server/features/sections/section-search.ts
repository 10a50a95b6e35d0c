import { catalogue, type CatalogueEntry } from '../../engine/sections/catalogue';
import { designationKey } from '../../engine/sections/designation';

interface Spelling {
  readonly letters: string;
  readonly numbers: string;
}

/** `457 x 191 UB` and `UB 457x191` are one: letters and numbers, each in their order. */
function spelling(text: string): Spelling {
  // Somebody is still typing.
  const key = designationKey(text.replace(/(\d)\s*[x×*]\s*$/i, '$1'));
  const space = key.indexOf(' ');
  return { letters: key.slice(0, space), numbers: key.slice(space + 1) };
}

const spelt = catalogue.map((entry) => ({ entry, ...spelling(entry.designation) }));

/** 0 where the section begins as asked, 1 where it holds what is asked; else undefined. */
function rank(section: Spelling, asked: Spelling): 0 | 1 | undefined {
  const { letters, numbers } = section;
  if (!letters.includes(asked.letters) || !numbers.includes(asked.numbers)) return undefined;
  return letters.startsWith(asked.letters) && numbers.startsWith(asked.numbers) ? 0 : 1;
}

/** Sections that begin as asked, in any spelling, then those that hold it; in catalogue order. */
export function searchSections(search: string, family: string | undefined): CatalogueEntry[] {
  const asked = spelling(search);
  const found: [CatalogueEntry[], CatalogueEntry[]] = [[], []];
  for (const section of spelt) {
    if (family !== undefined && section.entry.family !== family) continue;
    const place = rank(section, asked);
    if (place !== undefined) found[place].push(section.entry);
  }
  return found.flat();
}

export const families: readonly string[] = [...new Set(catalogue.map(({ family }) => family))];
