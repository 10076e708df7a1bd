import { inject, Injectable } from '@angular/core';
import type { DraftView } from '#shared/api';
import { timeOfDay } from '../../ui/dates';
import { Notices } from '../../ui/notices/notices';
import { DraftKeeper } from './draft-keeper';
import { sameJson } from './edit-conflict';
import { ReportState } from './report-state';
import { ReportStore } from './report-store';
import { contest } from './shared-report';

/** Puts back what was being written when the page was last left. */
@Injectable()
export class DraftRecovery {
  private readonly store = inject(ReportStore);
  private readonly state = inject(ReportState);
  private readonly keeper = inject(DraftKeeper);
  private readonly notices = inject(Notices);

  /**
   * Makes steps of the drafts that still fit. One whose block somebody has changed since stands
   * beside the newer version, for the person to choose.
   */
  putBack(): void {
    const put = this.keeper.left().filter((draft) => this.take(draft));
    const [last] = put.toSorted((one, other) => (one.savedAt < other.savedAt ? 1 : -1));
    if (last === undefined) return;
    const sentence = `Words from ${timeOfDay(last.savedAt)} that were not finished are back.`;
    this.notices.offer(sentence, 'Undo', () => this.store.undo());
  }

  private take(draft: DraftView): boolean {
    const block = this.store.block(draft.blockId);
    const put =
      block?.removedAt === null &&
      !sameJson(block.content, draft.content) &&
      (block.version === draft.baseVersion ? this.replace(draft) : this.contest(draft));
    this.keeper.drop(draft.blockId);
    return put;
  }

  private replace({ blockId, baseVersion, content }: DraftView): boolean {
    return this.store.dispatch([{ kind: 'replaceContent', blockId, baseVersion, content }]).ok;
  }

  private contest({ blockId, content, savedAt }: DraftView): boolean {
    const conflict = { blockId, mine: content, author: null, at: savedAt };
    this.state.shared.update((shared) => shared && contest(shared, conflict, savedAt));
    return false;
  }
}
