import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  model,
  output,
  ViewEncapsulation,
} from '@angular/core';
import type { ApiClient } from '../api/api-client';
import type { SectionLine } from '../contract';
import { ChoiceField } from '../fields/choice-field';
import { TextField } from '../fields/text-field';
import type { FieldFault } from '../form/field-reader';
import { gradeOptions, type AnyMaterial } from '../form/material';
import { SectionPicker } from '../section-picker/section-picker';
import { sizesFrom, type SectionDraft } from './section-draft';
import {
  choiceOf,
  dimensionFields,
  sectionWays,
  type DimensionName,
  type SectionWay,
} from './section-shapes';

/** A section by its designation or by its dimensions, and the steel that it is of. */
@Component({
  selector: 'htc-section-fields',
  templateUrl: './section-fields.html',
  imports: [ChoiceField, SectionPicker, TextField],
  host: { class: 'ht-form' },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class SectionFields {
  /** The section as it is typed. */
  readonly draft = model.required<SectionDraft>();
  /** The grade of the steel. */
  readonly grade = model('');
  /** The material that came from outside. */
  readonly material = input<AnyMaterial>();
  /** What is wrong, by the JSON pointer of its field. */
  readonly faults = input.required<ReadonlyMap<string, FieldFault>>();
  /** Where the catalogue is searched. */
  readonly client = input.required<ApiClient>();
  /** What the catalogue holds of the designation; its dimensions are begun from. */
  readonly line = input<SectionLine | null>(null);
  readonly readonly = input(false);
  /** How often the form was filled from outside. */
  readonly round = input(0);

  /** Whether a designation is being typed that does not count yet. */
  readonly pending = output<boolean>();

  protected readonly ways = sectionWays;
  protected readonly grades = computed(() => gradeOptions(this.material(), this.grade()));
  protected readonly fields = computed(() => dimensionFields(this.draft().way));

  protected choose(value: string): void {
    const way = value as SectionWay;
    const line = this.draft().way === 'designation' ? this.line() : null;
    const shape = choiceOf(way)?.shape;
    const alike = line && (line.shape === shape || (line.shape === 'RHS' && shape === 'SHS'));
    this.set({ way, ...(alike && { sizes: { ...this.draft().sizes, ...sizesFrom(line) } }) });
    this.pending.emit(false);
  }

  protected size(name: DimensionName, text: string): void {
    this.set({ sizes: { ...this.draft().sizes, [name]: text } });
  }

  protected set(change: Partial<SectionDraft>): void {
    this.draft.update((draft) => ({ ...draft, ...change }));
  }
}
