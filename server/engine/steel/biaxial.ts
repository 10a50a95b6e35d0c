import { formula } from '../formula/formula';

/** Without axial force n is 0, so alpha is 2 and beta, 5 n but not below 1, is 1. */
export const plasticBiaxialCriterion = formula({
  symbol: 'utilisation',
  title: 'Bending about both axes, I and H sections',
  unit: '1',
  clause: 'EN 1993-1-1 6.2.9.1(6) (6.41)',
  expression: '(M_y_Ed / M_y_Rd)^2 + M_z_Ed / M_z_Rd',
  where: { M_y_Ed: 'kN m', M_y_Rd: 'kN m', M_z_Ed: 'kN m', M_z_Rd: 'kN m' },
});

export const elasticBiaxialCriterion = formula({
  symbol: 'utilisation',
  title: 'Bending about both axes, elastic',
  unit: '1',
  clause: 'EN 1993-1-1 6.2.1(7) (6.2)',
  expression: 'M_y_Ed / M_y_Rd + M_z_Ed / M_z_Rd',
  where: { M_y_Ed: 'kN m', M_y_Rd: 'kN m', M_z_Ed: 'kN m', M_z_Rd: 'kN m' },
});
