import {
  afterNextRender,
  computed,
  DOCUMENT,
  inject,
  Injectable,
  Injector,
  signal,
} from '@angular/core';
import type { RunOrigin } from '#shared/layout';
import { CurrentStudy } from '../../session/current-study';
import { ReportState } from '../report-store/report-state';
import { ReportStore } from '../report-store/report-store';

/** What this person has in hand on the proof: a block, a text, a note. Nobody else sees it. */
@Injectable()
export class ProofDesk {
  private readonly document = inject(DOCUMENT);
  private readonly injector = inject(Injector);
  private readonly store = inject(ReportStore);
  private readonly state = inject(ReportState);
  private readonly study = inject(CurrentStudy);
  private readonly chosen = signal<string | null>(null);
  private readonly opened = signal<string | null>(null);

  /** The value under the pointer or the focus. */
  readonly spotlight = signal<RunOrigin | null>(null);
  /** The block whose note of sources is under the pointer; its values are lit. */
  readonly litBlockId = signal<string | null>(null);
  /** Which margin is in view where there is room for one only. */
  readonly margin = signal<'sources' | 'checks'>('checks');
  /** Whether the folded note of sources is opened, where the margin is narrow. */
  readonly sourcesOpen = signal(false);
  /** The check that was gone to last. */
  readonly activeCheck = signal<string | null>(null);

  /** Whether this person may add any block at all. */
  readonly mayAdd = computed(
    () =>
      this.state.isOpen() &&
      (this.study.may('editWordsBlocks') || this.study.may('editNumbersBlocks')),
  );
  /** The block that the Tab key stops at. */
  readonly tabStop = computed(() => this.selected() ?? this.store.blocks()[0]?.id ?? null);
  readonly selected = computed(() => this.present(this.chosen()));
  readonly editing = computed(() => this.present(this.opened()));

  select(blockId: string | null): void {
    this.chosen.set(blockId);
    if (this.opened() !== blockId) this.opened.set(null);
  }

  edit(blockId: string): void {
    this.chosen.set(blockId);
    this.opened.set(blockId);
  }

  /** Leaves the words and keeps the block in hand. */
  leave(): void {
    this.opened.set(null);
  }

  /** Puts the focus back on a block that the page is about to draw elsewhere. */
  focusAfterDrawing(blockId: string): void {
    afterNextRender(() => this.document.getElementById(`block-${blockId}`)?.focus(), {
      injector: this.injector,
    });
  }

  /** The block that lies so many places after the one in hand. */
  neighbour(step: 1 | -1): string | null {
    const blocks = this.store.blocks();
    const place = blocks.findIndex((block) => block.id === this.selected());
    if (place === -1) return (step === 1 ? blocks[0] : blocks.at(-1))?.id ?? null;
    return blocks[place + step]?.id ?? null;
  }

  private present(blockId: string | null): string | null {
    return this.store.blocks().some((block) => block.id === blockId) ? blockId : null;
  }
}
