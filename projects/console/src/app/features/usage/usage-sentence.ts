import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { Choices } from '../../core/choices/choices';
import { capital, count, counted, listed, percent } from '../../shared/words';
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
          <b>{{ refused() }}</b> {{ share() }}
          @if (figures().commonest; as commonest) {
            @if (commonest.clientId; as id) {
              <a [href]="'/problems/' + commonest.code">{{ commonest.code }}</a> from
              <a routerLink="/usage" queryParamsHandling="merge" [queryParams]="{ client: id }">{{
                commonest.clientName ?? choices.clientName(id)
              }}</a>.
            } @else {
              <a [href]="'/problems/' + commonest.code">{{ commonest.code }}</a>.
            }
          }
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
    const { clients, people } = this.figures();
    const who = [
      ...(clients > 0 ? [counted(clients, 'client')] : []),
      ...(people > 0 ? [counted(people, 'person', 'people')] : []),
    ];
    const when = this.period() === 'all there is' ? '' : ` in the ${this.period()}`;
    if (!this.complete())
      return { before: 'Of the last ', after: who.length > 0 ? `, made by ${listed(who)},` : ',' };
    if (who.length === 0) return { before: 'There were ', after: `${when}, without a known key.` };
    return { before: `${capital(listed(who))} made `, after: `${when}.` };
  });
  /** What stands between the share that was refused and the commonest code. */
  protected readonly share = computed(() => {
    const { commonest, refused } = this.figures();
    const were = refused === 1 ? 'was refused' : 'were refused';
    if (!commonest) return `${were}.`;
    if (commonest.calls === refused) return refused === 1 ? `${were}:` : `${were}, all of them`;
    return commonest.calls * 2 > refused ? `${were}, most of them` : `${were}, most often`;
  });
}
