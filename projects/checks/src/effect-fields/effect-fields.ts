import { NgTemplateOutlet } from '@angular/common';
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

const LABELS: Readonly<Record<Name, string>> = {
  My: 'My, about y-y',
  Mz: 'Mz, about z-z',
  Vz: 'Vz, along z',
  Vy: 'Vy, along y',
  T: 'T, torsion',
  stVenant: 'T, St Venant part',
  warping: 'T, warping part',
  bimoment: 'B, bimoment',
};

/** Design effects that act together at one cross-section. */
@Component({
  selector: 'htc-effect-fields',
  templateUrl: './effect-fields.html',
  imports: [ChoiceField, NgTemplateOutlet, TextField],
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

  protected readonly axials: readonly Option[] = [
    { value: 'compression', label: 'compression' },
    { value: 'tension', label: 'tension' },
  ];
  protected readonly torsion = computed((): readonly Name[] =>
    showsParts(this.draft(), this.isOpen()) ? ['T', 'stVenant', 'warping', 'bimoment'] : ['T'],
  );

  protected fieldsOf(names: readonly Name[]) {
    return names.map((name) => ({ name, label: LABELS[name], unit: effectUnits[name] }));
  }

  protected set(change: Partial<EffectsDraft>): void {
    this.draft.update((draft) => ({ ...draft, ...change }));
  }

  protected write(name: Name, text: string): void {
    this.set({ texts: { ...this.draft().texts, [name]: text } });
  }
}
