import { silentSheet } from '../../formula/sheet';
import { refuse } from '../refuse';
import { classOf } from '../steel/classes';
import type { SteelSection } from '../steel/section';
import type { Finding } from '../verification';
import { bendingAxial, bendingShear, biaxial } from './combined';
import type { CrossEffects } from './effects';
import { isRound } from './shear';
import {
  bending,
  compression,
  shear,
  shearBuckling,
  shearTorsion,
  tension,
  torsion,
} from './single';

/** Options of one cross-section. */
export interface CrossOptions {
  /** mm² at holes for fasteners. */
  readonly netArea?: number;
  readonly withSteps: boolean;
}

/** Every verification of EN 1993-1-1 6.2 that the effects at one cross-section ask for. */
export function verifyCrossSection(
  section: SteelSection,
  effects: CrossEffects,
  { netArea, withSteps }: CrossOptions,
): Finding[] {
  const { compression: C, tension: N, M_y, M_z, V_z, V_y, T_t, T_w } = effects;
  const twisted = T_t > 0 || T_w > 0;
  refuseSlenderTube(section, effects);
  return [
    ...(N > 0 ? [tension(section, effects, netArea, withSteps)] : []),
    ...(C > 0 ? [compression(section, effects, withSteps)] : []),
    ...(M_y > 0 ? [bending(section, effects, 'y', withSteps)] : []),
    ...(M_z > 0 ? [bending(section, effects, 'z', withSteps)] : []),
    ...(V_z > 0 ? [shear(section, effects, 'z', withSteps)] : []),
    // Of a round section shear along z-z is the resultant already.
    ...(V_y > 0 && !(isRound(section) && V_z > 0) ? [shear(section, effects, 'y', withSteps)] : []),
    ...shearBuckling(section, effects, withSteps),
    ...(twisted ? [torsion(section, effects, withSteps)] : []),
    ...(twisted ? shearTorsion(section, effects, withSteps) : []),
    ...bendingShear(section, effects, 'y', withSteps),
    ...bendingShear(section, effects, 'z', withSteps),
    ...bendingAxial(section, effects, 'y', withSteps),
    ...bendingAxial(section, effects, 'z', withSteps),
    ...biaxial(section, effects, withSteps),
  ];
}

/** A tube of class 4 is a shell, whatever acts but tension alone. */
function refuseSlenderTube(section: SteelSection, effects: CrossEffects): void {
  const { compression: C, M_y, M_z, V_z, V_y, T_t, T_w, B } = effects;
  const onlyTension = [C, M_y, M_z, V_z, V_y, T_t, T_w, B].every((effect) => effect === 0);
  if (section.shape.shape !== 'CHS' || onlyTension) return;
  if (classOf(section, 'compression', 0, silentSheet) < 4) return;
  refuse(
    'class-4',
    '/section',
    `${section.name} is class 4 at f_y ${section.f_y} N/mm²: a tube so thin is verified as a shell.`,
    'EN 1993-1-6',
  );
}
