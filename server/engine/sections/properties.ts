import type { Sheet } from '../formula/sheet';
import type { CatalogueEntry } from './catalogue';
import {
  area,
  elasticModulusY,
  elasticModulusZ,
  plasticModulusY,
  plasticModulusZ,
  secondMomentY,
  secondMomentZ,
  torsionConstantByJunctions,
  torsionConstantOfMills,
  warpingConstantOfFlanges,
  warpingConstantOfSection,
} from './i-section';

/** Properties of one member, in mm, mm², mm³, mm⁴, mm⁶. */
export interface SectionProperties {
  readonly A: number;
  readonly I_y: number;
  readonly I_z: number;
  readonly W_el_y: number;
  readonly W_el_z: number;
  readonly W_pl_y: number;
  readonly W_pl_z: number;
  readonly I_t: number;
  readonly I_w: number;
}

/** Families whose tables follow the fillet-junction terms; the rest follow the mill catalogues. */
const ukFamilies: ReadonlySet<string> = new Set(['UB', 'UC', 'UBP']);

/** Properties from the dimensions, each by its formula, written to the sheet. */
export function propertiesOf(entry: CatalogueEntry, sheet: Sheet): SectionProperties {
  const { h, b, t_w, t_f, r } = entry;
  const dimensions = { h, b, t_w, t_f, r };
  const I_y = sheet.evaluate(secondMomentY, dimensions);
  const I_z = sheet.evaluate(secondMomentZ, dimensions);
  const uk = ukFamilies.has(entry.family);
  return {
    A: sheet.evaluate(area, dimensions),
    I_y,
    I_z,
    W_el_y: sheet.evaluate(elasticModulusY, { I_y, h }),
    W_el_z: sheet.evaluate(elasticModulusZ, { I_z, b }),
    W_pl_y: sheet.evaluate(plasticModulusY, dimensions),
    W_pl_z: sheet.evaluate(plasticModulusZ, dimensions),
    I_t: sheet.evaluate(uk ? torsionConstantByJunctions : torsionConstantOfMills, dimensions),
    I_w: uk
      ? sheet.evaluate(warpingConstantOfSection, { I_z, h, t_f })
      : sheet.evaluate(warpingConstantOfFlanges, { t_f, b, h }),
  };
}
