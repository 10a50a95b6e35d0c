import { DestroyRef, DOCUMENT, inject, Injectable, signal } from '@angular/core';

const pause = 4_000;

/** Whether the service answers. When it does not, asks until it does. */
@Injectable({ providedIn: 'root' })
export class Connection {
  private readonly view = inject(DOCUMENT).defaultView;
  private readonly awayState = signal(false);
  private readonly returnCount = signal(0);
  private timer: ReturnType<typeof setTimeout> | undefined;

  readonly away = this.awayState.asReadonly();
  /** Counts each return; a page that reads it loads again. */
  readonly returns = this.returnCount.asReadonly();

  constructor() {
    const ask = () => {
      if (this.away()) void this.ask();
    };
    const lose = () => this.lost();
    this.view?.addEventListener('online', ask);
    this.view?.addEventListener('offline', lose);
    inject(DestroyRef).onDestroy(() => {
      clearTimeout(this.timer);
      this.view?.removeEventListener('online', ask);
      this.view?.removeEventListener('offline', lose);
    });
  }

  lost(): void {
    if (this.away()) return;
    this.awayState.set(true);
    this.askLater();
  }

  /** Asks now; resolves to whether the service is back. */
  async ask(): Promise<boolean> {
    clearTimeout(this.timer);
    const ready = await fetch('/readyz', { cache: 'no-store' }).then(
      ({ ok }) => ok,
      () => false,
    );
    if (!this.away()) return ready;
    if (!ready) {
      this.askLater();
      return false;
    }
    this.awayState.set(false);
    this.returnCount.update((count) => count + 1);
    return true;
  }

  private askLater(): void {
    clearTimeout(this.timer);
    this.timer = setTimeout(() => void this.ask(), pause);
  }
}
