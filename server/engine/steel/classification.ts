import { formula, type Formula } from '../formula/formula';

export type SectionClass = 1 | 2 | 3 | 4;

const TABLE = 'EN 1993-1-1 Table 5.2';
const SHEET_1 = `${TABLE} sheet 1`;
const SHEET_2 = `${TABLE} sheet 2`;
const SHEET_3 = `${TABLE} sheet 3`;

export const epsilonFactor = formula({
  symbol: 'epsilon',
  title: 'Strength factor of the width-to-thickness limits',
  unit: '1',
  clause: TABLE,
  expression: 'sqrt((235 N/mm^2) / f_y)',
  where: { f_y: 'N/mm^2' },
});

export const flangeOutstand = formula({
  symbol: 'c_f',
  title: 'Outstand of the flange beyond the root',
  unit: 'mm',
  clause: SHEET_2,
  expression: '(b - t_w - 2 * r) / 2',
  where: { b: 'mm', t_w: 'mm', r: 'mm' },
});

export const channelOutstand = formula({
  symbol: 'c_f',
  title: 'Outstand of the flange beyond the root',
  unit: 'mm',
  clause: SHEET_2,
  expression: 'b - t_w - r',
  where: { b: 'mm', t_w: 'mm', r: 'mm' },
});

export const webDepth = formula({
  symbol: 'c_w',
  title: 'Depth of the web between roots',
  unit: 'mm',
  clause: SHEET_1,
  expression: 'h - 2 * t_f - 2 * r',
  where: { h: 'mm', t_f: 'mm', r: 'mm' },
});

/** Of a hollow section's wall, whichever role it plays; 3 t for all corner radii. */
function wallWidth<S extends 'h' | 'b'>(symbol: 'c_f' | 'c_w', side: S) {
  return formula({
    symbol,
    title: `Width of the walls along ${side} that counts for buckling`,
    unit: 'mm',
    clause: 'EN 1993-1-5 4.4(2)',
    expression: `${side} - 3 * t`,
    where: { [side]: 'mm', t: 'mm' } as Record<S | 't', 'mm'>,
  });
}

/** The two roles of each wall: flange of bending about one axis, web of bending about the other. */
export const wallAsFlange = { h: wallWidth('c_f', 'h'), b: wallWidth('c_f', 'b') };
export const wallAsWeb = { h: wallWidth('c_w', 'h'), b: wallWidth('c_w', 'b') };

export const flangeSlenderness = formula({
  symbol: 'c_f_t_f',
  title: 'Width to thickness of the flange',
  unit: '1',
  clause: TABLE,
  expression: 'c_f / t_f',
  where: { c_f: 'mm', t_f: 'mm' },
});

export const webSlenderness = formula({
  symbol: 'c_w_t_w',
  title: 'Depth to thickness of the web',
  unit: '1',
  clause: SHEET_1,
  expression: 'c_w / t_w',
  where: { c_w: 'mm', t_w: 'mm' },
});

export const tubeSlenderness = formula({
  symbol: 'd_t',
  title: 'Diameter to thickness',
  unit: '1',
  clause: SHEET_3,
  expression: 'd / t',
  where: { d: 'mm', t: 'mm' },
});

/** From N_Ed alone, so that more moment never makes a class lower; n_w webs share it. */
export const plasticDepthInCompression = formula({
  symbol: 'alpha',
  title: 'Part of the web in compression, fully plastic',
  unit: '1',
  clause: SHEET_1,
  expression: 'min(0.5 * (1 + N_Ed / (n_w * c_w * t_w * f_y)), 1)',
  where: { N_Ed: 'kN', n_w: '1', c_w: 'mm', t_w: 'mm', f_y: 'N/mm^2' },
});

/** From N_Ed alone, as alpha is. */
export const stressRatioOfWeb = formula({
  symbol: 'psi',
  title: 'Ratio of the stresses at the edges of the web',
  unit: '1',
  clause: SHEET_1,
  expression: 'min(2 * N_Ed / (A * f_y) - 1, 1)',
  where: { N_Ed: 'kN', A: 'mm^2', f_y: 'N/mm^2' },
});

