import { computed, inject, Injectable, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import type { ReadingOptions, UploadView } from '#shared/api';
import {
  catchError,
  concat,
  concatMap,
  EMPTY,
  exhaustMap,
  type Observable,
  of,
  Subject,
  switchMap,
  takeWhile,
  timer,
} from 'rxjs';
import { ApiProblem } from '../../server-api/api-problem';
import { DataApi } from '../../server-api/data-api';
import type { UploadEvent } from '../../server-api/upload-event';
import { CurrentStudy } from '../../session/current-study';

const POLL_MILLISECONDS = 400;

/** Options that leave everything to the reader. */
export const FIND_OUT: ReadingOptions = {
  delimiter: null,
  encoding: null,
  decimalMark: null,
  sheet: null,
};

/** A file on its way: sent, then read by the server until its contents are known. */
@Injectable()
export class UploadStore {
  private readonly api = inject(DataApi);
  private readonly studyId = inject(CurrentStudy).study()?.id ?? '';
  /** What is under way; the next one breaks off the one before. */
  private readonly work = new Subject<Observable<UploadView>>();

  readonly upload = signal<UploadView | null>(null);
  /** Share of the file that was sent, 0..1; null when nothing is being sent. */
  readonly sending = signal<number | null>(null);
  /** Why the file was refused or lost. */
  readonly problem = signal<ApiProblem | null>(null);
  readonly isReading = computed(() => this.upload()?.state === 'reading');
  readonly isProfiled = computed(() => this.upload()?.state === 'profiled');

  constructor() {
    this.work
      .pipe(
        switchMap((views) => views.pipe(catchError((failure: unknown) => this.lose(failure)))),
        takeUntilDestroyed(),
      )
      .subscribe((upload) => {
        this.take(upload);
      });
  }

  send(file: File, dataSetId: string | null): void {
    this.discard();
    this.problem.set(null);
    this.sending.set(0);
    const sent = this.api.upload(this.studyId, { file, options: FIND_OUT, dataSetId });
    this.work.next(sent.pipe(concatMap((event) => this.arrived(event))));
  }

  /** Takes an upload up again that the server holds already. */
  resume(uploadId: string): void {
    this.work.next(this.followed(uploadId));
  }

  readAgain(options: ReadingOptions): void {
    const uploadId = this.upload()?.id;
    if (uploadId === undefined) return;
    this.problem.set(null);
    const again = this.api.changeReadingOptions(this.studyId, uploadId, options);
    this.work.next(again.pipe(concatMap(() => this.followed(uploadId))));
  }

  /** Breaks off whatever is under way and gives the file up. */
  discard(): void {
    this.work.next(EMPTY);
    this.sending.set(null);
    const uploadId = this.upload()?.id;
    this.upload.set(null);
    if (uploadId !== undefined) this.api.discardUpload(this.studyId, uploadId).subscribe();
  }

  private arrived(event: UploadEvent<UploadView>): Observable<UploadView> {
    if (event.kind === 'sending') {
      this.sending.set(event.share);
      return EMPTY;
    }
    this.sending.set(null);
    return concat(of(event.answer), this.followed(event.answer.id));
  }

  /** Asks how the reading goes until it has an end. */
  private followed(uploadId: string): Observable<UploadView> {
    return timer(0, POLL_MILLISECONDS).pipe(
      exhaustMap(() => this.api.readUpload(this.studyId, uploadId)),
      takeWhile(({ state }) => state === 'reading' || state === 'storing', true),
    );
  }

  private take(upload: UploadView): void {
    this.upload.set(upload);
    if (upload.problem === null) return;
    const { code, message, wayOut } = upload.problem;
    this.problem.set(new ApiProblem({ code, title: message, wayOut }));
  }

  /** A file that the server does not hold any more can't be gone on with. */
  private lose(failure: unknown): Observable<never> {
    const problem = ApiProblem.from(failure);
    this.sending.set(null);
    this.problem.set(problem);
    if (problem.status === 404) this.upload.set(null);
    return EMPTY;
  }
}
