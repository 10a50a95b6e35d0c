import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { RouterLink } from '@angular/router';
import { DayPipe } from '../../shared/dates';
import { ScrollTable } from '../../shared/scroll-table';
import { daysLeft, type Key, scopesInWords, shownKey } from './client';

/** The keys of a client, newest first; those out of use are quiet. */
@Component({
  selector: 'app-key-table',
  imports: [DayPipe, RouterLink, ScrollTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './key-table.html',
  styles: `
    .over td,
    .over th {
      color: var(--quiet);
    }
    @media (min-width: 621px) {
      .may {
        min-width: 15em;
        max-width: 24em;
      }
    }
    .origin {
      display: block;
      font-family: var(--mono);
      font-size: 12px;
      overflow-wrap: anywhere;
    }
    .soon {
      display: block;
      color: var(--warn);
    }
  `,
})
export class KeyTable {
  readonly keys = input.required<readonly Key[]>();
  readonly mayRevoke = input(false);
  readonly revoke = output<Key>();

  protected readonly shownKey = shownKey;
  protected readonly scopesInWords = scopesInWords;
  protected readonly now = new Date();

  protected leftOf(key: Key): string | null {
    const days = daysLeft(key, this.now);
    if (days === null || days > 14) return null;
    return days === 1 ? 'one day left' : `${days} days left`;
  }
}
