import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  linkedSignal,
  model,
  output,
  ViewEncapsulation,
} from '@angular/core';
import type { ApiClient } from '../api/api-client';
import { ChoiceField } from '../fields/choice-field';
import { TextField } from '../fields/text-field';
import { nextId, type WaiverRow, type WalerDraft } from '../form/draft';
import { MORE } from '../form/waler-fields';
import type { FieldFault } from '../form/field-reader';
import { gradeOptions } from '../form/material';
import { LoadTable } from '../load-table/load-table';
import { SectionPicker } from '../section-picker/section-picker';
import * as options from './form-options';

/** What is asked of a waler, as an engineer writes it. */
@Component({
  selector: 'htc-waler-form',
  templateUrl: './waler-form.html',
  imports: [ChoiceField, LoadTable, SectionPicker, TextField],
  host: { class: 'ht-form' },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class WalerForm {
  /** The form as it is typed. */
  readonly draft = model.required<WalerDraft>();
  /** What is wrong, by the JSON pointer of its field. */
  readonly faults = input.required<ReadonlyMap<string, FieldFault>>();
  /** Where the catalogue is searched. */
  readonly client = input.required<ApiClient>();
  readonly readonly = input(false);
  /** How often the form was filled from outside. */
  readonly round = input(0);

  /** Whether a section is being typed that does not count yet. */
  readonly pending = output<boolean>();

  protected readonly options = options;
  private readonly faultBehind = computed(() =>
    [...this.faults().keys()].some((pointer) => MORE.some((start) => pointer.startsWith(start))),
  );
  /** Open once a field behind it is at fault; the reader may close it. */
  protected readonly moreOpen = linkedSignal<boolean, boolean>({
    source: this.faultBehind,
    computation: (behind, before) => behind || (before?.value ?? false),
  });
  protected readonly grades = computed(() =>
    gradeOptions(this.draft().kept.material, this.draft().grade),
  );
  protected readonly restraints = computed(() => options.restraintOptions(this.draft()));
  /** What the request holds and the form does not show. */
  protected readonly keptWords = computed(() => keptFields(this.draft()));

  protected set(change: Partial<WalerDraft>): void {
    this.draft.update((draft) => ({ ...draft, ...change }));
  }

  protected fault(pointer: string): FieldFault | undefined {
    return this.faults().get(pointer);
  }

  protected ticked(event: Event): boolean {
    return (event.target as HTMLInputElement).checked;
  }

  protected toggled(event: Event): void {
    this.moreOpen.set((event.target as HTMLDetailsElement).open);
  }

  protected addWaiver(): void {
    const taken = this.draft().waivers.map(({ verification }) => verification);
    const free = options.waiverOptions('deflection').find(({ value }) => !taken.includes(value));
    const waiver = { id: nextId(), verification: free?.value ?? 'deflection', reason: '' };
    this.set({ waivers: [...this.draft().waivers, waiver] });
  }

  protected changeWaiver(row: WaiverRow, change: Partial<WaiverRow>): void {
    const waivers = this.draft().waivers.map((one) =>
      one.id === row.id ? { ...one, ...change } : one,
    );
    this.set({ waivers });
  }

  protected removeWaiver(row: WaiverRow): void {
    this.set({ waivers: this.draft().waivers.filter((one) => one.id !== row.id) });
  }
}

const HIDDEN: Readonly<Record<string, string>> = {
  patternLoading: 'pattern loading',
  verticalSupports: 'vertical supports',
  lossOfProp: 'loss of a prop',
  bucklingFactors: 'buckling factors',
  interaction: 'interaction method',
  lateralTorsional: 'lateral torsional method',
};

function keptFields({ kept }: WalerDraft): string {
  const names = Object.keys(kept).map((name) => HIDDEN[name]);
  return names.filter((name) => name !== undefined).join(', ');
}
