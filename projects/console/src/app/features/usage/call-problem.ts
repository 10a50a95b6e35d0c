import { ChangeDetectionStrategy, Component, inject, input, resource } from '@angular/core';
import { Api, segment } from '../../core/api/api';

interface ProblemKind {
  readonly title: string;
  readonly why: string;
  readonly remedy: string;
}

/** Why a call was refused and what to do, in the words of the problem's own page. */
@Component({
  selector: 'app-call-problem',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="problem">
      @if (kind.hasValue()) {
        <p>
          <b>{{ kind.value().title }}.</b> {{ kind.value().why }}
        </p>
        <p>{{ kind.value().remedy }}</p>
      }
      <p>
        <a [href]="'/problems/' + code()">The page about {{ code() }}</a>
      </p>
    </div>
  `,
})
export class CallProblem {
  private readonly api = inject(Api);
  readonly code = input.required<string>();
  protected readonly kind = resource({
    params: () => this.code(),
    loader: ({ params }) => this.api.get<ProblemKind>(`/problems/${segment(params)}`),
  });
}
