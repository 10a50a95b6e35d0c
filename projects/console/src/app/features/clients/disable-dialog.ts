import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import {
  MAT_DIALOG_DATA,
  MatDialogActions,
  MatDialogClose,
  MatDialogContent,
  MatDialogTitle,
} from '@angular/material/dialog';
import type { Client } from './client';
import { counted } from '../../shared/words';

/** Asks before a client, with all its keys, is taken out of use. */
@Component({
  selector: 'app-disable-dialog',
  imports: [MatButton, MatDialogActions, MatDialogClose, MatDialogContent, MatDialogTitle],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2 mat-dialog-title>Disable {{ client.name }}?</h2>
    <mat-dialog-content>
      <p>
        Its {{ keys }} {{ client.liveKeys === 1 ? 'is' : 'are' }} refused from now on. The client
        can be enabled again, and the keys with it.
      </p>
    </mat-dialog-content>
    <mat-dialog-actions>
      <button mat-flat-button type="button" [mat-dialog-close]="true">Disable the client</button>
      <button mat-button type="button" mat-dialog-close>Leave it</button>
    </mat-dialog-actions>
  `,
})
export class DisableDialog {
  protected readonly client = inject<Client>(MAT_DIALOG_DATA);
  protected readonly keys = counted(this.client.liveKeys, 'live key');
}
