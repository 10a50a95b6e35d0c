import { formula } from '../formula/formula';

const PLATES = 'EN 1993-1-5 4.4(2)';
const RATIOS = 'EN 1993-1-5 Table 4.1';
const SECTION = 'EN 1993-1-5 4.3(3)';

/**
 * The formulas of one plate, flange (f) or web (w), so that neither's numbers stand for the other's.
 * Tables 4.1 and 4.2, from memory; 28.4 and rho of internal parts reproduce A_eff 6095 mm² of NM-04,
 * which was read.
 */
function plate(role: 'f' | 'w') {
  const of = role === 'f' ? 'flange' : 'web';
  return {
    slenderness: formula({
      symbol: `lambda_bar_p_${role}`,
      title: `Plate slenderness of the ${of}`,
      unit: '1',
      clause: PLATES,
      expression: 'c / t / (28.4 * epsilon * sqrt(k_sigma))',
      where: { c: 'mm', t: 'mm', epsilon: '1', k_sigma: '1' },
    }),
    internal: formula({
      symbol: `rho_${role}`,
      title: `Reduction of the ${of}, an internal part`,
      unit: '1',
      clause: `${PLATES} (4.2)`,
      expression: 'min((lambda_bar_p - 0.055 * (3 + psi)) / lambda_bar_p^2, 1)',
      where: { lambda_bar_p: '1', psi: '1' },
    }),
    outstand: formula({
      symbol: `rho_${role}`,
      title: `Reduction of the ${of}, an outstand`,
      unit: '1',
      clause: `${PLATES} (4.3)`,
      expression: 'min((lambda_bar_p - 0.188) / lambda_bar_p^2, 1)',
      where: { lambda_bar_p: '1' },
    }),
    lost: formula({
      symbol: `A_lost_${role}`,
      title: `Area of the ${of} that does not count`,
      unit: 'mm^2',
      clause: SECTION,
      expression: 'n * (1 - rho_p) * c * t',
      where: { n: '1', rho_p: '1', c: 'mm', t: 'mm' },
    }),
  };
}

export const platesOfClass4 = { f: plate('f'), w: plate('w') };

/** Table 4.1 for 0 > psi > -1. */
export const bucklingFactorOfWeb = formula({
  symbol: 'k_sigma_w',
  title: 'Buckling factor of the web',
  unit: '1',
  clause: RATIOS,
  expression: '7.81 - 6.29 * psi + 9.78 * psi^2',
  where: { psi: '1' },
});

/** Table 4.1 for -1 ≥ psi > -3. */
export const bucklingFactorOfBentWeb = formula({
  symbol: 'k_sigma_w',
  title: 'Buckling factor of the web',
  unit: '1',
  clause: RATIOS,
  expression: '5.98 * (1 - psi)^2',
  where: { psi: '1' },
});

export const effectiveArea = formula({
  symbol: 'A_eff',
  title: 'Effective area under compression alone',
  unit: 'mm^2',
  clause: SECTION,
  expression: 'A - A_lost_f - A_lost_w',
  where: { A: 'mm^2', A_lost_f: 'mm^2', A_lost_w: 'mm^2' },
});

/** Of a channel: strips at the toes and in the web's middle; y from the back of the web. */
export const channelShift = formula({
  symbol: 'e_N_z',
  title: 'Shift of the centroid under compression alone',
  unit: 'mm',
  clause: 'EN 1993-1-1 6.2.2.5(4)',
  expression:
    'abs(y_c - (A * y_c - A_lost_f * y_f - A_lost_w * t_w / 2) / (A - A_lost_f - A_lost_w))',
  where: {
    y_c: 'mm',
    A: 'mm^2',
    A_lost_f: 'mm^2',
    y_f: 'mm',
    A_lost_w: 'mm^2',
    t_w: 'mm',
  },
});

/** The flange is reduced first; z_f is its middle from the gross centroid. */
export const stressRatioOfReducedWeb = formula({
  symbol: 'psi',
  title: 'Ratio of the stresses at the edges of the web, its flange reduced',
  unit: '1',
  clause: 'EN 1993-1-5 4.4(3)',
  expression:
    '-(c_w / 2 - A_lost_f * z_f / (A - A_lost_f)) / (c_w / 2 + A_lost_f * z_f / (A - A_lost_f))',
  where: { c_w: 'mm', A_lost_f: 'mm^2', z_f: 'mm', A: 'mm^2' },
});

