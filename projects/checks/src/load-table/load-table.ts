import { NgTemplateOutlet } from '@angular/common';
import { ChangeDetectionStrategy, Component, input, model, ViewEncapsulation } from '@angular/core';
import { ChoiceField } from '../fields/choice-field';
import { TextField } from '../fields/text-field';
import { emptyRow, rowPointer, type LoadRow } from '../form/draft';
import type { FieldFault } from '../form/field-reader';
import { shapeUnit } from '../form/read-rows';
import { RowFocus } from '../form/row-focus';
import { categoryOptions, natures, shapes } from './load-words';

/** The loads, one a row; Enter goes down, and on the last row writes a new one. */
@Component({
  selector: 'htc-load-table',
  templateUrl: './load-table.html',
  imports: [ChoiceField, NgTemplateOutlet, TextField],
  host: { class: 'ht-loads', role: 'group', 'aria-label': 'Loads' },
  changeDetection: ChangeDetectionStrategy.OnPush,
  encapsulation: ViewEncapsulation.None,
})
export class LoadTable {
  /** The loads as they are typed. */
  readonly rows = model.required<readonly LoadRow[]>();
  /** What is wrong, by JSON pointer. */
  readonly faults = input.required<ReadonlyMap<string, FieldFault>>();
  readonly readonly = input(false);

  private readonly keyboard = new RowFocus('.ht-load', 'name');
  protected readonly natures = natures;
  protected readonly shapes = shapes;
  protected readonly shapeUnit = shapeUnit;
  protected readonly categoryOptions = categoryOptions;

  /** Writes an empty row and goes to it. */
  add(): void {
    const rows = [...this.rows(), emptyRow()];
    this.rows.set(rows);
    this.keyboard.to(rows.length - 1, 'input');
  }

  protected remove(row: LoadRow): void {
    const index = this.rows().indexOf(row);
    this.rows.set(this.rows().filter((one) => one.id !== row.id));
    this.keyboard.afterRemoval(index, this.rows().length);
  }

  protected change(row: LoadRow, change: Partial<LoadRow>): void {
    this.rows.set(this.rows().map((one) => (one.id === row.id ? { ...one, ...change } : one)));
  }

  protected fault(row: LoadRow, field: string): FieldFault | undefined {
    const pointer = rowPointer(this.rows(), row);
    return this.faults().get(field === '' ? pointer : `${pointer}/${field}`);
  }

  protected pointer(row: LoadRow): string {
    return rowPointer(this.rows(), row);
  }

  /** Enter goes to the same field one row down, Shift with it one up. */
  protected press(event: Event, index: number): void {
    this.keyboard.press(event, index, this.rows().length, () => {
      if (!this.readonly()) this.add();
    });
  }
}
