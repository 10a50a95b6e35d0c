import type { WorkingSheet } from '../formula/sheet';
import { quantity, toUnit, type UnitName } from '../units/units';
import type { VerificationAnswer, VerificationId } from './contract';

/** One side of a criterion in the engine's own units, with the unit to show it in. */
export interface CriterionSide {
  readonly symbol: string;
  readonly value: number;
  readonly unit: UnitName;
}

/** A criterion at the place where it governs, with its working. */
export interface Finding {
  readonly id: VerificationId;
  readonly title: string;
  readonly clause: string;
  readonly effect: CriterionSide;
  readonly resistance: CriterionSide;
  readonly combination: string | null;
  /** x in mm from the first support; null where the whole member is meant. */
  readonly place: { readonly span: number; readonly x: number } | null;
  readonly sheet: WorkingSheet;
  /** Named point of the section or state of stress where it governs. */
  readonly point?: string;
  /** Why there is no utilisation. */
  readonly reason?: string;
}

/** The criterion as the answer has it: it holds if and only if the ratio is at most 1. */
export function verificationAnswer(
  finding: Finding,
  supports: ArrayLike<number>,
): VerificationAnswer {
  const { id, title, clause, effect, resistance, combination, place, sheet } = finding;
  const utilisation = utilisationOf(finding);
  const reason =
    finding.reason ??
    (utilisation === null
      ? `${resistance.symbol} is zero: what else acts leaves nothing for it.`
      : undefined);
  const base: VerificationAnswer = {
    id,
    title,
    clause,
    effect: { symbol: effect.symbol, ...quantity(effect.value, effect.unit) },
    resistance: { symbol: resistance.symbol, ...quantity(resistance.value, resistance.unit) },
    utilisation,
    status: utilisation !== null && utilisation <= 1 ? 'pass' : 'fail',
    combination,
    at: place && placeAnswer(place, supports),
    values: sheet.values,
  };
  const { point } = finding;
  const placed = point === undefined ? base : { ...base, point };
  return reason === undefined ? placed : { ...placed, reason };
}

function utilisationOf({ effect, resistance, reason }: Finding): number | null {
  if (reason !== undefined || !(resistance.value > 0)) return null;
  const utilisation = effect.value / resistance.value;
  if (!(utilisation >= 0))
    throw new Error(`${effect.symbol} over ${resistance.symbol} is no utilisation`);
  return utilisation;
}

/** A place this near (mm) to a support is at it. */
const AT_SUPPORT = 1e-6;

function placeAnswer(
  { span, x }: { span: number; x: number },
  supports: ArrayLike<number>,
): NonNullable<VerificationAnswer['at']> {
  const support = Array.from(supports).findIndex((at) => Math.abs(at - x) < AT_SUPPORT);
  const place = { span, x: toUnit(x, 'm') };
  return support === -1 ? place : { ...place, support: support + 1 };
}
