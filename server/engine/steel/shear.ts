import { formula } from '../formula/formula';

// Confirmed by examples: a by RB-04, which was read, b by GN-6.4, recalled. From memory, unconfirmed: d, f, g.
const ELASTIC = 'EN 1993-1-1 6.2.6(4) (6.20)';
const AREA = 'EN 1993-1-1 6.2.6(3)';
const RESISTANCE = 'EN 1993-1-1 6.2.6(2) (6.18)';
const CRITERION = 'EN 1993-1-1 6.2.6(1) (6.17)';

export const webHeight = formula({
  symbol: 'h_w',
  title: 'Height of the web between flanges',
  unit: 'mm',
  clause: AREA,
  expression: 'h - 2 * t_f',
  where: { h: 'mm', t_f: 'mm' },
});

export const shearAreaZ = formula({
  symbol: 'A_v_z',
  title: 'Shear area of a rolled I or H section, load along the web',
  unit: 'mm^2',
  clause: `${AREA}a`,
  expression: 'max(A - 2 * b * t_f + (t_w + 2 * r) * t_f, eta * h_w * t_w)',
  where: { A: 'mm^2', b: 'mm', t_f: 'mm', t_w: 'mm', r: 'mm', eta: '1', h_w: 'mm' },
});

export const shearAreaZOfChannel = formula({
  symbol: 'A_v_z',
  title: 'Shear area of a rolled channel, load along the web',
  unit: 'mm^2',
  clause: `${AREA}b`,
  expression: 'A - 2 * b * t_f + (t_w + r) * t_f',
  where: { A: 'mm^2', b: 'mm', t_f: 'mm', t_w: 'mm', r: 'mm' },
});

export const shearAreaZOfPlates = formula({
  symbol: 'A_v_z',
  title: 'Shear area of a welded section, load along the web',
  unit: 'mm^2',
  clause: `${AREA}d`,
  expression: 'eta * h_w * t_w',
  where: { eta: '1', h_w: 'mm', t_w: 'mm' },
});

/** Of a rectangular hollow section; h along z-z, b along y-y. */
export const shearAreaZOfRhs = formula({
  symbol: 'A_v_z',
  title: 'Shear area of a rectangular hollow section, load along its depth',
  unit: 'mm^2',
  clause: `${AREA}f`,
  expression: 'A * h / (b + h)',
  where: { A: 'mm^2', h: 'mm', b: 'mm' },
});

export const shearAreaYOfRhs = formula({
  symbol: 'A_v_y',
  title: 'Shear area of a rectangular hollow section, load along its width',
  unit: 'mm^2',
  clause: `${AREA}f`,
  expression: 'A * b / (b + h)',
  where: { A: 'mm^2', b: 'mm', h: 'mm' },
});

/** A section without parts whose shear area the clause names; one for each direction. */
function elasticShearArea(direction: 'z' | 'y') {
  const symbol = `A_v_${direction}` as const;
  return {
    tube: formula({
      symbol,
      title: 'Shear area of a circular hollow section',
      unit: 'mm^2',
      clause: `${AREA}g`,
      expression: '2 * A / pi',
      where: { A: 'mm^2' },
    }),
    rectangle: formula({
      symbol,
      title: 'Area over the greatest elastic shear stress of a rectangle, 1.5 V/A',
      unit: 'mm^2',
      clause: ELASTIC,
      expression: '2 * A / 3',
      where: { A: 'mm^2' },
    }),
    round: formula({
      symbol,
      title: 'Area over the greatest elastic shear stress of a round, 4/3 V/A',
      unit: 'mm^2',
      clause: ELASTIC,
      expression: '3 * A / 4',
      where: { A: 'mm^2' },
    }),
  };
}

export const elasticShearAreas = { z: elasticShearArea('z'), y: elasticShearArea('y') };

/** Both flanges, as for IPE 330 in SSB05 4.1.1 (RB-07); 6.2.6(3)e of welded sections would count the fillets too. */
export const shearAreaY = formula({
  symbol: 'A_v_y',
  title: 'Shear area of the flanges, load along y-y',
  unit: 'mm^2',
  clause: AREA,
  expression: '2 * b * t_f',
  where: { b: 'mm', t_f: 'mm' },
});

export const shearResistanceZ = formula({
  symbol: 'V_pl_z_Rd',
  title: 'Plastic shear resistance along z-z',
  unit: 'kN',
  clause: RESISTANCE,
  expression: 'A_v_z * (f_y / sqrt(3)) / gamma_M0',
  where: { A_v_z: 'mm^2', f_y: 'N/mm^2', gamma_M0: '1' },
});

export const shearResistanceY = formula({
  symbol: 'V_pl_y_Rd',
  title: 'Plastic shear resistance along y-y',
  unit: 'kN',
  clause: RESISTANCE,
  expression: 'A_v_y * (f_y / sqrt(3)) / gamma_M0',
  where: { A_v_y: 'mm^2', f_y: 'N/mm^2', gamma_M0: '1' },
});

export const shearZCriterion = formula({
  symbol: 'utilisation',
  title: 'Shear along z-z',
  unit: '1',
  clause: CRITERION,
  expression: 'V_z_Ed / V_pl_z_Rd',
  where: { V_z_Ed: 'kN', V_pl_z_Rd: 'kN' },
});

export const shearYCriterion = formula({
  symbol: 'utilisation',
  title: 'Shear along y-y',
  unit: '1',
  clause: CRITERION,
  expression: 'V_y_Ed / V_pl_y_Rd',
  where: { V_y_Ed: 'kN', V_pl_y_Rd: 'kN' },
});

export const webHeightToThickness = formula({
  symbol: 'h_w_t_w',
  title: 'Height to thickness of the web',
  unit: '1',
  clause: 'EN 1993-1-1 6.2.6(6)',
  expression: 'h_w / t_w',
  where: { h_w: 'mm', t_w: 'mm' },
});

/** Above it the web must be verified for shear buckling by EN 1993-1-5 section 5. */
export const shearBucklingLimit = formula({
  symbol: 'h_w_t_w_lim',
  title: 'Height to thickness from which the web buckles in shear',
  unit: '1',
  clause: 'EN 1993-1-1 6.2.6(6) (6.22)',
  expression: '72 * epsilon / eta',
  where: { epsilon: '1', eta: '1' },
});
