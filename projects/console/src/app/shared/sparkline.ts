import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { sparkPath } from './spark-path';

/** A line without axes; the words beside it say what it is. A gap is a stretch without calls. */
@Component({
  selector: 'app-sparkline',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <svg
      viewBox="0 0 300 64"
      preserveAspectRatio="none"
      role="img"
      focusable="false"
      [attr.aria-label]="label()"
    >
      @if (path().area; as area) {
        @if (filled()) {
          <path class="area" [attr.d]="area" />
        }
      }
      <path class="line" [attr.d]="path().line" vector-effect="non-scaling-stroke" />
    </svg>
  `,
  styles: `
    :host {
      display: block;
      color: var(--galvanised);
    }
    :host(.fail) {
      color: var(--fail);
    }
    :host(.timber) {
      color: var(--timber);
    }
    svg {
      display: block;
      width: 100%;
      height: 64px;
      overflow: visible;
    }
    .area {
      fill: currentColor;
      opacity: 0.2;
    }
    .line {
      fill: none;
      stroke: currentColor;
      stroke-width: 1.5;
      stroke-linejoin: round;
      stroke-linecap: round;
    }
  `,
  host: { '[class]': 'tone()' },
})
export class Sparkline {
  /** Oldest first; null where there is nothing to show. */
  readonly values = input.required<readonly (number | null)[]>();
  readonly label = input.required<string>();
  readonly tone = input<'galvanised' | 'fail' | 'timber'>('galvanised');
  readonly filled = input(false);

  protected readonly path = computed(() => sparkPath(this.values(), 300, 64));
}
