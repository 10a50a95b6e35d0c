import { unitText } from './units';

/** Narrow space that no line breaks at. */
export const THIN = '\u202f';
const MINUS = '−';

/** A number rounded for reading, thousands apart, with a real minus sign. */
export function readable(value: number, digits = 4): string {
  if (!Number.isFinite(value)) return '–';
  if (value === 0) return '0';
  const size = Math.abs(value);
  if (size >= 1e10 || size < 1e-4) return withExponent(value, digits);
  const decimals = Math.max(0, digits - 1 - Math.floor(Math.log10(size)));
  const rounded = size >= 10 ** digits ? Number(value.toPrecision(digits)) : value;
  const text = Math.abs(rounded).toFixed(Math.min(decimals, 6));
  const plain = decimals > 0 ? text.replace(/\.?0+$/, '') : text;
  return (value < 0 && Number(plain) !== 0 ? MINUS : '') + grouped(plain);
}

function withExponent(value: number, digits: number): string {
  const exponent = Math.floor(Math.log10(Math.abs(value)) / 3) * 3;
  const mantissa = Number((Math.abs(value) / 10 ** exponent).toPrecision(digits));
  const raised = String(exponent).replace(/./g, (mark) => SUPERSCRIPTS[mark] ?? mark);
  return `${value < 0 ? MINUS : ''}${mantissa}·10${raised}`;
}

const SUPERSCRIPTS: Readonly<Record<string, string>> = Object.fromEntries(
  Array.from('0123456789-').map((mark, index) => [mark, Array.from('⁰¹²³⁴⁵⁶⁷⁸⁹⁻')[index] ?? mark]),
);

function grouped(text: string): string {
  const [whole = '', fraction] = text.split('.');
  const spaced = whole.length > 4 ? whole.replace(/\B(?=(\d{3})+$)/g, THIN) : whole;
  return fraction === undefined ? spaced : `${spaced}.${fraction}`;
}

/** A number with so many decimals, always, with a real minus sign. */
export function fixed(value: number, decimals: number): string {
  const text = Math.abs(value).toFixed(decimals);
  return (value < 0 && Number(text) !== 0 ? MINUS : '') + grouped(text);
}

/** A number rounded for reading with its unit. */
export function readableQuantity(quantity: { value: number; unit: string }): string {
  return `${readable(quantity.value)} ${unitText(quantity.unit)}`.trim();
}

/**
 * A utilisation with two decimals, and more where two would hide that 1 is exceeded.
 *
 * @example utilisationText(1.0004) // '1.0004'
 */
export function utilisationText(value: number | null): string {
  if (value === null) return '–';
  for (let decimals = 2; decimals <= 6; decimals += 1) {
    const text = value.toFixed(decimals);
    if (value <= 1 || Number(text) > 1) return text;
  }
  return '> 1';
}
