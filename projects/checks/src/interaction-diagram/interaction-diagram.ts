import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  ViewEncapsulation,
} from '@angular/core';
import { capital, verificationName } from '../answer/words';
import type { InteractionCurve, Verification } from '../contract';
import { elementWidth } from '../look/element-width';
import { readableQuantity } from '../quantity/format';
import { unitText } from '../quantity/units';
import { isInside, layoutInteraction } from './layout-interaction';

type Axis = InteractionCurve['x'];

/** What two effects may be together, and what acts. */
@Component({
  selector: 'htc-interaction-diagram',
  templateUrl: './interaction-diagram.html',
  host: { class: 'ht-figure' },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class InteractionDiagram {
  readonly curve = input.required<InteractionCurve>();
  /** The verifications of the answer: the curve's own says whether what acts is within it. */
  readonly verifications = input<readonly Verification[]>([]);

  protected readonly width = elementWidth();
  protected readonly layout = computed(() => layoutInteraction(this.curve(), this.width() || 340));
  private readonly verification = computed(() =>
    this.verifications().find(({ id }) => id === this.curve().verification),
  );
  protected readonly title = computed(
    () => this.verification()?.title ?? capital(verificationName(this.curve().verification)),
  );
  protected readonly verdict = computed(() => {
    const made = this.verification();
    const holds = made ? made.status === 'pass' : isInside(this.curve());
    return holds ? 'what acts is inside the curve' : 'what acts is outside the curve';
  });
  protected readonly text = computed(() => {
    const { x, y, point, curve } = this.curve();
    const put = (axis: Axis, value: number): string =>
      `${plain(axis.symbol)} ${readableQuantity({ value: Math.abs(value), unit: axis.unit })}`;
    const alone = (axis: Axis, of: 'x' | 'y'): string =>
      put(axis, Math.max(0, ...curve.map((one) => one[of])));
    return (
      `${this.title()}: ${this.verdict()}. Acts: ${put(x, point.x)} with ${put(y, point.y)}. ` +
      `At most ${alone(x, 'x')}, ${alone(y, 'y')}.`
    );
  });

  /** A symbol with its subscript and its unit, as pieces of one line. */
  protected axis({ symbol, unit }: Axis) {
    const [head = symbol, ...rest] = symbol.split('_');
    return [
      { text: head, drop: 0, small: false },
      { text: rest.join(','), drop: 4, small: true },
      { text: `, ${unitText(unit)}`, drop: -4, small: false },
    ];
  }
}

const plain = (symbol: string): string => symbol.replace('_', ' ').replaceAll('_', ',');
