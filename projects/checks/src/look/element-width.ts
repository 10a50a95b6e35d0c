import {
  afterNextRender,
  DestroyRef,
  ElementRef,
  inject,
  signal,
  type Signal,
} from '@angular/core';

/** The width of the component's own element in whole px, kept up to date; 0 until it is known. */
export function elementWidth(): Signal<number> {
  const width = signal(0);
  const element = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  const ending = inject(DestroyRef);
  afterNextRender(() => {
    const measure = () => width.set(Math.floor(element.getBoundingClientRect().width));
    measure();
    if (typeof ResizeObserver === 'undefined') return;
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    ending.onDestroy(() => observer.disconnect());
  });
  return width.asReadonly();
}
