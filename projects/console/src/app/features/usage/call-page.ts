import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  resource,
} from '@angular/core';
import { RouterLink } from '@angular/router';
import { Api, segment } from '../../core/api/api';
import { Connection } from '../../core/api/connection';
import { Choices } from '../../core/choices/choices';
import { AnswerTag } from '../../shared/answer-tag';
import { CopyButton } from '../../shared/copy-button';
import { dayOf, timeOf, zone } from '../../shared/dates';
import { Loading } from '../../shared/loading';
import { PageHead } from '../../shared/page-head';
import { ProblemNote } from '../../shared/problem-note';
import { askedOf, type Call, callerOf, milliseconds, profileOf, standingOf, wordsOf } from './call';
import { CallProblem } from './call-problem';

/** Everything that the log holds of one call. */
@Component({
  selector: 'app-call-page',
  imports: [AnswerTag, CallProblem, CopyButton, Loading, PageHead, ProblemNote, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './call-page.html',
  styleUrl: './call-page.scss',
})
export class CallPage {
  private readonly api = inject(Api);
  private readonly connection = inject(Connection);
  protected readonly choices = inject(Choices);

  readonly requestId = input.required<string>();

  protected readonly call = resource({
    params: () => ({ id: this.requestId(), returns: this.connection.returns() }),
    loader: ({ params }) => this.api.get<Call>(`/v1/usage/${segment(params.id)}`),
  });
  protected readonly aside = computed(() => {
    if (!this.call.hasValue()) return null;
    const { at } = this.call.value();
    return `${dayOf(at)}, ${timeOf(at)}, ${zone()}`;
  });

  protected readonly callerOf = callerOf;
  protected readonly askedOf = askedOf;
  protected readonly profileOf = profileOf;
  protected readonly standingOf = standingOf;
  protected readonly wordsOf = wordsOf;
  protected readonly milliseconds = milliseconds;

  constructor() {
    this.choices.read();
  }
}
