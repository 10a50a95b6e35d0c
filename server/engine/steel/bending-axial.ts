import { formula } from '../formula/formula';

// Confirmed by examples that were read: (6.33) and (6.34) by NM-01, (6.36) by NM-02. From memory,
// unconfirmed: (6.38) to (6.40).
const FLANGED = 'EN 1993-1-1 6.2.9.1(5)';
const LIMITS = 'EN 1993-1-1 6.2.9.1(4)';
const strength = { f_y: 'N/mm^2', gamma_M0: '1' } as const;

export const axialRatio = formula({
  symbol: 'n',
  title: 'Axial force over its plastic resistance',
  unit: '1',
  clause: FLANGED,
  expression: 'N_Ed / N_pl_Rd',
  where: { N_Ed: 'kN', N_pl_Rd: 'kN' },
});

export const quarterLimit = formula({
  symbol: 'N_lim_1',
  title: 'Axial force that leaves bending about y-y as it is, of the section',
  unit: 'kN',
  clause: `${LIMITS} (6.33)`,
  expression: '0.25 * N_pl_Rd',
  where: { N_pl_Rd: 'kN' },
});

/** rho is the reduction of the web by shear. */
export const webLimitY = formula({
  symbol: 'N_lim_2',
  title: 'Axial force that leaves bending about y-y as it is, of the web',
  unit: 'kN',
  clause: `${LIMITS} (6.34)`,
  expression: '0.5 * h_w * t_w * (1 - rho_z) * f_y / gamma_M0',
  where: { ...strength, h_w: 'mm', t_w: 'mm', rho_z: '1' },
});

export const webLimitZ = formula({
  symbol: 'N_lim_3',
  title: 'Axial force that leaves bending about z-z as it is',
  unit: 'kN',
  clause: `${LIMITS} (6.35)`,
  expression: 'h_w * t_w * (1 - rho_z) * f_y / gamma_M0',
  where: { ...strength, h_w: 'mm', t_w: 'mm', rho_z: '1' },
});

/** A is the area left by shear: the web's share shrinks with its strength. */
export const webShare = formula({
  symbol: 'a',
  title: 'Share of the web in the area',
  unit: '1',
  clause: FLANGED,
  expression: 'max(min((A - rho_z * A_v_z - 2 * b * t_f) / (A - rho_z * A_v_z), 0.5), 0)',
  where: { A: 'mm^2', rho_z: '1', A_v_z: 'mm^2', b: 'mm', t_f: 'mm' },
});

export const reducedPlasticY = formula({
  symbol: 'M_N_y_Rd',
  title: 'Plastic bending resistance about y-y reduced by axial force',
  unit: 'kN m',
  clause: `${FLANGED} (6.36)`,
  expression: 'min(M_pl_y_Rd * max(1 - n, 0) / (1 - 0.5 * a), M_pl_y_Rd)',
  where: { M_pl_y_Rd: 'kN m', n: '1', a: '1' },
});

/** For n above a. */
export const reducedPlasticZ = formula({
  symbol: 'M_N_z_Rd',
  title: 'Plastic bending resistance about z-z reduced by axial force',
  unit: 'kN m',
  clause: `${FLANGED} (6.38)`,
  expression: 'M_pl_z_Rd * max(1 - (max(n - a, 0) / (1 - a))^2, 0)',
  where: { M_pl_z_Rd: 'kN m', n: '1', a: '1' },
});

export const webShareOfHollow = formula({
  symbol: 'a_w',
  title: 'Share of the walls along z-z in the area',
  unit: '1',
  clause: FLANGED,
  expression: 'max(min((A - 2 * b * t) / A, 0.5), 0)',
  where: { A: 'mm^2', b: 'mm', t: 'mm' },
});

export const flangeShareOfHollow = formula({
  symbol: 'a_f',
  title: 'Share of the walls along y-y in the area',
  unit: '1',
  clause: FLANGED,
  expression: 'max(min((A - 2 * h * t) / A, 0.5), 0)',
  where: { A: 'mm^2', h: 'mm', t: 'mm' },
});

function reducedPlasticOfHollow<S extends 'a_w' | 'a_f'>(
  axis: 'y' | 'z',
  share: S,
  equation: string,
) {
  return formula({
    symbol: `M_N_${axis}_Rd`,
    title: `Plastic bending resistance about ${axis}-${axis} reduced by axial force`,
    unit: 'kN m',
    clause: `${FLANGED} (${equation})`,
    expression: `min(M_pl_Rd * max(1 - n, 0) / (1 - 0.5 * ${share}), M_pl_Rd)`,
    where: { M_pl_Rd: 'kN m', n: '1', [share]: '1' } as Record<'M_pl_Rd', 'kN m'> &
      Record<'n' | S, '1'>,
  });
}

/**
 * EN 1993-1-1:2005 has no expression for tubes. 1 - n^1.7 is common practice, no source; above n = 0.7
 * a thin tube fully plastic carries less, cos(pi n/2), which follows from its geometry.
 */
function reducedPlasticOfTube(axis: 'y' | 'z') {
  return formula({
    symbol: `M_N_${axis}_Rd`,
    title: `Plastic bending resistance about ${axis}-${axis} reduced by axial force`,
    unit: 'kN m',
    clause: 'EN 1993-1-1 6.2.9.1(2); expression by common practice and of a thin tube, no source',
    expression: 'M_pl_Rd * max(min(1 - min(n, 1)^1.7, cos(pi / 2 * min(n, 1))), 0)',
    where: { M_pl_Rd: 'kN m', n: '1' },
  });
}

/** Solid rectangles and plates. */
function reducedPlasticOfRectangle(axis: 'y' | 'z') {
  return formula({
    symbol: `M_N_${axis}_Rd`,
    title: `Plastic bending resistance about ${axis}-${axis} reduced by axial force`,
    unit: 'kN m',
    clause: 'EN 1993-1-1 6.2.9.1(3) (6.32)',
    expression: 'M_pl_Rd * (1 - min(n, 1)^2)',
    where: { M_pl_Rd: 'kN m', n: '1' },
  });
}

export const reducedPlastic = {
  rhs: {
    y: reducedPlasticOfHollow('y', 'a_w', '6.39'),
    z: reducedPlasticOfHollow('z', 'a_f', '6.40'),
  },
  tube: { y: reducedPlasticOfTube('y'), z: reducedPlasticOfTube('z') },
  rectangle: { y: reducedPlasticOfRectangle('y'), z: reducedPlasticOfRectangle('z') },
};

export const plasticAxialYCriterion = formula({
  symbol: 'utilisation',
  title: 'Bending about y-y with axial force',
  unit: '1',
  clause: 'EN 1993-1-1 6.2.9.1(1) (6.31)',
  expression: 'M_y_Ed / M_N_y_Rd',
  where: { M_y_Ed: 'kN m', M_N_y_Rd: 'kN m' },
});

export const plasticAxialZCriterion = formula({
  symbol: 'utilisation',
  title: 'Bending about z-z with axial force',
  unit: '1',
  clause: 'EN 1993-1-1 6.2.9.1(1) (6.31)',
  expression: 'M_z_Ed / M_N_z_Rd',
  where: { M_z_Ed: 'kN m', M_N_z_Rd: 'kN m' },
});

export const addedMoment = formula({
  symbol: 'Delta_M_Ed',
  title: 'Moment from the shift of the centroid',
  unit: 'kN m',
  clause: 'EN 1993-1-1 6.2.2.5(4)',
  expression: 'N_Ed * e_N',
  where: { N_Ed: 'kN', e_N: 'mm' },
});
