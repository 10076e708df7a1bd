import { ChangeDetectionStrategy, Component, computed, inject, output } from '@angular/core';
import { carryOver } from '#shared/code-book';
import { MarginNote } from '../../ui/status/margin-note';
import { compareCuts } from './compare-cuts';
import { NewCutStore } from './new-cut-store';
import { PreviousCut } from './previous-cut';
import { UploadStore } from './upload-store';

/** Beside the steps: what has to be settled, what is odd, and what differs from the last cut. */
@Component({
  selector: 'eh-settle-notes',
  imports: [MarginNote],
  templateUrl: './settle-notes.html',
  styleUrl: './settle-notes.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SettleNotes {
  /** The column that a note speaks of was asked for. */
  readonly shown = output<string>();

  protected readonly store = inject(NewCutStore);
  protected readonly previous = inject(PreviousCut);
  private readonly uploads = inject(UploadStore);

  protected readonly warnings = computed(() => this.uploads.upload()?.profile?.warnings ?? []);
  protected readonly differences = computed(() => {
    const [book, profile] = [this.previous.book(), this.uploads.upload()?.profile ?? null];
    return book === null || profile === null ? [] : carryOver(book.content, profile).differences;
  });
  protected readonly comparison = computed(() => {
    const [before, after] = [this.previous.cut(), this.store.profile()];
    return before === null || after === null ? [] : compareCuts(before.profile, after);
  });
  protected readonly heading = computed(() => {
    const count = this.store.refusals().length;
    if (count > 0) return `${count} to settle`;
    return this.store.findings().length + this.warnings().length === 0
      ? 'Nothing to settle'
      : 'Worth a look';
  });

  protected columnName(columnId: string | null): string {
    const column = this.store.codeBook()?.columns.find(({ id }) => id === columnId);
    return column?.label ?? 'The file';
  }
}
