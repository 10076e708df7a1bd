import { computed, Injectable, signal, type TemplateRef } from '@angular/core';

/** A small line above the title, and where it leads. */
export interface BarContext {
  readonly text: string;
  readonly link: string | readonly string[] | null;
}

/** What a page puts in the bar. */
export interface BarContent {
  readonly title: () => string;
  readonly context: () => BarContext | null;
  readonly beside: () => TemplateRef<unknown> | undefined;
  readonly actions: () => TemplateRef<unknown> | undefined;
}

/** Carries a page's title, context, stamp and actions to the bar of the frame. */
@Injectable({ providedIn: 'root' })
export class PageBar {
  private readonly content = signal<BarContent | null>(null);

  readonly title = computed(() => this.content()?.title() ?? '');
  readonly context = computed(() => this.content()?.context() ?? null);
  readonly beside = computed(() => this.content()?.beside() ?? null);
  readonly actions = computed(() => this.content()?.actions() ?? null);

  show(content: BarContent): void {
    this.content.set(content);
  }

  /** A page that goes clears the bar, unless the next page has filled it already. */
  clear(content: BarContent): void {
    this.content.update((shown) => (shown === content ? null : shown));
  }
}
