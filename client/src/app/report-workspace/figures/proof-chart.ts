import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  effect,
  ElementRef,
  inject,
  input,
  signal,
  viewChild,
} from '@angular/core';
import type { FigureElement } from '#shared/layout';
import { ProofWords } from '../proof/proof-words';
import type { DrawnFigure } from './draw-figure';
import { figureRows } from './figure-rows';
import { shownTheme } from './shown-theme';

/** Height over width that a chart roughly has, so that the page does not jump when it is drawn. */
const USUAL_SHAPE = 0.5;

/**
 * The chart of a figure, with its numbers as a table behind it. The chart library is loaded when
 * the figure first comes into view; it is drawn again at another width or theme.
 */
@Component({
  selector: 'eh-proof-chart',
  templateUrl: './proof-chart.html',
  styleUrl: './proof-chart.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ProofChart {
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  private readonly words = inject(ProofWords);
  readonly element = input.required<FigureElement>();

  protected readonly place = viewChild.required<ElementRef<HTMLElement>>('place');
  protected readonly seen = signal(false);
  protected readonly failed = signal(false);
  protected readonly drawnHeight = signal<number | null>(null);
  protected readonly width = signal(0);
  protected readonly rows = computed(() =>
    figureRows(this.element().figure, (address) => this.words.textOf(address)),
  );
  protected readonly theme = shownTheme();
  private drawn: DrawnFigure | null = null;
  private drawing = 0;

  protected readonly leastHeight = computed(
    () => this.drawnHeight() ?? Math.round(this.width() * USUAL_SHAPE),
  );

  constructor() {
    const destroyed = inject(DestroyRef);
    afterNextRender(() => {
      this.watch(destroyed);
    });
    destroyed.onDestroy(() => {
      this.drawing += 1;
      this.drawn?.end();
    });
    effect(() => {
      const width = this.width();
      const { figure } = this.element();
      const theme = this.theme();
      if (this.seen() && width > 0) void this.draw(figure, { theme, width });
    });
  }

  private watch(destroyed: DestroyRef): void {
    const sight = new IntersectionObserver(
      (entries) => {
        if (!entries.some((entry) => entry.isIntersecting)) return;
        this.seen.set(true);
        sight.disconnect();
      },
      { rootMargin: '200px' },
    );
    const size = new ResizeObserver(() => {
      this.width.set(Math.floor(this.host.clientWidth));
    });
    sight.observe(this.host);
    size.observe(this.host);
    destroyed.onDestroy(() => {
      sight.disconnect();
      size.disconnect();
    });
  }

  /** A drawing that was overtaken by a newer one is thrown away. */
  private async draw(
    figure: FigureElement['figure'],
    look: { readonly theme: 'light' | 'dark'; readonly width: number },
  ): Promise<void> {
    const turn = ++this.drawing;
    try {
      const { drawFigure } = await import('./draw-figure');
      if (turn !== this.drawing) return;
      const drawn = await drawFigure(this.place().nativeElement, figure, look);
      if (turn !== this.drawing) return;
      this.drawn?.end();
      this.drawn = drawn;
      this.failed.set(false);
      this.drawnHeight.set(this.place().nativeElement.offsetHeight);
    } catch (failure) {
      if (turn === this.drawing) this.failed.set(true);
      console.error(failure);
    }
  }
}
