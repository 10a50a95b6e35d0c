import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  resource,
} from '@angular/core';
import { RouterLink } from '@angular/router';
import type { components } from '@headtree/contract';
import { Api, segment } from '../../core/api/api';
import { Connection } from '../../core/api/connection';
import { DayPipe } from '../../shared/dates';
import { Loading } from '../../shared/loading';
import { PageHead } from '../../shared/page-head';
import { ProblemNote } from '../../shared/problem-note';
import { ScrollTable } from '../../shared/scroll-table';
import { count, counted, inWords } from '../../shared/words';
import { ProfileBranch } from './profile-branch';
import { branchesOf, isUnconfirmed } from './provenance';
import { standingWords } from './standing-words';

type ProfileDetail = components['schemas']['ProfileDetail'];

/** One revision: what stands in it, and how each value is known. */
@Component({
  selector: 'app-profile-page',
  imports: [DayPipe, Loading, PageHead, ProblemNote, ProfileBranch, RouterLink, ScrollTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './profile-page.html',
  styleUrl: './profile-page.scss',
})
export class ProfilePage {
  private readonly api = inject(Api);
  private readonly connection = inject(Connection);

  /** A slug, or `slug@revision`. */
  readonly name = input.required<string>();

  protected readonly profile = resource({
    params: () => ({ name: this.name(), returns: this.connection.returns() }),
    loader: ({ params }) => this.api.get<ProfileDetail>(`/v1/profiles/${segment(params.name)}`),
  });
  protected readonly heading = computed(() => {
    if (!this.profile.hasValue()) return this.name();
    const { slug, revision } = this.profile.value();
    return `${slug}@${revision}`;
  });
  protected readonly branches = computed(() =>
    this.profile.hasValue() ? branchesOf(this.profile.value().tree) : [],
  );
  private readonly values = computed(() => this.branches().flatMap((branch) => branch.values));
  protected readonly departures = computed(() =>
    this.profile.hasValue() ? this.profile.value().departures : [],
  );
  protected readonly sentence = computed(() => {
    const all = this.values();
    const recalled = all.filter(({ kind }) => kind === 'recalled');
    const unconfirmed = recalled.filter(isUnconfirmed).length;
    return {
      values: `${count(all.length)} values`,
      recalled:
        recalled.length === 0
          ? 'none is from memory'
          : `${counted(recalled.length, 'is', 'are')} from memory`,
      unconfirmed:
        unconfirmed === 0
          ? '.'
          : `, ${inWords(unconfirmed)} of them confirmed by no published example: an answer that uses one is provisional.`,
      departures: counted(this.departures().length, 'departure'),
    };
  });
  protected readonly standingWords = standingWords;
}
