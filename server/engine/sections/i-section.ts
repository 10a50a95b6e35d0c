import { formula } from '../formula/formula';
import { fillet, lengths } from './shapes/fillet';

const root = fillet('r');

const clause = 'Geometry of EN 10365 dimensions';

export const area = formula({
  symbol: 'A',
  title: 'Area',
  unit: 'mm^2',
  clause,
  expression: `2 * b * t_f + (h - 2 * t_f) * t_w + 4 * ${root.area}`,
  where: lengths('h', 'b', 't_w', 't_f', 'r'),
});

export const secondMomentY = formula({
  symbol: 'I_y',
  title: 'Second moment of area about y-y',
  unit: 'mm^4',
  clause,
  expression: `(b * h^3 - (b - t_w) * (h - 2 * t_f)^3) / 12 + 4 * (${root.inertia} + ${root.area} * (h / 2 - t_f - ${root.centroid})^2)`,
  where: lengths('h', 'b', 't_w', 't_f', 'r'),
});

export const secondMomentZ = formula({
  symbol: 'I_z',
  title: 'Second moment of area about z-z',
  unit: 'mm^4',
  clause,
  expression: `t_f * b^3 / 6 + (h - 2 * t_f) * t_w^3 / 12 + 4 * (${root.inertia} + ${root.area} * (t_w / 2 + ${root.centroid})^2)`,
  where: lengths('h', 'b', 't_w', 't_f', 'r'),
});

export const plasticModulusY = formula({
  symbol: 'W_pl_y',
  title: 'Plastic section modulus about y-y',
  unit: 'mm^3',
  clause,
  expression: `b * t_f * (h - t_f) + t_w * (h - 2 * t_f)^2 / 4 + 4 * ${root.area} * (h / 2 - t_f - ${root.centroid})`,
  where: lengths('h', 'b', 't_w', 't_f', 'r'),
});

export const plasticModulusZ = formula({
  symbol: 'W_pl_z',
  title: 'Plastic section modulus about z-z',
  unit: 'mm^3',
  clause,
  expression: `t_f * b^2 / 2 + (h - 2 * t_f) * t_w^2 / 4 + 4 * ${root.area} * (t_w / 2 + ${root.centroid})`,
  where: lengths('h', 'b', 't_w', 't_f', 'r'),
});

/** From memory, confirmed by the tabulated I_t of UB and UC within 0.33 % (spec). */
export const torsionConstantByJunctions = formula({
  symbol: 'I_t',
  title: 'St Venant torsion constant, with flange-web junctions',
  unit: 'mm^4',
  clause: 'El Darwish and Johnston, as in UK section tables',
  expression:
    '2 / 3 * b * t_f^3 + (h - 2 * t_f) * t_w^3 / 3' +
    ' + 2 * (-0.042 + 0.2204 * t_w / t_f + 0.1355 * r / t_f - 0.0865 * r * t_w / t_f^2 - 0.0725 * t_w^2 / t_f^2)' +
    ' * (((t_f + r)^2 + (r + 0.25 * t_w) * t_w) / (2 * r + t_f))^4 - 0.42 * t_f^4',
  where: lengths('h', 'b', 't_w', 't_f', 'r'),
});

/** From memory, confirmed by the tabulated I_t of HE and IPE within 0.4 % (spec). */
export const torsionConstantOfMills = formula({
  symbol: 'I_t',
  title: 'St Venant torsion constant',
  unit: 'mm^4',
  clause: 'Formula printed in European mill catalogues',
  expression:
    '2 / 3 * (b - 0.63 * t_f) * t_f^3 + (h - 2 * t_f) * t_w^3 / 3' +
    ' + 2 * t_w / t_f * (0.145 + 0.1 * r / t_f)' +
    ' * (((r + t_w / 2)^2 + (r + t_f)^2 - r^2) / (2 * r + t_f))^4',
  where: lengths('h', 'b', 't_w', 't_f', 'r'),
});

export const warpingConstantOfSection = formula({
  symbol: 'I_w',
  title: 'Warping constant',
  unit: 'mm^6',
  clause: 'I_z (h - t_f)²/4, as in UK section tables',
  expression: 'I_z * (h - t_f)^2 / 4',
  where: { I_z: 'mm^4', h: 'mm', t_f: 'mm' },
});

export const warpingConstantOfFlanges = formula({
  symbol: 'I_w',
  title: 'Warping constant',
  unit: 'mm^6',
  clause: 'Flanges alone, as in European mill catalogues',
  expression: 't_f * b^3 / 24 * (h - t_f)^2',
  where: { t_f: 'mm', b: 'mm', h: 'mm' },
});
