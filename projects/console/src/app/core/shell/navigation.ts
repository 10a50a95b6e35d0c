import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { NavigationStart, Router, RouterLink, RouterLinkActive } from '@angular/router';
import { filter } from 'rxjs';
import { rolesInWords } from '../session/permission';
import { Session } from '../session/session';
import { Mark } from './mark';
import { placesFor } from './places';
import { SchemeSwitch } from './scheme-switch';

/** Words at the left; on a narrow screen folded into one button. */
@Component({
  selector: 'app-navigation',
  imports: [RouterLink, RouterLinkActive, Mark, SchemeSwitch],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './navigation.html',
  styleUrl: './navigation.scss',
  host: { role: 'banner', '(keydown.escape)': 'open.set(false)' },
})
export class Navigation {
  private readonly session = inject(Session);
  private readonly router = inject(Router);

  protected readonly person = this.session.person;
  protected readonly roles = computed(() => rolesInWords(this.person()?.roles ?? []));
  protected readonly groups = computed(() => placesFor((each) => this.session.may(each)));
  protected readonly open = signal(false);
  protected readonly failed = signal(false);

  constructor() {
    this.router.events
      .pipe(
        filter((event) => event instanceof NavigationStart),
        takeUntilDestroyed(),
      )
      .subscribe(() => this.open.set(false));
  }

  protected async signOut(): Promise<void> {
    this.failed.set(false);
    try {
      await this.session.signOut();
      await this.router.navigateByUrl('/sign-in');
    } catch {
      this.failed.set(true);
    }
  }
}
