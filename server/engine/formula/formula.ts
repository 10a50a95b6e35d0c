import type { MathNode } from 'mathjs/number';
import type { UnitName } from '../units/units';
import { compileNode } from './compile';
import { parseExpression } from './parse';
import { register } from './registry';

/** What its author writes: one line of a clause. */
export interface FormulaDefinition<Symbols extends string> {
  /** The Eurocode's symbol, subscripts joined by `_`, commas dropped. */
  readonly symbol: string;
  readonly title: string;
  readonly unit: UnitName;
  readonly clause: string;
  /** mathjs syntax; empirical constants carry their unit: `min((150 mm / h)^0.2, 1.3)`. */
  readonly expression: string;
  /** Every symbol of the expression with the unit its number is printed in. */
  readonly where: Readonly<Record<Symbols, UnitName>>;
}

/** A formula that is ready: read, checked and compiled once at start-up. */
export interface Formula<Symbols extends string = string> extends FormulaDefinition<Symbols> {
  /** Follows from the content, so that what an id shows never changes. */
  readonly id: string;
  readonly tree: MathNode;
  /** Over numbers in the engine's own units (N, mm, rad, K). */
  compute(values: Readonly<Record<Symbols, number>>): number;
}

/**
 * Declares a formula: the one line from which the number, the printed working, the MathML and the
 * proof of its dimensions all come.
 *
 * @throws {Error} at start-up on a symbol that is neither declared nor a unit straight after a
 *   number, on an unused declaration, and on any operator or function that is not allowed.
 */
export function formula<Symbols extends string>(
  definition: FormulaDefinition<Symbols>,
): Formula<Symbols> {
  const tree = parseExpression(definition.expression, new Set(Object.keys(definition.where)));
  const made: Formula<Symbols> = {
    ...definition,
    id: `${definition.symbol}-${contentHash(definition)}`,
    tree,
    compute: compileNode(tree),
  };
  register(made);
  return made;
}

/** FNV-1a, 32 bit, over what an engineer would see: enough to tell a few hundred lines apart. */
function contentHash(definition: FormulaDefinition<string>): string {
  const { symbol, title, unit, clause, expression, where } = definition;
  const text = JSON.stringify([symbol, title, unit, clause, expression, Object.entries(where)]);
  let hash = 0x811c9dc5;
  for (const character of text) {
    hash = Math.imul(hash ^ (character.codePointAt(0) ?? 0), 0x01000193);
  }
  return (hash >>> 0).toString(16).padStart(8, '0');
}
