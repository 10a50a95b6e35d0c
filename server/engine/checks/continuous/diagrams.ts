import type { BeamState } from '../../analysis/beam-state';
import { deflectionEnvelope, forceEnvelope, type EnvelopePoint } from '../../analysis/envelope';
import { toUnit, type UnitName } from '../../units/units';
import type { Diagrams } from '../contract';
import type { SolvedCase } from './solve';

/** Envelopes for one member that carries `share` of the set. */
export function diagramsOf(solved: readonly SolvedCase[], share: number): Diagrams {
  const states = (service: boolean): BeamState[] =>
    solved
      .filter(({ combination }) => (combination.situation === 'serviceability') === service)
      .flatMap(({ state }) => (state ? [state] : []));
  const strength = forceEnvelope(states(false));
  const points = (list: readonly EnvelopePoint[], unit: UnitName, factor: number) =>
    list.map(({ span, x, min, max }) => ({
      span,
      x: toUnit(x, 'm'),
      min: toUnit(min * factor, unit),
      max: toUnit(max * factor, unit),
    }));
  return {
    moment: points(strength.moment, 'kN m', share),
    shear: points(strength.shear, 'kN', share),
    deflection: points(deflectionEnvelope(states(true)), 'mm', 1),
  };
}
