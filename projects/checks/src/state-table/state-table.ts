import {
  ChangeDetectionStrategy,
  Component,
  computed,
  input,
  model,
  ViewEncapsulation,
} from '@angular/core';
import { TextField } from '../fields/text-field';
import type { FieldFault } from '../form/field-reader';
import { RowFocus } from '../form/row-focus';
import {
  stateNumbers,
  statePointer,
  stateRow,
  type StateRow,
  type StressComponent,
} from './states-draft';

/** States of stress, one a row; Enter goes down, and on the last row writes a new one. */
@Component({
  selector: 'htc-state-table',
  templateUrl: './state-table.html',
  imports: [TextField],
  host: { class: 'ht-loads', role: 'group', 'aria-label': 'States of stress' },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class StateTable {
  /** The states as they are typed. */
  readonly rows = model.required<readonly StateRow[]>();
  /** What is wrong, by JSON pointer. */
  readonly faults = input.required<ReadonlyMap<string, FieldFault>>();
  readonly readonly = input(false);

  protected readonly numbers = computed(() => stateNumbers(this.rows()));
  private readonly keyboard = new RowFocus('.ht-state', 'sigmaX');
  protected readonly heads = [
    { symbol: 'σ', index: 'x', words: 'along' },
    { symbol: 'σ', index: 'z', words: 'across' },
    { symbol: 'τ', index: '', words: 'shear' },
  ] as const;
  protected readonly fields: readonly {
    readonly name: StressComponent;
    readonly label: string;
    readonly placeholder: string;
  }[] = [
    { name: 'sigmaX', label: 'Stress along the member', placeholder: '0' },
    { name: 'sigmaZ', label: 'Stress across the member', placeholder: '0' },
    { name: 'tau', label: 'Shear stress', placeholder: '0' },
  ];

  /** Writes an empty row and goes to it. */
  add(): void {
    const rows = [...this.rows(), stateRow()];
    this.rows.set(rows);
    this.keyboard.to(rows.length - 1, 'input');
  }

  protected remove(row: StateRow): void {
    const index = this.rows().indexOf(row);
    this.rows.set(this.rows().filter((one) => one.id !== row.id));
    this.keyboard.afterRemoval(index, this.rows().length);
  }

  protected change(row: StateRow, name: StressComponent, text: string): void {
    this.rows.set(this.rows().map((one) => (one.id === row.id ? { ...one, [name]: text } : one)));
  }

  protected fault(row: StateRow, field: string): FieldFault | undefined {
    const pointer = statePointer(this.rows(), row);
    return this.faults().get(field === '' ? pointer : `${pointer}/${field}`);
  }

  protected press(event: Event, index: number): void {
    this.keyboard.press(event, index, this.rows().length, () => {
      if (!this.readonly()) this.add();
    });
  }
}
