import { DOCUMENT, inject, Injectable, Injector, afterNextRender } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { NavigationEnd, Router } from '@angular/router';
import { filter, map, pairwise, startWith } from 'rxjs';

const pathOf = (url: string): string => url.split(/[?#]/)[0] ?? url;

/** After a change of page the focus stands at its heading, so that reading goes on from there. */
@Injectable({ providedIn: 'root' })
export class FocusAfterNavigation {
  private readonly document = inject(DOCUMENT);
  private readonly injector = inject(Injector);

  constructor() {
    inject(Router)
      .events.pipe(
        filter((event) => event instanceof NavigationEnd),
        map(({ urlAfterRedirects }) => pathOf(urlAfterRedirects)),
        startWith(null),
        pairwise(),
        takeUntilDestroyed(),
      )
      .subscribe(([before, after]) => {
        if (before !== null && before !== after)
          afterNextRender(() => this.focusHeading(), { injector: this.injector });
      });
  }

  private focusHeading(): void {
    const heading = this.document.querySelector<HTMLElement>('main h1');
    const target = heading ?? this.document.querySelector<HTMLElement>('main');
    target?.setAttribute('tabindex', '-1');
    target?.focus({ preventScroll: true });
  }
}
