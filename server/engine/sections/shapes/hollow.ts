import { formula } from '../../formula/formula';
import type { Sheet } from '../../formula/sheet';
import { fillet, lengths } from './fillet';
import { elasticModulusY, elasticModulusZ, polarInertia, polarModulus } from './moduli';

export type Forming = 'hot-finished' | 'cold-formed';

/** A rectangular or square hollow section in mm; h along z-z. */
export interface RhsDimensions {
  readonly h: number;
  readonly b: number;
  readonly t: number;
  readonly r_o: number;
  readonly r_i: number;
}

/** A circular hollow section in mm. */
export interface ChsDimensions {
  readonly d: number;
  readonly t: number;
}

const ANNEX = 'EN 10210-2 and EN 10219-2, annexes of section properties';
const outer = fillet('r_o');
const inner = fillet('r_i');
const all = () => lengths('h', 'b', 't', 'r_o', 'r_i');

export const rhsArea = formula({
  symbol: 'A',
  title: 'Area',
  unit: 'mm^2',
  clause: ANNEX,
  expression: '2 * t * (b + h - 2 * t) - (4 - pi) * (r_o^2 - r_i^2)',
  where: all(),
});

export const rhsInertiaY = formula({
  symbol: 'I_y',
  title: 'Second moment of area about y-y',
  unit: 'mm^4',
  clause: ANNEX,
  expression: rhsInertia('b', 'h'),
  where: all(),
});

export const rhsInertiaZ = formula({
  symbol: 'I_z',
  title: 'Second moment of area about z-z',
  unit: 'mm^4',
  clause: ANNEX,
  expression: rhsInertia('h', 'b'),
  where: all(),
});

function rhsInertia(width: string, depth: string): string {
  return (
    `${width} * ${depth}^3 / 12 - (${width} - 2 * t) * (${depth} - 2 * t)^3 / 12` +
    ` - 4 * (${outer.inertia} + ${outer.area} * (${depth} / 2 - ${outer.centroid})^2)` +
    ` + 4 * (${inner.inertia} + ${inner.area} * (${depth} / 2 - t - ${inner.centroid})^2)`
  );
}

export const rhsPlasticY = formula({
  symbol: 'W_pl_y',
  title: 'Plastic section modulus about y-y',
  unit: 'mm^3',
  clause: ANNEX,
  expression: rhsPlastic('b', 'h'),
  where: all(),
});

export const rhsPlasticZ = formula({
  symbol: 'W_pl_z',
  title: 'Plastic section modulus about z-z',
  unit: 'mm^3',
  clause: ANNEX,
  expression: rhsPlastic('h', 'b'),
  where: all(),
});

function rhsPlastic(width: string, depth: string): string {
  return (
    `${width} * ${depth}^2 / 4 - (${width} - 2 * t) * (${depth} - 2 * t)^2 / 4` +
    ` - 4 * ${outer.area} * (${depth} / 2 - ${outer.centroid})` +
    ` + 4 * ${inner.area} * (${depth} / 2 - t - ${inner.centroid})`
  );
}

export const rhsMidLength = formula({
  symbol: 'h_m',
  title: 'Length of the wall’s centre line',
  unit: 'mm',
  clause: ANNEX,
  expression: '2 * (b - t + h - t) - (r_o + r_i) * (4 - pi)',
  where: all(),
});

export const rhsEnclosedArea = formula({
  symbol: 'A_h',
  title: 'Area inside the wall’s centre line',
  unit: 'mm^2',
  clause: ANNEX,
  expression: '(b - t) * (h - t) - ((r_o + r_i) / 2)^2 * (4 - pi)',
  where: all(),
});

export const rhsTorsionConstant = formula({
  symbol: 'I_t',
  title: 'Torsion constant',
  unit: 'mm^4',
  clause: ANNEX,
  expression: 't^3 * h_m / 3 + 4 * A_h^2 * t / h_m',
  where: { t: 'mm', h_m: 'mm', A_h: 'mm^2' },
});

