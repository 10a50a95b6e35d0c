import {
  ChangeDetectionStrategy,
  Component,
  input,
  output,
  ViewEncapsulation,
} from '@angular/core';
import type { ApiClient } from '../api/api-client';
import { EffectFields } from '../effect-fields/effect-fields';
import type { FieldFault } from '../form/field-reader';
import type { AnyMaterial } from '../form/material';
import { SectionFields } from '../section-fields/section-fields';
import type { DrawnSection } from '../section-figures/drawn-section';
import type { UnderEffects } from './under-effects';

/** What is asked of a section under design effects; more fields may stand beside the shear. */
@Component({
  selector: 'htc-section-form',
  templateUrl: './section-form.html',
  imports: [EffectFields, SectionFields],
  host: { class: 'ht-form' },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class SectionForm {
  /** The form as it is typed. */
  readonly draft = input.required<UnderEffects>();
  /** The material that came from outside. */
  readonly material = input<AnyMaterial>();
  /** What is wrong, by the JSON pointer of its field. */
  readonly faults = input.required<ReadonlyMap<string, FieldFault>>();
  /** Where the catalogue is searched. */
  readonly client = input.required<ApiClient>();
  /** The section as it is drawn: what the catalogue holds of it, and whether it is open. */
  readonly drawn = input.required<DrawnSection>();
  readonly readonly = input(false);
  /** How often the form was filled from outside. */
  readonly round = input(0);

  /** What was changed. */
  readonly changed = output<Partial<UnderEffects>>();
  /** Whether a designation is being typed that does not count yet. */
  readonly pending = output<boolean>();
}
