import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { Choices } from '../../core/choices/choices';
import { AnswerTag } from '../../shared/answer-tag';
import { dayOf, timeOf } from '../../shared/dates';
import { ScrollTable } from '../../shared/scroll-table';
import { askedOf, type Call, milliseconds, profileOf, shortId, standingOf, wordsOf } from './call';

interface Line {
  readonly call: Call;
  /** Set where the day differs from the line above. */
  readonly newDay: string | null;
}

/** The log, newest first, with a line where a day begins. */
@Component({
  selector: 'app-usage-table',
  imports: [AnswerTag, RouterLink, ScrollTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './usage-table.html',
  styleUrl: './usage-table.scss',
})
export class UsageTable {
  protected readonly choices = inject(Choices);
  readonly calls = input.required<readonly Call[]>();

  protected readonly lines = computed<Line[]>(() => {
    let day = '';
    return this.calls().map((call) => {
      const own = dayOf(call.at);
      const newDay = own === day ? null : own;
      day = own;
      return { call, newDay };
    });
  });

  protected readonly timeOf = timeOf;
  protected readonly askedOf = askedOf;
  protected readonly profileOf = profileOf;
  protected readonly standingOf = standingOf;
  protected readonly wordsOf = wordsOf;
  protected readonly shortId = shortId;
  protected readonly milliseconds = milliseconds;
}
