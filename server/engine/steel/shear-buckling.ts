import { formula } from '../formula/formula';

// Confirmed by no example here, from memory, unconfirmed: 86.4, 0.83 and the expressions of 5.2, 5.4 and 7.1.
const FACTOR = 'EN 1993-1-5 5.3(1) Table 5.1';

export const webSlendernessInShear = formula({
  symbol: 'lambda_bar_w',
  title: 'Slenderness of the web in shear, stiffened at the supports only',
  unit: '1',
  clause: 'EN 1993-1-5 5.3(3) (5.5)',
  expression: 'h_w / (86.4 * t_w * epsilon)',
  where: { h_w: 'mm', t_w: 'mm', epsilon: '1' },
});

/** Up to 0.83/eta the web yields. */
export const stockyWebFactor = formula({
  symbol: 'chi_w',
  title: 'Factor of the web',
  unit: '1',
  clause: FACTOR,
  expression: 'eta',
  where: { eta: '1' },
});

/** End posts are taken as not rigid, which is the lesser of both columns. */
export const slenderWebFactor = formula({
  symbol: 'chi_w',
  title: 'Factor of the web, end posts not rigid',
  unit: '1',
  clause: FACTOR,
  expression: '0.83 / lambda_bar_w',
  where: { lambda_bar_w: '1' },
});

/** What the flanges would add (5.4) is left out. */
export const webBucklingResistance = formula({
  symbol: 'V_bw_Rd',
  title: 'Shear buckling resistance of the web',
  unit: 'kN',
  clause: 'EN 1993-1-5 5.2(1) (5.2)',
  expression: 'chi_w * n_w * h_w * t_w * f_y / (sqrt(3) * gamma_M1)',
  where: { chi_w: '1', n_w: '1', h_w: 'mm', t_w: 'mm', f_y: 'N/mm^2', gamma_M1: '1' },
});

/**
 * Common practice, no source: what St Venant torsion shears the web by is taken off first, as
 * EN 1993-1-1 (6.28) takes it off yield.
 */
export const webBucklingWithTorsion = formula({
  symbol: 'V_bw_Rd',
  title: 'Shear buckling resistance of the web, less torsion',
  unit: 'kN',
  clause: 'EN 1993-1-5 5.2(1) (5.2), as EN 1993-1-1 (6.28); common practice, no source',
  expression: 'max(chi_w * f_y / (sqrt(3) * gamma_M1) - tau_t_Ed, 0 * f_y) * n_w * h_w * t_w',
  where: {
    chi_w: '1',
    f_y: 'N/mm^2',
    gamma_M1: '1',
    tau_t_Ed: 'N/mm^2',
    n_w: '1',
    h_w: 'mm',
    t_w: 'mm',
  },
});

export const webBucklingCriterion = formula({
  symbol: 'eta_3_bar',
  title: 'Shear buckling of the web',
  unit: '1',
  clause: 'EN 1993-1-5 5.5(1) (5.10)',
  expression: 'V_Ed / V_bw_Rd',
  where: { V_Ed: 'kN', V_bw_Rd: 'kN' },
});

/** The flanges alone, less what axial force takes of them (5.4(2)). */
export const flangesAlone = formula({
  symbol: 'M_f_Rd',
  title: 'Bending resistance of the flanges alone',
  unit: 'kN m',
  clause: 'EN 1993-1-5 7.1(1) and 5.4(2)',
  expression: 'max(A_f - N_Ed * gamma_M0 / (2 * f_y), 0 * A_f) * (h - t_f) * f_y / gamma_M0',
  where: { A_f: 'mm^2', h: 'mm', t_f: 'mm', f_y: 'N/mm^2', gamma_M0: '1', N_Ed: 'kN' },
});

/** Effective flanges with the whole web, whatever its class. */
export const plasticWithWholeWeb = formula({
  symbol: 'M_pl_Rd',
  title: 'Plastic bending resistance of effective flanges and the whole web',
  unit: 'kN m',
  clause: 'EN 1993-1-5 7.1(1)',
  expression: '(A_f * (h - t_f) + n_w * t_w * h_w^2 / 4) * f_y / gamma_M0',
  where: {
    A_f: 'mm^2',
    h: 'mm',
    t_f: 'mm',
    n_w: '1',
    t_w: 'mm',
    h_w: 'mm',
    f_y: 'N/mm^2',
    gamma_M0: '1',
  },
});

/** For V above half of V_bw_Rd and M above M_f_Rd. */
export const bendingWithWebBuckling = formula({
  symbol: 'utilisation',
  title: 'Bending about y-y with shear buckling',
  unit: '1',
  clause: 'EN 1993-1-5 7.1(1) (7.1)',
  expression: 'M_y_Ed / M_pl_Rd + (1 - M_f_Rd / M_pl_Rd) * (2 * V_z_Ed / V_bw_Rd - 1)^2',
  where: { M_y_Ed: 'kN m', M_pl_Rd: 'kN m', M_f_Rd: 'kN m', V_z_Ed: 'kN', V_bw_Rd: 'kN' },
});
