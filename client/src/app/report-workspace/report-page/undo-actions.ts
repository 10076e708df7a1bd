import { inject, Injectable } from '@angular/core';
import type { Result } from '#shared/core';
import { Notices } from '../../ui/notices/notices';
import { ReportStore } from '../report-store/report-store';
import type { UndoIssue } from '../report-store/undo-history';

const WORDS: Readonly<Record<UndoIssue, string>> = {
  nothingToUndo: 'There is nothing to take back.',
  changedSince: 'This cannot be taken back: the block has changed since.',
  numbersMovedSince: 'This cannot be taken back: the numbers behind it have moved since.',
};

/** Takes back and does again, and says why when it cannot. */
@Injectable()
export class UndoActions {
  private readonly store = inject(ReportStore);
  private readonly notices = inject(Notices);

  undo(): void {
    this.tell(this.store.undo());
  }

  redo(): void {
    this.tell(this.store.redo());
  }

  private tell(done: Result<void, UndoIssue>): void {
    if (!done.ok) this.notices.say(WORDS[done.issue]);
  }
}
