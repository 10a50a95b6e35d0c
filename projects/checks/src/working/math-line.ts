import {
  ChangeDetectionStrategy,
  Component,
  computed,
  DOCUMENT,
  effect,
  ElementRef,
  inject,
  input,
  ViewEncapsulation,
} from '@angular/core';
import type { MathElement } from '../contract';
import { marksIn } from './breakable';

const MATHML = 'http://www.w3.org/1998/Math/MathML';
/** What a formula may be made of; anything else is left out. */
const TAGS = new Set([
  'math',
  'mrow',
  'mi',
  'mn',
  'mo',
  'mtext',
  'mfrac',
  'msup',
  'msub',
  'msubsup',
  'msqrt',
  'mroot',
  'mover',
  'munder',
  'munderover',
  'mspace',
  'mtable',
  'mtr',
  'mtd',
  'mstyle',
]);
const ATTRIBUTES = new Set(['mathvariant', 'title', 'stretchy', 'accent', 'fence', 'displaystyle']);

/** Builds MathML node by node, never from markup. */
export function mathNode(document: Document, element: MathElement): Element | null {
  if (!TAGS.has(element.tag)) return null;
  const node = document.createElementNS(MATHML, element.tag);
  for (const [name, value] of Object.entries(element.attributes ?? {})) {
    if (ATTRIBUTES.has(name)) node.setAttribute(name, value);
  }
  if (element.text !== undefined) node.textContent = element.text;
  for (const child of element.children ?? []) {
    const made = mathNode(document, child);
    if (made) node.append(made);
  }
  return node;
}

/** A piece of a formula; pieces in a row break between them, at their equals signs. */
@Component({
  selector: 'htc-math',
  template: '',
  host: {
    class: 'ht-math',
    '[class.ht-math-long]': 'marks() > 70',
    '[class.ht-math-longest]': 'marks() > 120',
  },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class MathPiece {
  /** The elements of the piece, side by side. */
  readonly pieces = input.required<readonly MathElement[]>();

  /** A fraction breaks nowhere: the longer it is, the smaller it is printed. */
  protected readonly marks = computed(() =>
    this.pieces().reduce((sum, piece) => sum + marksIn(piece), 0),
  );

  constructor() {
    const host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
    const document = inject(DOCUMENT);
    effect(() => {
      const children = this.pieces();
      const attributes = { displaystyle: 'true' };
      const math = mathNode(document, { tag: 'math', attributes, children });
      host.replaceChildren(...(math ? [math] : []));
    });
  }
}
