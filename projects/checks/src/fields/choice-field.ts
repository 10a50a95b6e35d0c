import { ChangeDetectionStrategy, Component, input, model, ViewEncapsulation } from '@angular/core';
import type { FieldFault } from '../form/field-reader';
import { uniqueId } from '../look/unique-id';
import { FaultNote } from './fault-note';

/** One of a few words to choose. */
export interface Option {
  readonly value: string;
  readonly label: string;
}

/** A choice among a few words, with what is wrong beneath. */
@Component({
  selector: 'htc-choice-field',
  templateUrl: './choice-field.html',
  imports: [FaultNote],
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class ChoiceField {
  /** What is chosen. */
  readonly label = input.required<string>();
  /** Whether the label is for those who hear the page only. */
  readonly hushed = input(false);
  readonly options = input.required<readonly Option[]>();
  /** The value of the chosen option. */
  readonly chosen = model('');
  /** Whether the options are words, not symbols. */
  readonly words = input(true);
  readonly readonly = input(false);
  readonly fault = input<FieldFault>();

  protected readonly id = uniqueId();

  protected choose(event: Event): void {
    this.chosen.set((event.target as HTMLSelectElement).value);
  }
}
