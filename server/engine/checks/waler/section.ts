import type { Sheet } from '../../formula/sheet';
import type { ProfileReader } from '../../profiles/reader';
import type { ShapeOf } from '../../sections/shapes/shape';
import { shearReduction } from '../../steel/bending-shear';
import type { SectionClass } from '../../steel/classification';
import type { MaterialInput, SectionInput } from '../contract';
import { notCovered, refuse } from '../refuse';
import { bendingResistance, bendingWithShear } from '../steel/bending';
import { classOf } from '../steel/classes';
import { readSteelSection, type SteelSection } from '../steel/section';
import { buckles, shearResistance, websOf } from '../steel/shear';

/** An I or H section in bending without axial force. */
export interface WalerSection extends SteelSection {
  readonly shape: ShapeOf<'I'>;
  readonly sectionClass: SectionClass;
}

/** @throws {Refusal} `not-covered` for other shapes, `class-4`, `shear-buckling` */
export function readWalerSection(
  section: SectionInput,
  material: MaterialInput,
  profile: ProfileReader,
  sheet: Sheet,
): WalerSection {
  const read = readSteelSection(section, material, profile, sheet);
  const { shape, name, f_y } = read;
  if (shape.shape !== 'I') {
    return notCovered(
      pointerOf(section),
      `${name} is no I or H section; a waler of another shape`,
      'EN 1993-1-1 6.2',
    );
  }
  const sectionClass = classOf(read, 'y', 0, sheet);
  if (sectionClass === 4) {
    refuse(
      'class-4',
      pointerOf(section),
      `${name} is class 4 in bending at f_y ${f_y} N/mm²; effective sections are not covered by this version of the check.`,
      'EN 1993-1-5 4.4',
    );
  }
  const waler = { ...read, shape, sectionClass };
  refuseSlenderWeb(waler, sheet);
  return waler;
}

function pointerOf(section: SectionInput): string {
  if (typeof section === 'string') return '/section';
  return 'designation' in section ? '/section/designation' : '/section/shape';
}

function refuseSlenderWeb(section: WalerSection, sheet: Sheet): void {
  const webs = websOf(section, 'z', sheet);
  if (!webs || !buckles(section, webs, sheet)) return;
  refuse(
    'shear-buckling',
    '/section',
    `The web of ${section.name} is more slender than 6.2.6(6) allows without a verification of shear buckling, which this version of the check does not make.`,
    'EN 1993-1-5 5',
  );
}

/**
 * Bending resistance about y-y beside a shear force along the web, N mm.
 *
 * @param V_Ed N; up to half of the shear resistance nothing is reduced (6.2.8(2))
 */
export function bendingResistanceWithShear(
  section: WalerSection,
  V_Ed: number,
  sheet: Sheet,
): number {
  const V_pl_Rd = shearResistance(section, 'z', sheet);
  const { sectionClass } = section;
  const M_c_Rd = bendingResistance(section, 'y', sectionClass, sheet);
  if (V_Ed <= 0.5 * V_pl_Rd) return M_c_Rd;
  const rho = sheet.evaluate(shearReduction, { V_Ed, V_Rd: V_pl_Rd });
  return bendingWithShear(section, 'y', sectionClass, { M_c_Rd, rho_z: rho, rho_y: 0 }, sheet);
}
