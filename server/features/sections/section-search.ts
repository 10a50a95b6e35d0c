import { catalogue, type CatalogueEntry } from '../../engine/sections/catalogue';
import { spellingOf } from '../../engine/sections/designation';

interface Spelling {
  readonly letters: string;
  readonly numbers: string;
}

const said = { 'hot-finished': 'HF', 'cold-formed': 'CF' } as const;

/** `457 x 191 UB` and `UB 457x191` are one: letters and numbers, each in their order. */
function spelling(text: string): Spelling {
  const { family, forming, numbers } = spellingOf(text);
  return { letters: `${forming ? said[forming] : ''}${family}`, numbers: numbers.join('x') };
}

/** Every way to write a section: a square is a rectangle too, an angle has either leg first. */
function spellings(entry: CatalogueEntry): Spelling[] {
  const { family, numbers } = spellingOf(entry.designation);
  const names = family === 'SHS' ? ['SHS', 'RHS'] : [family];
  const letters =
    'forming' in entry ? names.flatMap((name) => [name, `${said[entry.forming]}${name}`]) : names;
  const [first, second, ...rest] = numbers.map(String);
  const turned = entry.shape === 'angle' && first !== second ? [[second, first, ...rest]] : [];
  return letters.flatMap((each) =>
    [numbers, ...turned].map((row) => ({ letters: each, numbers: row.join('x') })),
  );
}

const spelt = catalogue.map((entry) => ({ entry, ways: spellings(entry) }));

/** 0 where it begins as asked in the very family, 1 in another ("R 20" in RHS), 2 where it holds it. */
type Rank = 0 | 1 | 2;

function rank(section: Spelling, asked: Spelling): Rank | undefined {
  const { letters, numbers } = section;
  if (!letters.includes(asked.letters) || !numbers.includes(asked.numbers)) return undefined;
  if (!letters.startsWith(asked.letters) || !numbers.startsWith(asked.numbers)) return 2;
  return letters === asked.letters ? 0 : 1;
}

/** What a search is narrowed to. */
export interface Narrowing {
  readonly family?: string | undefined;
  readonly shape?: string | undefined;
}

/** Sections that begin as asked, in any spelling, then those that hold it; in catalogue order. */
export function searchSections(search: string, { family, shape }: Narrowing): CatalogueEntry[] {
  // Somebody is still typing.
  const asked = spelling(search.replace(/(\d)\s*[x×*]\s*$/i, '$1'));
  const found: Record<Rank, CatalogueEntry[]> = { 0: [], 1: [], 2: [] };
  for (const { entry, ways } of spelt) {
    if (family !== undefined && entry.family !== family) continue;
    if (shape !== undefined && entry.shape !== shape) continue;
    const ranks = ways.map((way) => rank(way, asked)).filter((each) => each !== undefined);
    const [best] = ranks.sort((a, b) => a - b);
    if (best !== undefined) found[best].push(entry);
  }
  return [...found[0], ...found[1], ...found[2]];
}

export const families: readonly string[] = [...new Set(catalogue.map(({ family }) => family))];
export const shapes: readonly string[] = [...new Set(catalogue.map(({ shape }) => shape))];
