import {
  afterNextRender,
  DestroyRef,
  ElementRef,
  inject,
  type Signal,
  signal,
} from '@angular/core';

/** The width of the component that calls this, in pixels; `assumed` until it is laid out. */
export function observedWidth(assumed: number): Signal<number> {
  const width = signal(assumed);
  const host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  const destroyed = inject(DestroyRef);
  afterNextRender(() => {
    const observer = new ResizeObserver(([entry]) => {
      const measured = Math.round(entry?.contentRect.width ?? 0);
      if (measured > 0) width.set(measured);
    });
    observer.observe(host);
    destroyed.onDestroy(() => {
      observer.disconnect();
    });
  });
  return width.asReadonly();
}
