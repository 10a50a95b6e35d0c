import { KeyValuePipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { FormControl, FormGroup, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatCheckbox } from '@angular/material/checkbox';
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
import { MatRadioButton, MatRadioGroup } from '@angular/material/radio';
import { MatOption, MatSelect } from '@angular/material/select';
import { type Problem, problemOf } from '../../core/api/problem';
import { ProblemNote } from '../../shared/problem-note';
import { refusedBy } from '../../shared/refused';
import { wording } from '../../shared/validators';
import type { Client, IssuedKey } from './client';
import { ClientsApi } from './clients-api';
import { expiries, requestFrom, usageIsFor } from './issue-form';
import { originsValidator } from './origins';

/** Asks what a new key is for, and issues it. */
@Component({
  selector: 'app-issue-dialog',
  imports: [
    KeyValuePipe,
    MatButton,
    MatCheckbox,
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
    MatRadioButton,
    MatRadioGroup,
    MatSelect,
    ProblemNote,
    ReactiveFormsModule,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './issue-dialog.html',
})
export class IssueDialog {
  private readonly api = inject(ClientsApi);
  private readonly dialog = inject<MatDialogRef<IssueDialog, IssuedKey>>(MatDialogRef);
  protected readonly client = inject<Client>(MAT_DIALOG_DATA);

  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly expiries = expiries;
  protected readonly form = new FormGroup({
    kind: new FormControl<'secret' | 'page'>('secret', { nonNullable: true }),
    label: new FormControl('', {
      nonNullable: true,
      validators: wording(100),
    }),
    origins: new FormControl(
      { value: '', disabled: true },
      { nonNullable: true, validators: [originsValidator] },
    ),
    checks: new FormControl(true, { nonNullable: true }),
    catalogue: new FormControl(true, { nonNullable: true }),
    usage: new FormControl(false, { nonNullable: true }),
    expiry: new FormControl<keyof typeof expiries>('year', { nonNullable: true }),
  });

  constructor() {
    const { kind, origins, usage } = this.form.controls;
    kind.valueChanges.pipe(takeUntilDestroyed()).subscribe((chosen) => {
      if (chosen === 'page') origins.enable();
      else origins.disable();
      if (usageIsFor(chosen)) usage.enable();
      else usage.disable();
    });
  }

  protected get originFaults(): string[] {
    const { origins } = this.form.controls;
    const refused: unknown = origins.getError('refused');
    if (typeof refused === 'string') return [refused];
    return (origins.getError('origins') as string[] | null) ?? [];
  }

  protected get withoutScope(): boolean {
    const { checks, catalogue, usage } = this.form.controls;
    return !checks.value && !catalogue.value && !(usage.enabled && usage.value);
  }

  protected async issue(): Promise<void> {
    this.form.markAllAsTouched();
    if (this.form.invalid || this.withoutScope || this.busy()) return;
    this.busy.set(true);
    this.problem.set(null);
    try {
      const request = requestFrom(this.form.getRawValue(), new Date());
      this.dialog.close(await this.api.issue(this.client.id, request));
    } catch (error) {
      const problem = problemOf(error);
      const { label, origins, expiry } = this.form.controls;
      const fields = { '/label': label, '/origins': origins, '/expiresAt': expiry };
      if (!refusedBy(problem, fields)) this.problem.set(problem);
    } finally {
      this.busy.set(false);
    }
  }
}
