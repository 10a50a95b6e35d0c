import {
  ChangeDetectionStrategy,
  Component,
  computed,
  DOCUMENT,
  inject,
  signal,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import {
  MAT_DIALOG_DATA,
  MatDialogActions,
  MatDialogContent,
  MatDialogRef,
  MatDialogTitle,
} from '@angular/material/dialog';
import { CopyButton } from '../../shared/copy-button';
import { type IssuedKey, scopesInWords } from './client';
import { snippetFor } from './snippet';

export interface KeyDialogData {
  readonly issued: IssuedKey;
  readonly profile: string;
}

/** Shows a new key. It is held here alone, and let go of when the dialog closes. */
@Component({
  selector: 'app-key-dialog',
  imports: [CopyButton, MatButton, MatDialogActions, MatDialogContent, MatDialogTitle],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './key-dialog.html',
  styleUrl: './key-dialog.scss',
})
export class KeyDialog {
  private readonly dialog = inject<MatDialogRef<KeyDialog>>(MatDialogRef);
  private readonly data = inject<KeyDialogData>(MAT_DIALOG_DATA);
  private readonly origin = inject(DOCUMENT).location.origin;

  private readonly issued = signal<IssuedKey | null>(this.data.issued);
  protected readonly key = computed(() => this.issued()?.key ?? null);
  protected readonly text = computed(() => this.issued()?.text ?? '');
  protected readonly isPage = computed(() => this.key()?.kind === 'page');
  protected readonly scopes = computed(() => scopesInWords(this.key()?.scopes ?? []));
  protected readonly snippet = computed(() => {
    const issued = this.issued();
    return issued ? snippetFor(issued, this.origin, this.data.profile) : '';
  });

  protected done(): void {
    this.issued.set(null);
    this.dialog.close();
  }
}
