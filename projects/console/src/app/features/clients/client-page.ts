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
import { MatDialog } from '@angular/material/dialog';
import { RouterLink } from '@angular/router';
import { firstValueFrom } from 'rxjs';
import { Connection } from '../../core/api/connection';
import { Session } from '../../core/session/session';
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
  private readonly dialog = inject(MatDialog);
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
    const dialog = this.dialog.open<ClientDialog, Client, Client>(ClientDialog, {
      data: client,
      width: '460px',
    });
    const changed = await firstValueFrom(dialog.afterClosed());
    if (!changed) return;
    this.client.set(changed);
    this.said.set('Saved.');
  }

  protected async disable(client: Client): Promise<void> {
    const dialog = this.dialog.open<DisableDialog, Client, boolean>(DisableDialog, {
      data: client,
      width: '440px',
    });
    if (await firstValueFrom(dialog.afterClosed())) await this.setDisabled(true);
  }

  protected async setDisabled(disabled: boolean): Promise<void> {
    this.failure.set(null);
    try {
      this.client.set(await this.api.change(this.id(), { disabled }));
      this.said.set(disabled ? 'The client is disabled.' : 'The client is enabled again.');
    } catch (error) {
      this.failure.set(error);
    }
  }

  protected async issue(client: Client): Promise<void> {
    const asked = this.dialog.open<IssueDialog, Client, IssuedKey>(IssueDialog, {
      data: client,
      width: '520px',
    });
    const issued = await firstValueFrom(asked.afterClosed());
    if (!issued) return;
    const data: KeyDialogData = { issued, profile: client.defaultProfile ?? 'uk-na' };
    const shown = this.dialog.open<KeyDialog, KeyDialogData>(KeyDialog, {
      data,
      width: '620px',
      // Neither a slip on Escape nor a click beside it loses the key.
      disableClose: true,
    });
    this.readAgain();
    await firstValueFrom(shown.afterClosed());
    this.said.set(`The key “${issued.key.label}” is issued.`);
  }

  protected async revoke(key: Key): Promise<void> {
    const dialog = this.dialog.open<RevokeDialog, Key, Key>(RevokeDialog, {
      data: key,
      width: '460px',
    });
    const revoked = await firstValueFrom(dialog.afterClosed());
    if (!revoked) return;
    this.readAgain();
    this.said.set(`The key “${revoked.label}” was revoked on ${dayOf(new Date())}.`);
  }

  private readAgain(): void {
    this.client.reload();
    this.keys.reload();
  }
}