export const lostLengthOfWeb = formula({
  symbol: 'l_w',
  title: 'Length of the web that does not count',
  unit: 'mm',
  clause: RATIOS,
  expression: '(1 - rho_p) * c_w / (1 - psi)',
  where: { rho_p: '1', c_w: 'mm', psi: '1' },
});

/** 0.4 of what counts stands at the compressed edge. */
export const lostPlaceOfWeb = formula({
  symbol: 'z_w',
  title: 'Its middle above mid-depth',
  unit: 'mm',
  clause: RATIOS,
  expression: 'c_w / 2 - 0.4 * rho_p * c_w / (1 - psi) - l_w / 2',
  where: { c_w: 'mm', rho_p: '1', psi: '1', l_w: 'mm' },
});

const holes = {
  A: 'mm^2',
  A_lost_f: 'mm^2',
  z_f: 'mm',
  A_lost_w: 'mm^2',
  z_w: 'mm',
} as const;

export const shiftUnderBending = formula({
  symbol: 'e_M',
  title: 'Shift of the axis away from the compressed side',
  unit: 'mm',
  clause: SECTION,
  expression: '(A_lost_f * z_f + A_lost_w * z_w) / (A - A_lost_f - A_lost_w)',
  where: holes,
});

export const effectiveInertia = formula({
  symbol: 'I_eff',
  title: 'Effective second moment of area',
  unit: 'mm^4',
  clause: SECTION,
  expression:
    'I - A_lost_f * (z_f^2 + t_f^2 / 12) - A_lost_w * (z_w^2 + l_w^2 / 12) - (A - A_lost_f - A_lost_w) * e_M^2',
  where: { ...holes, I: 'mm^4', t_f: 'mm', l_w: 'mm', e_M: 'mm' },
});

/** h is the depth across the axis. */
export const effectiveModulus = formula({
  symbol: 'W_eff',
  title: 'Effective section modulus',
  unit: 'mm^3',
  clause: SECTION,
  expression: 'I_eff / (h / 2 + e_M)',
  where: { I_eff: 'mm^4', h: 'mm', e_M: 'mm' },
});

/** Strips lost at the toes on the compressed side; y_f and l_f are the middle and the length of one. */
export const effectiveInertiaZ = formula({
  symbol: 'I_eff_z',
  title: 'Effective second moment of area about z-z',
  unit: 'mm^4',
  clause: SECTION,
  expression: 'I_z - A_lost_f * (y_f^2 + l_f^2 / 12) - (A_lost_f * y_f)^2 / (A - A_lost_f)',
  where: { I_z: 'mm^4', A_lost_f: 'mm^2', y_f: 'mm', l_f: 'mm', A: 'mm^2' },
});

/** At the end of what counts of the compressed flange, or at the other side, y_other from the centroid. */
export const effectiveModulusZ = formula({
  symbol: 'W_eff_z',
  title: 'Effective section modulus about z-z',
  unit: 'mm^3',
  clause: SECTION,
  expression:
    'I_eff_z / max(y_f - l_f / 2 + A_lost_f * y_f / (A - A_lost_f), y_other - A_lost_f * y_f / (A - A_lost_f))',
  where: {
    I_eff_z: 'mm^4',
    y_f: 'mm',
    l_f: 'mm',
    A_lost_f: 'mm^2',
    A: 'mm^2',
    y_other: 'mm',
  },
});

/** Of a channel with its web compressed: the web's strip is lost at y_w from the centroid. */
export const effectiveModulusZOfWeb = formula({
  symbol: 'W_eff_z',
  title: 'Effective section modulus about z-z, web compressed',
  unit: 'mm^3',
  clause: SECTION,
  expression:
    '(I_z - A_lost_w * (y_w^2 + t_w^2 / 12) - (A_lost_w * y_w)^2 / (A - A_lost_w))' +
    ' / max(y_c + A_lost_w * y_w / (A - A_lost_w), b - y_c - A_lost_w * y_w / (A - A_lost_w))',
  where: {
    I_z: 'mm^4',
    A_lost_w: 'mm^2',
    y_w: 'mm',
    t_w: 'mm',
    A: 'mm^2',
    y_c: 'mm',
    b: 'mm',
  },
});
