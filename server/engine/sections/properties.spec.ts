import { numberIn, readTable, worstOf, type TableRow } from '../../../test/support/section-tables';
import { silentSheet } from '../formula/sheet';
import { catalogue, findSection } from './catalogue';
import { propertiesOf } from './properties';
import { impossibilityOf } from './shapes/possible';

type Computed = Readonly<Record<string, number | undefined>>;

/** What each column of the tables prints, in the engine's units, with the column's factor. */
const columns: Readonly<Record<string, readonly [factor: number, of: (row: Computed) => number]>> =
  {
    A_cm2: [1e2, the('A')],
    Iy_cm4: [1e4, the('I_y')],
    Iz_cm4: [1e4, the('I_z')],
    Wely_cm3: [1e3, the('W_el_y')],
    Welz_cm3: [1e3, the('W_el_z')],
    Wply_cm3: [1e3, the('W_pl_y')],
    Wplz_cm3: [1e3, the('W_pl_z')],
    iy_cm: [10, gyration('I_y')],
    iz_cm: [10, gyration('I_z')],
    It_cm4: [1e4, the('I_t')],
    Iw_cm6: [1e6, the('I_w')],
    Wt_cm3: [1e3, the('W_t')],
    Iu_cm4: [1e4, the('I_u')],
    Iv_cm4: [1e4, the('I_v')],
    iu_cm: [10, gyration('I_u')],
    iv_cm: [10, gyration('I_v')],
    e0_cm: [10, the('e_0')],
    // The tables measure "y" along the longer leg, which stands along z-z here.
    ey_cm: [10, the('z_c')],
    ez_cm: [10, the('y_c')],
    // From the centroid to the shear centre.
    em_cm: [10, (row) => the('y_c')(row) + the('e_0')(row) - the('t_w')(row) / 2],
  };

function the(property: string): (row: Computed) => number {
  return (row) => row[property] ?? NaN;
}

function gyration(inertia: string): (row: Computed) => number {
  return (row) => Math.sqrt(the(inertia)(row) / the('A')(row));
}

/** Dimensions and properties of the entry that a table's row names. */
function computed(table: string, { designation = '' }: TableRow): Computed {
  const entry = findSection(table.endsWith('_cold') ? `CF ${designation}` : designation);
  if (!entry) throw new Error(`${designation} is not in the catalogue.`);
  const t_w = 't_w' in entry ? entry.t_w : undefined;
  return { ...propertiesOf(entry, silentSheet), t_w };
}

type Limits = Readonly<Record<string, number>> & { readonly all: number };

const mill: Limits = { all: 0.12, It_cm4: 0.4 };
// The UK tables print I_w in dm⁶, of the smallest sections with two digits.
const uk: Limits = { all: 0.55, Iw_cm6: 1.2 };
// I_v of the smallest angles is printed from rounded parts.
const angle: Limits = { all: 0.7, Iv_cm4: 1 };
const cold: Limits = { all: 0.02 };

/** Tables with how many values each holds, and the greatest deviation allowed in per cent. */
const tables: readonly (readonly [table: string, count: number, limits: Limits])[] = [
  ['ub', 991, uk],
  ['uc', 406, uk],
  ['ubp', 17, uk],
  ['hea', 264, mill],
  ['heb', 240, mill],
  ['hem', 264, mill],
  ['heaa', 240, mill],
  ['he_x', 172, mill],
  ['hd', 118, mill],
  ['hl', 248, { ...mill, It_cm4: 1.6 }],
  // The area of HP 200x53 alone is 0.3 % from its dimensions.
  ['hp', 31, { all: 0.32 }],
  ['ipe', 202, mill],
  ['ipea', 171, mill],
  ['ipeaa', 9, mill],
  ['ipeo', 130, mill],
  ['iper', 87, mill],
  ['ipev', 35, mill],
  ['ipn', 210, { all: 0.45, A_cm2: 0.05, It_cm4: 2.2 }],
  ['upn', 187, { all: 0.6, A_cm2: 0.15, It_cm4: 2, em_cm: 2.1 }],
  ['upe', 14, uk],
  ['pfc', 192, { ...uk, Wplz_cm3: 0.74 }],
  ['l_equal', 1057, angle],
  ['l_unequal', 291, angle],
  ['rhs_hot', 2915, uk],
  ['shs_hot', 1661, uk],
  ['chs_hot', 1752, uk],
  ['rhs_cold', 3276, cold],
  ['shs_cold', 2373, cold],
  ['chs_cold', 1441, cold],
  ['bar_round', 65, cold],
];

