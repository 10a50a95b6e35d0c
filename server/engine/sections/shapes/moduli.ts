import { formula } from '../../formula/formula';
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
