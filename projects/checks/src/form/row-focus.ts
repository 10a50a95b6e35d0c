import { afterNextRender, ElementRef, inject, Injector } from '@angular/core';

/** Moves the keyboard among the rows of a table that is written in; made where it is injected. */
export class RowFocus {
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  private readonly injector = inject(Injector);

  /** @param rows selector of a row @param first name of the cell where a new row begins */
  constructor(
    private readonly rows: string,
    private readonly first: string,
  ) {}

  /** Goes to something in a row once it is drawn; −1 looks in the whole table. */
  to(index: number, selector: string): void {
    const go = () => {
      const row = index < 0 ? this.host : this.host.querySelectorAll(this.rows)[index];
      row?.querySelector<HTMLElement>(selector)?.focus();
    };
    afterNextRender(go, { injector: this.injector });
  }

  /** Where the keyboard is after a row was taken out. */
  afterRemoval(index: number, left: number): void {
    if (left > 0) this.to(Math.max(0, index - 1), '.ht-load-remove');
    else this.to(-1, '.ht-acts button');
  }

  /** Enter goes to the same field one row down, Shift with it one up; `add` is called at the end. */
  press(event: Event, index: number, count: number, add: () => void): void {
    const { target } = event;
    if (!(event instanceof KeyboardEvent) || !(target instanceof HTMLInputElement)) return;
    event.preventDefault();
    const to = index + (event.shiftKey ? -1 : 1);
    if (to < 0) return;
    if (to >= count) {
      add();
      return;
    }
    const cell = target.closest('[data-cell]')?.getAttribute('data-cell');
    this.to(to, `[data-cell="${cell ?? this.first}"] input`);
  }
}
