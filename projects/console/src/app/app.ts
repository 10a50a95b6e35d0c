import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { RouterOutlet } from '@angular/router';
import { FocusAfterNavigation } from './core/page/focus-after-navigation';
import { Session } from './core/session/session';
import { AwayBanner } from './core/shell/away-banner';
import { Navigation } from './core/shell/navigation';

@Component({
  selector: 'app-root',
  imports: [RouterOutlet, Navigation, AwayBanner],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './app.html',
  styleUrl: './app.scss',
})
export class App {
  private readonly session = inject(Session);
  protected readonly signedIn = computed(() => this.session.person() !== null);

  constructor() {
    inject(FocusAfterNavigation);
  }

  /** A link to a place in the page would leave it: the base of every address is the root. */
  protected skip(event: Event, main: HTMLElement): void {
    event.preventDefault();
    main.focus();
  }
}
