import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { Choices } from '../../core/choices/choices';
import { capital, count, counted, percent } from '../../shared/words';
import type { UsageFigures } from './usage-figures';

/** What matters about the calls, said in one or two sentences. */
@Component({
  selector: 'app-usage-sentence',
  imports: [RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <p class="say">
      @if (figures().calls === 0) {
        No call {{ narrowed() ? 'fits the filters' : 'was made' }} in the {{ period() }}.
      } @else {
        {{ opening().before }}<b>{{ calls() }}</b
        >{{ opening().after }}
        @if (figures().refused === 0) {
          None was refused.
        } @else {
          <b>{{ refused() }}</b> {{ figures().refused === 1 ? 'was' : 'were' }} refused
          @if (figures().commonest; as commonest) {
            <ng-container>, {{ share() }} </ng-container>
            <a [href]="'/problems/' + commonest.code">{{ commonest.code }}</a>
            @if (commonest.clientId; as id) {
              from
              <a routerLink="/usage" queryParamsHandling="merge" [queryParams]="{ client: id }">{{
                choices.clientName(id)
              }}</a>
            }
          }
          <ng-container>.</ng-container>
        }
      }
    </p>
  `,
})
export class UsageSentence {
  protected readonly choices = inject(Choices);

  readonly figures = input.required<UsageFigures>();
  /** Whether every call of the period is loaded. */
  readonly complete = input.required<boolean>();
  readonly narrowed = input.required<boolean>();
  readonly period = input.required<string>();

  protected readonly calls = computed(() => {
    const { calls } = this.figures();
    return `${count(calls)} ${calls === 1 ? 'call' : 'calls'}`;
  });
  protected readonly refused = computed(() =>
    percent(this.figures().refused, this.figures().calls),
  );
  protected readonly opening = computed(() => {
    const { clients } = this.figures();
    const who = capital(counted(clients, 'client'));
    if (!this.complete())
      return { before: 'Of the last ', after: `, made by ${counted(clients, 'client')},` };
    const when = this.period() === 'all there is' ? '' : ` in the ${this.period()}`;
    if (clients === 0) return { before: 'There were ', after: `${when}, without a known key.` };
    return { before: `${who} made `, after: `${when}.` };
  });
  protected readonly share = computed(() => {
    const { commonest, refused } = this.figures();
    if (!commonest || commonest.calls === refused) return refused === 1 ? 'with' : 'all of them';
    return commonest.calls * 2 > refused ? 'most of them' : 'most often';
  });
}
