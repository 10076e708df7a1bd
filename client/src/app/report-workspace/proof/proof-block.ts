import { CdkDragHandle } from '@angular/cdk/drag-drop';
import { NgComponentOutlet } from '@angular/common';
import {
  ChangeDetectionStrategy,
  Component,
  computed,
  DOCUMENT,
  effect,
  ElementRef,
  inject,
  input,
  untracked,
} from '@angular/core';
import type { Block } from '#shared/report';
import { ProofElement, ProofFigure } from '../../ui/proof/proof-element';
import { AddBlock } from '../block-actions/add-block';
import { BlockActions } from '../block-actions/block-actions';
import { BlockMenu } from '../block-actions/block-menu';
import { kindOf, textOf } from '../block-editors/block-content';
import { companionOf } from '../block-editors/companions';
import { ConflictPanel } from './conflict-panel';
import { BlockEditor } from '../block-editors/block-editor';
import { ProofChart } from '../figures/proof-chart';
import { ReportState } from '../report-store/report-state';
import type { PrintedBlock } from './printed-block';
import { printsNothing } from './prints-nothing';
import { ProofDesk } from './proof-desk';

/** One block as it prints, with what moves, adds and opens it. */
@Component({
  selector: 'eh-proof-block',
  imports: [
    AddBlock,
    BlockEditor,
    BlockMenu,
    CdkDragHandle,
    ConflictPanel,
    NgComponentOutlet,
    ProofChart,
    ProofElement,
    ProofFigure,
  ],
  templateUrl: './proof-block.html',
  styleUrl: './proof-block.scss',
  host: {
    role: 'group',
    '[tabindex]': 'isStop() ? 0 : -1',
    '[attr.id]': '"block-" + block().id',
    '[attr.aria-label]': 'name()',
    '[attr.aria-details]': 'detailIds() || null',
    '[class.selected]': 'selected()',
    '[class.editing]': 'editing()',
    '(focusin)': 'takeFocused()',
    '(pointerdown)': 'press()',
    '(click)': 'click($event)',
    '(dblclick)': 'open()',
  },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ProofBlock {
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  private readonly document = inject(DOCUMENT);
  protected readonly desk = inject(ProofDesk);
  private readonly state = inject(ReportState);
  private readonly actions = inject(BlockActions);

  readonly block = input.required<Block>();
  readonly selected = input.required<boolean>();
  readonly editing = input.required<boolean>();
  /** What it prints; null as long as it was not drawn. */
  readonly printed = input.required<PrintedBlock | null>();
  /** Ids of the notes that tell more about the block. */
  readonly detailIds = input('');

  private readonly id = computed(() => this.block().id);
  protected readonly elements = computed(() => this.printed()?.elements ?? []);
  protected readonly name = computed(() => this.actions.nameOf(this.id()));
  protected readonly mayChange = computed(() => this.actions.mayChangeKind(this.block().kind));
  protected readonly conflict = computed(() =>
    this.state.conflicts().find((conflict) => conflict.blockId === this.id()),
  );
  protected readonly companion = computed(() => companionOf(this.block().kind)?.component ?? null);
  protected readonly companionInputs = computed(() => ({ block: this.block() }));
  protected readonly hint = computed(() => {
    if (this.printed() === null || !printsNothing(this.elements())) return null;
    const text = textOf(this.block());
    return `Empty ${kindOf(this.block())?.label.toLowerCase() ?? 'block'}. ${text?.hint ?? ''}`;
  });
  /** One block is a stop of the Tab key; the arrow keys go from block to block. */
  protected readonly isStop = computed(() => this.desk.tabStop() === this.id());

  constructor() {
    effect(() => {
      if (!this.selected() || this.editing()) return;
      untracked(() => {
        this.takeFocus();
      });
    });
  }

  protected takeFocused(): void {
    if (!this.pressed) this.take();
  }

  /**
   * A press takes the block in hand when it ends: what unfolds under a block in hand would move the
   * button away from under the pointer, and the press would be lost.
   */
  protected press(): void {
    this.pressed = true;
    this.wasSelected = this.selected();
    const released = new AbortController();
    const end = (event: Event): void => {
      released.abort();
      this.pressed = false;
      if (event.type === 'pointerup') this.take();
    };
    for (const type of ['pointerup', 'pointercancel']) {
      this.document.addEventListener(type, end, { signal: released.signal });
    }
  }

  /** The first press takes the block in hand; the next one, into its text, opens it. */
  protected click(event: MouseEvent): void {
    const pressed = event.target as Element;
    const onText = pressed.closest('eh-proof-element') !== null;
    const onControl = pressed.closest('button, a, summary, input, select') !== null;
    if (this.wasSelected && onText && !onControl && textOf(this.block()) !== null) this.open();
  }

  protected open(): void {
    if (this.mayChange() && !this.editing()) this.desk.edit(this.id());
  }

  protected follow(blockId: string): void {
    this.desk.select(blockId);
  }

  protected leave(): void {
    this.desk.leave();
    this.host.focus();
  }

  private wasSelected = false;
  private pressed = false;

  private take(): void {
    if (!this.selected()) this.desk.select(this.id());
  }

  private takeFocus(): void {
    if (this.host.contains(this.document.activeElement)) return;
    const elsewhere = this.document.activeElement?.closest('[role=dialog], eh-frame-bar') ?? null;
    if (elsewhere === null) this.host.focus();
  }
}
