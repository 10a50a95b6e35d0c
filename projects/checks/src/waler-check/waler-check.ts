import {
  booleanAttribute,
  ChangeDetectionStrategy,
  Component,
  input,
  output,
  ViewEncapsulation,
} from '@angular/core';
import type { ApiError } from '../api/api-error';
import type { Credentials } from '../api/api-client';
import type { CheckAnswer, WalerRequest } from '../contract';

/** A waler's check: what is asked, its drawing, the answer and the working on one sheet. */
@Component({
  selector: 'htc-waler',
  templateUrl: './waler-check.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class WalerCheck {
  /** The request as JSON, numbers with a decimal point; null for an empty form. */
  readonly value = input<WalerRequest | null>(null);
  /** A page key (`htp_…`). A secret key is refused before anything is sent. */
  readonly apiKey = input('');
  /** Base address of the service; '' for the page's own origin. */
  readonly server = input('');
  /** The factor profile where the request names none, such as `uk-na` or `uk-na@2`. */
  readonly profile = input('');
  /** What is checked, in the words of the drawing: "north face, level 2". */
  readonly label = input('');
  /** Whether calls carry the page key or the console's own session. */
  readonly credentials = input<Credentials>('key');
  /** Whether the fields can only be read. */
  readonly readonly = input(false, { transform: booleanAttribute });

  /** The request after each change that can be read. */
  readonly valueChange = output<WalerRequest>();
  /** Each new answer. */
  readonly result = output<CheckAnswer>();
  /** Why there is no answer. */
  readonly failed = output<ApiError>();

  /** Checks at once; undefined where there is nothing that can be sent, or no answer. */
  check(): Promise<CheckAnswer | undefined> {
    return Promise.resolve(undefined);
  }

  /** Puts the form back to the value that was last set from outside. */
  reset(): void {
    return;
  }
}
