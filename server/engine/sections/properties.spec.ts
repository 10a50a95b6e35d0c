import { silentSheet } from '../formula/sheet';
import { readTable, worstOf } from '../../../test/support/section-tables';
import { findSection } from './catalogue';
import { propertiesOf } from './properties';

const of = (designation: string) => {
  const entry = findSection(designation);
  if (!entry) throw new Error(`${designation} is not in the catalogue`);
  return propertiesOf(entry, silentSheet);
};

describe.each(['ub', 'uc', 'hea', 'heb', 'hem', 'heaa', 'ipe', 'ipea', 'ipeo', 'hl'])(
  'properties of %s from dimensions agree with the tables',
  (table) => {
    const limit = ['ub', 'uc'].includes(table) ? 0.55 : 0.2;
    test.each([
      ['A_cm2', 1e2, (d: string) => of(d).A, Math.max(limit, 0.3)],
      ['Iy_cm4', 1e4, (d: string) => of(d).I_y, limit],
      ['Iz_cm4', 1e4, (d: string) => of(d).I_z, limit],
      ['Wely_cm3', 1e3, (d: string) => of(d).W_el_y, limit],
      ['Welz_cm3', 1e3, (d: string) => of(d).W_el_z, limit],
      ['Wply_cm3', 1e3, (d: string) => of(d).W_pl_y, limit],
      ['Wplz_cm3', 1e3, (d: string) => of(d).W_pl_z, limit],
      ['It_cm4', 1e4, (d: string) => of(d).I_t, table === 'hl' ? 1.6 : 0.5],
    ] as const)('%s', (column, factor, pick, percent) => {
      const { percent: worst, count } = worstOf(
        table,
        column,
        ({ designation = '' }) => pick(designation) / factor,
      );
      expect(count).toBeGreaterThan(0);
      expect(worst).toBeLessThan(percent);
    });
  },
);

test('every tabulated section is in the catalogue', () => {
  for (const table of ['ub', 'uc', 'ubp', 'hea', 'heb', 'hem', 'ipe', 'iper', 'ipev', 'hp']) {
    for (const { designation } of readTable(table)) {
      expect(findSection(designation ?? '')?.designation).toBe(designation);
    }
  }
});

test.each([
  ['457 x 191 x 67 UB', 'UB 457x191x67'],
  ['UB457x191x67', 'UB 457x191x67'],
  ['ub 457×191×67', 'UB 457x191x67'],
  ['610x229x125 UKB', 'UB 610x229x125'],
  ['IPE200', 'IPE 200'],
  ['HEB 200', 'HE 200 B'],
  ['he200b', 'HE 200 B'],
  ['IPE A 100', 'IPE A 100'],
  ['IPEA100', 'IPE A 100'],
])('%s is found as %s', (spelling, designation) => {
  expect(findSection(spelling)?.designation).toBe(designation);
});
