import {
  ChangeDetectionStrategy,
  Component,
  input,
  output,
  ViewEncapsulation,
} from '@angular/core';
import type { FieldFault } from '../form/field-reader';

/** What is wrong with a field, and the ways to read it where there are two. */
@Component({
  selector: 'htc-fault-note',
  template: `
    @if (fault(); as wrong) {
      <span class="ht-fault">
        <span [id]="noteId()">{{ wrong.message }}{{ wrong.fix ? ' ' + wrong.fix : '' }}</span>
        @if (wrong.choices; as choices) {
          <span class="ht-fault-choices">
            @for (choice of choices; track choice.text) {
              <button type="button" (click)="chosen.emit(choice.text)">{{ choice.label }}</button>
            }
          </span>
        }
      </span>
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class FaultNote {
  /** What is wrong; nothing shows without it. */
  readonly fault = input<FieldFault>();
  /** Id of the text, for the field's `aria-describedby`. */
  readonly noteId = input.required<string>();
  /** The text of the reading that was chosen. */
  readonly chosen = output<string>();
}
