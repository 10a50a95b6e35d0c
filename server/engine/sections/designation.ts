import { editDistance } from '../text/edit-distance';

/** Names of the same family in the trade. */
const aliases: Readonly<Record<string, string>> = { UKB: 'UB', UKC: 'UC', UKBP: 'UBP' };

/**
 * One spelling for all spellings of a designation: letters together, then numbers joined by x.
 *
 * @example designationKey('457 x 191 x 67 UB') // 'UB 457x191x67'
 * @example designationKey('HE 200 B') // 'HEB 200', as for 'HEB200'
 */
export function designationKey(text: string): string {
  const plain = text
    .toUpperCase()
    .replace(/[×*]/g, 'X')
    .replace(/(\d)\s*X\s*(?=\d)/g, '$1x')
    .replace(/,/g, '.');
  const numbers = plain.match(/\d+(?:\.\d+)?/g) ?? [];
  const letters = (plain.match(/[A-Z]+/g) ?? []).join('');
  const family = aliases[letters] ?? letters;
  return `${family} ${numbers.map(Number).join('x')}`;
}

/** The `count` candidates with the smallest edit distance, nearest first. */
export function nearest(text: string, candidates: readonly string[], count: number): string[] {
  return candidates
    .map((candidate) => ({ candidate, distance: editDistance(text, candidate) }))
    .sort((a, b) => a.distance - b.distance || a.candidate.localeCompare(b.candidate))
    .slice(0, count)
    .map(({ candidate }) => candidate);
}
