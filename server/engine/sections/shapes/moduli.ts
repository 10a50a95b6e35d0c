import { formula, type Formula } from '../../formula/formula';
import type { Sheet } from '../../formula/sheet';
import { GEOMETRY } from './fillet';

/** Of a shape whose edges are as far from the axis: h is its depth across y-y. */
export const elasticModulusY = formula({
  symbol: 'W_el_y',
  title: 'Elastic section modulus about y-y',
  unit: 'mm^3',
  clause: GEOMETRY,
  expression: '2 * I_y / h',
  where: { I_y: 'mm^4', h: 'mm' },
});

/** Of a shape whose edges are as far from the axis: b is its width across z-z. */
export const elasticModulusZ = formula({
  symbol: 'W_el_z',
  title: 'Elastic section modulus about z-z',
  unit: 'mm^3',
  clause: GEOMETRY,
  expression: '2 * I_z / b',
  where: { I_z: 'mm^4', b: 'mm' },
});

/** Of a round section, hollow or solid. */
export const polarInertia = formula({
  symbol: 'I_t',
  title: 'Torsion constant',
  unit: 'mm^4',
  clause: GEOMETRY,
  expression: 'I_y + I_z',
  where: { I_y: 'mm^4', I_z: 'mm^4' },
});

/** Of a round section, hollow or solid. */
export const polarModulus = formula({
  symbol: 'W_t',
  title: 'Torsion modulus',
  unit: 'mm^3',
  clause: GEOMETRY,
  expression: 'W_el_y + W_el_z',
  where: { W_el_y: 'mm^3', W_el_z: 'mm^3' },
});

/** Text of the torsion constant of a rectangle: St Venant's series, cut after its strongest term. */
export function rectangleTorsion(one: string, other: string): string {
  const long = `max(${one}, ${other})`;
  const short = `min(${one}, ${other})`;
  return `${long} * ${short}^3 * (1 / 3 - 0.21 * ${short} / ${long} * (1 - ${short}^4 / (12 * ${long}^4)))`;
}

/** Two flanges and a web apart from each other: what junctions add is left out. */
export const torsionConstantOfPlates = formula({
  symbol: 'I_t',
  title: 'St Venant torsion constant of the plates',
  unit: 'mm^4',
  clause: 'Timoshenko and Goodier, torsion of rectangular bars; from memory, unconfirmed',
  expression: `2 * ${rectangleTorsion('b', 't_f')} + ${rectangleTorsion('(h - 2 * t_f)', 't_w')}`,
  where: { h: 'mm', b: 'mm', t_w: 'mm', t_f: 'mm' },
});

/** Dimensions of a rolled I section or channel in mm. */
interface Rolled {
  readonly h: number;
  readonly b: number;
  readonly t_w: number;
  readonly t_f: number;
  readonly r: number;
}

/**
 * The terms of flange-web junctions are fits: beyond the proportions of rolled sections they run away,
 * below nothing too. There, and wherever they give less, the plates alone count.
 */
export function torsionOfRolled(
  junctions: Formula<'h' | 'b' | 't_w' | 't_f' | 'r'>,
  { h, b, t_w, t_f, r }: Rolled,
  sheet: Sheet,
): number {
  const plates = torsionConstantOfPlates.compute({ h, b, t_w, t_f });
  const fits = r <= 3 * t_f && t_w <= 1.2 * t_f && b >= 2 * t_f;
  return fits && junctions.compute({ h, b, t_w, t_f, r }) >= plates
    ? sheet.evaluate(junctions, { h, b, t_w, t_f, r })
    : sheet.evaluate(torsionConstantOfPlates, { h, b, t_w, t_f });
}
