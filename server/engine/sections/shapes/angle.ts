import { formula } from '../../formula/formula';
import type { Sheet } from '../../formula/sheet';
import { GEOMETRY, fillet, lengths } from './fillet';

/** An angle in mm: leg h along z-z, leg b along y-y, both of thickness t; the heel at the origin. */
export interface AngleDimensions {
  readonly h: number;
  readonly b: number;
  readonly t: number;
  /** Root radius and toe radius. */
  readonly r_1: number;
  readonly r_2: number;
}

const root = fillet('r_1');
const toe = fillet('r_2');
const all = () => lengths('h', 'b', 't', 'r_1', 'r_2');

export const angleArea = formula({
  symbol: 'A',
  title: 'Area of an angle',
  unit: 'mm^2',
  clause: GEOMETRY,
  expression: `t * (h + b - t) + ${root.area} - 2 * ${toe.area}`,
  where: all(),
});

/** Distance of the centroid from the back of the leg `other`, measured along the leg `along`. */
function centroid(symbol: 'y_c' | 'z_c', along: 'b' | 'h', other: 'h' | 'b') {
  return formula({
    symbol,
    title: `Centroid from the back of the leg ${other}`,
    unit: 'mm',
    clause: GEOMETRY,
    expression:
      `(${other} * t^2 / 2 + (${along} - t) * t * (${along} + t) / 2` +
      ` + ${root.area} * (t + ${root.centroid})` +
      ` - ${toe.area} * (t - ${toe.centroid}) - ${toe.area} * (${along} - ${toe.centroid})) / A`,
    where: { ...all(), A: 'mm^2' },
  });
}

export const angleCentroidY = centroid('y_c', 'b', 'h');
export const angleCentroidZ = centroid('z_c', 'h', 'b');

/** About an axis parallel to the leg `other`: distances run along `along`. */
function inertiaText(along: 'b' | 'h', other: 'h' | 'b', c: 'y_c' | 'z_c'): string {
  return (
    `t * ${along}^3 / 3 + (${other} - t) * t^3 / 3` +
    ` + ${root.inertia} + ${root.area} * (t + ${root.centroid})^2` +
    ` - 2 * ${toe.inertia} - ${toe.area} * (t - ${toe.centroid})^2` +
    ` - ${toe.area} * (${along} - ${toe.centroid})^2 - A * ${c}^2`
  );
}

export const angleInertiaY = formula({
  symbol: 'I_y',
  title: 'Second moment of area about y-y',
  unit: 'mm^4',
  clause: GEOMETRY,
  expression: inertiaText('h', 'b', 'z_c'),
  where: { ...all(), A: 'mm^2', z_c: 'mm' },
});

export const angleInertiaZ = formula({
  symbol: 'I_z',
  title: 'Second moment of area about z-z',
  unit: 'mm^4',
  clause: GEOMETRY,
  expression: inertiaText('b', 'h', 'y_c'),
  where: { ...all(), A: 'mm^2', y_c: 'mm' },
});

export const angleProduct = formula({
  symbol: 'I_yz',
  title: 'Product of area about the centroid',
  unit: 'mm^4',
  clause: GEOMETRY,
  expression:
    'h^2 * t^2 / 4 + (b^2 - t^2) * t^2 / 4' +
    ` + ${root.product} + ${root.area} * (t + ${root.centroid})^2` +
    ` - 2 * ${toe.product} - ${toe.area} * (t - ${toe.centroid}) * (h - ${toe.centroid})` +
    ` - ${toe.area} * (b - ${toe.centroid}) * (t - ${toe.centroid}) - A * y_c * z_c`,
  where: { ...all(), A: 'mm^2', y_c: 'mm', z_c: 'mm' },
});

const principalWhere = { I_y: 'mm^4', I_z: 'mm^4', I_yz: 'mm^4' } as const;

export const angleInertiaU = formula({
  symbol: 'I_u',
  title: 'Greater principal second moment of area',
  unit: 'mm^4',
  clause: GEOMETRY,
  expression: '(I_y + I_z) / 2 + sqrt(((I_y - I_z) / 2)^2 + I_yz^2)',
  where: principalWhere,
});

