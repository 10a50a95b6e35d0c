/** What a text says as a number; where it can be read in two ways, both, for the reader to choose. */
export type NumberReading =
  | { readonly state: 'number'; readonly number: number }
  | { readonly state: 'ambiguous'; readonly readings: readonly [number, number] }
  | { readonly state: 'wrong' };

const WRONG: NumberReading = { state: 'wrong' };
const SPACES = /[\s'’\u00a0\u2009\u202f]/g;

/**
 * Reads a number with a decimal point or a decimal comma, with or without groups of three.
 *
 * @example readNumber('12,5') // 12.5
 * @example readNumber('1.234') // ambiguous: 1.234 or 1234
 * @example readNumber('1.234,5') // 1234.5
 */
export function readNumber(text: string): NumberReading {
  const parts = /^([+\-−]?)([\d.,\s'’\u00a0\u2009\u202f]+?)(?:[eE]([+-]?\d{1,3}))?$/.exec(
    text.trim(),
  );
  if (!parts) return WRONG;
  const sign = parts[1] === '-' || parts[1] === '−' ? -1 : 1;
  const exponent = parts[3];
  const body = (parts[2] ?? '').trim();
  if (SPACES.test(body)) {
    SPACES.lastIndex = 0;
    if (!/^\d{1,3}(?:[\s'’\u00a0\u2009\u202f]\d{3})+(?:[.,]\d+)?$/.test(body)) return WRONG;
    return number(sign, body.replace(SPACES, '').replace(',', '.'), exponent);
  }
  return read(sign, body, exponent);
}

function read(sign: number, body: string, exponent: string | undefined): NumberReading {
  const marks = body.replace(/\d/g, '');
  if (marks.length <= 1) {
    if (!/\d/.test(body)) return WRONG;
    const dotted = body.replace(',', '.');
    if (exponent !== undefined || !isAmbiguous(body)) return number(sign, dotted, exponent);
    const grouped = sign * Number(body.replace(/[.,]/, ''));
    return { state: 'ambiguous', readings: [sign * Number(dotted), grouped] };
  }
  const [first = ''] = marks;
  const last = marks.at(-1) ?? '';
  const groups = marks.slice(0, first === last ? undefined : -1);
  if (groups !== first.repeat(groups.length)) return WRONG;
  const [whole = '', fraction = ''] =
    first === last ? [body] : [body.slice(0, body.lastIndexOf(last)), body.split(last).at(-1)];
  if (!/^\d{1,3}(?:[.,]\d{3})+$/.test(whole)) return WRONG;
  return number(sign, `${whole.replace(/[.,]/g, '')}.${fraction}`, exponent);
}

function number(sign: number, digits: string, exponent: string | undefined): NumberReading {
  const value = sign * Number(exponent === undefined ? digits : `${digits}e${exponent}`);
  return Number.isFinite(value) ? { state: 'number', number: value } : WRONG;
}

/** Whether one mark with three digits after it may as well group thousands. */
function isAmbiguous(body: string): boolean {
  return /^[1-9]\d{0,2}[.,]\d{3}$/.test(body);
}

/**
 * A number as a field shows it: with a decimal point and never so that it could be misread.
 *
 * @example writeNumber(2.345) // '2.3450'
 * @example writeNumber(3, 1) // '3.0'
 */
export function writeNumber(value: number, decimals = 0): string {
  const plain = String(value);
  if (plain.includes('e')) return plain;
  if (isAmbiguous(plain.replace('-', ''))) return `${plain}0`;
  const given = plain.split('.')[1]?.length ?? 0;
  return given < decimals ? value.toFixed(decimals) : plain;
}
