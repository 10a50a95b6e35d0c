import { silentSheet } from '../../engine/formula/sheet';
import type { CatalogueEntry } from '../../engine/sections/catalogue';
import { propertiesOf } from '../../engine/sections/properties';
import { quantity } from '../../engine/units/units';

const sqrtOf = (over: number, under: number): number => Math.sqrt(over / under);

/** A section of the catalogue as the API gives it; each name as a request would write it. */
export function toSection(entry: CatalogueEntry) {
  const { designation, family, source, mass, h, b, t_w, t_f, r } = entry;
  const { A, I_y, I_z, W_el_y, W_el_z, W_pl_y, W_pl_z, I_t, I_w } = propertiesOf(
    entry,
    silentSheet,
  );
  return {
    designation,
    family,
    shape: 'I' as const,
    fabrication: 'rolled' as const,
    source,
    mass: mass === null ? null : { value: mass, unit: 'kg/m' as const },
    dimensions: {
      h: quantity(h, 'mm'),
      b: quantity(b, 'mm'),
      tw: quantity(t_w, 'mm'),
      tf: quantity(t_f, 'mm'),
      r: quantity(r, 'mm'),
    },
    properties: {
      A: quantity(A, 'mm^2'),
      Iy: quantity(I_y, 'mm^4'),
      Iz: quantity(I_z, 'mm^4'),
      Wely: quantity(W_el_y, 'mm^3'),
      Welz: quantity(W_el_z, 'mm^3'),
      Wply: quantity(W_pl_y, 'mm^3'),
      Wplz: quantity(W_pl_z, 'mm^3'),
      iy: quantity(sqrtOf(I_y, A), 'mm'),
      iz: quantity(sqrtOf(I_z, A), 'mm'),
      It: quantity(I_t, 'mm^4'),
      Iw: quantity(I_w, 'mm^6'),
    },
  };
}
