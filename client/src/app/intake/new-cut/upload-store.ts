import { computed, DestroyRef, inject, Injectable, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import type { ReadingOptions, UploadView } from '#shared/api';
import { type Observable, of, Subscription, switchMap, takeWhile, timer } from 'rxjs';
import { ApiProblem } from '../../server-api/api-problem';
import { DataApi } from '../../server-api/data-api';
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
  private readonly destroyRef = inject(DestroyRef);
  private readonly studyId = inject(CurrentStudy).study()?.id ?? '';
  private following = Subscription.EMPTY;

  readonly upload = signal<UploadView | null>(null);
  /** Share of the file that was sent, 0..1; null when nothing is being sent. */
  readonly sending = signal<number | null>(null);
  /** Why the file was refused or lost. */
  readonly problem = signal<ApiProblem | null>(null);
  readonly isReading = computed(() => this.upload()?.state === 'reading');
  readonly isProfiled = computed(() => this.upload()?.state === 'profiled');

  send(file: File, dataSetId: string | null): void {
    this.discard();
    this.problem.set(null);
    this.sending.set(0);
    this.following = this.api
      .upload(this.studyId, { file, options: FIND_OUT, dataSetId })
      .subscribe({
        next: (event) => {
          if (event.kind === 'sending') this.sending.set(event.share);
          else this.begin(event.answer);
        },
        error: (failure: unknown) => {
          this.sending.set(null);
          this.problem.set(ApiProblem.from(failure));
        },
      });
  }

  /** Takes an upload up again that the server holds already. */
  resume(uploadId: string): void {
    this.follow(uploadId, of(null));
  }

  readAgain(options: ReadingOptions): void {
    const uploadId = this.upload()?.id;
    if (uploadId === undefined) return;
    this.problem.set(null);
    this.follow(uploadId, this.api.changeReadingOptions(this.studyId, uploadId, options));
  }

  /** Breaks off whatever is under way and gives the file up. */
  discard(): void {
    this.following.unsubscribe();
    this.sending.set(null);
    const uploadId = this.upload()?.id;
    this.upload.set(null);
    if (uploadId !== undefined) this.api.discardUpload(this.studyId, uploadId).subscribe();
  }

  private begin(upload: UploadView): void {
    this.sending.set(null);
    this.upload.set(upload);
    this.follow(upload.id, of(null));
  }

  /** Asks how the reading goes until it has an end. */
  private follow(uploadId: string, first: Observable<unknown>): void {
    this.following.unsubscribe();
    this.following = first
      .pipe(
        switchMap(() => timer(0, POLL_MILLISECONDS)),
        switchMap(() => this.api.readUpload(this.studyId, uploadId)),
        takeWhile(({ state }) => state === 'reading' || state === 'storing', true),
        takeUntilDestroyed(this.destroyRef),
      )
      .subscribe({
        next: (upload) => {
          this.take(upload);
        },
        error: (failure: unknown) => {
          this.lose(ApiProblem.from(failure));
        },
      });
  }

  private take(upload: UploadView): void {
    this.upload.set(upload);
    if (upload.problem === null) return;
    const { code, message, wayOut } = upload.problem;
    this.problem.set(new ApiProblem({ code, title: message, wayOut }));
  }

  /** A file that the server does not hold any more can't be gone on with. */
  private lose(problem: ApiProblem): void {
    this.problem.set(problem);
    if (problem.status === 404) this.upload.set(null);
  }
}
