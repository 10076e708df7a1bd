import { inject, Injectable } from '@angular/core';
import { type Block, blockKindOf } from '#shared/report';
import type { TextDocument } from '#shared/report/text';
import { newId } from '../../ui/new-id';
import { BlockActions } from '../block-actions/block-actions';
import { DraftKeeper } from '../report-store/draft-keeper';
import { ReportStore } from '../report-store/report-store';
import { ReportSync } from '../report-store/report-sync';

const REST_MILLISECONDS = 10_000;

/** What the session needs of the open editor. */
export interface OpenText {
  /** What was done since the last time, as JSON of text steps. */
  readonly steps: readonly unknown[];
  /** Forgets those steps: they have become a step of the report. */
  settle(): void;
}

/**
 * Turns typing into steps: on leaving the text, after a rest, and before steps of others come in.
 * Until then the text is a draft. All steps of one stay in a text are undone together.
 */
@Injectable()
export class TextEditSession {
  private readonly store = inject(ReportStore);
  private readonly actions = inject(BlockActions);
  private readonly drafts = inject(DraftKeeper);
  private readonly sync = inject(ReportSync);
  private open: {
    readonly blockId: string;
    readonly text: OpenText;
    readonly group: string;
  } | null = null;
  private rest: ReturnType<typeof setTimeout> | undefined;

  begin(blockId: string, text: OpenText): void {
    this.open = { blockId, text, group: newId() };
    this.sync.beforeOthers = () => {
      this.commit();
    };
  }

  changed(blockId: string, document: TextDocument): void {
    const block = this.store.block(blockId);
    const content = block === undefined ? null : contentWith(block, document);
    if (block === undefined || content === null) return;
    this.drafts.keep({ blockId, baseVersion: block.version, content });
    clearTimeout(this.rest);
    this.rest = setTimeout(() => {
      this.commit();
    }, REST_MILLISECONDS);
  }

  end(): void {
    this.commit();
    this.sync.beforeOthers = () => undefined;
    this.open = null;
  }

  /** Makes a step of what was typed. Words that are refused stay in the editor and in the draft. */
  commit(): void {
    clearTimeout(this.rest);
    if (this.open === null) return;
    const { blockId, text, group } = this.open;
    const baseVersion = this.store.block(blockId)?.version;
    const { steps } = text;
    if (baseVersion === undefined || steps.length === 0) return;
    if (this.actions.make([{ kind: 'editText', blockId, baseVersion, steps }], group)) {
      text.settle();
      this.sync.keepUnsent();
      this.drafts.drop(blockId);
    }
  }
}

function contentWith(block: Block, document: TextDocument): unknown {
  const kind = blockKindOf(block.kind);
  if (!kind.ok || kind.value.editableText === null) return null;
  return kind.value.editableText.withDocument(block.content, document);
}
