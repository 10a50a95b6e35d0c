import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** The heading of a page, with a quiet word beside it and its actions at the end. */
@Component({
  selector: 'app-page-head',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h1 tabindex="-1">{{ heading() }}</h1>
    @if (aside()) {
      <p>{{ aside() }}</p>
    }
    <div class="actions no-print"><ng-content /></div>
  `,
  styles: `
    :host {
      display: flex;
      flex-wrap: wrap;
      align-items: baseline;
      gap: 4px 18px;
    }
    h1 {
      overflow-wrap: anywhere;
    }
    p {
      color: var(--quiet);
    }
    .actions {
      display: flex;
      flex-wrap: wrap;
      gap: 8px 12px;
      margin-left: auto;
    }
    .actions:empty {
      display: none;
    }
    @media (max-width: 760px) {
      :host {
        justify-content: space-between;
      }
      .actions {
        margin-left: 0;
      }
      p {
        order: 2;
        width: 100%;
      }
    }
  `,
})
export class PageHead {
  readonly heading = input.required<string>();
  readonly aside = input<string | null>(null);
}
