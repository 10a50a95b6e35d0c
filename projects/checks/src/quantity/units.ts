/** The default units that fields of a check are written in. */
export type FieldUnit =
  'm' | 'mm' | 'mm^2' | 'kN' | 'kN/m' | 'kN/m^2' | 'kN m' | 'kN m^2' | 'kN/mm' | 'N/mm^2';

interface WrittenUnit {
  /** As the service reads it. */
  readonly name: string;
  readonly dimension: string;
  /** How many N, mm or N/mm² one of it is. */
  readonly scale: number;
}

const FOOT = 304.8;
const INCH = 25.4;
const POUND_FORCE = 4.4482216152605;
const KIP = 1000 * POUND_FORCE;

function kind(dimension: string, scales: Readonly<Record<string, number>>): WrittenUnit[] {
  return Object.entries(scales).map(([name, scale]) => ({ name, dimension, scale }));
}

const units: readonly WrittenUnit[] = [
  ...kind('length', { mm: 1, cm: 10, m: 1e3, in: INCH, ft: FOOT }),
  ...kind('area', { mm2: 1, cm2: 100, m2: 1e6, in2: INCH ** 2, ft2: FOOT ** 2 }),
  ...kind('force', { N: 1, kN: 1e3, MN: 1e6, lbf: POUND_FORCE, kip: KIP }),
  ...kind('force per length', {
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
  ...kind('force per area', {
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
    psf: POUND_FORCE / FOOT ** 2,
    'lbf/ft2': POUND_FORCE / FOOT ** 2,
    'kip/ft2': KIP / FOOT ** 2,
  }),
  ...kind('moment', {
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
  ...kind('bimoment', {
    'N mm2': 1,
    'kN m2': 1e9,
    'kip ft2': KIP * FOOT ** 2,
    'kip in2': KIP * INCH ** 2,
  }),
];

const byName = new Map(units.map((unit) => [unit.name.toLowerCase(), unit]));
const superscripts: Readonly<Record<string, string>> = { '²': '2', '³': '3', '⁴': '4', '⁶': '6' };
const joined = /^(kn|n|mn|lbf|kip)-?((?:mm|m|ft|in)2?)$/;

/** A unit in any spelling (`kNm`, `KN/M`, `kN·m`, `N/mm²`); undefined where it is not on the list. */
function findUnit(text: string): WrittenUnit | undefined {
  const plain = text
    .replace(/[²³⁴⁶]/g, (mark) => superscripts[mark] ?? mark)
    .replaceAll('^', '')
    .replace(/\s*\/\s*/g, '/')
    .replace(/\s*[·*.]\s*/g, ' ')
    .trim()
    .toLowerCase();
  const product = joined.exec(plain);
  return byName.get(plain) ?? byName.get(product ? `${product[1]} ${product[2]}` : '');
}

/** The unit of a text as the service reads it and its size in the field's own unit. */
export type UnitReading =
  | { readonly ok: true; readonly name: string; toField(number: number): number }
  | { readonly ok: false; readonly message: string };

/** Reads a unit for a field whose own unit is `field`. */
export function readUnit(text: string, field: FieldUnit): UnitReading {
  const own = findUnit(field);
  const found = findUnit(text);
  if (!found || !own) {
    return { ok: false, message: `“${text}” is not a unit known here. Try ${examples(field)}.` };
  }
  if (found.dimension !== own.dimension) {
    return { ok: false, message: `${found.name} is no ${own.dimension}. Try ${examples(field)}.` };
  }
  // One division by the ratio keeps 2400 mm and 2.4 m the same number.
  const toField = (number: number) =>
    found.scale <= own.scale
      ? number / (own.scale / found.scale)
      : number * (found.scale / own.scale);
  return { ok: true, name: found.name, toField };
}

/** Whether both are the same unit in other spellings. */
export function sameUnit(text: string, field: FieldUnit): boolean {
  return findUnit(text) !== undefined && findUnit(text) === findUnit(field);
}

function examples(field: FieldUnit): string {
  const own = findUnit(field);
  const names = units.filter(({ dimension }) => dimension === own?.dimension);
  return names
    .slice(0, 5)
    .map(({ name }) => unitText(name))
    .join(', ');
}

/** A unit for the eye: `mm^4` as mm⁴, `1` as nothing. */
export function unitText(unit: string): string {
  if (unit === '1') return '';
  const raised: Readonly<Record<string, string>> = { '2': '²', '3': '³', '4': '⁴', '6': '⁶' };
  return unit.replace(/\^?([2346])$/, (_, digit: string) => raised[digit] ?? digit);
}