describe('every tabulated value from dimensions, through the catalogue', () => {
  test.each(tables)('%s: %i values', (table, count, limits) => {
    const found = Object.entries(columns).map(([column, [factor, of]]) => ({
      column,
      ...worstOf(table, column, (row) => of(computed(table, row)) / factor),
    }));
    const over = found.filter(
      ({ column, percent }) => !(percent <= (limits[column] ?? limits.all)),
    );
    expect(over).toEqual([]);
    expect(found.reduce((sum, { count: each }) => sum + each, 0)).toBe(count);
  });

  test('upn: 15 warping constants, all doubted by whom we have them from, within 7.4 %', () => {
    const rows = readTable('upn').filter((row) => numberIn(row, 'Iw_cm6') > 0);
    const ratios = rows.map(
      (row) => the('I_w')(computed('upn', row)) / 1e6 / numberIn(row, 'Iw_cm6'),
    );
    expect(ratios).toHaveLength(15);
    for (const ratio of ratios) expect(Math.abs(ratio - 1)).toBeLessThan(0.074);
  });

  test('flats: 225 masses', () => {
    const mass = (row: TableRow) => the('A')(computed('bar_flat', row)) * 7.85e-3;
    const { percent, count } = worstOf('bar_flat', 'mass_kg_m', mass);
    expect(count).toBe(225);
    expect(percent).toBeLessThan(0.25);
  });
});

test('every section of the tables is in the catalogue, and nothing else but timber', () => {
  const names = [...tables.map(([table]) => table), 'bar_flat', 'bar_square'].flatMap((table) =>
    readTable(table).map(({ designation = '' }) => [table, designation] as const),
  );
  const found = names.map(([table, name]) =>
    findSection(table.endsWith('_cold') ? `CF ${name}` : name),
  );
  expect(names.filter((_, index) => found[index] === undefined)).toEqual([]);
  const steel = catalogue.filter(({ family }) => family !== 'timber');
  expect(new Set(found).size).toBe(names.length);
  expect(steel).toHaveLength(names.length);
});

test('every size of timber is in the catalogue once, whichever regions saw it', () => {
  const sizes = readTable('timber').map((row) => [numberIn(row, 'b_mm'), numberIn(row, 'h_mm')]);
  const timber = catalogue.filter(({ family }) => family === 'timber');
  const missing = sizes.filter(([b = NaN, h = NaN]) => {
    const entry = findSection(`timber ${b}x${h}`);
    return entry?.shape !== 'rectangle' || entry.b !== b || entry.h !== h;
  });
  expect(missing).toEqual([]);
  expect(timber).toHaveLength(new Set(sizes.map(String)).size);
});

test('every section of the catalogue can be, but two whose toes are printed too round', () => {
  const impossible = catalogue.filter((entry) => impossibilityOf(entry) !== undefined);
  expect(impossible.map(({ designation }) => designation)).toEqual(['L 45x45x3', 'L 50x50x3']);
});

test('every property of every section is a number', () => {
  const wrong = catalogue.flatMap((entry) =>
    Object.entries(propertiesOf(entry, silentSheet))
      // The product of area of an angle has a sign.
      .filter(([name, value]) => !(Number.isFinite(value) && (name === 'I_yz' || value > 0)))
      .map(([name]) => `${entry.designation} ${name}`),
  );
  expect(wrong).toEqual([]);
});
