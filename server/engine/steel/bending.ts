import { formula } from '../formula/formula';

const CLAUSE_PLASTIC = 'EN 1993-1-1 6.2.5(2) (6.13)';
const CLAUSE_EFFECTIVE = 'EN 1993-1-1 6.2.5(2) (6.15)';
const CLAUSE_ELASTIC = 'EN 1993-1-1 6.2.5(2) (6.14)';

export const plasticBendingY = formula({
  symbol: 'M_c_y_Rd',
  title: 'Bending resistance about y-y',
  unit: 'kN m',
  clause: CLAUSE_PLASTIC,
  expression: 'W_pl_y * f_y / gamma_M0',
  where: { W_pl_y: 'mm^3', f_y: 'N/mm^2', gamma_M0: '1' },
});

export const elasticBendingY = formula({
  symbol: 'M_c_y_Rd',
  title: 'Bending resistance about y-y, elastic',
  unit: 'kN m',
  clause: CLAUSE_ELASTIC,
  expression: 'W_el_y * f_y / gamma_M0',
  where: { W_el_y: 'mm^3', f_y: 'N/mm^2', gamma_M0: '1' },
});

export const plasticBendingZ = formula({
  symbol: 'M_c_z_Rd',
  title: 'Bending resistance about z-z',
  unit: 'kN m',
  clause: CLAUSE_PLASTIC,
  expression: 'W_pl_z * f_y / gamma_M0',
  where: { W_pl_z: 'mm^3', f_y: 'N/mm^2', gamma_M0: '1' },
});

export const elasticBendingZ = formula({
  symbol: 'M_c_z_Rd',
  title: 'Bending resistance about z-z, elastic',
  unit: 'kN m',
  clause: CLAUSE_ELASTIC,
  expression: 'W_el_z * f_y / gamma_M0',
  where: { W_el_z: 'mm^3', f_y: 'N/mm^2', gamma_M0: '1' },
});

export const effectiveBendingY = formula({
  symbol: 'M_c_y_Rd',
  title: 'Bending resistance about y-y of the effective section',
  unit: 'kN m',
  clause: CLAUSE_EFFECTIVE,
  expression: 'W_eff_y * f_y / gamma_M0',
  where: { W_eff_y: 'mm^3', f_y: 'N/mm^2', gamma_M0: '1' },
});

export const effectiveBendingZ = formula({
  symbol: 'M_c_z_Rd',
  title: 'Bending resistance about z-z of the effective section',
  unit: 'kN m',
  clause: CLAUSE_EFFECTIVE,
  expression: 'W_eff_z * f_y / gamma_M0',
  where: { W_eff_z: 'mm^3', f_y: 'N/mm^2', gamma_M0: '1' },
});

export const bendingYCriterion = formula({
  symbol: 'utilisation',
  title: 'Bending about y-y',
  unit: '1',
  clause: 'EN 1993-1-1 6.2.5(1) (6.12)',
  expression: 'M_y_Ed / M_c_y_Rd',
  where: { M_y_Ed: 'kN m', M_c_y_Rd: 'kN m' },
});

export const bendingZCriterion = formula({
  symbol: 'utilisation',
  title: 'Bending about z-z',
  unit: '1',
  clause: 'EN 1993-1-1 6.2.5(1) (6.12)',
  expression: 'M_z_Ed / M_c_z_Rd',
  where: { M_z_Ed: 'kN m', M_c_z_Rd: 'kN m' },
});
