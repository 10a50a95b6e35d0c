import { ChangeDetectionStrategy, Component, computed, inject, resource } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import { Api } from '../../core/api/api';
import { Connection } from '../../core/api/connection';
import { Session } from '../../core/session/session';
import { Ask } from '../../shared/ask';
import { momentOf } from '../../shared/dates';
import { Loading } from '../../shared/loading';
import { PageHead } from '../../shared/page-head';
import { ProblemNote } from '../../shared/problem-note';
import { ScrollTable } from '../../shared/scroll-table';
import { capital, count, counted, inWords } from '../../shared/words';
import type { CallPage } from '../usage/call';
import type { Client } from './client';
import { ClientDialog } from './client-dialog';
import { ClientsApi } from './clients-api';
import { recentByClient } from './recent-calls';

const month = 720 * 3_600_000;

/** The tools that call, and whether they do. */
@Component({
  selector: 'app-clients-page',
  imports: [Loading, MatButton, PageHead, ProblemNote, RouterLink, ScrollTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './clients-page.html',
  styles: `
    .scope {
      margin-top: 8px;
    }
  `,
})
export class ClientsPage {
  private readonly api = inject(Api);
  private readonly clientsApi = inject(ClientsApi);
  private readonly connection = inject(Connection);
  private readonly ask = inject(Ask);
  private readonly router = inject(Router);
  private readonly session = inject(Session);

  protected readonly mayChange = computed(() => this.session.may('clients:write'));
  protected readonly clients = resource({
    params: () => this.connection.returns(),
    loader: () => this.clientsApi.list(),
  });
  /** The newest calls of the last 30 days: the log keeps no totals by client. */
  private readonly log = resource({
    params: () => (this.session.may('usage:read') ? this.connection.returns() : undefined),
    loader: () =>
      this.api.get<CallPage>('/v1/usage', {
        from: new Date(Date.now() - month).toISOString(),
        pageSize: 500,
      }),
  });

  protected readonly items = computed(() =>
    this.clients.hasValue() ? this.clients.value().items : [],
  );
  protected readonly sentence = computed(() => {
    const live = this.items().filter(({ disabledAt }) => disabledAt === null);
    const keys = live.reduce((all, { liveKeys }) => all + liveKeys, 0);
    const off = this.items().length - live.length;
    const without = live.filter(({ liveKeys }) => liveKeys === 0).length;
    return {
      main: `${capital(counted(live.length, 'client'))} ${live.length === 1 ? 'holds' : 'hold'}`,
      keys: counted(keys, 'live key'),
      without:
        without === 0
          ? ''
          : ` ${capital(inWords(without))} ${without === 1 ? 'has' : 'have'} none.`,
      off: off === 0 ? '' : ` ${capital(inWords(off))} ${off === 1 ? 'is' : 'are'} disabled.`,
    };
  });
  private readonly recent = computed(() =>
    recentByClient(this.log.hasValue() ? this.log.value().items : []),
  );
  protected readonly logScope = computed(() => {
    if (!this.log.hasValue()) return null;
    const { items, nextPageToken } = this.log.value();
    return nextPageToken === null
      ? 'Calls are of the last 30 days.'
      : `Calls are of the last ${count(items.length)} in the log.`;
  });

  protected lastOf({ id }: Client): string {
    const last = this.recent().get(id)?.last;
    return last === undefined ? '–' : momentOf(last);
  }

  protected callsOf({ id }: Client): string {
    return this.log.hasValue() ? count(this.recent().get(id)?.calls ?? 0) : '–';
  }

  protected async make(): Promise<void> {
    const made = await this.ask.for<Client>(ClientDialog, null, { width: '460px' });
    if (made) await this.router.navigate(['/clients', made.id]);
  }
}
