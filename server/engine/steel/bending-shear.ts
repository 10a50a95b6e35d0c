import { formula } from '../formula/formula';

const SHEAR_REDUCTION = 'EN 1993-1-1 6.2.8(3)';

/**
 * Valid for V_Ed above half of V_pl_Rd; below that no reduction is due (6.2.8(2)). Beyond V_pl_Rd,
 * where shear fails by itself, nothing is left of the shear area.
 */
export const shearReduction = formula({
  symbol: 'rho',
  title: 'Reduction of yield by shear',
  unit: '1',
  clause: SHEAR_REDUCTION,
  expression: 'min((2 * V_z_Ed / V_pl_z_Rd - 1)^2, 1)',
  where: { V_z_Ed: 'kN', V_pl_z_Rd: 'kN' },
});

export const webArea = formula({
  symbol: 'A_w',
  title: 'Area of the web',
  unit: 'mm^2',
  clause: 'EN 1993-1-1 6.2.8(5)',
  expression: 'h_w * t_w',
  where: { h_w: 'mm', t_w: 'mm' },
});

/** Never above M_c_y_Rd, nor below nothing where shear alone exhausts the web. */
export const plasticBendingWithShear = formula({
  symbol: 'M_V_y_Rd',
  title: 'Bending resistance about y-y reduced by shear',
  unit: 'kN m',
  clause: 'EN 1993-1-1 6.2.8(5) (6.30)',
  expression:
    'max(min((W_pl_y - rho * A_w^2 / (4 * t_w)) * f_y / gamma_M0, M_c_y_Rd), 0 * M_c_y_Rd)',
  where: {
    W_pl_y: 'mm^3',
    rho: '1',
    A_w: 'mm^2',
    t_w: 'mm',
    f_y: 'N/mm^2',
    gamma_M0: '1',
    M_c_y_Rd: 'kN m',
  },
});

/** Elastic sections: first yield at the web's edge, where the reduced strength holds. */
export const elasticBendingWithShear = formula({
  symbol: 'M_V_y_Rd',
  title: 'Bending resistance about y-y reduced by shear, elastic',
  unit: 'kN m',
  clause: SHEAR_REDUCTION,
  expression: 'max(min(W_el_y, (1 - rho) * 2 * I_y / h_w), 0 * W_el_y) * f_y / gamma_M0',
  where: {
    W_el_y: 'mm^3',
    rho: '1',
    I_y: 'mm^4',
    h_w: 'mm',
    f_y: 'N/mm^2',
    gamma_M0: '1',
  },
});

export const bendingShearCriterion = formula({
  symbol: 'utilisation',
  title: 'Bending about y-y with shear',
  unit: '1',
  clause: 'EN 1993-1-1 6.2.8(3)',
  expression: 'M_y_Ed / M_V_y_Rd',
  where: { M_y_Ed: 'kN m', M_V_y_Rd: 'kN m' },
});
