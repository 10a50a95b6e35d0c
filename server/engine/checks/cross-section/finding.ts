import { WorkingSheet, type Sheet } from '../../formula/sheet';
import type { UnitName } from '../../units/units';
import type { VerificationId } from '../contract';
import type { CriterionSide, Finding } from '../verification';
import type { Sum } from './interaction';

/** Both sides of a criterion, and why there is no utilisation where there is none. */
export interface Sides {
  readonly effect: CriterionSide;
  readonly resistance: CriterionSide;
  readonly reason?: string;
}

/** What a criterion is called and where it stands. */
export interface Heading {
  readonly title: string;
  readonly clause: string;
}

/** Writes one criterion on a sheet of its own. */
export function finding(
  id: VerificationId,
  { title, clause }: Heading,
  withSteps: boolean,
  write: (sheet: Sheet) => Sides,
): Finding {
  const sheet = new WorkingSheet(id, withSteps);
  return { id, title, clause, ...write(sheet), combination: null, place: null, sheet };
}

export const side = (symbol: string, value: number, unit: UnitName): CriterionSide => ({
  symbol,
  value,
  unit,
});

/** A sum of ratios against 1; without a sum where something that acts has no resistance. */
export function sumSides({ value, zero }: Sum): Sides {
  const sides = {
    effect: side('utilisation', value, '1'),
    resistance: side('limit', zero === undefined ? 1 : 0, '1'),
  };
  return zero === undefined
    ? sides
    : { ...sides, reason: `${zero} is zero: what else acts leaves nothing for it.` };
}
