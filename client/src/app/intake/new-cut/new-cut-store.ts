import { computed, effect, inject, Injectable, signal, untracked } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import type { CutView, DataSetView, UploadView } from '#shared/api';
import { carryOver, type CodeBook, validateCodeBook } from '#shared/code-book';
import { ApiProblem } from '../../server-api/api-problem';
import { DataApi } from '../../server-api/data-api';
import { CurrentStudy } from '../../session/current-study';
import { NOW } from '../../ui/clock';
import { UnfinishedCuts } from '../unfinished-cuts';
import { dataValuesOf, isDoubtful, profileUnder } from './data-values';
import { PreviousCut } from './previous-cut';
import { UploadStore } from './upload-store';

/** A cut that is being made: its code book so far, and where it will go. */
@Injectable()
export class NewCutStore {
  private readonly api = inject(DataApi);
  private readonly unfinished = inject(UnfinishedCuts);
  private readonly uploads = inject(UploadStore);
  private readonly previous = inject(PreviousCut);
  private readonly now = inject(NOW);
  private readonly studyId = inject(CurrentStudy).study()?.id ?? '';
  private aimedId: string | null = null;
  private suggested = { name: '', date: '' };

  readonly dataSets = signal<readonly DataSetView[]>([]);
  readonly dataSet = this.previous.dataSet.asReadonly();
  readonly codeBook = signal<CodeBook | null>(null);
  readonly dataSetName = signal('');
  readonly dataDate = signal('');
  readonly savedAt = signal<string | null>(null);
  readonly storing = signal(false);
  /** Why the cut was not stored. */
  readonly problem = signal<ApiProblem | null>(null);
  readonly made = signal<CutView | null>(null);

  readonly profile = computed(() => {
    const profile = this.uploads.upload()?.profile ?? null;
    return profile === null ? null : profileUnder(profile, this.codeBook());
  });
  readonly cutNumber = computed(
    () => Math.max(0, ...(this.dataSet()?.cuts ?? []).map(({ number }) => number)) + 1,
  );
  readonly findings = computed(() => {
    const [codeBook, profile] = [this.codeBook(), this.profile()];
    if (codeBook === null || profile === null) return [];
    const findings = validateCodeBook(codeBook, dataValuesOf(profile));
    return findings.filter((finding) => !isDoubtful(finding, profile));
  });
  readonly refusals = computed(() =>
    this.findings().filter(({ severity }) => severity === 'refusal'),
  );

  constructor() {
    this.api
      .listDataSets(this.studyId)
      .pipe(takeUntilDestroyed())
      .subscribe((dataSets) => {
        this.dataSets.set(dataSets);
        this.aim(this.aimedId);
      });
    effect(() => {
      const upload = this.uploads.upload();
      if (upload?.state === 'profiled') {
        untracked(() => {
          this.begin(upload);
        });
      }
    });
    this.keepWhatIsSettled();
  }

  /** The data set that the cut is for; null for a new one. */
  aim(dataSetId: string | null): void {
    this.aimedId = dataSetId;
    this.previous.dataSet.set(this.dataSets().find(({ id }) => id === dataSetId) ?? null);
  }

  send(file: File): void {
    this.drop();
    this.suggestFrom(file.name);
    this.uploads.send(file, this.dataSet()?.id ?? null);
  }

  /** Takes up a cut that was left for later. */
  resume(uploadId: string): void {
    const left = this.unfinished.find(uploadId);
    if (left !== null) {
      this.codeBook.set(left.codeBook);
      this.aim(left.dataSetId);
      this.dataSetName.set(left.dataSetName);
      this.dataDate.set(left.dataDate);
    }
    this.uploads.resume(uploadId);
  }

  /** Reads the file in another way; its columns may be others then. */
  readAgain(options: Parameters<UploadStore['readAgain']>[0]): void {
    this.codeBook.set(null);
    this.uploads.readAgain(options);
  }

  /** Starts again from the code book of the data set. */
  useCodeBookOfDataSet(): void {
    const [book, profile] = [this.previous.book(), this.uploads.upload()?.profile ?? null];
    if (book !== null && profile !== null) {
      this.codeBook.set(carryOver(book.content, profile).codeBook);
    }
  }

  store(): void {
    const [upload, codeBook] = [this.uploads.upload(), this.codeBook()];
    if (upload === null || codeBook === null) return;
    this.problem.set(null);
    this.storing.set(true);
    const request = {
      dataSetId: this.dataSet()?.id ?? null,
      dataSetName: this.dataSet()?.name ?? this.dataSetName(),
      dataDate: this.dataDate(),
      codeBook,
    };
    this.api.storeCut(this.studyId, upload.id, request).subscribe({
      next: (cut) => {
        this.unfinished.forget(upload.id);
        this.storing.set(false);
        this.made.set(cut);
      },
      error: (failure: unknown) => {
        this.storing.set(false);
        this.problem.set(ApiProblem.from(failure));
      },
    });
  }

  /** Gives the file up. */
  drop(): void {
    const uploadId = this.uploads.upload()?.id;
    if (uploadId !== undefined) this.unfinished.forget(uploadId);
    this.codeBook.set(null);
    this.problem.set(null);
    this.uploads.discard();
  }

  /** What the file's name says, unless a person said something else. */
  private suggestFrom(fileName: string): void {
    const before = this.suggested;
    this.suggested = { name: nameOfFile(fileName), date: dateOfFile(fileName) };
    if (['', before.name].includes(this.dataSetName())) this.dataSetName.set(this.suggested.name);
    if (['', before.date].includes(this.dataDate())) this.dataDate.set(this.suggested.date);
  }

  private begin(upload: UploadView): void {
    if (this.codeBook() === null) this.codeBook.set(upload.proposedCodeBook);
  }

  /** Whatever is settled stays in this browser, so that leaving loses nothing. */
  private keepWhatIsSettled(): void {
    effect(() => {
      const upload = this.uploads.upload();
      const settled = {
        dataSetId: this.dataSet()?.id ?? null,
        dataSetName: this.dataSet()?.name ?? this.dataSetName(),
        dataDate: this.dataDate(),
        codeBook: this.codeBook(),
      };
      if (upload?.state !== 'profiled' || this.made() !== null) return;
      const { id: uploadId, fileName } = upload;
      const savedAt = this.now().toISOString();
      untracked(() => {
        this.unfinished.keep({ studyId: this.studyId, uploadId, fileName, savedAt, ...settled });
        this.savedAt.set(savedAt);
      });
    });
  }
}

function nameOfFile(fileName: string): string {
  return fileName
    .replace(/\.[^.]+$/, '')
    .replace(/[_\s]+/g, ' ')
    .trim();
}

/** The date that many file names carry, as in "wetwork_2025-11-28.csv". */
function dateOfFile(fileName: string): string {
  return /(\d{4}-\d{2}-\d{2})/.exec(fileName)?.[1] ?? '';
}
