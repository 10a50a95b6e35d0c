import type { QuantityRule } from './document';

const unprintable = /[\p{Cc}\p{Cs}\p{Zl}\p{Zp}\u202A-\u202E\u2066-\u2069]/gu;

const nouns: Readonly<Record<string, string>> = {
  string: 'text',
  number: 'a number',
  integer: 'a whole number',
  boolean: 'true or false',
  object: 'an object { … }',
  array: 'a list [ … ]',
  null: 'null',
};

/** `a, b or c` */
export function either(words: readonly string[]): string {
  const last = words.at(-1) ?? '';
  return words.length < 2 ? last : `${words.slice(0, -1).join(', ')} or ${last}`;
}

/** Types of JSON Schema in words. */
export const typeWords = (types: readonly string[]): string =>
  either(types.map((type) => nouns[type] ?? type));

/** What a value is, in words. */
export function kindOf(value: unknown): string {
  if (value === null) return 'null';
  if (Array.isArray(value)) return 'a list';
  switch (typeof value) {
    case 'string':
      return 'text';
    case 'number':
      return Number.isFinite(value) ? 'a number' : 'not a finite number';
    case 'boolean':
      return String(value);
    default:
      return 'an object';
  }
}

/** How a quantity of this unit is written. */
export function quantityWords({ unit }: QuantityRule): string {
  return unit === '1' ? 'a number' : `a number in ${unit}, or text such as "2.4 ${unit}"`;
}

/** `/loads/0/value` → `loads[0].value`, in backticks; the whole body has no pointer. */
export function fieldName(pointer: string): string {
  if (pointer === '') return 'the body';
  const parts = pointer.slice(1).split('/').map(unescape);
  const path = parts.reduce(
    (text, part) => (/^\d+$/.test(part) ? `${text}[${part}]` : text ? `${text}.${part}` : part),
    '',
  );
  return `\`${path}\``;
}

const unescape = (part: string) => shown(part.replaceAll('~1', '/').replaceAll('~0', '~'));

/** A caller's text as it may be printed back: short, without control characters. */
export function shown(text: string, longest = 40): string {
  const clean = text.replace(unprintable, '\uFFFD');
  return clean.length > longest ? `${clean.slice(0, longest)}…` : clean;
}

/** What makes a text unfit to print, if anything does. */
export function unfit(text: string): { code: string; words: string } | undefined {
  if (/\p{Cs}/u.test(text)) return { code: 'not-text', words: 'half of a character' };
  if (text.search(unprintable) < 0) return undefined;
  return { code: 'control-character', words: 'a control character or a line break' };
}
