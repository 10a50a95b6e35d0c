import { formula } from '../formula/formula';

const CLAUSE = 'EN 1993-1-1 6.2.1(5) (6.1)';
const stresses = { sigma_x_Ed: 'N/mm^2', sigma_z_Ed: 'N/mm^2', tau_Ed: 'N/mm^2' } as const;

/** The square root of the left side of (6.1), as a stress. */
export const equivalentStress = formula({
  symbol: 'sigma_v_Ed',
  title: 'Equivalent stress of von Mises',
  unit: 'N/mm^2',
  clause: CLAUSE,
  expression: 'sqrt(sigma_x_Ed^2 + sigma_z_Ed^2 - sigma_x_Ed * sigma_z_Ed + 3 * tau_Ed^2)',
  where: stresses,
});

export const yieldLimit = formula({
  symbol: 'sigma_Rd',
  title: 'Yield strength over its factor',
  unit: 'N/mm^2',
  clause: CLAUSE,
  expression: 'f_y / gamma_M0',
  where: { f_y: 'N/mm^2', gamma_M0: '1' },
});

export const vonMisesCriterion = formula({
  symbol: 'utilisation',
  title: 'Von Mises’ criterion',
  unit: '1',
  clause: CLAUSE,
  expression: 'sigma_v_Ed / sigma_Rd',
  where: { sigma_v_Ed: 'N/mm^2', sigma_Rd: 'N/mm^2' },
});
