import { ChangeDetectionStrategy, Component, computed, inject, resource } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { components } from '@headtree/contract';
import { Api } from '../../core/api/api';
import { Connection } from '../../core/api/connection';
import type { Page } from '../../core/api/page';
import { DayPipe } from '../../shared/dates';
import { Loading } from '../../shared/loading';
import { PageHead } from '../../shared/page-head';
import { ProblemNote } from '../../shared/problem-note';
import { ScrollTable } from '../../shared/scroll-table';
import { capital, counted } from '../../shared/words';
import { standingWords } from './standing-words';

type ProfileSummary = components['schemas']['ProfileSummary'];

@Component({
  selector: 'app-profiles-page',
  imports: [DayPipe, Loading, PageHead, ProblemNote, RouterLink, ScrollTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './profiles-page.html',
})
export class ProfilesPage {
  private readonly api = inject(Api);
  private readonly connection = inject(Connection);

  protected readonly profiles = resource({
    params: () => this.connection.returns(),
    loader: () => this.api.get<Page<ProfileSummary>>('/v1/profiles'),
  });
  protected readonly items = computed(() =>
    this.profiles.hasValue() ? this.profiles.value().items : [],
  );
  protected readonly sentence = computed(() => {
    const inEffect = this.items().filter(({ current }) => current !== null).length;
    const out = this.items().length - inEffect;
    const verb = inEffect === 1 ? 'is' : 'are';
    return {
      main: `${capital(counted(inEffect, 'factor profile'))} ${verb} in effect`,
      rest: out === 0 ? '' : `, ${counted(out, 'has', 'have')} no revision in effect`,
    };
  });
  protected readonly standingWords = standingWords;
}
