import { formula } from '../formula/formula';

// Confirmed by no example here, from memory, unconfirmed: (6.26) to (6.28) with their 1.25. The stresses
// of an open section follow Vlasov; TR-03, recalled, agrees within what its charts are read to.
const STRESS = 'EN 1993-1-1 6.2.7(4)';
const REDUCED = 'EN 1993-1-1 6.2.7(9)';

/** At the point where St Venant torsion shears most. */
export const torsionResistance = formula({
  symbol: 'T_t_Rd',
  title: 'Torsion resistance, St Venant',
  unit: 'kN m',
  clause: 'EN 1993-1-1 6.2.7(1)',
  expression: 'W_t * f_y / (sqrt(3) * gamma_M0)',
  where: { W_t: 'mm^3', f_y: 'N/mm^2', gamma_M0: '1' },
});

/**
 * Common practice, no source: no clause says it of torsion, whose shear fills the same walls that
 * 6.2.6(6) sends to EN 1993-1-5.
 */
export const torsionBucklingResistance = formula({
  symbol: 'T_t_Rd',
  title: 'Torsion resistance of walls that buckle in shear',
  unit: 'kN m',
  clause: 'EN 1993-1-1 6.2.6(6) and EN 1993-1-5 5.2(1), of torsion; common practice, no source',
  expression: 'W_t * f_y / sqrt(3) * min(1 / gamma_M0, chi_w / gamma_M1)',
  where: { W_t: 'mm^3', f_y: 'N/mm^2', gamma_M0: '1', chi_w: '1', gamma_M1: '1' },
});

export const openTorsionModulus = formula({
  symbol: 'W_t',
  title: 'Torsion modulus at the thickest part of an open section',
  unit: 'mm^3',
  clause: 'Thin-walled torsion, I_t over the greatest thickness',
  expression: 'I_t / t_max',
  where: { I_t: 'mm^4', t_max: 'mm' },
});

export const torsionCriterion = formula({
  symbol: 'utilisation',
  title: 'Torsion',
  unit: '1',
  clause: 'EN 1993-1-1 6.2.7(1) (6.23)',
  expression: 'T_t_Ed / T_t_Rd',
  where: { T_t_Ed: 'kN m', T_t_Rd: 'kN m' },
});

/** Both parts shear the same flange. */
export const mixedTorsionCriterion = formula({
  symbol: 'utilisation',
  title: 'St Venant and warping torsion',
  unit: '1',
  clause: 'EN 1993-1-1 6.2.7(2) and (5)',
  expression: 'T_t_Ed / T_t_Rd + tau_w_Ed * sqrt(3) * gamma_M0 / f_y',
  where: {
    T_t_Ed: 'kN m',
    T_t_Rd: 'kN m',
    tau_w_Ed: 'N/mm^2',
    gamma_M0: '1',
    f_y: 'N/mm^2',
  },
});

export const torsionStress = formula({
  symbol: 'tau_t_Ed',
  title: 'Shear stress from St Venant torsion',
  unit: 'N/mm^2',
  clause: STRESS,
  expression: 'T_t_Ed / W_t',
  where: { T_t_Ed: 'kN m', W_t: 'mm^3' },
});

/** The flange of an I section as a rectangle under T_w/(h - t_f). */
export const warpingShearOfI = formula({
  symbol: 'tau_w_Ed',
  title: 'Shear stress in the flanges from warping torsion',
  unit: 'N/mm^2',
  clause: STRESS,
  expression: '1.5 * T_w_Ed / ((h - t_f) * b * t_f)',
  where: { T_w_Ed: 'kN m', h: 'mm', t_f: 'mm', b: 'mm' },
});

/** S_omega is the greatest sectorial moment of the walls over their thickness. */
export const warpingShear = formula({
  symbol: 'tau_w_Ed',
  title: 'Shear stress from warping torsion',
  unit: 'N/mm^2',
  clause: STRESS,
  expression: 'T_w_Ed * S_omega_t / I_w',
  where: { T_w_Ed: 'kN m', S_omega_t: 'mm^3', I_w: 'mm^6' },
});

/** Vlasov's sectorial coordinate of an I section at the tips of its flanges. */
export const sectorialOfI = formula({
  symbol: 'omega_max',
  title: 'Greatest sectorial coordinate, at the flange tips',
  unit: 'mm^2',
  clause: 'Vlasov, thin-walled bars',
  expression: 'b * (h - t_f) / 4',
  where: { b: 'mm', h: 'mm', t_f: 'mm' },
});

