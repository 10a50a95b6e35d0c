import { silentSheet } from '../../formula/sheet';
import { numberIn, worstOf, type TableRow } from '../../../../test/support/section-tables';
import { propertiesOf } from '../properties';
import { angleProperties } from './angle';
import { channelProperties } from './channel';
import { chsProperties, cornerRadii, rhsProperties } from './hollow';
import { rectangleProperties, roundProperties } from './solid';
import { taperedChannelProperties, taperedIProperties } from './tapered';

const rhs = (row: TableRow) =>
  rhsProperties(
    {
      h: numberIn(row, 'h_mm'),
      b: numberIn(row, 'b_mm'),
      t: numberIn(row, 't_mm'),
      r_o: numberIn(row, 'ro_mm'),
      r_i: numberIn(row, 'ri_mm'),
    },
    silentSheet,
  );

const chs = (row: TableRow) =>
  chsProperties({ d: numberIn(row, 'h_mm'), t: numberIn(row, 't_mm') }, silentSheet);

const channel = (row: TableRow) =>
  channelProperties(
    {
      h: numberIn(row, 'h_mm'),
      b: numberIn(row, 'b_mm'),
      t_w: numberIn(row, 'tw_mm'),
      t_f: numberIn(row, 'tf_mm'),
      r: numberIn(row, 'r1_mm'),
    },
    silentSheet,
  );

const angle = (row: TableRow) =>
  angleProperties(
    {
      h: numberIn(row, 'h_mm'),
      b: numberIn(row, 'b_mm'),
      t: numberIn(row, 'tw_mm'),
      r_1: numberIn(row, 'r1_mm'),
      r_2: numberIn(row, 'r2_mm'),
    },
    silentSheet,
  );

const modulus = [
  ['A_cm2', 'A', 1e2],
  ['Iy_cm4', 'I_y', 1e4],
  ['Iz_cm4', 'I_z', 1e4],
  ['Wely_cm3', 'W_el_y', 1e3],
  ['Welz_cm3', 'W_el_z', 1e3],
] as const;

const plastic = [
  ['Wply_cm3', 'W_pl_y', 1e3],
  ['Wplz_cm3', 'W_pl_z', 1e3],
  ['It_cm4', 'I_t', 1e4],
] as const;

describe.each(['rhs_hot', 'rhs_cold', 'shs_hot', 'shs_cold'])(
  '%s agrees with its table',
  (table) => {
    test.each([...modulus, ...plastic, ['Wt_cm3', 'W_t', 1e3] as const])(
      '%s',
      (column, name, factor) => {
        const { percent, count } = worstOf(table, column, (row) => rhs(row)[name] / factor);
        expect(count).toBeGreaterThan(100);
        expect(percent).toBeLessThan(table.endsWith('cold') ? 0.02 : 0.55);
      },
    );
  },
);

describe.each(['chs_hot', 'chs_cold'])('%s agrees with its table', (table) => {
  test.each([...modulus, ...plastic, ['Wt_cm3', 'W_t', 1e3] as const])(
    '%s',
    (column, name, factor) => {
      const { percent, count } = worstOf(table, column, (row) => chs(row)[name] / factor);
      expect(count).toBeGreaterThan(100);
      expect(percent).toBeLessThan(table.endsWith('cold') ? 0.02 : 0.55);
    },
  );
});

describe('parallel flange channels agree with their table', () => {
  test.each([
    ...modulus,
    ...plastic,
    ['Iw_cm6', 'I_w', 1e6] as const,
    ['e0_cm', 'e_0', 10] as const,
  ])('%s', (column, name, factor) => {
    const { percent, count } = worstOf('pfc', column, (row) => channel(row)[name] / factor);
    expect(count).toBe(16);
    expect(percent).toBeLessThan(name === 'W_pl_z' ? 0.74 : 0.55);
  });
});

describe.each(['l_equal', 'l_unequal'])('%s agrees with its table', (table) => {
  test.each([
    ...modulus,
    ['It_cm4', 'I_t', 1e4] as const,
    ['Iu_cm4', 'I_u', 1e4] as const,
    ['Iv_cm4', 'I_v', 1e4] as const,
  ])('%s', (column, name, factor) => {
    const { percent, count } = worstOf(table, column, (row) => angle(row)[name] / factor);
    expect(count).toBeGreaterThan(15);
    // I_v of the smallest angles is printed from rounded parts.
    expect(percent).toBeLessThan(name === 'I_v' ? 1 : 0.7);
  });
});

describe('solids', () => {
  test('a square bar twists as 0.1406 of its side to the fourth', () => {
    expect(rectangleProperties({ b: 1, h: 1 }, silentSheet).I_t).toBeCloseTo(0.1406, 3);
  });

  test('a flat bar twists as a third of b t³ as it thins', () => {
    expect(rectangleProperties({ b: 1, h: 1000 }, silentSheet).I_t).toBeCloseTo(1000 / 3, 0);
  });

  test('a round is a tube without a hole', () => {
    const round = roundProperties({ d: 60 }, silentSheet);
    const tube = chsProperties({ d: 60, t: 30 }, silentSheet);
    expect(round.A).toBeCloseTo(tube.A, 6);
    expect(round.W_pl_y).toBeCloseTo(tube.W_pl_y, 6);
    expect(round.I_t).toBeCloseTo(tube.I_t, 3);
  });
});

describe('flanges that taper by nothing are parallel ones', () => {
  const taper = { slope: 0, at: 0, r_2: 0 };
  const same = (tapered: object, parallel: object, names: readonly string[]): void => {
    for (const name of names) {
      const [a, b] = [tapered, parallel].map((of) => (of as Record<string, number>)[name] ?? NaN);
      expect([name, (a ?? NaN) / (b ?? NaN)]).toEqual([name, expect.closeTo(1, 9)]);
    }
  };

  test.each([
    ['the plastic axis in the flanges', { h: 200, b: 90, t_w: 7, t_f: 14, r: 12 }],
    ['the plastic axis in the web', { h: 430, b: 100, t_w: 16, t_f: 19, r: 15 }],
  ])('a channel, %s', (_, dimensions) => {
    const section = { shape: 'channel', ...dimensions } as const;
    const tapered = taperedChannelProperties(section, taper, silentSheet);
    const names = ['A', 'y_c', 'I_y', 'I_z', 'W_el_z', 'W_pl_y', 'W_pl_z', 'e_0', 'I_w'];
    same(tapered, channelProperties(dimensions, silentSheet), names);
  });

  test('an I section', () => {
    const dimensions = { h: 453.4, b: 189.9, t_w: 8.5, t_f: 12.7, r: 10.2 };
    const shape = { shape: 'I', fabrication: 'rolled', ...dimensions } as const;
    const names = ['A', 'I_y', 'I_z', 'W_el_y', 'W_el_z', 'W_pl_y', 'W_pl_z'];
    const parallel = propertiesOf(shape, silentSheet);
    same(taperedIProperties(shape, taper, silentSheet), parallel, names);
  });
});

test.each([
  ['hot-finished', 8, 12, 8],
  ['cold-formed', 6, 12, 6],
  ['cold-formed', 8, 20, 12],
  ['cold-formed', 12, 36, 24],
] as const)('%s corners of %p mm walls', (forming, t, r_o, r_i) => {
  expect(cornerRadii(t, forming)).toEqual({ r_o, r_i });
});
