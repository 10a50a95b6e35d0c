import { ChangeDetectionStrategy, Component, effect, inject } from '@angular/core';
import { Location } from '@angular/common';
import { Router } from '@angular/router';
import { Connection } from '../../core/api/connection';
import { PageHead } from '../../shared/page-head';

/** Stands in for a page while it cannot be known who is signed in. */
@Component({
  selector: 'app-away',
  imports: [PageHead],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-page-head heading="Service away" />
    <p class="say">
      The page you asked for comes up by itself as soon as the service answers. Nothing is lost.
    </p>
  `,
})
export class Away {
  constructor() {
    const connection = inject(Connection);
    const router = inject(Router);
    const asked = inject(Location).path(true);
    connection.lost();
    effect(() => {
      if (!connection.away()) void router.navigateByUrl(asked.startsWith('/away') ? '/' : asked);
    });
  }
}
