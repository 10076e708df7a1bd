import { computed, inject, Injectable, signal } from '@angular/core';
import type { CodeBookView, CutView, DataSetView } from '#shared/api';
import { type CodeBook, validateCodeBook } from '#shared/code-book';
import { type Observable, of, switchMap, zip } from 'rxjs';
import { ApiProblem } from '../server-api/api-problem';
import { DataApi } from '../server-api/data-api';
import { CurrentStudy } from '../session/current-study';
import { onTopOf } from './code-book-differences';

/** The code book of a data set while it is edited. */
@Injectable()
export class CodeBookStore {
  private readonly api = inject(DataApi);
  private readonly studyId = inject(CurrentStudy).study()?.id ?? '';

  readonly dataSet = signal<DataSetView | null>(null);
  readonly cut = signal<CutView | null>(null);
  readonly saved = signal<CodeBookView | null>(null);
  readonly codeBook = signal<CodeBook | null>(null);
  readonly saving = signal(false);
  readonly problem = signal<ApiProblem | null>(null);
  /** Somebody else's newer code book, when saving met one. */
  readonly theirs = signal<CodeBookView | null>(null);

  /** Their code book with one's own changes on top. */
  readonly onTop = computed(() => {
    const [theirs, mine, saved] = [this.theirs(), this.codeBook(), this.saved()];
    if (theirs === null || mine === null || saved === null) return null;
    return onTopOf(theirs.content, mine, saved.content);
  });
  readonly isChanged = computed(() => {
    const [saved, codeBook] = [this.saved(), this.codeBook()];
    return saved !== null && codeBook !== null && saved.content !== codeBook;
  });
  readonly findings = computed(() => {
    const codeBook = this.codeBook();
    return codeBook === null ? [] : validateCodeBook(codeBook);
  });
  readonly refusals = computed(() =>
    this.findings().filter(({ severity }) => severity === 'refusal'),
  );

  open(dataSetId: string): void {
    this.problem.set(null);
    this.theirs.set(null);
    zip(this.api.readCodeBook(this.studyId, dataSetId), this.api.listDataSets(this.studyId))
      .pipe(
        switchMap(([book, dataSets]) => {
          this.take(book);
          this.dataSet.set(dataSets.find(({ id }) => id === dataSetId) ?? null);
          return this.readNewestCut();
        }),
      )
      .subscribe({
        next: (cut) => {
          this.cut.set(cut);
        },
        error: (failure: unknown) => {
          this.problem.set(ApiProblem.from(failure));
        },
      });
  }

  /** Saves under a new number. A newer code book of somebody else is shown, and nothing is lost. */
  save(): void {
    const [saved, content] = [this.saved(), this.codeBook()];
    if (saved === null || content === null) return;
    this.send(saved.dataSetId, saved.number, content);
  }

  /** Puts the own changes on top of the newer code book. */
  keepOwn(): void {
    const [theirs, content] = [this.theirs(), this.onTop()];
    if (theirs !== null && content !== null) this.send(theirs.dataSetId, theirs.number, content);
  }

  /** Gives the own version up for the newer one. */
  takeTheirs(): void {
    const theirs = this.theirs();
    if (theirs !== null) this.take(theirs);
  }

  /** Back to what is saved. */
  undo(): void {
    const saved = this.saved();
    if (saved !== null) this.take(saved);
  }

  private send(dataSetId: string, baseNumber: number, content: CodeBook): void {
    this.saving.set(true);
    this.problem.set(null);
    this.api.changeCodeBook(this.studyId, dataSetId, { baseNumber, content }).subscribe({
      next: (book) => {
        this.saving.set(false);
        this.take(book);
      },
      error: (failure: unknown) => {
        this.saving.set(false);
        this.refuse(dataSetId, ApiProblem.from(failure));
      },
    });
  }

  /** Over somebody's newer version both are shown. */
  private refuse(dataSetId: string, problem: ApiProblem): void {
    if (problem.status !== 409) {
      this.problem.set(problem);
      return;
    }
    this.api.readCodeBook(this.studyId, dataSetId).subscribe({
      next: (book) => {
        this.theirs.set(book);
      },
      error: () => {
        this.problem.set(problem);
      },
    });
  }

  private take(book: CodeBookView): void {
    this.saved.set(book);
    this.codeBook.set(book.content);
    this.theirs.set(null);
    this.problem.set(null);
  }

  private readNewestCut(): Observable<CutView | null> {
    const cuts = this.dataSet()?.cuts ?? [];
    const newest = cuts.toSorted((one, other) => other.number - one.number)[0];
    return newest === undefined ? of(null) : this.api.readCut(this.studyId, newest.id);
  }
}
