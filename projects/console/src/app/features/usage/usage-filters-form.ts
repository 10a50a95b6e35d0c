import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { MatFormField, MatHint, MatLabel } from '@angular/material/form-field';
import { MatOptgroup, MatOption, MatSelect } from '@angular/material/select';
import type { Problem } from '../../core/api/problem';
import { Choices } from '../../core/choices/choices';
import type { Call } from './call';
import { checkAnswers, type Range, ranges, type UsageFilters } from './usage-filters';

interface Choice {
  readonly value: string;
  readonly words: string;
}

/** One line of fields; each change is a new address. */
@Component({
  selector: 'app-usage-filters-form',
  imports: [MatFormField, MatHint, MatLabel, MatOptgroup, MatOption, MatSelect],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './usage-filters-form.html',
  styles: `
    form {
      margin: 18px 0 0;
      grid-template-columns: repeat(auto-fill, minmax(150px, 1fr));
    }
    mat-hint {
      color: var(--fail);
    }
    @media (max-width: 480px) {
      form {
        grid-template-columns: 1fr 1fr;
        column-gap: 16px;
      }
    }
  `,
})
export class UsageFiltersForm {
  private readonly choices = inject(Choices);

  readonly filters = input.required<UsageFilters>();
  readonly problem = input<Problem | null>(null);
  /** The loaded calls: their keys can be chosen. */
  readonly calls = input.required<readonly Call[]>();
  readonly changed = output<UsageFilters>();

  protected readonly answers = checkAnswers;
  protected readonly statuses: readonly Choice[] = [
    { value: '401', words: '401 key' },
    { value: '403', words: '403 not allowed' },
    { value: '404', words: '404 not found' },
    { value: '422', words: '422 not valid' },
    { value: '429', words: '429 too many' },
    { value: '503', words: '503 away' },
  ];
  protected readonly periods = Object.entries(ranges).map(([value, { words }]) => ({
    value: value as Range,
    words,
  }));
  protected readonly clients = computed<Choice[]>(() =>
    this.choices.clients().map(({ id, name }) => ({ value: id, words: name })),
  );
  protected readonly checks = computed(() => this.choices.checks().map(({ id }) => id));
  protected readonly profiles = computed(() =>
    withChosen(
      this.filters().profile,
      this.choices
        .profiles()
        .flatMap(({ slug, revisions }) => [
          slug,
          ...revisions.map((each) => `${slug}@${each.revision}`),
        ]),
    ),
  );
  protected readonly keys = computed(() =>
    withChosen(this.filters().key, [
      ...new Set(this.calls().flatMap(({ keySelector }) => keySelector ?? [])),
    ]),
  );

  protected at(name: string): string | undefined {
    return this.problem()?.at(`/query/${name}`);
  }

  protected choose(change: Partial<UsageFilters>): void {
    this.changed.emit({ ...this.filters(), ...change });
  }
}

/** What the address asks for can always be seen, on the list or not. */
const withChosen = (chosen: string, items: readonly string[]): readonly string[] =>
  chosen === '' || items.includes(chosen) ? items : [chosen, ...items];
