import { formula } from '../../formula/formula';
import type { Sheet } from '../../formula/sheet';
import { GEOMETRY, lengths } from './fillet';
import {
  elasticModulusY,
  elasticModulusZ,
  polarInertia,
  polarModulus,
  rectangleTorsion,
} from './moduli';

/** A solid rectangle in mm, h along z-z. */
export interface RectangleDimensions {
  readonly b: number;
  readonly h: number;
}

/** A solid round in mm. */
export interface RoundDimensions {
  readonly d: number;
}

export const rectangleArea = formula({
  symbol: 'A',
  title: 'Area of a rectangle',
  unit: 'mm^2',
  clause: GEOMETRY,
  expression: 'b * h',
  where: lengths('b', 'h'),
});

export const rectangleInertiaY = formula({
  symbol: 'I_y',
  title: 'Second moment of area about y-y',
  unit: 'mm^4',
  clause: GEOMETRY,
  expression: 'b * h^3 / 12',
  where: lengths('b', 'h'),
});

export const rectangleInertiaZ = formula({
  symbol: 'I_z',
  title: 'Second moment of area about z-z',
  unit: 'mm^4',
  clause: GEOMETRY,
  expression: 'h * b^3 / 12',
  where: lengths('b', 'h'),
});

export const rectanglePlasticY = formula({
  symbol: 'W_pl_y',
  title: 'Plastic section modulus about y-y',
  unit: 'mm^3',
  clause: GEOMETRY,
  expression: 'b * h^2 / 4',
  where: lengths('b', 'h'),
});

export const rectanglePlasticZ = formula({
  symbol: 'W_pl_z',
  title: 'Plastic section modulus about z-z',
  unit: 'mm^3',
  clause: GEOMETRY,
  expression: 'h * b^2 / 4',
  where: lengths('b', 'h'),
});

/** The series of St Venant for a rectangle, cut after its strongest term: within 0.5 % of it. */
export const rectangleTorsionConstant = formula({
  symbol: 'I_t',
  title: 'Torsion constant of a rectangle',
  unit: 'mm^4',
  clause: 'Timoshenko and Goodier, torsion of a rectangular bar; from memory, unconfirmed',
  expression: rectangleTorsion('b', 'h'),
  where: lengths('b', 'h'),
});

/** First terms of the same series, at the middle of the longer side: within 0.1 % of it. */
export const rectangleTorsionModulus = formula({
  symbol: 'W_t',
  title: 'Torsion modulus of a rectangle',
  unit: 'mm^3',
  clause: 'Timoshenko and Goodier, torsion of a rectangular bar; from memory, unconfirmed',
  expression:
    'I_t / (min(b, h) * (1 - 16 / pi^2 * exp(-pi * max(b, h) / (2 * min(b, h))) / (1 + exp(-pi * max(b, h) / min(b, h)))))',
  where: { I_t: 'mm^4', ...lengths('b', 'h') },
});

export const roundArea = formula({
  symbol: 'A',
  title: 'Area of a round',
  unit: 'mm^2',
  clause: GEOMETRY,
  expression: 'pi * d^2 / 4',
  where: lengths('d'),
});

export const roundInertia = formula({
  symbol: 'I_y',
  title: 'Second moment of area of a round',
  unit: 'mm^4',
  clause: GEOMETRY,
  expression: 'pi * d^4 / 64',
  where: lengths('d'),
});

export const roundPlastic = formula({
  symbol: 'W_pl_y',
  title: 'Plastic section modulus of a round',
  unit: 'mm^3',
  clause: GEOMETRY,
  expression: 'd^3 / 6',
  where: lengths('d'),
});

/** mm², mm³, mm⁴. */
export interface SolidProperties {
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

export function rectangleProperties({ b, h }: RectangleDimensions, sheet: Sheet): SolidProperties {
  const I_y = sheet.evaluate(rectangleInertiaY, { b, h });
  const I_z = sheet.evaluate(rectangleInertiaZ, { b, h });
  const I_t = sheet.evaluate(rectangleTorsionConstant, { b, h });
  return {
    A: sheet.evaluate(rectangleArea, { b, h }),
    I_y,
    I_z,
    W_el_y: sheet.evaluate(elasticModulusY, { I_y, h }),
    W_el_z: sheet.evaluate(elasticModulusZ, { I_z, b }),
    W_pl_y: sheet.evaluate(rectanglePlasticY, { b, h }),
    W_pl_z: sheet.evaluate(rectanglePlasticZ, { b, h }),
    I_t,
    W_t: sheet.evaluate(rectangleTorsionModulus, { I_t, b, h }),
  };
}

export function roundProperties({ d }: RoundDimensions, sheet: Sheet): SolidProperties {
  const I_y = sheet.evaluate(roundInertia, { d });
  const W_el_y = sheet.evaluate(elasticModulusY, { I_y, h: d });
  const W_pl_y = sheet.evaluate(roundPlastic, { d });
  const same = 'By symmetry';
  return {
    A: sheet.evaluate(roundArea, { d }),
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