/** At the toes, or at the back corners where the shear centre is far from the web. */
export const sectorialOfChannel = formula({
  symbol: 'omega_max',
  title: 'Greatest sectorial coordinate, at the toes or the corners',
  unit: 'mm^2',
  clause: 'Vlasov, thin-walled bars',
  expression: '(h - t_f) / 2 * max(b - t_w / 2 - e_0, e_0)',
  where: { h: 'mm', t_f: 'mm', b: 'mm', t_w: 'mm', e_0: 'mm' },
});

/**
 * The greatest of: where the coordinate passes zero on the flange; the corner, in flange or web; the
 * middle of the web.
 */
export const sectorialMomentOfChannel = formula({
  symbol: 'S_omega_t',
  title: 'Greatest sectorial moment over the thickness there',
  unit: 'mm^3',
  clause: 'Vlasov, thin-walled bars',
  expression:
    '(h - t_f) / 4 * max((b - t_w / 2 - e_0)^2,' +
    ' abs((b - t_w / 2) * (b - t_w / 2 - 2 * e_0)) * t_f / min(t_f, t_w),' +
    ' abs((b - t_w / 2) * (b - t_w / 2 - 2 * e_0) * t_f / t_w - e_0 * (h - t_f) / 2))',
  where: { h: 'mm', t_f: 'mm', b: 'mm', t_w: 'mm', e_0: 'mm' },
});

export const bimomentResistance = formula({
  symbol: 'B_Rd',
  title: 'Bimoment that makes the tips yield',
  unit: 'kN m^2',
  clause: STRESS,
  expression: 'I_w / omega_max * f_y / gamma_M0',
  where: { I_w: 'mm^6', omega_max: 'mm^2', f_y: 'N/mm^2', gamma_M0: '1' },
});

/**
 * Common practice, no source: no clause lowers bending beside torsion alone, whose stress fills the
 * same walls. What 6.2.8(3) says of shear is said of it, above half of the resistance.
 */
export const torsionReduction = formula({
  symbol: 'rho',
  title: 'Reduction of yield by torsion',
  unit: '1',
  clause: 'EN 1993-1-1 6.2.7(4), as 6.2.8(3); common practice, no source',
  expression: 'min((2 * T_t_Ed / T_t_Rd - 1)^2, 1)',
  where: { T_t_Ed: 'kN m', T_t_Rd: 'kN m' },
});

/** Flanges of class 4 bend in their own plane as they do about z-z. */
export const effectiveBimomentResistance = formula({
  symbol: 'B_Rd',
  title: 'Bimoment that makes the tips yield, flanges as far as they count',
  unit: 'kN m^2',
  clause: `${STRESS} and EN 1993-1-5 4.4`,
  expression: 'I_w / omega_max * f_y / gamma_M0 * W_eff_z / W_el_z',
  where: {
    I_w: 'mm^6',
    omega_max: 'mm^2',
    f_y: 'N/mm^2',
    gamma_M0: '1',
    W_eff_z: 'mm^3',
    W_el_z: 'mm^3',
  },
});

/** One for each direction of shear. */
function reducedShear(direction: 'z' | 'y') {
  const symbol = `V_pl_T_${direction}_Rd`;
  const title = `Plastic shear resistance along ${direction}-${direction}, reduced by torsion`;
  const strength = 'f_y / (sqrt(3) * gamma_M0)';
  const where = { V_pl_Rd: 'kN', tau_t_Ed: 'N/mm^2', f_y: 'N/mm^2', gamma_M0: '1' } as const;
  return {
    flanged: formula({
      symbol,
      title,
      unit: 'kN',
      clause: `${REDUCED} (6.26)`,
      expression: `sqrt(max(1 - tau_t_Ed / (1.25 * ${strength}), 0)) * V_pl_Rd`,
      where,
    }),
    warped: formula({
      symbol,
      title,
      unit: 'kN',
      clause: `${REDUCED} (6.27)`,
      expression: `max(sqrt(max(1 - tau_t_Ed / (1.25 * ${strength}), 0)) - tau_w_Ed / (${strength}), 0) * V_pl_Rd`,
      where: { ...where, tau_w_Ed: 'N/mm^2' },
    }),
    hollow: formula({
      symbol,
      title,
      unit: 'kN',
      clause: `${REDUCED} (6.28)`,
      expression: `max(1 - tau_t_Ed / (${strength}), 0) * V_pl_Rd`,
      where,
    }),
  };
}

export const shearWithTorsion = { z: reducedShear('z'), y: reducedShear('y') };

/** Along z-z and along y-y. */
export const shearTorsionCriterion = formula({
  symbol: 'utilisation',
  title: 'Shear with torsion',
  unit: '1',
  clause: `${REDUCED} (6.25)`,
  expression: 'V_Ed / V_pl_T_Rd',
  where: { V_Ed: 'kN', V_pl_T_Rd: 'kN' },
});
