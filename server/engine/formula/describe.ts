import type { UnitName } from '../units/units';
import { formulaElement, mathmlText, type MathElement } from './mathml';
import { findFormula } from './registry';

/** What `GET /v1/formulas/{id}` answers; the same id always answers the same. */
export interface FormulaDescription {
  readonly id: string;
  readonly symbol: string;
  readonly title: string;
  readonly unit: UnitName;
  readonly clause: string;
  readonly expression: string;
  readonly where: Readonly<Record<string, UnitName>>;
  readonly mathml: string;
  readonly elements: MathElement;
}

export function describeFormula(id: string): FormulaDescription | undefined {
  const found = findFormula(id);
  if (!found) return undefined;
  const { symbol, title, unit, clause, expression, where } = found;
  const elements = formulaElement(found);
  return {
    id,
    symbol,
    title,
    unit,
    clause,
    expression,
    where,
    mathml: mathmlText(elements),
    elements,
  };
}
