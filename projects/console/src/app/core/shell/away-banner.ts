import { ChangeDetectionStrategy, Component, effect, inject, signal } from '@angular/core';
import { Connection } from '../api/connection';

/** Says that the service does not answer, and that it does again. */
@Component({
  selector: 'app-away-banner',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div role="status">
      @if (connection.away()) {
        <p class="away">
          <b>The service does not answer.</b> What you see may be old, and nothing can be changed
          now. The page asks again every few seconds.
          <button type="button" class="link-button" (click)="connection.ask()">Ask now</button>
        </p>
      } @else if (back()) {
        <p class="back">The service answers again.</p>
      }
    </div>
  `,
  styles: `
    p {
      padding: 9px var(--gutter);
      border-bottom: 1px solid var(--rule);
    }
    .away {
      background: var(--wash);
      box-shadow: inset 3px 0 var(--warn);
    }
    .back {
      color: var(--quiet);
    }
    @media (max-width: 760px) {
      p {
        padding-inline: 16px;
      }
    }
    @media print {
      :host {
        display: none;
      }
    }
  `,
})
export class AwayBanner {
  protected readonly connection = inject(Connection);
  protected readonly back = signal(false);

  constructor() {
    effect((onCleanup) => {
      if (this.connection.returns() === 0) return;
      this.back.set(true);
      const timer = setTimeout(() => this.back.set(false), 6_000);
      onCleanup(() => clearTimeout(timer));
    });
  }
}
