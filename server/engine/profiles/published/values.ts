import type { ProfileTree, ProfileValue } from '../tree';
import { sources, type SourceKey } from './sources';

type Content = number | string;

/** A value read in a publication. */
export function sourced(
  value: Content,
  clause: string,
  source: SourceKey,
  locator?: string,
): ProfileValue {
  const base = { value, unit: '1', clause, source: sources[source], kind: 'sourced' } as const;
  return locator === undefined ? base : { ...base, locator };
}

/** A value from memory; `confirmedBy` names the published example, read in its source, that uses it. */
export function recalled(value: Content, clause: string, confirmedBy?: string): ProfileValue {
  const base = { value, unit: '1', clause, source: sources.MEM, kind: 'recalled' } as const;
  return confirmedBy === undefined ? base : { ...base, confirmedBy };
}

/** The end of a range that a definition itself sets, taken because it is the safe one. */
export function bound(value: Content, clause: string, note: string): ProfileValue {
  return { value, unit: '1', clause, source: 'Safe end of the range', kind: 'bound', note };
}

const notReduced = 'No value is published for it here; 1.0 is the greatest that psi can be.';

/** psi for an action that no source here reduces. */
export const unreduced: ProfileTree = {
  psi_0: bound(1, 'EN 1990 4.1.3', notReduced),
  psi_1: bound(1, 'EN 1990 4.1.3', notReduced),
  psi_2: bound(1, 'EN 1990 4.1.3', notReduced),
};