type LimitSymbols = 'epsilon';

/** Greatest slenderness of classes 1, 2 and 3. */
function limits(
  of: string,
  clause: string,
  expressions: readonly [string, string, string],
  under = '',
): readonly Formula<LimitSymbols>[] {
  return expressions.map((expression, index) =>
    formula({
      symbol: `${of}_lim_${index + 1}${under && '_N'}`,
      title: `Limit of class ${index + 1}${under && `, ${under}`}`,
      unit: '1',
      clause,
      expression,
      where: { epsilon: '1' },
    }),
  );
}

/**
 * Table 5.2. Confirmed by published examples that were read: 9 and 72 (CL-01, MSB04 App. A.1), 10
 * (CL-03, UBP 356x368x174 is class 2), 33 (CL-06), 42 (NM-04: IPE 330 in S355 is class 4 in
 * compression). From memory, unconfirmed: 14, 38, 83, 124, and the limits of tubes.
 */
export const outstandLimits = limits('c_f_t_f', SHEET_2, [
  '9 * epsilon',
  '10 * epsilon',
  '14 * epsilon',
]);

const SQUASHED = ['33 * epsilon', '38 * epsilon', '42 * epsilon'] as const;

export const compressedFlangeLimits = limits('c_f_t_f', SHEET_1, SQUASHED);

export const compressedWebLimits = limits('c_w_t_w', SHEET_1, SQUASHED);

/** Beside the limits that N_Ed gives: of the same web under uniform compression. */
export const squashedWebLimits = limits('c_w_t_w', SHEET_1, SQUASHED, 'under uniform compression');

export const bentWebLimits = limits('c_w_t_w', SHEET_1, [
  '72 * epsilon',
  '83 * epsilon',
  '124 * epsilon',
]);

export const tubeLimits = limits('d_t', SHEET_3, [
  '50 * epsilon^2',
  '70 * epsilon^2',
  '90 * epsilon^2',
]);

/** A web under bending and compression, alpha above 0.5: classes 1 and 2. */
export const plasticWebLimits = ([396, 456] as const).map((factor, index) =>
  formula({
    symbol: `c_w_t_w_lim_${index + 1}`,
    title: `Limit of class ${index + 1}`,
    unit: '1',
    clause: SHEET_1,
    expression: `${factor} * epsilon / (13 * alpha - 1)`,
    where: { epsilon: '1', alpha: '1' },
  }),
);

/** A web under bending and compression, psi above -1: class 3. */
export const elasticWebLimit = formula({
  symbol: 'c_w_t_w_lim_3',
  title: 'Limit of class 3',
  unit: '1',
  clause: SHEET_1,
  expression: '42 * epsilon / (0.67 + 0.33 * psi)',
  where: { epsilon: '1', psi: '1' },
});

export const angleLegSlenderness = formula({
  symbol: 'h_t',
  title: 'Longer leg to thickness',
  unit: '1',
  clause: SHEET_3,
  expression: 'max(h, b) / t',
  where: { h: 'mm', b: 'mm', t: 'mm' },
});

export const angleSumSlenderness = formula({
  symbol: 'b_h_2t',
  title: 'Mean of the legs to thickness',
  unit: '1',
  clause: SHEET_3,
  expression: '(b + h) / (2 * t)',
  where: { b: 'mm', h: 'mm', t: 'mm' },
});

/** Confirmed by AN-01, which was read: 15 epsilon and 11.5 epsilon. */
export const angleLegLimit = formula({
  symbol: 'h_t_lim_3',
  title: 'Limit of class 3',
  unit: '1',
  clause: SHEET_3,
  expression: '15 * epsilon',
  where: { epsilon: '1' },
});

export const angleSumLimit = formula({
  symbol: 'b_h_2t_lim_3',
  title: 'Limit of class 3',
  unit: '1',
  clause: SHEET_3,
  expression: '11.5 * epsilon',
  where: { epsilon: '1' },
});
