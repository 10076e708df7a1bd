import { inject, Injectable } from '@angular/core';
import {
  type Block,
  blockKindOf,
  type PinnedAnalysis,
  placeAfter,
  reportIssueText,
  type Step,
} from '#shared/report';
import type { StudyAction } from '#shared/permissions';
import { type Observable, of } from 'rxjs';
import { CurrentStudy } from '../../session/current-study';
import { newId } from '../../ui/new-id';
import { Notices } from '../../ui/notices/notices';
import { ProofDesk } from '../proof/proof-desk';
import { ReportState } from '../report-store/report-state';
import { ReportStore } from '../report-store/report-store';
import { AnalysisPicker } from './analysis-picker';
import { blockName } from './block-name';
import { ProofWords } from '../proof/proof-words';

/** What can be done with whole blocks, by keys, menus and drags alike. */
@Injectable()
export class BlockActions {
  private readonly store = inject(ReportStore);
  private readonly state = inject(ReportState);
  private readonly desk = inject(ProofDesk);
  private readonly study = inject(CurrentStudy);
  private readonly picker = inject(AnalysisPicker);
  private readonly words = inject(ProofWords);
  private readonly notices = inject(Notices);

  /** Whether this person may change blocks of a kind. Reads signals. */
  mayChangeKind(kindId: string): boolean {
    const kind = blockKindOf(kindId);
    const rights = kind.ok ? kind.value.rights : 'words';
    return this.state.isOpen() && this.study.may(ACTIONS[rights]);
  }

  mayChange(blockId: string): boolean {
    const block = this.store.block(blockId);
    return block !== undefined && this.mayChangeKind(block.kind);
  }

  /** "Table 2", or the kind of a block that has no number. Reads signals. */
  nameOf(blockId: string): string {
    return blockName(this.store.block(blockId), this.words.references());
  }

  /** Adds a block after another (null: at the top) and opens it. */
  add(kindId: string, afterId: string | null): void {
    const kind = blockKindOf(kindId);
    if (!kind.ok) return;
    const analysis: Observable<PinnedAnalysis | null> = kind.value.needsAnalysis
      ? this.picker.pick()
      : of(null);
    analysis.subscribe((picked) => {
      if (picked !== null) this.state.offer(picked);
      this.insert(kindId, kind.value.emptyContent({ analysis: picked }), afterId);
    });
  }

  remove(blockId: string): void {
    if (!this.mayChange(blockId)) return;
    const name = this.nameOf(blockId);
    const next = this.desk.neighbour(1) ?? this.desk.neighbour(-1);
    if (!this.make([{ kind: 'removeBlock', blockId }])) return;
    this.desk.select(next);
    this.notices.offer(`${name} removed.`, 'Undo', () => {
      this.store.dispatch([{ kind: 'restoreBlock', blockId }]);
      this.desk.select(blockId);
    });
  }

  /** Moves a block one place. */
  shift(blockId: string, step: 1 | -1): void {
    const blocks = this.store.blocks();
    const place = blocks.findIndex((block) => block.id === blockId);
    const target = place + step;
    if (place === -1 || target < 0 || target >= blocks.length) return;
    this.moveTo(blockId, target);
  }

  /** Moves a block to a place, counted without the block itself. */
  moveTo(blockId: string, place: number): void {
    const report = this.store.report();
    const block = this.store.block(blockId);
    if (report === null || block === undefined || !this.mayChange(blockId)) return;
    const others = this.store.blocks().filter((each) => each.id !== blockId);
    const previous = others[place - 1]?.id ?? null;
    const { orderKey, rekeyed } = placeAfter(report, previous, blockId);
    if (!this.make([moveStep(block, orderKey), ...this.rekeySteps(rekeyed)])) return;
    if (this.desk.selected() === blockId) this.desk.focusAfterDrawing(blockId);
  }

  /** Makes steps; says in plain words when one cannot be made. */
  make(steps: readonly Step[], groupId = newId()): boolean {
    const made = this.store.dispatch(steps, groupId);
    if (!made.ok) this.notices.say(reportIssueText(made.issue));
    return made.ok;
  }

  private insert(kindId: string, content: unknown, afterId: string | null): void {
    const report = this.store.report();
    if (report === null) return;
    const { orderKey, rekeyed } = placeAfter(report, afterId);
    const block = { id: newId(), kind: kindId, orderKey, content };
    if (this.make([{ kind: 'insertBlock', block }, ...this.rekeySteps(rekeyed)])) {
      this.desk.edit(block.id);
    }
  }

  private rekeySteps(
    rekeyed: readonly { readonly blockId: string; readonly orderKey: string }[],
  ): readonly Step[] {
    return rekeyed.flatMap(({ blockId, orderKey }) => {
      const block = this.store.block(blockId);
      return block === undefined ? [] : [moveStep(block, orderKey)];
    });
  }
}

const ACTIONS: Readonly<Record<'words' | 'numbers', StudyAction>> = {
  words: 'editWordsBlocks',
  numbers: 'editNumbersBlocks',
};

function moveStep(block: Block, orderKey: string): Step {
  const { id: blockId, positionVersion: basePositionVersion } = block;
  return { kind: 'moveBlock', blockId, basePositionVersion, orderKey };
}
