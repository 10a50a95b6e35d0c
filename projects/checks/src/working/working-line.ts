import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  ViewEncapsulation,
} from '@angular/core';
import type { Formula, MathElement, Step } from '../contract';
import { Scrolls } from '../look/scrolls';
import { readableQuantity } from '../quantity/format';
import { breakable, marksIn } from './breakable';
import { MathPiece } from './math-line';
import { numberElement, numbersIn, takesNumbers } from './numbers-in';
import { plainText } from './plain-text';
import { symbolElement } from './symbols';

const EQUALS: MathElement = { tag: 'mo', text: '=' };

/** Beyond so many marks a formula is given in pieces, to break on paper and on a telephone. */
const LONG = 60;

/** A formula behind what begins it. */
function begun(
  start: readonly MathElement[],
  formula: MathElement,
): readonly (readonly MathElement[])[] {
  const [first = [], ...others] = marksIn(formula) > LONG ? breakable(formula) : [[formula]];
  return [[...start, ...first], ...others];
}

/** One line of the working: the formula, the formula with its numbers, the value, the clause. */
@Component({
  selector: 'htc-working-line',
  templateUrl: './working-line.html',
  imports: [MathPiece, Scrolls],
  host: { class: 'ht-line' },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class WorkingLine {
  readonly step = input.required<Step>();
  /** The formula behind the line; while it is not there, its text with numbers stands in. */
  readonly formula = input<Formula>();

  /** The pieces of the line, each beginning at its equals sign. */
  protected readonly pieces = computed((): readonly (readonly MathElement[])[] => {
    const step = this.step();
    const value = this.value(step);
    const elements = this.formula()?.elements as MathElement | undefined;
    const [symbol, , expression] = elements?.children ?? [];
    if (!symbol || !expression) return [[symbolElement(step.symbol ?? ''), ...value]];
    const put = takesNumbers(expression) ? begun([EQUALS], numbersIn(expression, step.inputs)) : [];
    return [...begun([symbol, EQUALS], expression), ...put, value];
  });
  /** What stands under the line in words: why a choice was made, or the text of the formula. */
  protected readonly words = computed(() => {
    const { kind, substituted, because = '' } = this.step();
    if (kind === 'choice') return because;
    return kind === 'formula' && !this.formula() ? plainText(substituted) : '';
  });
  /** Every number that was put in, exact. */
  protected readonly exact = computed(() => {
    const step = this.step();
    const inputs = Object.entries(step.inputs).map(
      ([name, { value, unit }]) => `${name} = ${value} ${unit}`,
    );
    return [...inputs, `${step.symbol ?? ''} = ${step.value} ${step.unit}`]
      .join('\n')
      .replace(/ 1$/gm, '');
  });
  protected readonly said = computed(() => {
    const { symbol, value, unit } = this.step();
    const shown = typeof value === 'number' ? readableQuantity({ value, unit }) : value;
    return `${symbol ?? ''} = ${shown}`;
  });

  private value({ value, unit }: Step): MathElement[] {
    const shown =
      typeof value === 'number' ? numberElement({ value, unit }) : { tag: 'mtext', text: value };
    return [EQUALS, shown];
  }
}
