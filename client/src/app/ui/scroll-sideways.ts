import {
  DestroyRef,
  Directive,
  ElementRef,
  afterNextRender,
  inject,
  input,
  signal,
} from '@angular/core';

/**
 * A box that scrolls sideways when what it holds is too wide. Only then does it take the focus, so
 * that keys can scroll it, and only then is it a region with a name.
 */
@Directive({
  selector: '[ehScrollSideways]',
  host: {
    class: 'scroll-sideways',
    '[attr.tabindex]': 'scrolls() ? 0 : null',
    '[attr.role]': "scrolls() ? 'region' : null",
    '[attr.aria-label]': 'scrolls() ? name() : null',
  },
})
export class ScrollSideways {
  readonly name = input.required<string>({ alias: 'ehScrollSideways' });
  protected readonly scrolls = signal(false);

  constructor() {
    const box = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
    const destroyed = inject(DestroyRef);
    afterNextRender(() => {
      const observer = new ResizeObserver(() => {
        this.scrolls.set(box.scrollWidth > box.clientWidth + 1);
      });
      for (const element of [box, ...box.children]) observer.observe(element);
      destroyed.onDestroy(() => {
        observer.disconnect();
      });
    });
  }
}
