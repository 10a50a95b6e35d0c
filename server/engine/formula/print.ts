import { isSymbolNode, type MathNode } from 'mathjs';
import { toUnit } from '../units/units';
import type { Formula } from './formula';
import { allowedConstants, literalQuantity } from './parse';

/**
 * The formula with its numbers put in, in mathjs syntax with units: any parser of that syntax
 * evaluates it to the value that the engine gives.
 *
 * @param values in the engine's own units
 * @example "(1224000 mm^3) * (265 N/mm^2) / 1"
 */
export function substituted<S extends string>(
  formula: Formula<S>,
  values: Readonly<Record<S, number>>,
): string {
  const handler = (node: MathNode): string | undefined => {
    if (!isSymbolNode(node)) {
      // A literal keeps its brackets, so that its units never join what stands beside it.
      return literalQuantity(node) === undefined ? undefined : `(${node.toString()})`;
    }
    if (Object.hasOwn(allowedConstants, node.name)) return node.name;
    const symbol = node.name as S;
    const unit = formula.where[symbol];
    const number = toUnit(values[symbol], unit);
    if (unit === '1') return number < 0 ? `(${number})` : String(number);
    return `(${number} ${unit})`;
  };
  return formula.tree.toString({ parenthesis: 'keep', handler });
}
