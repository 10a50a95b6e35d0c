import type { MathElement } from '../contract';

const SIGNS = new Set(['+', '−']);

/** A row, and what begins it where that is a row itself, side by side; brackets stay whole. */
function terms({ tag, children = [] }: MathElement): readonly MathElement[] | null {
  if (tag !== 'mrow' || children[0]?.text === '(') return null;
  const [first, ...others] = children;
  return first ? [...(terms(first) ?? [first]), ...others] : [];
}

/**
 * A formula in pieces that a line may break between: MathML itself breaks nowhere. Each piece but
 * the first begins with its sign.
 */
export function breakable(element: MathElement): readonly (readonly MathElement[])[] {
  const pieces: MathElement[][] = [[]];
  for (const child of terms(element) ?? [element]) {
    const begins = child.tag === 'mo' && SIGNS.has(child.text ?? '') && pieces.at(-1)?.length;
    if (begins) pieces.push([]);
    pieces.at(-1)?.push(child);
  }
  return pieces;
}

/** How many marks stand in a formula, as a measure of its width. */
export function marksIn({ text = '', children = [] }: MathElement): number {
  return text.length + children.reduce((sum, child) => sum + marksIn(child), 0);
}
