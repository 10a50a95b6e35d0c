import type { Sheet } from '../formula/sheet';
import {
  area,
  plasticModulusY,
  plasticModulusZ,
  secondMomentY,
  secondMomentZ,
  torsionConstantByJunctions,
  torsionConstantOfMills,
  warpingConstantOfFlanges,
  warpingConstantOfSection,
} from './i-section';
import type { SectionProperties } from './properties.types';
import { angleProperties } from './shapes/angle';
import { channelProperties } from './shapes/channel';
import { chsProperties, rhsProperties } from './shapes/hollow';
import {
  elasticModulusY,
  elasticModulusZ,
  torsionConstantOfPlates,
  torsionOfRolled,
} from './shapes/moduli';
import type { IShape, SectionShape } from './shapes/shape';
import { rectangleProperties, roundProperties } from './shapes/solid';
import { taperedChannelProperties, taperedIProperties } from './shapes/tapered';

export type { SectionProperties } from './properties.types';

/** Families whose tables follow the fillet-junction terms; the rest follow the mill catalogues. */
const ukFamilies: ReadonlySet<string> = new Set(['UB', 'UC', 'UBP']);

/** Properties from the dimensions, each by its formula, written to the sheet. */
export function propertiesOf(
  section: SectionShape & { readonly family?: string },
  sheet: Sheet,
): SectionProperties {
  switch (section.shape) {
    case 'I':
      return section.taper
        ? symmetrical(taperedIProperties(section, section.taper, sheet))
        : iProperties(section, section.family, sheet);
    case 'channel':
      return symmetrical(
        section.taper
          ? taperedChannelProperties(section, section.taper, sheet)
          : channelProperties(section, sheet),
      );
    case 'RHS':
      return symmetrical(rhsProperties(section, sheet));
    case 'CHS':
      return symmetrical(chsProperties(section, sheet));
    case 'angle':
      return angleProperties(section, sheet);
    case 'rectangle':
      return symmetrical(rectangleProperties(section, sheet));
    case 'round':
      return symmetrical(roundProperties(section, sheet));
  }
}

/** y-y and z-z are the principal axes. */
function symmetrical<P extends { readonly I_y: number; readonly I_z: number }>(
  properties: P,
): P & Pick<SectionProperties, 'I_yz' | 'I_u' | 'I_v'> {
  const { I_y, I_z } = properties;
  return { ...properties, I_yz: 0, I_u: Math.max(I_y, I_z), I_v: Math.min(I_y, I_z) };
}

function iProperties(section: IShape, family: string | undefined, sheet: Sheet): SectionProperties {
  const { h, b, t_w, t_f, r } = section;
  const dimensions = { h, b, t_w, t_f, r };
  const I_y = sheet.evaluate(secondMomentY, dimensions);
  const I_z = sheet.evaluate(secondMomentZ, dimensions);
  const uk = family !== undefined && ukFamilies.has(family);
  return symmetrical({
    A: sheet.evaluate(area, dimensions),
    I_y,
    I_z,
    W_el_y: sheet.evaluate(elasticModulusY, { I_y, h }),
    W_el_z: sheet.evaluate(elasticModulusZ, { I_z, b }),
    W_pl_y: sheet.evaluate(plasticModulusY, dimensions),
    W_pl_z: sheet.evaluate(plasticModulusZ, dimensions),
    I_t: torsionConstant(section, uk, sheet),
    I_w: uk
      ? sheet.evaluate(warpingConstantOfSection, { I_z, h, t_f })
      : sheet.evaluate(warpingConstantOfFlanges, { t_f, b, h }),
  });
}

function torsionConstant(section: IShape, uk: boolean, sheet: Sheet): number {
  const { h, b, t_w, t_f, r, fabrication } = section;
  if (fabrication === 'welded') return sheet.evaluate(torsionConstantOfPlates, { h, b, t_w, t_f });
  const formula = uk ? torsionConstantByJunctions : torsionConstantOfMills;
  return torsionOfRolled(formula, { h, b, t_w, t_f, r }, sheet);
}
