import { afterNextRender, DestroyRef, ElementRef, inject, signal, type Signal } from '@angular/core';

/** The host element's width in whole CSS px, kept up to date; `initial` until it is first measured. */
export function elementWidth(initial: number): Signal<number> {
  const host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  const destroyRef = inject(DestroyRef);
  const width = signal(initial);
  afterNextRender(() => {
    if (typeof ResizeObserver === 'undefined') return;
    const observer = new ResizeObserver(() => {
      const measured = Math.round(host.clientWidth);
      if (measured > 0) width.set(measured);
    });
    observer.observe(host);
    destroyRef.onDestroy(() => observer.disconnect());
  });
  return width.asReadonly();
}
