import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatError, MatFormField, MatLabel } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { Router } from '@angular/router';
import { type Problem, problemOf } from '../../core/api/problem';
import { Session } from '../../core/session/session';
import { isInside } from '../../core/session/sign-in-for';
import { Mark } from '../../core/shell/mark';
import { SchemeSwitch } from '../../core/shell/scheme-switch';
import { required } from '../../shared/validators';
import { Drawing } from './drawing';
import { refusalWords } from './refusal-words';

@Component({
  selector: 'app-sign-in',
  imports: [
    Drawing,
    ReactiveFormsModule,
    MatButton,
    MatError,
    MatFormField,
    MatInput,
    MatLabel,
    Mark,
    SchemeSwitch,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './sign-in.html',
  styleUrl: './sign-in.scss',
})
export class SignIn {
  private readonly session = inject(Session);
  private readonly router = inject(Router);

  /** The page that was asked for. */
  readonly to = input<string>();
  /** Set when a session ended while somebody worked. */
  readonly ended = input<string>();

  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly refusal = computed(() => {
    const problem = this.problem();
    return problem && refusalWords(problem);
  });
  protected readonly form = new FormGroup({
    email: new FormControl('', { nonNullable: true, validators: [required] }),
    password: new FormControl('', { nonNullable: true, validators: [required] }),
  });

  protected async signIn(): Promise<void> {
    this.form.markAllAsTouched();
    if (this.form.invalid || this.busy()) return;
    const { email, password } = this.form.getRawValue();
    this.busy.set(true);
    this.problem.set(null);
    try {
      await this.session.signIn(email.trim(), password);
      const to = this.to();
      await this.router.navigateByUrl(isInside(to) ? to : '/');
    } catch (error) {
      this.problem.set(problemOf(error));
      this.form.controls.password.reset();
    } finally {
      this.busy.set(false);
    }
  }
}
