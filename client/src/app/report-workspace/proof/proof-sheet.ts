import { CdkDrag, CdkDropList, CdkDragPreview, type CdkDragDrop } from '@angular/cdk/drag-drop';
import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  type ElementRef,
  inject,
  viewChild,
} from '@angular/core';
import { type Block, visibleBlocks } from '#shared/report';
import { EmptyState } from '../../ui/status/empty-state';
import { AddBlock } from '../block-actions/add-block';
import { BlockActions } from '../block-actions/block-actions';
import { CheckList } from '../margins/check-list';
import { MarginLayout } from '../margins/margin-layout';
import { SourceList } from '../margins/source-list';
import { ReportState } from '../report-store/report-state';
import { ProofDesk } from './proof-desk';
import { ProofRow } from './proof-row';
import { ProofSlug } from './proof-slug';

/** The proof: a trimmed page on its galley sheet, between the two margins. */
@Component({
  selector: 'eh-proof-sheet',
  imports: [
    AddBlock,
    CdkDrag,
    CdkDragPreview,
    CdkDropList,
    CheckList,
    EmptyState,
    ProofRow,
    ProofSlug,
    SourceList,
  ],
  templateUrl: './proof-sheet.html',
  styleUrl: './proof-sheet.scss',
  host: { '[class]': "'margin-' + desk.margin()" },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ProofSheet {
  private readonly state = inject(ReportState);
  private readonly actions = inject(BlockActions);
  private readonly layout = inject(MarginLayout);
  protected readonly desk = inject(ProofDesk);
  private readonly flow = viewChild.required<ElementRef<HTMLElement>>('flow');

  /** The blocks in order, with those that others removed while this person was changing them. */
  protected readonly rows = computed((): readonly Block[] => {
    const blocks = this.state.report()?.blocks ?? [];
    const contested = new Set(this.state.conflicts().map(({ blockId }) => blockId));
    const byId = new Map(blocks.map((block) => [block.id, block]));
    const shown = blocks.map((block) =>
      contested.has(block.id) ? { ...block, removedAt: null } : block,
    );
    return visibleBlocks({ blocks: shown }).map((block) => byId.get(block.id) ?? block);
  });

  constructor() {
    afterNextRender(() => {
      this.layout.watch(this.flow().nativeElement);
    });
  }

  protected nameOf(block: Block): string {
    return this.actions.nameOf(block.id);
  }

  protected mayMove(block: Block): boolean {
    return this.actions.mayChangeKind(block.kind);
  }

  protected drop(event: CdkDragDrop<unknown, unknown, Block>): void {
    if (event.previousIndex === event.currentIndex) return;
    this.actions.moveTo(event.item.data.id, event.currentIndex);
  }
}
