import { formula } from '../formula/formula';

export const grossTension = formula({
  symbol: 'N_pl_Rd',
  title: 'Plastic resistance of the gross section',
  unit: 'kN',
  clause: 'EN 1993-1-1 6.2.3(2)a (6.6)',
  expression: 'A * f_y / gamma_M0',
  where: { A: 'mm^2', f_y: 'N/mm^2', gamma_M0: '1' },
});

/** From memory, unconfirmed: 0.9. */
export const netTension = formula({
  symbol: 'N_u_Rd',
  title: 'Ultimate resistance of the net section at holes',
  unit: 'kN',
  clause: 'EN 1993-1-1 6.2.3(2)b (6.7)',
  expression: '0.9 * A_net * f_u / gamma_M2',
  where: { A_net: 'mm^2', f_u: 'N/mm^2', gamma_M2: '1' },
});

export const lesserTension = formula({
  symbol: 'N_t_Rd',
  title: 'Tension resistance',
  unit: 'kN',
  clause: 'EN 1993-1-1 6.2.3(2)',
  expression: 'min(N_pl_Rd, N_u_Rd)',
  where: { N_pl_Rd: 'kN', N_u_Rd: 'kN' },
});

export const compressionResistance = formula({
  symbol: 'N_c_Rd',
  title: 'Compression resistance',
  unit: 'kN',
  clause: 'EN 1993-1-1 6.2.4(2) (6.10)',
  expression: 'A * f_y / gamma_M0',
  where: { A: 'mm^2', f_y: 'N/mm^2', gamma_M0: '1' },
});

export const effectiveCompressionResistance = formula({
  symbol: 'N_c_Rd',
  title: 'Compression resistance of the effective section',
  unit: 'kN',
  clause: 'EN 1993-1-1 6.2.4(2) (6.11)',
  expression: 'A_eff * f_y / gamma_M0',
  where: { A_eff: 'mm^2', f_y: 'N/mm^2', gamma_M0: '1' },
});

/** The yield strength of each shear area is reduced by its rho. */
export const axialWithShear = formula({
  symbol: 'N_V_Rd',
  title: 'Axial resistance reduced by shear',
  unit: 'kN',
  clause: 'EN 1993-1-1 6.2.10(3) (6.45)',
  expression: 'max(A - rho_z * A_v_z - rho_y * A_v_y, 0 * A) * f_y / gamma_M0',
  where: {
    A: 'mm^2',
    rho_z: '1',
    A_v_z: 'mm^2',
    rho_y: '1',
    A_v_y: 'mm^2',
    f_y: 'N/mm^2',
    gamma_M0: '1',
  },
});

export const tensionCriterion = formula({
  symbol: 'utilisation',
  title: 'Tension',
  unit: '1',
  clause: 'EN 1993-1-1 6.2.3(1) (6.5)',
  expression: 'N_Ed / N_t_Rd',
  where: { N_Ed: 'kN', N_t_Rd: 'kN' },
});

export const compressionCriterion = formula({
  symbol: 'utilisation',
  title: 'Compression',
  unit: '1',
  clause: 'EN 1993-1-1 6.2.4(1) (6.9)',
  expression: 'N_Ed / N_c_Rd',
  where: { N_Ed: 'kN', N_c_Rd: 'kN' },
});
