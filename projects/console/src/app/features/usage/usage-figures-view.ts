import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { Sparkline } from '../../shared/sparkline';
import { count, percent } from '../../shared/words';
import { milliseconds } from './call';
import type { UsageFigures } from './usage-figures';

/** Three figures of the loaded calls, each with its course over time. */
@Component({
  selector: 'app-usage-figures-view',
  imports: [Sparkline],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <section aria-label="Figures" class="figures">
      <div>
        <h2>Calls</h2>
        <strong>{{ calls() }}</strong>
        <app-sparkline
          [filled]="true"
          [values]="series().calls"
          [label]="'Calls over time, a point for ' + series().step"
        />
      </div>
      <div>
        <h2>Refused</h2>
        <strong>{{ refused() }}</strong>
        <app-sparkline
          tone="fail"
          [values]="series().refused"
          [label]="'Share refused over time, a point for ' + series().step"
        />
      </div>
      <div>
        <h2>Answered within, 99 of 100</h2>
        <strong>{{ within() }}</strong>
        <app-sparkline
          tone="timber"
          [values]="series().within99"
          [label]="'Time to answer, a point for ' + series().step"
        />
      </div>
    </section>
    <p class="scope">{{ scope() }}</p>
  `,
  styleUrl: './usage-figures-view.scss',
})
export class UsageFiguresView {
  readonly figures = input.required<UsageFigures>();
  readonly complete = input.required<boolean>();

  protected readonly series = computed(() => this.figures().series);
  protected readonly calls = computed(() => count(this.figures().calls));
  protected readonly refused = computed(() =>
    percent(this.figures().refused, this.figures().calls),
  );
  protected readonly within = computed(() => {
    const { within99 } = this.figures();
    return within99 === null ? '–' : `${milliseconds(within99)} ms`;
  });
  protected readonly scope = computed(() => {
    const { calls, series } = this.figures();
    const which = this.complete() ? 'every call below' : `the last ${count(calls)} calls`;
    return `Figures are of ${which}; a point of a line is ${series.step}.`;
  });
}
