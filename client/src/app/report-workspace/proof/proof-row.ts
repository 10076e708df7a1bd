import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  DestroyRef,
  ElementRef,
  inject,
  input,
} from '@angular/core';
import type { Block } from '#shared/report';
import { ReportChecks } from '../checks/report-checks';
import { noteId } from '../checks/note-id';
import { CheckNote } from '../margins/check-note';
import { SourceNote } from '../margins/source-note';
import { ProofBlock } from './proof-block';
import type { ProofCheck } from '../checks/proof-check';
import { DrawQueue } from './draw-queue';
import { ProofDesk } from './proof-desk';

/** A block between its two margins: on the left where its numbers come from, on the right notes. */
@Component({
  selector: 'eh-proof-row',
  imports: [CheckNote, ProofBlock, SourceNote],
  template: `
    <eh-proof-block
      [block]="block()"
      [selected]="selected()"
      [editing]="editing()"
      [printed]="printed()"
      [detailIds]="noteIds()"
    />
    <eh-source-note
      class="sources"
      [class.selected]="selected()"
      [blockId]="block().id"
      [printed]="printed()"
      [selected]="selected()"
    />
    <div class="checks">
      @for (check of checks(); track check.id) {
        <eh-check-note [check]="check" />
      }
    </div>
  `,
  styleUrl: './proof-row.scss',
  host: { '[class.selected]': 'selected()' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ProofRow {
  private readonly desk = inject(ProofDesk);
  private readonly reportChecks = inject(ReportChecks);
  private readonly queue = inject(DrawQueue);

  readonly block = input.required<Block>();

  private readonly id = computed(() => this.block().id);
  protected readonly selected = computed(() => this.desk.selected() === this.id());
  protected readonly editing = computed(() => this.desk.editing() === this.id());
  protected readonly printed = computed(() => this.queue.of(this.id())());
  protected readonly checks = computed(() => this.reportChecks.of(this.id()), {
    equal: sameChecks,
  });
  protected readonly noteIds = computed(() => this.checks().map(noteId).join(' '));

  constructor() {
    const row = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
    const destroyed = inject(DestroyRef);
    afterNextRender(() => {
      destroyed.onDestroy(this.queue.watch(row, this.id()));
    });
  }
}

/** Rules look again after every change; most of what they say stays the same. */
function sameChecks(one: readonly ProofCheck[], other: readonly ProofCheck[]): boolean {
  return (
    one.length === other.length &&
    one.every((check, index) => check.id === other[index]?.id && check.text === other[index].text)
  );
}
