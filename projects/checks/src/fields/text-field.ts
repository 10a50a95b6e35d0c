import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  model,
  ViewEncapsulation,
} from '@angular/core';
import type { FieldFault } from '../form/field-reader';
import { uniqueId } from '../look/unique-id';
import { unitText } from '../quantity/units';
import { FaultNote } from './fault-note';

/** A line to write on, its unit at the end and what is wrong beneath. */
@Component({
  selector: 'htc-text-field',
  templateUrl: './text-field.html',
  imports: [FaultNote],
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class TextField {
  /** What the field is for. */
  readonly label = input.required<string>();
  /** Whether the label is for those who hear the page only. */
  readonly hushed = input(false);
  /** The text as it is typed. */
  readonly text = model('');
  /** Unit that a bare number is read in. */
  readonly unit = input('');
  readonly placeholder = input('');
  /** Whether words are written, not numbers. */
  readonly words = input(false);
  readonly readonly = input(false);
  readonly fault = input<FieldFault>();

  protected readonly id = uniqueId();
  protected readonly shownUnit = computed(() => unitText(this.unit()));

  protected type(event: Event): void {
    this.text.set((event.target as HTMLInputElement).value);
  }
}
