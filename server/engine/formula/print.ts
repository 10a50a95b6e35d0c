import {
  isConstantNode,
  isFunctionNode,
  isOperatorNode,
  isParenthesisNode,
  isSymbolNode,
  type MathNode,
} from 'mathjs/number';
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
  return print(formula.tree, (name) => {
    if (Object.hasOwn(allowedConstants, name)) return name;
    const symbol = name as S;
    const unit = formula.where[symbol];
    const number = toUnit(values[symbol], unit);
    if (unit !== '1') return `(${number} ${unit})`;
    return number < 0 ? `(${number})` : String(number);
  });
}

/** The tree came from text with its brackets kept, so that no new ones are needed. */
function print(node: MathNode, symbol: (name: string) => string): string {
  // A literal gets brackets, so that its units never join what stands beside it.
  if (literalQuantity(node) !== undefined) return `(${node.toString()})`;
  if (isConstantNode(node)) return String(node.value);
  if (isSymbolNode(node)) return symbol(node.name);
  if (isParenthesisNode(node)) return `(${print(node.content, symbol)})`;
  if (isFunctionNode(node)) {
    return `${node.fn.name}(${node.args.map((arg) => print(arg, symbol)).join(', ')})`;
  }
  if (isOperatorNode(node)) {
    const [left, right] = node.args.map((arg) => print(arg, symbol));
    if (right === undefined) return `-${left ?? ''}`;
    return `${left ?? ''} ${node.op} ${right}`;
  }
  throw new Error(`${node.type} has no printed form.`);
}
