import { silentSheet } from '../../formula/sheet';
import { sectionPlane } from '../../stress/plane';
import {
  namedStresses,
  stressAt,
  stressShapeOf,
  type ElasticEffects,
  type NamedStress,
} from '../../stress/elastic-stress';
import type { CheckAnswer, MissingItem } from '../contract';
import { classFor } from '../cross-section/resistances';
import { stVenantStress, warpingShearStress } from '../cross-section/torsion';
import type { SteelSection } from '../steel/section';
import { sizes, type SignedEffects } from './effects';

/** What stress is made from at one cross-section. */
export function elasticEffects(section: SteelSection, effects: SignedEffects): ElasticEffects {
  const { compression, tension, M_y, M_z, V_z, V_y, T_t, B } = effects;
  const { I_w } = section.properties;
  return {
    N: tension - compression,
    M_y,
    M_z,
    V_z,
    V_y,
    tau_t: Math.sign(T_t) * stVenantStress(section, sizes(effects), silentSheet),
    tau_w: warpingShearStress(section, sizes(effects), silentSheet),
    warpingPerOmega: B === 0 || I_w === undefined ? 0 : B / I_w,
  };
}

export function stressesOf(section: SteelSection, effects: SignedEffects): NamedStress[] {
  const { shape, gross, properties } = section;
  return namedStresses(
    shape,
    gross,
    sectionPlane(shape, gross, properties),
    elasticEffects(section, effects),
  );
}

/** Named points as the answer has them. */
export function pointsOf(stresses: readonly NamedStress[]): NonNullable<CheckAnswer['points']> {
  return stresses.map(({ station: { id, title, y, z }, sigma, tau, sigma_v }) => ({
    id,
    title,
    y,
    z,
    sigma,
    tau,
    sigma_v,
  }));
}

/** How stress runs along each wall, for a drawing. */
export function wallsOf(
  section: SteelSection,
  effects: SignedEffects,
): NonNullable<CheckAnswer['walls']> {
  const { shape, gross, properties } = section;
  const plane = sectionPlane(shape, gross, properties);
  const elastic = elasticEffects(section, effects);
  return stressShapeOf(shape, gross).walls.map(({ id, title, t, stations }) => ({
    id,
    title,
    t,
    points: stations.map((station) => {
      const { sigma, tau } = stressAt(station, shape, plane, elastic);
      return { y: station.y, z: station.z, sigma, tau };
    }),
  }));
}

/** Stress on the whole of a section that buckles locally says nothing (6.2.1(4)). */
export function grossStressMissing(section: SteelSection, effects: SignedEffects): MissingItem[] {
  const { compression, M_y, M_z, B } = effects;
  const axes = [...(M_y !== 0 ? (['y'] as const) : []), ...(M_z !== 0 ? (['z'] as const) : [])];
  if (compression === 0 && axes.length === 0 && B === 0) return [];
  const asked = axes.length > 0 && B === 0 ? axes : (['y', 'z'] as const);
  if (classFor(section, sizes(effects), asked, silentSheet) < 4) return [];
  return [
    {
      pointer: '/section',
      verification: 'von-mises',
      reason: `${section.name} is class 4: the stress of its effective section is greater, and is not made. The check "section" verifies its resistances.`,
      clause: 'EN 1993-1-1 6.2.1(4)',
    },
  ];
}
