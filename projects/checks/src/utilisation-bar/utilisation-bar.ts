import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  ViewEncapsulation,
} from '@angular/core';
import type { CheckStatus } from '../contract';

/** Greatest utilisation that the bar shows to scale; beyond, it breaks. */
const SCALE = 1.25;

/** The colour of a bar: that of the whole answer, and grey for all that is neither pass nor fail. */
export type BarTone = 'pass' | 'fail' | 'none';

/**
 * The tone of a bar. Green belongs to a pass of the whole answer alone; in a failing answer red
 * marks what does not hold.
 */
export function barTone(whole: CheckStatus | null, holds: boolean): BarTone {
  if (whole === 'pass') return 'pass';
  return whole === 'fail' && !holds ? 'fail' : 'none';
}

/** A utilisation on a scale to 1.25 with a tick at 1.00; the number always stands beside it. */
@Component({
  selector: 'htc-utilisation-bar',
  template: `<span [style.width.%]="width()"></span>`,
  host: {
    'aria-hidden': 'true',
    '[class]': "'ht-bar ht-bar-' + tone()",
    '[class.ht-bar-small]': 'small()',
    '[class.ht-bar-broken]': 'broken()',
  },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class UtilisationBar {
  /** Effect over resistance; null where the resistance is zero. */
  readonly value = input.required<number | null>();
  readonly tone = input<BarTone>('none');
  readonly small = input(false);

  protected readonly broken = computed(() => (this.value() ?? Infinity) > SCALE);
  protected readonly width = computed(() => {
    const share = Math.min((this.value() ?? SCALE) / SCALE, 1) * 100;
    return Math.round(share * 100) / 100;
  });
}
