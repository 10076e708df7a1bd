import { effect, inject, Injectable, signal } from '@angular/core';
import type { CodeBookView, CutView, DataSetView } from '#shared/api';
import { Subscription } from 'rxjs';
import { DataApi } from '../../server-api/data-api';
import { CurrentStudy } from '../../session/current-study';

/** The data set that a new cut is for: its code book and newest cut, to compare with. */
@Injectable()
export class PreviousCut {
  private readonly api = inject(DataApi);
  private readonly studyId = inject(CurrentStudy).study()?.id ?? '';

  /** Null for a new data set. */
  readonly dataSet = signal<DataSetView | null>(null);
  readonly book = signal<CodeBookView | null>(null);
  readonly cut = signal<CutView | null>(null);

  constructor() {
    effect((onCleanup) => {
      const dataSet = this.dataSet();
      this.book.set(null);
      this.cut.set(null);
      if (dataSet === null) return;
      const reading = this.read(dataSet);
      onCleanup(() => {
        reading.unsubscribe();
      });
    });
  }

  /** Comparing is a help: without the answers the new cut can still be made. */
  private read(dataSet: DataSetView): Subscription {
    const reading = new Subscription();
    reading.add(
      this.api.readCodeBook(this.studyId, dataSet.id).subscribe((book) => {
        this.book.set(book);
      }),
    );
    const newest = dataSet.cuts.toSorted((one, other) => other.number - one.number)[0];
    if (newest !== undefined) {
      reading.add(
        this.api.readCut(this.studyId, newest.id).subscribe((cut) => {
          this.cut.set(cut);
        }),
      );
    }
    return reading;
  }
}
