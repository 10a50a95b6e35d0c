import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  resource,
  signal,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { Connection } from '../../core/api/connection';
import { Session } from '../../core/session/session';
import { Ask } from '../../shared/ask';
import { DayPipe, dayOf } from '../../shared/dates';
import { Loading } from '../../shared/loading';
import { PageHead } from '../../shared/page-head';
import { ProblemNote } from '../../shared/problem-note';
import { capital, counted, inWords } from '../../shared/words';
import { type Client, daysLeft, type IssuedKey, type Key } from './client';
import { ClientDialog } from './client-dialog';
import { ClientsApi } from './clients-api';
import { DisableDialog } from './disable-dialog';
import { IssueDialog } from './issue-dialog';
import { KeyDialog, type KeyDialogData } from './key-dialog';
import { KeyTable } from './key-table';
import { RevokeDialog } from './revoke-dialog';

const soon = 14;

/** One client: what it is, and its keys. */
@Component({
  selector: 'app-client-page',
  imports: [DayPipe, KeyTable, Loading, MatButton, PageHead, ProblemNote, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './client-page.html',
  styleUrl: './client-page.scss',
})
export class ClientPage {
  private readonly api = inject(ClientsApi);
  private readonly connection = inject(Connection);
  private readonly ask = inject(Ask);
  private readonly session = inject(Session);

  readonly id = input.required<string>();

  protected readonly mayChange = computed(() => this.session.may('clients:write'));
  protected readonly mayIssue = computed(() => this.session.may('keys:write'));
  protected readonly maySeeKeys = computed(() => this.session.may('keys:read'));
  protected readonly said = signal('');
  protected readonly failure = signal<unknown>(null);

  protected readonly client = resource({
    params: () => ({ id: this.id(), returns: this.connection.returns() }),
    loader: ({ params }) => this.api.read(params.id),
  });
  protected readonly keys = resource({
    params: () =>
      this.maySeeKeys() ? { id: this.id(), returns: this.connection.returns() } : undefined,
    loader: ({ params }) => this.api.keys(params.id),
  });
  protected readonly keyItems = computed(() =>
    this.keys.hasValue() ? this.keys.value().items : [],
  );
  protected readonly sentence = computed(() => {
    const now = new Date();
    const ending = this.keyItems().filter((key) => (daysLeft(key, now) ?? soon + 1) <= soon).length;
    const live = this.client.hasValue() ? this.client.value().liveKeys : 0;
    return {
      keys: counted(live, 'live key'),
      ending:
        ending === 0
          ? ''
          : ` ${capital(inWords(ending))} ${ending === 1 ? 'expires' : 'expire'} within ${soon} days.`,
    };
  });

  protected async change(client: Client): Promise<void> {
    const changed = await this.ask.for<Client>(ClientDialog, client, { width: '460px' });
    if (!changed) return;
    this.client.set(changed);
    this.said.set('Saved.');
  }

  protected async disable(client: Client): Promise<void> {
    const sure = await this.ask.for<boolean>(DisableDialog, client, { width: '440px' });
    if (sure) await this.setDisabled(true);
  }

  protected async setDisabled(disabled: boolean): Promise<void> {
    this.failure.set(null);
    try {
      this.client.set(await this.api.change(this.id(), { disabled }));
      this.said.set(disabled ? 'Its keys are refused from now on.' : 'Its keys work again.');
    } catch (error) {
      this.failure.set(error);
    }
  }

  protected async issue(client: Client): Promise<void> {
    const issued = await this.ask.for<IssuedKey>(IssueDialog, client, { width: '520px' });
    if (!issued) return;
    this.readAgain();
    const { label } = issued.key;
    const data: KeyDialogData = { issued, profile: client.defaultProfile ?? 'uk-na' };
    await this.ask.for(KeyDialog, data, { width: '620px', held: true });
    this.said.set(`The key “${label}” is issued.`);
  }

  protected async revoke(key: Key): Promise<void> {
    const revoked = await this.ask.for<Key>(RevokeDialog, key, { width: '460px' });
    if (!revoked) return;
    this.readAgain();
    this.said.set(`The key “${revoked.label}” was revoked on ${dayOf(new Date())}.`);
  }

  private readAgain(): void {
    this.client.reload();
    this.keys.reload();
  }
}
