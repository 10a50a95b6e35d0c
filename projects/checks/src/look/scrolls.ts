import {
  afterNextRender,
  DestroyRef,
  Directive,
  ElementRef,
  inject,
  input,
  signal,
} from '@angular/core';

/** A box that scrolls sideways inside itself; the keyboard reaches it while there is something to scroll. */
@Directive({
  selector: '[htcScrolls]',
  host: {
    class: 'ht-scroll',
    '[attr.tabindex]': 'scrolls() ? 0 : null',
    '[attr.role]': "scrolls() ? 'group' : null",
    '[attr.aria-label]': 'scrolls() ? htcScrolls() : null',
  },
})
export class Scrolls {
  /** What is in the box, for those who reach it to scroll. */
  readonly htcScrolls = input.required<string>();
  /** Whether the content is wider than the box. */
  protected readonly scrolls = signal(false);

  constructor() {
    const box = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
    const ending = inject(DestroyRef);
    afterNextRender(() => {
      if (typeof ResizeObserver === 'undefined') return;
      const observer = new ResizeObserver(() =>
        this.scrolls.set(box.scrollWidth > box.clientWidth + 1),
      );
      observer.observe(box);
      for (const child of Array.from(box.children)) observer.observe(child);
      ending.onDestroy(() => observer.disconnect());
    });
  }
}
