import { formula } from '../formula/formula';

// From memory, unconfirmed: the exponents; no example here has both moments.
const CLAUSE = 'EN 1993-1-1 6.2.9.1(6)';

export const exponentZOfI = formula({
  symbol: 'beta',
  title: 'Exponent of bending about z-z, I and H sections',
  unit: '1',
  clause: CLAUSE,
  expression: 'max(5 * n, 1)',
  where: { n: '1' },
});

/** n ≤ 0.9 keeps the root real; the cap of 6 rules from 0.8 on. */
export const exponentOfHollow = formula({
  symbol: 'alpha',
  title: 'Exponents, rectangular hollow sections',
  unit: '1',
  clause: CLAUSE,
  expression: 'min(1.66 / (1 - 1.13 * min(n, 0.9)^2), 6)',
  where: { n: '1' },
});

/** alpha is 2 for I sections, and alpha and beta are 2 for tubes. */
export const biaxialCriterion = formula({
  symbol: 'utilisation',
  title: 'Bending about both axes',
  unit: '1',
  clause: `${CLAUSE} (6.41)`,
  expression: '(M_y_Ed / M_N_y_Rd)^alpha + (M_z_Ed / M_N_z_Rd)^beta',
  where: {
    M_y_Ed: 'kN m',
    M_N_y_Rd: 'kN m',
    M_z_Ed: 'kN m',
    M_N_z_Rd: 'kN m',
    alpha: '1',
    beta: '1',
  },
});

export const elasticBiaxialCriterion = formula({
  symbol: 'utilisation',
  title: 'Bending about both axes, elastic',
  unit: '1',
  clause: 'EN 1993-1-1 6.2.1(7) (6.2)',
  expression: 'M_y_Ed / M_y_Rd + M_z_Ed / M_z_Rd',
  where: { M_y_Ed: 'kN m', M_y_Rd: 'kN m', M_z_Ed: 'kN m', M_z_Rd: 'kN m' },
});
