import { editDistance } from '../text/edit-distance';
import type { Forming } from './shapes/hollow';

/** Names of the same family in the trade. */
const aliases: Readonly<Record<string, string>> = {
  UKB: 'UB',
  UKC: 'UC',
  UKBP: 'UBP',
  UKPFC: 'PFC',
  UNP: 'UPN',
  INP: 'IPN',
  UKA: 'L',
  RSA: 'L',
  EA: 'L',
  UA: 'L',
  ANGLE: 'L',
  FLAT: 'FL',
  ROUND: 'R',
  SQUARE: 'SQ',
};

const formings: readonly (readonly [Forming, RegExp])[] = [
  ['hot-finished', /HOT(?:FINISHED|FORMED|ROLLED)?|HF/],
  ['cold-formed', /COLD(?:FORMED)?|CF/],
];
const hollow = /[RSC]HS/;

/** A designation taken apart: its family's letters, how it was formed if said, and its numbers. */
export interface Spelling {
  readonly family: string;
  readonly forming: Forming | undefined;
  readonly numbers: readonly number[];
}

/** @example spellingOf('150 x 150 x 8 SHS, cold-formed') // SHS, cold-formed, [150, 150, 8] */
export function spellingOf(text: string): Spelling {
  const plain = text
    .toUpperCase()
    .replace(/[×*]/g, 'X')
    // The product standard says how a section was formed; its numbers are not dimensions.
    .replace(/(?:BS\s*)?EN[\s-]*10210(?:-\d)?/, ' HF ')
    .replace(/(?:BS\s*)?EN[\s-]*10219(?:-\d)?/, ' CF ')
    .replace(/(\d)\s*X\s*(?=\d)/g, '$1x')
    .replace(/(\d),(?=\d)/g, '$1.');
  const numbers = (plain.match(/\d+(?:\.\d+)?/g) ?? []).map(Number);
  const letters = (plain.match(/[A-Z]+/g) ?? []).join('');
  const kind = hollow.exec(letters)?.[0];
  const about = kind === undefined ? '' : letters.replace(kind, '');
  const said = formings.find(([, words]) => words.exec(about)?.[0] === about);
  const family = kind !== undefined && said ? kind : letters;
  return { family: aliases[family] ?? family, forming: said?.[0], numbers };
}

/** How a hollow section was formed, where its designation says so. */
export function formingIn(text: string): Forming | undefined {
  return spellingOf(text).forming;
}

/** What a spelling leaves out, as the catalogue has it; which leg comes first is never turned: axes hang on it. */
function inOrder({ family, numbers }: Spelling): Pick<Spelling, 'family' | 'numbers'> {
  const [first = NaN, second = NaN] = numbers;
  if (family === 'L' || family === 'SHS') {
    // "L 100x10" has equal legs, "SHS 150x8" equal sides.
    if (numbers.length === 2) return { family, numbers: [first, first, second] };
  }
  const square = family === 'RHS' && numbers.length === 3 && first === second;
  return { family: square ? 'SHS' : family, numbers };
}

/**
 * One spelling for all spellings of a designation: how it was formed if said, letters together,
 * then numbers joined by x.
 *
 * @example designationKey('457 x 191 x 67 UB') // 'UB 457x191x67'
 * @example designationKey('HE 200 B') // 'HEB 200', as for 'HEB200'
 * @example designationKey('RHS 150x150x8 cold-formed') // 'CF SHS 150x150x8'
 */
export function designationKey(text: string): string {
  const spelling = spellingOf(text);
  const { family, numbers } = inOrder(spelling);
  const forming = { 'hot-finished': 'HF ', 'cold-formed': 'CF ' } as const;
  const prefix = spelling.forming ? forming[spelling.forming] : '';
  return `${prefix}${family} ${numbers.join('x')}`;
}

/** The `count` candidates with the smallest edit distance, nearest first, else as they came. */
export function nearest(text: string, candidates: readonly string[], count: number): string[] {
  return candidates
    .map((candidate) => ({ candidate, distance: editDistance(text, candidate) }))
    .sort((a, b) => a.distance - b.distance)
    .slice(0, count)
    .map(({ candidate }) => candidate);
}
