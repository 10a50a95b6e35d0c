const small = [
  'no',
  'one',
  'two',
  'three',
  'four',
  'five',
  'six',
  'seven',
  'eight',
  'nine',
  'ten',
  'eleven',
  'twelve',
];

const grouped = new Intl.NumberFormat('en-GB');

/** 1,284,310 */
export const count = (value: number): string => grouped.format(value);

/** Small numbers are words in a sentence. */
export const inWords = (value: number): string => small[value] ?? count(value);

/** `three clients`, `one client`, `no client` */
export const counted = (value: number, one: string, many = `${one}s`): string =>
  `${inWords(value)} ${value === 1 ? one : many}`;

export const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

/** `a, b and c` */
export const listed = (items: readonly string[]): string =>
  new Intl.ListFormat('en-GB', { type: 'conjunction' }).format(items);

/** A share of the whole with one digit: `2.1 %`. */
export const percent = (part: number, whole: number): string =>
  whole === 0 ? '–' : `${((100 * part) / whole).toFixed(1)} %`;
