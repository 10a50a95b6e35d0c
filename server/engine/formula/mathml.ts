import {
  isConstantNode,
  isFunctionNode,
  isOperatorNode,
  isParenthesisNode,
  isSymbolNode,
  type MathNode,
} from 'mathjs/number';
import type { Formula } from './formula';
import { allowedConstants, literalQuantity } from './parse';
import { symbolElement } from './symbol';

/** An element of MathML as data: clients build it node by node, never from markup. */
export interface MathElement {
  readonly tag: string;
  readonly text?: string;
  readonly children?: readonly MathElement[];
  /** Set where the element stands for a symbol of the formula, so that a number can replace it. */
  readonly symbol?: string;
  readonly attributes?: Readonly<Record<string, string>>;
}

const leaf = (tag: string, text: string): MathElement => ({ tag, text });
const row = (...children: MathElement[]): MathElement => ({ tag: 'mrow', children });
const infix: Readonly<Record<string, string>> = { add: '+', subtract: '−', multiply: '·' };

/** Powers of units as an engineer writes them. */
const raised: Readonly<Record<string, string>> = { '2': '²', '3': '³', '4': '⁴', '6': '⁶' };

/** The left side, an equals sign and the expression. */
export function formulaElement(formula: Formula): MathElement {
  return {
    tag: 'math',
    attributes: { display: 'block' },
    children: [symbolElement(formula.symbol), leaf('mo', '='), element(formula.tree)],
  };
}

function element(node: MathNode): MathElement {
  if (literalQuantity(node) !== undefined) {
    const text = node.toString().replaceAll(' / ', '/');
    return leaf(
      'mn',
      text.replace(/ \^ ([2346])/g, (_, power: string) => raised[power] ?? power),
    );
  }
  if (isConstantNode(node)) return leaf('mn', String(node.value));
  if (isSymbolNode(node)) {
    const shown = symbolElement(node.name);
    return Object.hasOwn(allowedConstants, node.name) ? shown : { ...shown, symbol: node.name };
  }
  if (isParenthesisNode(node)) return row(leaf('mo', '('), element(node.content), leaf('mo', ')'));
  if (isFunctionNode(node)) return functionElement(node.fn.name, node.args);
  if (isOperatorNode(node)) return operatorElement(node.fn, node.args);
  throw new Error(`${node.type} has no MathML.`);
}

/** A fraction bar and a root already group what they hold. */
function bare(node: MathNode | undefined): MathElement {
  if (!node) return row();
  return isParenthesisNode(node) ? element(node.content) : element(node);
}

function functionElement(name: string, args: MathNode[]): MathElement {
  if (name === 'sqrt') return { tag: 'msqrt', children: [bare(args[0])] };
  if (name === 'abs') return row(leaf('mo', '|'), bare(args[0]), leaf('mo', '|'));
  const inside = args.flatMap((arg, index) =>
    index === 0 ? [element(arg)] : [leaf('mo', ','), element(arg)],
  );
  return row(leaf('mi', name === 'log' ? 'ln' : name), leaf('mo', '('), ...inside, leaf('mo', ')'));
}

function operatorElement(fn: string, args: MathNode[]): MathElement {
  const [left, right] = args;
  if (!left) throw new Error(`The operator ${fn} stands alone.`);
  if (!right) return row(leaf('mo', '−'), element(left));
  if (fn === 'divide') return { tag: 'mfrac', children: [bare(left), bare(right)] };
  if (fn === 'pow') return { tag: 'msup', children: [element(left), bare(right)] };
  return row(element(left), leaf('mo', infix[fn] ?? fn), element(right));
}

const escapes: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;' };

/** The same tree as markup, for readers of the API. */
export function mathmlText(node: MathElement): string {
  const attributes = Object.entries(node.attributes ?? {})
    .map(([name, value]) => ` ${name}="${value}"`)
    .join('');
  const namespace = node.tag === 'math' ? ' xmlns="http://www.w3.org/1998/Math/MathML"' : '';
  const content = node.text
    ? node.text.replace(/[&<>]/g, (mark) => escapes[mark] ?? mark)
    : (node.children ?? []).map(mathmlText).join('');
  return `<${node.tag}${namespace}${attributes}>${content}</${node.tag}>`;
}
