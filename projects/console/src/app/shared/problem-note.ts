import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { problemOf } from '../core/api/problem';

/** Says what went wrong, in the service's own words, with the page that explains it. */
@Component({
  selector: 'app-problem-note',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="problem" role="alert">
      <p>
        <b>{{ problem().title }}.</b> {{ detail() }}
      </p>
      @for (item of problem().errors; track $index) {
        <p class="quiet">{{ item.message }} {{ item.fix }}</p>
      }
      <p class="row">
        @if (retry()) {
          <button type="button" class="link-button" (click)="again.emit()">Try again</button>
        }
        @if (problem().status > 0) {
          <a [href]="'/problems/' + problem().code">What {{ problem().code }} means</a>
        }
        @if (problem().requestId; as id) {
          <span class="quiet">
            Request <code>{{ id }}</code>
          </span>
        }
      </p>
    </div>
  `,
})
export class ProblemNote {
  readonly error = input.required<unknown>();
  readonly retry = input(true);
  readonly again = output();
  /** Nothing where the title has said it already. */
  protected readonly detail = computed(() => {
    const { title, detail } = this.problem();
    return detail === `${title}.` ? '' : detail;
  });
  protected readonly problem = computed(() => {
    const error = this.error();
    // A resource wraps what is not an Error of its own making.
    return problemOf(error instanceof Error && error.cause !== undefined ? error.cause : error);
  });
}
