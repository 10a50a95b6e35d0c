import { TestBed } from '@angular/core/testing';
import { emptyRow, type LoadRow } from '../form/draft';
import type { FieldFault } from '../form/field-reader';
import { LoadTable } from './load-table';
import { LoadTableHarness } from './testing/load-table-harness';

const row = (change: Partial<LoadRow>): LoadRow => ({ ...emptyRow(), ...change });

function table(rows: readonly LoadRow[], faults: FieldFault[] = [], readonly = false) {
  const fixture = TestBed.createComponent(LoadTable);
  fixture.componentRef.setInput('rows', rows);
  fixture.componentRef.setInput('faults', new Map(faults.map((one) => [one.pointer, one])));
  fixture.componentRef.setInput('readonly', readonly);
  document.body.append(fixture.nativeElement as Element);
  fixture.detectChanges();
  const harness = new LoadTableHarness(fixture.nativeElement as Element);
  const enter = async (field: Element) => {
    field.dispatchEvent(new KeyboardEvent('keydown', { key: 'Enter', bubbles: true }));
    fixture.detectChanges();
    await fixture.whenStable();
  };
  return { fixture, harness, enter, rows: () => fixture.componentInstance.rows() };
}

describe('the load table', () => {
  const earth = row({ name: 'earth', value: '95' });
  const crane = row({ name: 'crane', nature: 'variable', shape: 'point', value: '40', at: '1.5' });

  it('asks for the category of a variable load and for the place of a point load only', () => {
    const { harness } = table([earth, crane]);
    expect(() => harness.row(0).field('Category')).toThrow();
    expect(() => harness.row(0).field('Place')).toThrow();
    expect(harness.row(1).field('Place').value).toBe('1.5');
    expect(harness.row(1).text).toContain('kN');
  });

  it('goes down with Enter, and writes a new row after the last', async () => {
    const { harness, enter, rows } = table([earth, crane]);
    await enter(harness.row(0).field('Value'));
    expect(document.activeElement).toBe(harness.row(1).field('Value'));
    await enter(harness.row(1).field('Value'));
    expect(rows()).toHaveLength(3);
    expect(document.activeElement).toBe(harness.row(2).field('Name of the load'));
  });

  it('removes a row and leaves the keyboard at its neighbour', async () => {
    const { fixture, harness, rows } = table([earth, crane]);
    harness.press('Remove crane');
    fixture.detectChanges();
    await fixture.whenStable();
    expect(rows()).toEqual([earth]);
    expect(document.activeElement?.getAttribute('aria-label')).toBe('Remove earth');
  });

  it('keeps two changes of one moment', () => {
    const { harness, rows } = table([earth]);
    harness.row(0).write('Name of the load', 'water');
    harness.row(0).write('Value', '60');
    expect(rows()[0]).toMatchObject({ name: 'water', value: '60' });
  });

  it('shows what is wrong beside its cell, its row or under the table', () => {
    const { harness } = table(
      [earth],
      [
        { pointer: '/loads/0/value', message: 'Too large.' },
        { pointer: '/loads/0', message: 'No such shape.' },
        { pointer: '/loads', message: 'Too many.' },
      ],
    );
    expect(harness.row(0).fault('Value')).toBe('Too large.');
    expect(harness.row(0).text).toContain('No such shape.');
    expect(harness.text).toContain('Too many.');
  });

  it('can be read without being changed', () => {
    const { harness } = table([earth], [], true);
    expect((harness.row(0).field('Value') as HTMLInputElement).readOnly).toBe(true);
    expect(() => harness.press('Add load')).toThrow();
  });
});
