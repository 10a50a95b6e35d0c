import { formula } from '../formula/formula';

// From memory, unconfirmed: no example here has bending with shear above half of its resistance.
const SHEAR_REDUCTION = 'EN 1993-1-1 6.2.8(3)';

/**
 * V_Rd is V_pl_Rd, or what torsion or buckling leaves of it. Valid for V_Ed above its half; below that no reduction is due (6.2.8(2)). Beyond V_pl_Rd,
 * where shear fails by itself, nothing is left of the shear area. With torsion V_pl_T_Rd stands in
 * its place (6.2.8(4)).
 */
export const shearReduction = formula({
  symbol: 'rho',
  title: 'Reduction of yield by shear',
  unit: '1',
  clause: `${SHEAR_REDUCTION} and (4)`,
  expression: 'min((2 * V_Ed / V_Rd - 1)^2, 1)',
  where: { V_Ed: 'kN', V_Rd: 'kN' },
});

export const webArea = formula({
  symbol: 'A_w',
  title: 'Area of the web',
  unit: 'mm^2',
  clause: 'EN 1993-1-1 6.2.8(5)',
  expression: 'h_w * t_w',
  where: { h_w: 'mm', t_w: 'mm' },
});

const strength = { rho: '1', f_y: 'N/mm^2', gamma_M0: '1' } as const;

/** Never above M_c_y_Rd, nor below nothing where shear alone exhausts the web. */
export const plasticBendingWithShear = formula({
  symbol: 'M_V_y_Rd',
  title: 'Bending resistance about y-y reduced by shear',
  unit: 'kN m',
  clause: 'EN 1993-1-1 6.2.8(5) (6.30)',
  expression:
    'max(min((W_pl_y - rho * A_w^2 / (4 * t_w)) * f_y / gamma_M0, M_c_y_Rd), 0 * M_c_y_Rd)',
  where: { ...strength, W_pl_y: 'mm^3', A_w: 'mm^2', t_w: 'mm', M_c_y_Rd: 'kN m' },
});

/** Shear along both axes: the flanges, too, have less left for bending. */
export const plasticBendingWithShears = formula({
  symbol: 'M_V_y_Rd',
  title: 'Bending resistance about y-y reduced by shear along both axes',
  unit: 'kN m',
  clause: SHEAR_REDUCTION,
  expression:
    'max(W_pl_y - rho_z * h_w^2 * t_w / 4 - rho_y * b * t_f * (h - t_f), 0 * W_pl_y) * f_y / gamma_M0',
  where: {
    W_pl_y: 'mm^3',
    rho_z: '1',
    h_w: 'mm',
    t_w: 'mm',
    rho_y: '1',
    b: 'mm',
    t_f: 'mm',
    h: 'mm',
    f_y: 'N/mm^2',
    gamma_M0: '1',
  },
});

/** Elastic sections: first yield at the web's edge or in the flanges, at the strength left there. */
export const elasticBendingWithShear = formula({
  symbol: 'M_V_y_Rd',
  title: 'Bending resistance about y-y reduced by shear, elastic',
  unit: 'kN m',
  clause: SHEAR_REDUCTION,
  expression: 'min((1 - rho_y) * W_el_y, (1 - rho_z) * 2 * I_y / h_w) * f_y / gamma_M0',
  where: {
    rho_z: '1',
    rho_y: '1',
    f_y: 'N/mm^2',
    gamma_M0: '1',
    W_el_y: 'mm^3',
    I_y: 'mm^4',
    h_w: 'mm',
  },
});

/**
 * Walls across the axis hold the shear area A_v in two plates of thickness t, and bend with rho_w;
 * those along it hold A_f at the arm (d - t)/2, and have lost rho_f.
 */
function hollowWithShear(axis: 'y' | 'z') {
  return formula({
    symbol: `M_V_${axis}_Rd`,
    title: `Bending resistance about ${axis}-${axis} reduced by shear`,
    unit: 'kN m',
    clause: SHEAR_REDUCTION,
    expression:
      'max(W_pl - rho_w * A_v^2 / (8 * t) - rho_f * A_f * (d - t) / 2, 0 * W_pl) * f_y / gamma_M0',
    where: {
      W_pl: 'mm^3',
      rho_w: '1',
      A_v: 'mm^2',
      t: 'mm',
      rho_f: '1',
      A_f: 'mm^2',
      d: 'mm',
      f_y: 'N/mm^2',
      gamma_M0: '1',
    },
  });
}

export const hollowBendingWithShear = { y: hollowWithShear('y'), z: hollowWithShear('z') };

/** The whole section at the reduced strength, where its shear area is not told apart: the safe end. */
function wholeWithShear(axis: 'y' | 'z') {
  return formula({
    symbol: `M_V_${axis}_Rd`,
    title: `Bending resistance about ${axis}-${axis} reduced by shear`,
    unit: 'kN m',
    clause: SHEAR_REDUCTION,
    expression: '(1 - rho) * M_c_Rd',
    where: { rho: '1', M_c_Rd: 'kN m' },
  });
}

export const wholeBendingWithShear = { y: wholeWithShear('y'), z: wholeWithShear('z') };

export const bendingShearYCriterion = formula({
  symbol: 'utilisation',
  title: 'Bending about y-y with shear',
  unit: '1',
  clause: SHEAR_REDUCTION,
  expression: 'M_y_Ed / M_V_y_Rd',
  where: { M_y_Ed: 'kN m', M_V_y_Rd: 'kN m' },
});

export const bendingShearZCriterion = formula({
  symbol: 'utilisation',
  title: 'Bending about z-z with shear',
  unit: '1',
  clause: SHEAR_REDUCTION,
  expression: 'M_z_Ed / M_V_z_Rd',
  where: { M_z_Ed: 'kN m', M_V_z_Rd: 'kN m' },
});
