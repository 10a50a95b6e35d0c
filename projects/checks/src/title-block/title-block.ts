import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  ViewEncapsulation,
} from '@angular/core';
import type { CheckAnswer } from '../contract';
import { Scrolls } from '../look/scrolls';
import { valueText } from '../answer/words';

/** What the answer stands on, as the title block of a drawing; departures and open values beneath. */
@Component({
  selector: 'htc-title-block',
  templateUrl: './title-block.html',
  imports: [Scrolls],
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class TitleBlock {
  readonly answer = input.required<CheckAnswer>();
  /** When the revision was approved, where that is known. */
  readonly approvedAt = input<string | null>(null);

  protected readonly valueText = valueText;
  protected readonly profile = computed(() => this.answer().profile);
  protected readonly departures = computed(() => {
    const ids = this.profile().departures.map(({ id }) => id);
    return ids.length > 0 ? ids.join(', ') : 'none';
  });
  protected readonly standing = computed(() => {
    const { status, standing } = this.profile();
    const at = this.approvedAt();
    const date = at && status === 'approved' ? new Date(at) : null;
    const approved = date
      ? date.toLocaleDateString('en-GB', { day: 'numeric', month: 'short', year: 'numeric' })
      : status;
    return standing === 'in-effect' || standing === status
      ? approved
      : `${approved}, ${standing.replaceAll('-', ' ')}`;
  });
}
