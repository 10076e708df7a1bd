import {
  ApplicationRef,
  DestroyRef,
  DOCUMENT,
  effect,
  inject,
  Injectable,
  type Signal,
  signal,
  untracked,
  type WritableSignal,
} from '@angular/core';
import type { PrintedBlock } from './printed-block';
import { ReportProof } from './report-proof';

/** So many blocks are drawn at once when a report opens; they fill the first screen. */
const FIRST_SCREEN = 6;
const NEAR_PIXELS = 400;
const LONGEST_WAIT_MILLISECONDS = 150;

/**
 * Draws what is in view at once, and the rest of the page block by block when there is time: a
 * change of the whole report (its framing, its house style) must not hold up the next paint.
 */
@Injectable()
export class DrawQueue {
  private readonly proof = inject(ReportProof);
  private readonly application = inject(ApplicationRef);
  private readonly view = inject(DOCUMENT).defaultView;
  private readonly drawn = new Map<string, WritableSignal<PrintedBlock | null>>();
  private readonly inView = new Set<string>();
  private readonly waiting = new Set<string>();
  private readonly ids = new WeakMap<Element, string>();
  private readonly observer = new IntersectionObserver(
    (entries) => {
      this.look(entries);
    },
    {
      rootMargin: `${NEAR_PIXELS}px`,
    },
  );
  private scheduled = false;

  constructor() {
    effect(() => {
      const blocks = this.proof.blocks();
      untracked(() => {
        this.take(blocks);
      });
    });
    const print = (): void => {
      this.drawAll();
    };
    this.view?.addEventListener('beforeprint', print);
    inject(DestroyRef).onDestroy(() => {
      this.observer.disconnect();
      this.view?.removeEventListener('beforeprint', print);
    });
  }

  /** What of a block is on the page now; null before it was drawn for the first time. */
  of(blockId: string): Signal<PrintedBlock | null> {
    const known = this.drawn.get(blockId);
    if (known !== undefined) return known;
    const atOnce = this.drawn.size < FIRST_SCREEN;
    const made = signal(untracked(() => (atOnce ? this.proof.of(blockId) : null)));
    this.drawn.set(blockId, made);
    if (!atOnce) this.wait(blockId);
    return made;
  }

  /** Watches where a block is, until the page gives it up. */
  watch(element: Element, blockId: string): () => void {
    this.ids.set(element, blockId);
    this.observer.observe(element);
    return () => {
      this.observer.unobserve(element);
      this.inView.delete(blockId);
      this.drawn.delete(blockId);
    };
  }

  private take(blocks: ReadonlyMap<string, PrintedBlock>): void {
    for (const [blockId, shown] of this.drawn) {
      if (shown() === blocks.get(blockId)) continue;
      if (this.inView.has(blockId)) this.draw(blockId);
      else this.wait(blockId);
    }
  }

  private look(entries: readonly IntersectionObserverEntry[]): void {
    for (const { target, isIntersecting } of entries) {
      const blockId = this.ids.get(target) ?? '';
      if (isIntersecting) this.inView.add(blockId);
      else this.inView.delete(blockId);
      if (isIntersecting && this.waiting.has(blockId)) this.draw(blockId);
    }
  }

  private draw(blockId: string): void {
    this.waiting.delete(blockId);
    this.drawn.get(blockId)?.set(this.proof.of(blockId));
  }

  private wait(blockId: string): void {
    this.waiting.add(blockId);
    if (this.scheduled) return;
    this.scheduled = true;
    whenIdle(() => {
      this.scheduled = false;
      this.drawNext();
    });
  }

  /** One block at a time: a table alone may take a good part of a frame. */
  private drawNext(): void {
    const [next] = this.waiting;
    if (next === undefined) return;
    this.draw(next);
    const [after] = this.waiting;
    if (after !== undefined) this.wait(after);
  }

  private drawAll(): void {
    for (const blockId of [...this.waiting]) this.draw(blockId);
    this.application.tick();
  }
}

/** Some browsers cannot say when they are idle. */
function whenIdle(work: () => void): void {
  if (typeof requestIdleCallback === 'function') {
    requestIdleCallback(work, { timeout: LONGEST_WAIT_MILLISECONDS });
  } else {
    setTimeout(work, 0);
  }
}
