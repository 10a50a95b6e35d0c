import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import {
  MAT_DIALOG_DATA,
  MatDialogActions,
  MatDialogClose,
  MatDialogContent,
  MatDialogRef,
  MatDialogTitle,
} from '@angular/material/dialog';
import { MatError, MatFormField, MatHint, MatLabel } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { MatOption, MatSelect } from '@angular/material/select';
import { type Problem, problemOf } from '../../core/api/problem';
import { Choices } from '../../core/choices/choices';
import { ProblemNote } from '../../shared/problem-note';
import { refusedBy } from '../../shared/refused';
import { wording } from '../../shared/validators';
import type { Client } from './client';
import { ClientsApi } from './clients-api';

/** Makes a client, or changes the one that is given. */
@Component({
  selector: 'app-client-dialog',
  imports: [
    MatButton,
    MatDialogActions,
    MatDialogClose,
    MatDialogContent,
    MatDialogTitle,
    MatError,
    MatFormField,
    MatHint,
    MatInput,
    MatLabel,
    MatOption,
    MatSelect,
    ProblemNote,
    ReactiveFormsModule,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './client-dialog.html',
})
export class ClientDialog {
  private readonly api = inject(ClientsApi);
  private readonly choices = inject(Choices);
  private readonly dialog = inject<MatDialogRef<ClientDialog, Client>>(MatDialogRef);
  protected readonly client = inject<Client | null>(MAT_DIALOG_DATA);

  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly slugs = computed(() => this.choices.profiles().map(({ slug }) => slug));
  protected readonly form = new FormGroup({
    name: new FormControl(this.client?.name ?? '', {
      nonNullable: true,
      validators: wording(100),
    }),
    defaultProfile: new FormControl(this.client?.defaultProfile ?? '', { nonNullable: true }),
  });

  constructor() {
    this.choices.read();
  }

  protected async save(): Promise<void> {
    this.form.markAllAsTouched();
    if (this.form.invalid || this.busy()) return;
    const { name, defaultProfile } = this.form.getRawValue();
    const said = { name: name.trim(), defaultProfile: defaultProfile || null };
    this.busy.set(true);
    this.problem.set(null);
    try {
      const saved = this.client
        ? await this.api.change(this.client.id, said)
        : await this.api.make(said);
      this.dialog.close(saved);
    } catch (error) {
      const problem = problemOf(error);
      const { name, defaultProfile } = this.form.controls;
      const shown = refusedBy(problem, { '/name': name, '/defaultProfile': defaultProfile });
      if (!shown) this.problem.set(problem);
    } finally {
      this.busy.set(false);
    }
  }
}