export const rhsTorsionModulus = formula({
  symbol: 'W_t',
  title: 'Torsion modulus',
  unit: 'mm^3',
  clause: ANNEX,
  expression: 'I_t / (t + 2 * A_h / h_m)',
  where: { I_t: 'mm^4', t: 'mm', A_h: 'mm^2', h_m: 'mm' },
});

export const chsArea = formula({
  symbol: 'A',
  title: 'Area',
  unit: 'mm^2',
  clause: ANNEX,
  expression: 'pi * (d^2 - (d - 2 * t)^2) / 4',
  where: lengths('d', 't'),
});

export const chsInertia = formula({
  symbol: 'I_y',
  title: 'Second moment of area',
  unit: 'mm^4',
  clause: ANNEX,
  expression: 'pi * (d^4 - (d - 2 * t)^4) / 64',
  where: lengths('d', 't'),
});

export const chsPlastic = formula({
  symbol: 'W_pl_y',
  title: 'Plastic section modulus',
  unit: 'mm^3',
  clause: ANNEX,
  expression: '(d^3 - (d - 2 * t)^3) / 6',
  where: lengths('d', 't'),
});

/** mm², mm⁴, mm³. */
export interface HollowProperties {
  readonly A: number;
  readonly I_y: number;
  readonly I_z: number;
  readonly W_el_y: number;
  readonly W_el_z: number;
  readonly W_pl_y: number;
  readonly W_pl_z: number;
  readonly I_t: number;
  readonly W_t: number;
}

export function rhsProperties(dimensions: RhsDimensions, sheet: Sheet): HollowProperties {
  const { h, b, t } = dimensions;
  const I_y = sheet.evaluate(rhsInertiaY, dimensions);
  const I_z = sheet.evaluate(rhsInertiaZ, dimensions);
  const h_m = sheet.evaluate(rhsMidLength, dimensions);
  const A_h = sheet.evaluate(rhsEnclosedArea, dimensions);
  const I_t = sheet.evaluate(rhsTorsionConstant, { t, h_m, A_h });
  return {
    A: sheet.evaluate(rhsArea, dimensions),
    I_y,
    I_z,
    W_el_y: sheet.evaluate(elasticModulusY, { I_y, h }),
    W_el_z: sheet.evaluate(elasticModulusZ, { I_z, b }),
    W_pl_y: sheet.evaluate(rhsPlasticY, dimensions),
    W_pl_z: sheet.evaluate(rhsPlasticZ, dimensions),
    I_t,
    W_t: sheet.evaluate(rhsTorsionModulus, { I_t, t, A_h, h_m }),
  };
}

export function chsProperties(dimensions: ChsDimensions, sheet: Sheet): HollowProperties {
  const { d } = dimensions;
  const I_y = sheet.evaluate(chsInertia, dimensions);
  const W_pl_y = sheet.evaluate(chsPlastic, dimensions);
  const W_el_y = sheet.evaluate(elasticModulusY, { I_y, h: d });
  const same = 'By symmetry';
  return {
    A: sheet.evaluate(chsArea, dimensions),
    I_y,
    I_z: sheet.given('I_z', I_y, 'mm^4', 'Second moment of area about z-z', same),
    W_el_y,
    W_el_z: sheet.given('W_el_z', W_el_y, 'mm^3', 'Elastic section modulus about z-z', same),
    W_pl_y,
    W_pl_z: sheet.given('W_pl_z', W_pl_y, 'mm^3', 'Plastic section modulus about z-z', same),
    I_t: sheet.evaluate(polarInertia, { I_y, I_z: I_y }),
    W_t: sheet.evaluate(polarModulus, { W_el_y, W_el_z: W_el_y }),
  };
}

/** Corner radii where none are published: EN 10210-2 and EN 10219-2, nominal for calculation. */
export function cornerRadii(t: number, forming: Forming): { r_o: number; r_i: number } {
  if (forming === 'hot-finished') return { r_o: 1.5 * t, r_i: t };
  if (t <= 6) return { r_o: 2 * t, r_i: t };
  return t <= 10 ? { r_o: 2.5 * t, r_i: 1.5 * t } : { r_o: 3 * t, r_i: 2 * t };
}
