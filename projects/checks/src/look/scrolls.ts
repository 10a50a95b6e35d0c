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
      const measure = (): void => this.scrolls.set(box.scrollWidth > box.clientWidth + 1);
      const sizes = new ResizeObserver(measure);
      sizes.observe(box);
      for (const child of Array.from(box.children)) sizes.observe(child);
      // A formula that comes later runs over without a change of any box's size.
      const content = new MutationObserver(measure);
      content.observe(box, { childList: true, subtree: true, characterData: true });
      ending.onDestroy(() => {
        sizes.disconnect();
        content.disconnect();
      });
    });
  }
}
