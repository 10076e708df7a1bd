import { computed, inject, Injectable } from '@angular/core';
import { timeOfDay } from '../../ui/dates';
import { DraftKeeper } from './draft-keeper';
import { ReportState } from './report-state';
import { ReportSync } from './report-sync';
import { StepTransport } from './step-transport';

/** How far a person's work has come, in a word or two, with the reason where it got stuck. */
export interface SaveWords {
  readonly kind: 'saved' | 'saving' | 'stuck' | 'contested';
  readonly words: string;
  readonly reason: string;
}

/** Says whether everything is saved. */
@Injectable()
export class SaveState {
  private readonly state = inject(ReportState);
  private readonly sync = inject(ReportSync);
  private readonly transport = inject(StepTransport);
  private readonly drafts = inject(DraftKeeper);

  /** Whether leaving now would leave something unsent. */
  readonly unsent = computed(
    () =>
      this.state.pending().length > 0 ||
      this.sync.recovering().length > 0 ||
      this.state.conflicts().length > 0 ||
      this.drafts.writing(),
  );

  readonly words = computed((): SaveWords => {
    const trouble = this.transport.trouble();
    if (trouble !== null) {
      const reason = `${trouble.title} Your work is kept in this browser and sent again.`;
      return { kind: 'stuck', words: 'Not saved yet', reason };
    }
    if (this.state.conflicts().length > 0) {
      return { kind: 'contested', words: 'Two versions', reason: 'Choose one to go on.' };
    }
    if (this.unsent()) return { kind: 'saving', words: 'Saving', reason: '' };
    const at = this.state.lastSavedAt();
    return { kind: 'saved', words: at === null ? 'Saved' : `Saved ${timeOfDay(at)}`, reason: '' };
  });
}
