const loneSurrogate = /\p{Surrogate}/u;

/** Whether every character is whole: half of a surrogate pair cannot be written as UTF-8. */
export const isWellFormed = (text: string): boolean => !loneSurrogate.test(text);

export const wellFormed = (text: string): string =>
  text.replace(new RegExp(loneSurrogate, 'gu'), '\ufffd');

/** One part of a JSON pointer, RFC 6901, short enough to print. */
export const pointerPart = (name: string): string =>
  wellFormed(name.slice(0, 100)).replaceAll('~', '~0').replaceAll('/', '~1');
