import { ElementHarness } from '../../../testing/element-harness';

/** The loads, row by row. */
export class LoadTableHarness extends ElementHarness {
  get rows(): ElementHarness[] {
    const rows = this.host.querySelectorAll('[role="group"][aria-label^="Load "]');
    return Array.from(rows, (row) => new ElementHarness(row));
  }

  row(index: number): ElementHarness {
    const row = this.rows[index];
    if (!row) throw new Error(`There is no row ${index + 1}.`);
    return row;
  }
}