export const angleInertiaV = formula({
  symbol: 'I_v',
  title: 'Lesser principal second moment of area',
  unit: 'mm^4',
  clause: GEOMETRY,
  expression: '(I_y + I_z) / 2 - sqrt(((I_y - I_z) / 2)^2 + I_yz^2)',
  where: principalWhere,
});

export const angleElasticY = formula({
  symbol: 'W_el_y',
  title: 'Elastic section modulus about y-y, at the farther edge',
  unit: 'mm^3',
  clause: GEOMETRY,
  expression: 'I_y / max(z_c, h - z_c)',
  where: { I_y: 'mm^4', z_c: 'mm', h: 'mm' },
});

export const angleElasticZ = formula({
  symbol: 'W_el_z',
  title: 'Elastic section modulus about z-z, at the farther edge',
  unit: 'mm^3',
  clause: GEOMETRY,
  expression: 'I_z / max(y_c, b - y_c)',
  where: { I_z: 'mm^4', y_c: 'mm', b: 'mm' },
});

/** From memory, confirmed by the tabulated I_t of equal angles within 0.4 % (spec). */
export const equalAngleTorsionConstant = formula({
  symbol: 'I_t',
  title: 'St Venant torsion constant of an equal angle, with its junction',
  unit: 'mm^4',
  clause: 'El Darwish and Johnston, as in UK section tables',
  expression:
    'b * t^3 / 3 + (h - t) * t^3 / 3 + (0.0768 + 0.0479 * r_1 / t)' +
    ' * (2 * (3 * r_1 + 2 * t - sqrt(2) * (2 * r_1 + t)))^4 - 0.21 * t^4',
  where: lengths('h', 'b', 't', 'r_1'),
});

/** As tabulated for unequal angles (spec). */
export const unequalAngleTorsionConstant = formula({
  symbol: 'I_t',
  title: 'St Venant torsion constant of an unequal angle',
  unit: 'mm^4',
  clause: 'A t²/3, as in UK section tables',
  expression: 'A * t^2 / 3',
  where: { A: 'mm^2', t: 'mm' },
});

/** mm, mm², mm³, mm⁴. The shear centre stands where the centre lines of the legs meet; I_w is 0. */
export interface AngleProperties {
  readonly A: number;
  readonly I_y: number;
  readonly I_z: number;
  readonly I_yz: number;
  readonly I_u: number;
  readonly I_v: number;
  readonly W_el_y: number;
  readonly W_el_z: number;
  readonly I_t: number;
  readonly y_c: number;
  readonly z_c: number;
}

export function angleProperties(dimensions: AngleDimensions, sheet: Sheet): AngleProperties {
  const { h, b, t, r_1 } = dimensions;
  const A = sheet.evaluate(angleArea, dimensions);
  const y_c = sheet.evaluate(angleCentroidY, { ...dimensions, A });
  const z_c = sheet.evaluate(angleCentroidZ, { ...dimensions, A });
  const I_y = sheet.evaluate(angleInertiaY, { ...dimensions, A, z_c });
  const I_z = sheet.evaluate(angleInertiaZ, { ...dimensions, A, y_c });
  const I_yz = sheet.evaluate(angleProduct, { ...dimensions, A, y_c, z_c });
  return {
    A,
    y_c,
    z_c,
    I_y,
    I_z,
    I_yz,
    I_u: sheet.evaluate(angleInertiaU, { I_y, I_z, I_yz }),
    I_v: sheet.evaluate(angleInertiaV, { I_y, I_z, I_yz }),
    W_el_y: sheet.evaluate(angleElasticY, { I_y, z_c, h }),
    W_el_z: sheet.evaluate(angleElasticZ, { I_z, y_c, b }),
    I_t:
      h === b
        ? sheet.evaluate(equalAngleTorsionConstant, { h, b, t, r_1 })
        : sheet.evaluate(unequalAngleTorsionConstant, { A, t }),
  };
}
