import { Directive, ElementRef, inject, signal, afterNextRender, DestroyRef } from '@angular/core';

/** A table that scrolls inside itself; the keyboard can reach it when, and only when, it does. */
@Directive({
  selector: '[appScroll]',
  host: {
    class: 'scroll',
    '[attr.tabindex]': 'scrolls() ? 0 : null',
    '[attr.role]': 'scrolls() ? "region" : null',
  },
})
export class ScrollTable {
  private readonly element = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  protected readonly scrolls = signal(false);

  constructor() {
    const destroy = inject(DestroyRef);
    afterNextRender(() => {
      const look = () => this.scrolls.set(this.element.scrollWidth > this.element.clientWidth + 1);
      const observer = new ResizeObserver(look);
      observer.observe(this.element);
      for (const child of Array.from(this.element.children)) observer.observe(child);
      destroy.onDestroy(() => observer.disconnect());
    });
  }
}
