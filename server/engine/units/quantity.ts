import { fromUnit, unitScale, type UnitName } from './units';

/** What a text quantity may be measured in: base units (N, mm, rad, K) for one of each. */
interface WrittenUnit {
  readonly dimension: string;
  readonly scale: number;
}

const FOOT = 304.8;
const INCH = 25.4;
/** International pound-force (NIST SP 811, Appendix B): exact. */
const POUND_FORCE = 4.4482216152605;
const KIP = 1000 * POUND_FORCE;

function powers(symbol: string, size: number): [string, WrittenUnit][] {
  return [1, 2, 3, 4, 6].map((n) => [
    n === 1 ? symbol : `${symbol}${n}`,
    { dimension: `L${n}`, scale: size ** n },
  ]);
}

function named(dimension: string, scales: Record<string, number>): [string, WrittenUnit][] {
  return Object.entries(scales).map(([name, scale]) => [name, { dimension, scale }]);
}

/** The closed list, keyed by the normal form that `normalise` gives. */
const writtenUnits: ReadonlyMap<string, WrittenUnit> = new Map([
  ...powers('mm', 1),
  ...powers('cm', 10),
  ...powers('m', 1e3),
  ...powers('in', INCH),
  ...powers('ft', FOOT),
  ...named('F', { N: 1, kN: 1e3, MN: 1e6, lbf: POUND_FORCE, kip: KIP }),
  ...named('F/L', {
    'N/mm': 1,
    'N/m': 1e-3,
    'kN/m': 1,
    'kN/mm': 1e3,
    'MN/m': 1e3,
    'lbf/ft': POUND_FORCE / FOOT,
    'lbf/in': POUND_FORCE / INCH,
    'kip/ft': KIP / FOOT,
    'kip/in': KIP / INCH,
  }),
  ...named('F/L2', {
    Pa: 1e-6,
    kPa: 1e-3,
    MPa: 1,
    GPa: 1e3,
    'N/mm2': 1,
    'kN/mm2': 1e3,
    'N/m2': 1e-6,
    'kN/m2': 1e-3,
    'MN/m2': 1,
    psi: POUND_FORCE / INCH ** 2,
    ksi: KIP / INCH ** 2,
    'lbf/ft2': POUND_FORCE / FOOT ** 2,
    psf: POUND_FORCE / FOOT ** 2,
    'kip/ft2': KIP / FOOT ** 2,
  }),
  ...named('FL', {
    'N mm': 1,
    'N m': 1e3,
    'kN mm': 1e3,
    'kN m': 1e6,
    'MN m': 1e9,
    'lbf ft': POUND_FORCE * FOOT,
    'lbf in': POUND_FORCE * INCH,
    'kip ft': KIP * FOOT,
    'kip in': KIP * INCH,
  }),
  ...named('FL2', {
    'N mm2': 1,
    'kN m2': 1e9,
    'kip ft2': KIP * FOOT ** 2,
    'kip in2': KIP * INCH ** 2,
  }),
  ...named('angle', { deg: Math.PI / 180, '°': Math.PI / 180, rad: 1 }),
  ...named('temperature', { K: 1, '°C': 1, degC: 1 }),
  ...named('ratio', { '1': 1 }),
]);

const dimensionOf: Readonly<Record<UnitName, string>> = {
  '1': 'ratio',
  mm: 'L1',
  'mm^2': 'L2',
  'mm^3': 'L3',
  'mm^4': 'L4',
  'mm^6': 'L6',
  m: 'L1',
  N: 'F',
  kN: 'F',
  'N/mm': 'F/L',
  'kN/m': 'F/L',
  'kN/mm': 'F/L',
  'kN/m^2': 'F/L2',
  'N/mm^2': 'F/L2',
  'kN m': 'FL',
  'kN m^2': 'FL2',
  deg: 'angle',
  K: 'temperature',
};

const superscripts: Readonly<Record<string, string>> = { '²': '2', '³': '3', '⁴': '4', '⁶': '6' };
const joined = /^(kN|N|MN|lbf|kip)-?(mm2|mm|m2|m|ft2|ft|in2|in)$/;

/** `kN·m`, `kN*m`, `kNm` → `kN m`; `N/mm²`, `N/mm^2` → `N/mm2`. */
function normalise(text: string): string {
  const plain = text
    .replace(/[²³⁴⁶]/g, (mark) => superscripts[mark] ?? mark)
    .replaceAll('^', '')
    .replace(/\s*\/\s*/g, '/')
    .replace(/\s*[·*.]\s*/g, ' ')
    .trim();
  const product = joined.exec(plain);
  return product ? `${product[1] ?? ''} ${product[2] ?? ''}` : plain;
}

const written = /^([+-]?(?:\d+(?:\.\d*)?|\.\d+)(?:[eE][+-]?\d+)?)\s+(\S(?:.*\S)?)$/;

export type ParsedQuantity =
  | { readonly ok: true; /** In the field's default unit. */ readonly value: number }
  | {
      readonly ok: false;
      readonly code: 'not-a-quantity' | 'wrong-unit' | 'unknown-unit' | 'not-finite';
      readonly message: string;
    };

function refused(
  code: 'not-a-quantity' | 'wrong-unit' | 'unknown-unit' | 'not-finite',
  message: string,
): ParsedQuantity {
  return { ok: false, code, message };
}

/**
 * Reads a request's quantity: a number in the field's default unit, or `number space unit`.
 *
 * @param input the value as it stands in the request
 * @param unit the field's default unit, in which the result is given
 * @example parseQuantity('8 ft', 'm') // { ok: true, value: 2.4384 }
 */
export function parseQuantity(input: number | string, unit: UnitName): ParsedQuantity {
  if (typeof input === 'number') {
    return Number.isFinite(input)
      ? { ok: true, value: input }
      : refused('not-finite', 'The number is not finite.');
  }
  const match = written.exec(input.trim().replace(/^−/, '-'));
  if (!match) {
    return refused('not-a-quantity', `Give a number in ${unit}, or a text such as "2.4 ${unit}".`);
  }
  const unitText = match[2] ?? '';
  const found = writtenUnits.get(normalise(unitText));
  if (!found) {
    return refused('unknown-unit', `The unit "${unitText}" is not on the list of units.`);
  }
  if (found.dimension !== dimensionOf[unit]) {
    return refused('wrong-unit', `The unit "${unitText}" does not measure what ${unit} measures.`);
  }
  // One division by the ratio of scales keeps "2400 mm" and 2.4 the same double.
  const value = scaled(Number(match[1]), found.scale, unitScale[unit]);
  return Number.isFinite(value)
    ? { ok: true, value }
    : refused('not-finite', 'The number is too large.');
}

function scaled(number: number, from: number, to: number): number {
  return from <= to ? number / (to / from) : number * (from / to);
}

/**
 * A quantity that the contract has already validated, in the engine's own units.
 *
 * @throws {Error} on a text that is no quantity of this kind: the validation was left out.
 */
export function readQuantity(input: number | string, unit: UnitName): number {
  const parsed = parseQuantity(input, unit);
  if (!parsed.ok) throw new Error(`A quantity reached the engine unvalidated: ${parsed.message}`);
  return fromUnit(parsed.value, unit);
}
