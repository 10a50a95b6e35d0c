import { ChangeDetectionStrategy, Component, input } from '@angular/core';

/** Words, not a wheel; shown only when the answer takes its time. */
@Component({
  selector: 'app-loading',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<p class="say quiet" role="status">Reading {{ what() }}…</p>`,
  styles: `
    p {
      animation: appear 0.1s linear 0.35s both;
    }
    @keyframes appear {
      from {
        visibility: hidden;
      }
    }
  `,
})
export class Loading {
  readonly what = input.required<string>();
}
