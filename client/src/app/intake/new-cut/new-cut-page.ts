import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  signal,
  untracked,
} from '@angular/core';
import { Router, RouterLink } from '@angular/router';
import { CurrentStudy } from '../../session/current-study';
import { Bar, BarActions, BarBeside } from '../../ui/bar/bar';
import { CodeBookEditor } from '../../ui/code-book-editor/code-book-editor';
import { dateAndTime } from '../../ui/dates';
import { Confirm } from '../../ui/dialog/confirm';
import { CheckStep } from './check-step';
import { ColumnsStep } from './columns-step';
import { CUT_STEPS, type CutStep, CutSteps } from './cut-steps';
import { MadeStep } from './made-step';
import { NewCutStore } from './new-cut-store';
import { PreviousCut } from './previous-cut';
import { SettleNotes } from './settle-notes';
import { UploadStep } from './upload-step';
import { UploadStore } from './upload-store';

/** Makes a data cut of a file, step by step; nothing is stored before the last one. */
@Component({
  selector: 'eh-new-cut-page',
  imports: [
    Bar,
    BarActions,
    BarBeside,
    CheckStep,
    CodeBookEditor,
    ColumnsStep,
    CutSteps,
    MadeStep,
    RouterLink,
    SettleNotes,
    UploadStep,
  ],
  providers: [NewCutStore, PreviousCut, UploadStore],
  templateUrl: './new-cut-page.html',
  styleUrl: './new-cut-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NewCutPage {
  /** From the address: the data set that the cut is for, or the upload to go on with. */
  readonly dataSet = input<string>();
  readonly upload = input<string>();

  protected readonly store = inject(NewCutStore);
  protected readonly study = inject(CurrentStudy).study;
  private readonly uploads = inject(UploadStore);
  private readonly router = inject(Router);
  private readonly confirm = inject(Confirm);

  protected readonly step = signal<CutStep>('upload');
  protected readonly columnId = signal<string | null>(null);
  protected readonly home = computed(() => ['/studies', this.study()?.id ?? '']);
  protected readonly isProfiled = this.uploads.isProfiled;
  protected readonly open = computed<readonly CutStep[]>(() => {
    if (this.store.made() !== null) return [];
    return this.isProfiled() ? CUT_STEPS.slice(0, 4) : ['upload'];
  });
  protected readonly notes = computed(() => this.stepNotes());
  protected readonly savedWords = computed(() => {
    const savedAt = this.store.savedAt();
    return savedAt === null ? '' : `Kept ${dateAndTime(savedAt)}`;
  });
  /** Why the cut can't be made yet; empty when it can. */
  protected readonly obstacle = computed(() => {
    if (!this.isProfiled()) return 'Load a file first.';
    const refusals = this.store.refusals().length;
    if (refusals > 0) return `After ${refusals} settled`;
    if (this.store.dataSet() === null && this.store.dataSetName().trim() === '') {
      return 'Name the data set first.';
    }
    return this.store.dataDate() === '' ? 'Give the date of the data first.' : '';
  });

  constructor() {
    effect(() => {
      const [dataSet, upload] = [this.dataSet(), this.upload()];
      untracked(() => {
        if (dataSet !== undefined) this.store.aim(dataSet);
        if (upload !== undefined) this.store.resume(upload);
      });
    });
    effect(() => {
      if (this.store.made() !== null) this.step.set('made');
    });
    effect(() => {
      if (!this.isProfiled() && this.store.made() === null) this.step.set('upload');
    });
  }

  protected showColumn(columnId: string): void {
    this.columnId.set(columnId);
    this.step.set('codeBook');
  }

  protected make(): void {
    if (this.step() !== 'check') this.step.set('check');
    else if (this.obstacle() === '' && !this.store.storing()) this.store.store();
  }

  protected discard(): void {
    this.confirm
      .ask({
        question: 'Discard this upload?',
        consequence: 'The file and what was settled about it go. No cut was made of it.',
        keep: 'Keep it',
        act: 'Discard it',
      })
      .subscribe((acted) => {
        if (!acted) return;
        this.store.drop();
        void this.router.navigate([...this.home(), 'data']);
      });
  }

  private stepNotes(): Readonly<Record<CutStep, string>> {
    const profile = this.store.profile();
    const columns = this.store.codeBook()?.columns ?? [];
    const used = columns.filter(({ kind }) => kind !== 'ignored').length;
    const refusals = this.store.refusals().length;
    const read = profile !== null;
    return {
      upload: read ? `${profile.rows.toLocaleString('en')} rows` : 'A file',
      columns: read ? `${used} of ${columns.length} used` : 'What they are',
      codeBook: refusals > 0 ? `${refusals} to settle` : 'Labels, order, missing',
      check: 'Name and date',
      made: this.obstacle() === '' ? 'Ready' : this.obstacle(),
    };
  }
}
