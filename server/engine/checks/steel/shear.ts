import type { Sheet } from '../../formula/sheet';
import { epsilonFactor } from '../../steel/classification';
import {
  elasticShearAreas,
  shearAreaY,
  shearAreaYOfRhs,
  shearAreaZ,
  shearAreaZOfChannel,
  shearAreaZOfPlates,
  shearAreaZOfRhs,
  shearBucklingLimit,
  shearResistanceY,
  shearResistanceZ,
  webHeight,
  webHeightToThickness,
} from '../../steel/shear';
import { greatestShear } from '../../stress/shear-flow';
import type { SteelSection } from './section';

export type Direction = 'z' | 'y';

/** mm²; the caller's own where given. */
export function shearArea(section: SteelSection, direction: Direction, sheet: Sheet): number {
  const given = section.shearAreas[direction];
  if (given !== undefined) {
    return sheet.given(`A_v_${direction}`, given, 'mm^2', 'Shear area', 'Given by the caller');
  }
  return direction === 'z' ? areaAlongZ(section, sheet) : areaAlongY(section, sheet);
}

function areaAlongZ(section: SteelSection, sheet: Sheet): number {
  const { shape, eta, properties } = section;
  const { A } = properties;
  switch (shape.shape) {
    case 'I': {
      const { h, b, t_f, t_w, r } = shape;
      const h_w = sheet.evaluate(webHeight, { h, t_f });
      return shape.fabrication === 'welded'
        ? sheet.evaluate(shearAreaZOfPlates, { eta, h_w, t_w })
        : sheet.evaluate(shearAreaZ, { A, b, t_f, t_w, r, eta, h_w });
    }
    case 'channel': {
      const { b, t_f, t_w, r } = shape;
      return sheet.evaluate(shearAreaZOfChannel, { A, b, t_f, t_w, r });
    }
    case 'RHS':
      return sheet.evaluate(shearAreaZOfRhs, { A, h: shape.h, b: shape.b });
    default:
      return areaOfWhole(section, 'z', sheet);
  }
}

function areaAlongY(section: SteelSection, sheet: Sheet): number {
  const { shape, properties } = section;
  switch (shape.shape) {
    case 'I':
    case 'channel':
      return sheet.evaluate(shearAreaY, { b: shape.b, t_f: shape.t_f });
    case 'RHS':
      return sheet.evaluate(shearAreaYOfRhs, { A: properties.A, b: shape.b, h: shape.h });
    default:
      return areaOfWhole(section, 'y', sheet);
  }
}

/** Shapes of which the whole carries shear along either axis. */
function areaOfWhole(section: SteelSection, direction: Direction, sheet: Sheet): number {
  const { shape, properties } = section;
  const { A } = properties;
  const areas = elasticShearAreas[direction];
  if (shape.shape === 'CHS') return sheet.evaluate(areas.tube, { A });
  if (shape.shape === 'rectangle') return sheet.evaluate(areas.rectangle, { A });
  if (shape.shape === 'round') return sheet.evaluate(areas.round, { A });
  if (shape.shape !== 'angle') throw new Error(`${shape.shape} has its own shear area`);
  return sheet.given(
    `A_v_${direction}`,
    1 / greatestShear(shape, section.gross, direction),
    'mm^2',
    'Area over the greatest elastic shear stress of the legs',
    'EN 1993-1-1 6.2.6(4) (6.20)',
  );
}

/** N, by yield of the shear area. */
export function shearResistance(section: SteelSection, direction: Direction, sheet: Sheet): number {
  const { f_y, gamma_M0 } = section;
  return direction === 'z'
    ? sheet.evaluate(shearResistanceZ, { A_v_z: shearArea(section, 'z', sheet), f_y, gamma_M0 })
    : sheet.evaluate(shearResistanceY, { A_v_y: shearArea(section, 'y', sheet), f_y, gamma_M0 });
}

/** The plates that carry shear in a direction and are held at both edges. */
export interface ShearWebs {
  readonly h_w: number;
  readonly t_w: number;
  readonly n_w: number;
}

/** Undefined where no web carries it: flanges of an open section, solids, tubes, angles. */
export function websOf(
  section: SteelSection,
  direction: Direction,
  sheet: Sheet,
): ShearWebs | undefined {
  const { shape } = section;
  if (shape.shape === 'RHS') {
    const h = direction === 'z' ? shape.h : shape.b;
    return { h_w: sheet.evaluate(webHeight, { h, t_f: shape.t }), t_w: shape.t, n_w: 2 };
  }
  if (direction === 'y' || (shape.shape !== 'I' && shape.shape !== 'channel')) return undefined;
  const { h, t_f, t_w } = shape;
  return { h_w: sheet.evaluate(webHeight, { h, t_f }), t_w, n_w: 1 };
}

/** Whether a web is so slender that it buckles in shear before it yields (6.2.6(6)). */
export function buckles(section: SteelSection, webs: ShearWebs, sheet: Sheet): boolean {
  const { f_y, eta } = section;
  const epsilon = sheet.evaluate(epsilonFactor, { f_y });
  const { h_w, t_w } = webs;
  const slenderness = sheet.evaluate(webHeightToThickness, { h_w, t_w });
  return slenderness > sheet.evaluate(shearBucklingLimit, { epsilon, eta });
}
