import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  untracked,
} from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { ActivatedRoute, Router, RouterLink } from '@angular/router';
import { Connection } from '../../core/api/connection';
import { Choices } from '../../core/choices/choices';
import { zone } from '../../shared/dates';
import { Loading } from '../../shared/loading';
import { PageHead } from '../../shared/page-head';
import { ProblemNote } from '../../shared/problem-note';
import { capital, counted } from '../../shared/words';
import { UsageFiltersForm } from './usage-filters-form';
import {
  addressOf,
  filtersFrom,
  isNarrowed,
  queryOf,
  ranges,
  type UsageFilters,
} from './usage-filters';
import { UsageFiguresView } from './usage-figures-view';
import { UsageLog } from './usage-log';
import { UsageSentence } from './usage-sentence';
import { UsageTable } from './usage-table';

@Component({
  selector: 'app-usage-page',
  imports: [
    Loading,
    MatButton,
    PageHead,
    ProblemNote,
    RouterLink,
    UsageFiltersForm,
    UsageFiguresView,
    UsageSentence,
    UsageTable,
  ],
  providers: [UsageLog],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './usage-page.html',
  styleUrl: './usage-page.scss',
})
export class UsagePage {
  private readonly router = inject(Router);
  private readonly route = inject(ActivatedRoute);
  private readonly connection = inject(Connection);

  protected readonly log = inject(UsageLog);
  protected readonly choices = inject(Choices);

  private readonly params = toSignal(this.route.queryParamMap, { requireSync: true });
  protected readonly filters = computed(() => filtersFrom(this.params()));
  protected readonly narrowed = computed(() => isNarrowed(this.filters()));
  protected readonly period = computed(() => ranges[this.filters().range].words);
  protected readonly aside = computed(() => {
    const period = this.period();
    return `${capital(period)}, times in ${zone()}`;
  });

  protected readonly leftOut = computed(() => capital(counted(this.log.leftOut(), 'call')));

  constructor() {
    this.choices.read();
    effect(() => {
      const filters = this.filters();
      this.connection.returns();
      untracked(() => void this.read(filters));
    });
  }

  protected narrow(filters: UsageFilters): void {
    void this.router.navigate([], {
      relativeTo: this.route,
      queryParams: addressOf(filters),
      replaceUrl: true,
    });
  }

  protected showConsole(shown: boolean): void {
    this.narrow({ ...this.filters(), console: shown ? 'shown' : '' });
  }

  protected readAgain(): void {
    void this.read(this.filters());
  }

  private read(filters: UsageFilters): Promise<void> {
    return this.log.read(queryOf(filters, new Date()), filters.console === 'shown');
  }
}
