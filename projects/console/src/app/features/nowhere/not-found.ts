import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterLink } from '@angular/router';
import { PageHead } from '../../shared/page-head';

@Component({
  selector: 'app-not-found',
  imports: [PageHead, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-page-head heading="Nothing here" />
    <p class="say">
      No page has this address. It may be mistyped, or the link that led here is old.
      <a routerLink="/">Go to the start page</a>.
    </p>
  `,
})
export class NotFound {}
