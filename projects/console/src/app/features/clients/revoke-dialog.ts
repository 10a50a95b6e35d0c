import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import {
  MAT_DIALOG_DATA,
  MatDialogActions,
  MatDialogClose,
  MatDialogContent,
  MatDialogRef,
  MatDialogTitle,
} from '@angular/material/dialog';
import { type Problem, problemOf } from '../../core/api/problem';
import { dayOf } from '../../shared/dates';
import { ProblemNote } from '../../shared/problem-note';
import { type Key, shownKey } from './client';
import { ClientsApi } from './clients-api';

/** Asks before a key is taken out of use, and names it. */
@Component({
  selector: 'app-revoke-dialog',
  imports: [
    MatButton,
    MatDialogActions,
    MatDialogClose,
    MatDialogContent,
    MatDialogTitle,
    ProblemNote,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2 mat-dialog-title>Revoke “{{ key.label }}”?</h2>
    <mat-dialog-content>
      <p>
        <code>{{ shown }}</code> stops working within seconds, for good. Whatever still uses it is
        refused with <code>key-revoked</code>. {{ lastUse }}
      </p>
      @if (problem(); as problem) {
        <app-problem-note [error]="problem" [retry]="false" />
      }
    </mat-dialog-content>
    <mat-dialog-actions>
      <button mat-flat-button type="button" [attr.aria-disabled]="busy()" (click)="revoke()">
        Revoke the key
      </button>
      <button mat-button type="button" mat-dialog-close>Keep it</button>
    </mat-dialog-actions>
  `,
})
export class RevokeDialog {
  private readonly api = inject(ClientsApi);
  private readonly dialog = inject<MatDialogRef<RevokeDialog, Key>>(MatDialogRef);
  protected readonly key = inject<Key>(MAT_DIALOG_DATA);

  protected readonly shown = shownKey(this.key);
  protected readonly lastUse = this.key.lastUsedOn
    ? `It was last used on ${dayOf(this.key.lastUsedOn)}.`
    : 'It was never used.';
  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);

  protected async revoke(): Promise<void> {
    if (this.busy()) return;
    this.busy.set(true);
    this.problem.set(null);
    try {
      this.dialog.close(await this.api.revoke(this.key.selector));
    } catch (error) {
      this.problem.set(problemOf(error));
    } finally {
      this.busy.set(false);
    }
  }
}
