import { formula } from '../../formula/formula';
import type { Sheet } from '../../formula/sheet';
import { GEOMETRY, fillet, lengths } from './fillet';
import { elasticModulusY, torsionOfRolled } from './moduli';
import { flangeStrips, plasticModulusZ } from './tapered-flange';

/** A parallel-flange channel in mm; the web at the left, y from the back of the web. */
export interface ChannelDimensions {
  readonly h: number;
  readonly b: number;
  readonly t_w: number;
  readonly t_f: number;
  readonly r: number;
}

const root = fillet('r');
const all = () => lengths('h', 'b', 't_w', 't_f', 'r');

export const channelArea = formula({
  symbol: 'A',
  title: 'Area of a channel',
  unit: 'mm^2',
  clause: GEOMETRY,
  expression: `2 * b * t_f + (h - 2 * t_f) * t_w + 2 * ${root.area}`,
  where: all(),
});

export const channelCentroid = formula({
  symbol: 'y_c',
  title: 'Centroid from the back of the web',
  unit: 'mm',
  clause: GEOMETRY,
  expression: `(b^2 * t_f + (h - 2 * t_f) * t_w^2 / 2 + 2 * ${root.area} * (t_w + ${root.centroid})) / A`,
  where: { ...all(), A: 'mm^2' },
});

export const channelInertiaY = formula({
  symbol: 'I_y',
  title: 'Second moment of area about y-y',
  unit: 'mm^4',
  clause: GEOMETRY,
  expression: `(b * h^3 - (b - t_w) * (h - 2 * t_f)^3) / 12 + 2 * (${root.inertia} + ${root.area} * (h / 2 - t_f - ${root.centroid})^2)`,
  where: all(),
});

export const channelInertiaZ = formula({
  symbol: 'I_z',
  title: 'Second moment of area about z-z',
  unit: 'mm^4',
  clause: GEOMETRY,
  expression: `2 * t_f * b^3 / 3 + (h - 2 * t_f) * t_w^3 / 3 + 2 * (${root.inertia} + ${root.area} * (t_w + ${root.centroid})^2) - A * y_c^2`,
  where: { ...all(), A: 'mm^2', y_c: 'mm' },
});

export const channelElasticZ = formula({
  symbol: 'W_el_z',
  title: 'Elastic section modulus about z-z, at the toes',
  unit: 'mm^3',
  clause: GEOMETRY,
  expression: 'I_z / (b - y_c)',
  where: { I_z: 'mm^4', b: 'mm', y_c: 'mm' },
});

export const channelPlasticY = formula({
  symbol: 'W_pl_y',
  title: 'Plastic section modulus about y-y',
  unit: 'mm^3',
  clause: GEOMETRY,
  expression: `b * t_f * (h - t_f) + t_w * (h - 2 * t_f)^2 / 4 + 2 * ${root.area} * (h / 2 - t_f - ${root.centroid})`,
  where: all(),
});

export const channelAxisInWeb = formula({
  symbol: 'y_p',
  title: 'Plastic neutral axis from the back of the web, inside the web',
  unit: 'mm',
  clause: GEOMETRY,
  expression: 'A / (2 * h)',
  where: { A: 'mm^2', h: 'mm' },
});

export const channelPlasticZInWeb = formula({
  symbol: 'W_pl_z',
  title: 'Plastic section modulus about z-z, axis inside the web',
  unit: 'mm^3',
  clause: GEOMETRY,
  expression: 'A * y_c - A * y_p + h * y_p^2',
  where: { A: 'mm^2', y_c: 'mm', y_p: 'mm', h: 'mm' },
});

export const channelAxisInFlanges = formula({
  symbol: 'y_p',
  title: 'Plastic neutral axis from the back of the web, beyond the fillets',
  unit: 'mm',
  clause: GEOMETRY,
  expression: 'b - A / (4 * t_f)',
  where: { b: 'mm', A: 'mm^2', t_f: 'mm' },
});

export const channelPlasticZInFlanges = formula({
  symbol: 'W_pl_z',
  title: 'Plastic section modulus about z-z, axis through the flanges',
  unit: 'mm^3',
  clause: GEOMETRY,
  expression: '2 * t_f * (b - y_p)^2 - A * y_c + A * y_p',
  where: { t_f: 'mm', b: 'mm', y_p: 'mm', A: 'mm^2', y_c: 'mm' },
});

