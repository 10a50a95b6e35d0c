import {
  isConstantNode,
  isFunctionNode,
  isOperatorNode,
  isParenthesisNode,
  isSymbolNode,
  parse,
  type MathNode,
} from 'mathjs/number';
import { unitScale, type UnitName } from '../units/units';

/** Functions a formula may use: the same name and meaning in mathjs and in the compiled line. */
export const allowedFunctions = new Set([
  'sqrt',
  'min',
  'max',
  'abs',
  'sin',
  'cos',
  'tan',
  'exp',
  'log',
]);
const allowedOperators = new Set(['add', 'subtract', 'multiply', 'divide', 'pow', 'unaryMinus']);

/** Constants known by name. */
export const allowedConstants: Readonly<Record<string, number>> = { pi: Math.PI };

/** Units that may follow a number inside an expression. */
const literalUnits = new Set<string>(['mm', 'm', 'N', 'kN', 'K', 'deg'] satisfies UnitName[]);

/**
 * The value of a number with a unit (`150 mm`, `235 N/mm^2`) in the engine's own units, or
 * undefined where the node is none.
 */
export function literalQuantity(node: MathNode): number | undefined {
  if (isOperatorNode(node) && node.fn === 'multiply' && node.implicit) {
    const [number, unit] = node.args as [MathNode, MathNode];
    const scale = unitPower(unit);
    if (scale === undefined) return undefined;
    if (isConstantNode(number)) return number.value * scale;
    const base = literalQuantity(number);
    return base === undefined ? undefined : base * scale;
  }
  if (isOperatorNode(node) && node.fn === 'divide') {
    const [quantity, unit] = node.args as [MathNode, MathNode];
    const base = literalQuantity(quantity);
    const scale = unitPower(unit);
    return base === undefined || scale === undefined ? undefined : base / scale;
  }
  return undefined;
}

function unitPower(node: MathNode): number | undefined {
  if (isSymbolNode(node)) {
    return literalUnits.has(node.name) ? unitScale[node.name as UnitName] : undefined;
  }
  if (isOperatorNode(node) && node.fn === 'pow') {
    const [unit, power] = node.args as [MathNode, MathNode];
    const scale = unitPower(unit);
    if (scale === undefined || !isConstantNode(power)) return undefined;
    return scale ** power.value;
  }
  return undefined;
}

/**
 * Reads an expression of this repository and refuses all that mathjs would silently understand
 * otherwise: an undeclared `E` is 2.718 to it, `h` a unit, and `h / 2 t` is h/(2 t).
 */
export function parseExpression(expression: string, declared: ReadonlySet<string>): MathNode {
  for (const symbol of declared) {
    if (literalUnits.has(symbol) || Object.hasOwn(allowedConstants, symbol)) {
      throw new Error(`In "${expression}": ${symbol} has a meaning already.`);
    }
  }
  const tree = parse(expression);
  const used = new Set<string>();
  check(tree, expression, declared, used);
  for (const symbol of declared) {
    if (!used.has(symbol)) throw new Error(`In "${expression}": ${symbol} is declared, not used.`);
  }
  return tree;
}

function check(
  node: MathNode,
  expression: string,
  declared: ReadonlySet<string>,
  used: Set<string>,
): void {
  const refuse = (what: string): never => {
    throw new Error(`In "${expression}": ${what}.`);
  };
  if (literalQuantity(node) !== undefined) return;
  if (isSymbolNode(node)) {
    if (Object.hasOwn(allowedConstants, node.name)) return;
    if (!declared.has(node.name)) refuse(`${node.name} is not declared`);
    used.add(node.name);
    return;
  }
  if (isConstantNode(node)) {
    if (typeof node.value !== 'number') refuse(`${String(node.value)} is not a number`);
    return;
  }
  if (isOperatorNode(node)) {
    if (!allowedOperators.has(node.fn)) refuse(`the operator ${node.op} is not allowed`);
    if (node.implicit) refuse('a product without a sign is for units only');
  } else if (isFunctionNode(node)) {
    if (!allowedFunctions.has(node.fn.name)) refuse(`${node.fn.name}() is not allowed`);
  } else if (!isParenthesisNode(node)) {
    refuse(`${node.type} is not allowed`);
  }
  const children = isParenthesisNode(node) ? [node.content] : (node as { args?: MathNode[] }).args;
  for (const child of children ?? []) check(child, expression, declared, used);
}
