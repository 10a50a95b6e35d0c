import { ChangeDetectionStrategy, Component } from '@angular/core';

/** A headtree on its prop, with two braces. */
@Component({
  selector: 'app-mark',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <svg viewBox="0 0 22 22" width="22" height="22" aria-hidden="true" focusable="false">
      <path class="head" d="M1 2.5h20v4.7H1z" />
      <path class="prop" d="M9 7.2h4V21H9z" />
      <path class="prop" d="M3.2 7.2 9 13v-3.6L6.9 7.2zM18.8 7.2 13 13v-3.6l2.1-2.2z" />
    </svg>
    <span>Headtree</span>
  `,
  styles: `
    :host {
      display: inline-flex;
      gap: 10px;
      align-items: center;
      font-weight: 600;
      font-size: 16px;
      color: var(--ink);
    }
    .head {
      fill: var(--timber);
    }
    .prop {
      fill: currentColor;
    }
  `,
})
export class Mark {}
