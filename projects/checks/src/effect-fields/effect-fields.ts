import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  model,
  ViewEncapsulation,
} from '@angular/core';
import { ChoiceField, type Option } from '../fields/choice-field';
import { TextField } from '../fields/text-field';
import type { FieldFault } from '../form/field-reader';
import { effectUnits, showsParts, type EffectsDraft } from './effects-draft';

type Name = keyof EffectsDraft['texts'];

const FIELDS: readonly { readonly name: Name; readonly label: string }[] = [
  { name: 'My', label: 'My, about y-y' },
  { name: 'Mz', label: 'Mz, about z-z' },
  { name: 'Vz', label: 'Vz, along z' },
  { name: 'Vy', label: 'Vy, along y' },
  { name: 'T', label: 'T, torsion' },
];

const PARTS: typeof FIELDS = [
  { name: 'stVenant', label: 'of T, St Venant' },
  { name: 'warping', label: 'of T, warping' },
  { name: 'bimoment', label: 'B, bimoment' },
];

/** Design effects that act together at one cross-section. */
@Component({
  selector: 'htc-effect-fields',
  templateUrl: './effect-fields.html',
  imports: [ChoiceField, TextField],
  host: { class: 'ht-form', role: 'group', 'aria-label': 'Design effects' },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class EffectFields {
  /** The effects as they are typed. */
  readonly draft = model.required<EffectsDraft>();
  /** What is wrong, by the JSON pointer of its field. */
  readonly faults = input.required<ReadonlyMap<string, FieldFault>>();
  /** Whether the section is an open one, on which torsion has parts. */
  readonly isOpen = input(true);
  readonly readonly = input(false);

  protected readonly units = effectUnits;
  protected readonly axials: readonly Option[] = [
    { value: 'compression', label: 'compression' },
    { value: 'tension', label: 'tension' },
  ];
  protected readonly shown = computed(() =>
    showsParts(this.draft(), this.isOpen()) ? [...FIELDS, ...PARTS] : FIELDS,
  );

  protected set(change: Partial<EffectsDraft>): void {
    this.draft.update((draft) => ({ ...draft, ...change }));
  }

  protected write(name: Name, text: string): void {
    this.set({ texts: { ...this.draft().texts, [name]: text } });
  }
}
