import type { MathElement } from '../contract';
import { readable } from '../quantity/format';
import { unitText } from '../quantity/units';

/** A number with its unit. */
export interface Put {
  readonly value: number;
  readonly unit: string;
}

const row = (...children: MathElement[]): MathElement => ({ tag: 'mrow', children });
const mark = (text: string): MathElement => ({ tag: 'mo', text });

/** A number rounded for reading, its unit beside it, the exact number on hover. */
export function numberElement({ value, unit }: Put): MathElement {
  const number = {
    tag: 'mn',
    text: readable(value),
    attributes: { title: `${value} ${unit}`.replace(/ 1$/, '') },
  };
  const name = unitText(unit);
  return name === '' ? number : row(number, { tag: 'mtext', text: `\u00a0${name}` });
}

/** Whether any symbol in it can take a number. */
export function takesNumbers(element: MathElement): boolean {
  return element.symbol !== undefined || (element.children ?? []).some(takesNumbers);
}

/**
 * The same formula with a number in the place of each symbol. A number that a power or a sign
 * stands beside gets brackets.
 */
export function numbersIn(
  element: MathElement,
  inputs: Readonly<Record<string, Put>>,
  bracket: 'always' | 'negative' | 'never' = 'never',
): MathElement {
  const put = element.symbol === undefined ? undefined : inputs[element.symbol];
  if (put) {
    const number = numberElement(put);
    const composed = put.value < 0 || number.tag === 'mrow';
    const needed = bracket === 'always' ? composed : bracket === 'negative' && put.value < 0;
    return needed ? row(mark('('), number, mark(')')) : number;
  }
  if (!element.children) return element;
  const children = element.children.map((child, index) => {
    if (element.tag === 'msup' && index === 0) return numbersIn(child, inputs, 'always');
    if (element.tag !== 'mrow') return numbersIn(child, inputs, 'never');
    // What begins a group has before it what the group has.
    const first = bracket === 'always' ? 'never' : bracket;
    return numbersIn(child, inputs, index === 0 ? first : 'negative');
  });
  return { ...element, children };
}
