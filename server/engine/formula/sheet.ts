import type { components } from '../../../openapi/generated/types';
import { Refusal } from '../refusal';
import { quantity, toUnit, type Quantity, type UnitName } from '../units/units';
import type { Formula } from './formula';
import { substituted } from './print';

type VerificationId = components['schemas']['VerificationId'];

/** A line of the working: a formula with numbers put in, a given value, or a choice that was made. */
export interface Step {
  /** Id of the formula; null for a choice or a given value. */
  readonly formula: string | null;
  readonly kind: 'formula' | 'given' | 'choice';
  /** Null for what depends on section, material and profile only. */
  readonly verification: VerificationId | null;
  readonly symbol: string;
  readonly title: string;
  readonly substituted: string;
  /** Of a choice: why, in words with the numbers that decided. */
  readonly because?: string;
  readonly inputs: Readonly<Record<string, Quantity>>;
  readonly value: number | string;
  readonly unit: UnitName;
  readonly clause: string;
}

/** A decision between clauses, curves or classes, with the clause it stands on. */
export interface Choice {
  readonly symbol: string;
  readonly title: string;
  /** Why, in words with the numbers that decided. */
  readonly because: string;
  readonly value: number | string;
  readonly clause: string;
}

/** Where calculation writes itself down. The silent sheet writes nothing and costs nothing. */
export interface Sheet {
  /**
   * The formula's number in the engine's own units.
   *
   * @throws {Refusal} `not-computable` where it is not finite: NaN never travels on.
   */
  evaluate<S extends string>(formula: Formula<S>, values: Readonly<Record<S, number>>): number;
  /** A value that enters from a table, the profile or the caller. */
  given(symbol: string, value: number, unit: UnitName, title: string, clause: string): number;
  choose(choice: () => Choice): void;
}

function computed<S extends string>(
  formula: Formula<S>,
  values: Readonly<Record<S, number>>,
): number {
  const result = formula.compute(values);
  if (!Number.isFinite(result)) {
    const detail = `${formula.symbol} (${formula.clause}) has no finite value for these inputs.`;
    throw new Refusal('not-computable', detail, [
      { pointer: '', code: 'not-computable', message: detail, clause: formula.clause },
    ]);
  }
  return result;
}

export const silentSheet: Sheet = {
  evaluate: computed,
  given: (_symbol, value) => value,
  choose: () => undefined,
};

/** Keeps each symbol's value, and each line too when someone will read the working. */
export class WorkingSheet implements Sheet {
  readonly values: Record<string, Quantity> = {};
  readonly steps: Step[] = [];

  constructor(
    private readonly verification: VerificationId | null,
    private readonly withSteps: boolean,
  ) {}

  evaluate<S extends string>(formula: Formula<S>, values: Readonly<Record<S, number>>): number {
    const result = computed(formula, values);
    const { id, symbol, title, unit, clause } = formula;
    this.values[symbol] = quantity(result, unit);
    if (this.withSteps) {
      this.steps.push({
        kind: 'formula',
        formula: id,
        verification: this.verification,
        symbol,
        title,
        substituted: substituted(formula, values),
        inputs: inputsOf(formula, values),
        value: toUnit(result, unit),
        unit,
        clause,
      });
    }
    return result;
  }

  given(symbol: string, value: number, unit: UnitName, title: string, clause: string): number {
    const shown = quantity(value, unit);
    this.values[symbol] = shown;
    this.write({
      kind: 'given',
      symbol,
      title,
      substituted: unit === '1' ? String(shown.value) : `${shown.value} ${unit}`,
      value: shown.value,
      unit,
      clause,
    });
    return value;
  }

  choose(make: () => Choice): void {
    const { symbol, title, because, value, clause } = make();
    if (typeof value === 'number') this.values[symbol] = quantity(value, '1');
    const substituted = typeof value === 'number' ? String(value) : JSON.stringify(value);
    this.write({ kind: 'choice', symbol, title, substituted, because, value, unit: '1', clause });
  }

  /** A line that no formula stands behind. */
  private write(line: Omit<Step, 'formula' | 'verification' | 'inputs'>): void {
    if (!this.withSteps) return;
    this.steps.push({ formula: null, verification: this.verification, inputs: {}, ...line });
  }
}

function inputsOf<S extends string>(
  formula: Formula<S>,
  values: Readonly<Record<S, number>>,
): Record<string, Quantity> {
  const inputs: Record<string, Quantity> = {};
  for (const [symbol, unit] of Object.entries<UnitName>(formula.where)) {
    inputs[symbol] = quantity(values[symbol as S], unit);
  }
  return inputs;
}