/** From memory, confirmed by the tabulated I_t of PFC within 0.1 % (spec). */
export const channelTorsionConstant = formula({
  symbol: 'I_t',
  title: 'St Venant torsion constant, with flange-web junctions',
  unit: 'mm^4',
  clause: 'El Darwish and Johnston, as in UK section tables',
  expression:
    '2 / 3 * b * t_f^3 + (h - 2 * t_f) * t_w^3 / 3' +
    ' + 2 * (-0.0908 + 0.2621 * t_w / t_f + 0.1231 * r / t_f - 0.0752 * t_w * r / t_f^2 - 0.0945 * t_w^2 / t_f^2)' +
    ' * (2 * (3 * r + t_w + t_f - sqrt(2 * (2 * r + t_w) * (2 * r + t_f))))^4 - 0.42 * t_f^4',
  where: all(),
});

/** From memory, confirmed by the tabulated values of PFC within 0.4 % (spec). */
export const channelShearCentre = formula({
  symbol: 'e_0',
  title: 'Shear centre from the centre line of the web, away from the flanges',
  unit: 'mm',
  clause: 'UK section tables, explanatory notes',
  expression: '(y_c - t_w / 2) * (h - t_f)^2 * A / (4 * I_y)',
  where: { y_c: 'mm', t_w: 'mm', h: 'mm', t_f: 'mm', A: 'mm^2', I_y: 'mm^4' },
});

/** From memory, confirmed by the tabulated values of PFC within 0.4 % (spec). */
export const channelWarpingConstant = formula({
  symbol: 'I_w',
  title: 'Warping constant',
  unit: 'mm^6',
  clause: 'UK section tables, explanatory notes',
  expression: '(h - t_f)^2 / 4 * (I_z - A * (y_c - t_w / 2)^2 * ((h - t_f)^2 * A / (4 * I_y) - 1))',
  where: { h: 'mm', t_f: 'mm', I_z: 'mm^4', A: 'mm^2', y_c: 'mm', t_w: 'mm', I_y: 'mm^4' },
});

/** mm, mm², mm³, mm⁴, mm⁶. */
export interface ChannelProperties {
  readonly A: number;
  readonly I_y: number;
  readonly I_z: number;
  readonly W_el_y: number;
  readonly W_el_z: number;
  readonly W_pl_y: number;
  readonly W_pl_z: number;
  readonly I_t: number;
  readonly I_w: number;
  /** Centroid from the back of the web. */
  readonly y_c: number;
  /** Shear centre from the web's centre line, outside. */
  readonly e_0: number;
}

export function channelProperties(dimensions: ChannelDimensions, sheet: Sheet): ChannelProperties {
  const { h, b, t_w, t_f } = dimensions;
  const A = sheet.evaluate(channelArea, dimensions);
  const y_c = sheet.evaluate(channelCentroid, { ...dimensions, A });
  const I_y = sheet.evaluate(channelInertiaY, dimensions);
  const I_z = sheet.evaluate(channelInertiaZ, { ...dimensions, A, y_c });
  return {
    A,
    y_c,
    I_y,
    I_z,
    W_el_y: sheet.evaluate(elasticModulusY, { I_y, h }),
    W_el_z: sheet.evaluate(channelElasticZ, { I_z, b, y_c }),
    W_pl_y: sheet.evaluate(channelPlasticY, dimensions),
    W_pl_z: plasticZ(dimensions, A, y_c, sheet),
    I_t: torsionOfRolled(channelTorsionConstant, dimensions, sheet),
    e_0: sheet.evaluate(channelShearCentre, { y_c, t_w, h, t_f, A, I_y }),
    I_w: sheet.evaluate(channelWarpingConstant, { h, t_f, I_z, A, y_c, t_w, I_y }),
  };
}

function plasticZ(dimensions: ChannelDimensions, A: number, y_c: number, sheet: Sheet): number {
  const { h, b, t_w, t_f, r } = dimensions;
  if (h * t_w >= A / 2) {
    const y_p = sheet.evaluate(channelAxisInWeb, { A, h });
    return sheet.evaluate(channelPlasticZInWeb, { A, y_c, y_p, h });
  }
  if (b - A / (4 * t_f) < t_w + r) {
    const taper = { slope: 0, at: 0, r_2: 0 };
    const flanges = flangeStrips({ h, t_f, r, taper, from: t_w, toe: b });
    const W_pl_z = plasticModulusZ(h, t_w, flanges, A, y_c);
    const title = 'Plastic section modulus about z-z, axis through the roots, integrated';
    return sheet.given('W_pl_z', W_pl_z, 'mm^3', title, GEOMETRY);
  }
  const y_p = sheet.evaluate(channelAxisInFlanges, { b, A, t_f });
  return sheet.evaluate(channelPlasticZInFlanges, { t_f, b, y_p, A, y_c });
}
