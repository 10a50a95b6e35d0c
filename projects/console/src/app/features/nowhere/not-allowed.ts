import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { RouterLink } from '@angular/router';
import { rolesInWords } from '../../core/session/permission';
import { Session } from '../../core/session/session';
import { PageHead } from '../../shared/page-head';

@Component({
  selector: 'app-not-allowed',
  imports: [PageHead, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-page-head heading="Not for your role" />
    <p class="say">
      @if (roles()) {
        You are signed in as {{ name() }}, <b>{{ roles() }}</b>, and that role may not see this
        page.
      } @else {
        You are signed in as {{ name() }} without a role that may see this page.
      }
      Ask an admin of your firm if you need it, or <a routerLink="/">go to the start page</a>.
    </p>
  `,
})
export class NotAllowed {
  private readonly person = inject(Session).person;
  protected readonly name = computed(() => this.person()?.name ?? 'somebody');
  protected readonly roles = computed(() => rolesInWords(this.person()?.roles ?? []));
}
