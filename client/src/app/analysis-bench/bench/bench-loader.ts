import { effect, inject, Injectable, signal, untracked } from '@angular/core';
import type { AnalysisView, DataSetView } from '#shared/api';
import { forkJoin, of, Subscription } from 'rxjs';
import { AnalysesApi } from '../../server-api/analyses-api';
import { ApiProblem } from '../../server-api/api-problem';
import { DataApi } from '../../server-api/data-api';
import { HouseStylesApi } from '../../server-api/house-styles-api';
import { CurrentStudy } from '../../session/current-study';
import { emptyDraft, withOutcomeWords } from '../draft/analysis-draft';
import { BenchStore } from './bench-store';
import { newestCut } from './cut-place';
import { withoutGone } from './without-gone';

const HOUSE_STYLE_ID = 'open-clinical';

/** Brings onto the bench what it needs: an analysis, its data sets, code book and house style. */
@Injectable()
export class BenchLoader {
  private readonly store = inject(BenchStore);
  private readonly data = inject(DataApi);
  private readonly analyses = inject(AnalysesApi);
  private readonly styles = inject(HouseStylesApi);
  private readonly studyId = inject(CurrentStudy).study()?.id ?? '';

  readonly ready = signal(false);
  readonly problem = signal<ApiProblem | null>(null);

  constructor() {
    this.readCodeBookOfCut();
  }

  /** Opens an analysis, or an empty bench when `analysisId` is null. */
  open(analysisId: string | null): void {
    this.ready.set(false);
    this.problem.set(null);
    forkJoin({
      dataSets: this.data.listDataSets(this.studyId),
      styles: this.styles.list(),
      analysis: analysisId === null ? of(null) : this.analyses.read(this.studyId, analysisId),
    }).subscribe({
      next: ({ dataSets, styles, analysis }) => {
        const style = styles.find(({ id }) => id === HOUSE_STYLE_ID) ?? styles[0] ?? null;
        this.store.houseStyle.set(style);
        this.store.dataSets.set(dataSets);
        if (analysis === null) this.startEmpty(dataSets);
        else this.take(analysis);
        this.ready.set(true);
      },
      error: (failure: unknown) => {
        this.problem.set(ApiProblem.from(failure));
      },
    });
  }

  /** Takes an analysis as the server has it. */
  take(analysis: AnalysisView): void {
    this.store.saved.set(analysis);
    this.store.name.set(analysis.name);
    this.store.cutId.set(analysis.cutId);
    this.store.draft.set(analysis.specification);
  }

  private startEmpty(dataSets: readonly DataSetView[]): void {
    this.store.saved.set(null);
    this.store.name.set('');
    this.store.cutId.set(newestCut(dataSets)?.cut.id ?? null);
    const [only, ...others] = this.store.study()?.outcomes ?? [];
    const draft = emptyDraft();
    this.store.draft.set(
      only === undefined || others.length > 0 ? draft : withOutcomeWords(draft, only.id),
    );
  }

  /** The code book follows the cut; what another data set does not have is picked again. */
  private readCodeBookOfCut(): void {
    effect((onCleanup) => {
      const place = this.store.cut();
      if (place === null) return;
      const reading = new Subscription();
      untracked(() => {
        reading.add(this.readCodeBook(place.dataSet.id));
        reading.add(this.readProfile(place.cut.id));
      });
      onCleanup(() => {
        reading.unsubscribe();
      });
    });
  }

  private readCodeBook(dataSetId: string): Subscription {
    return this.data.readCodeBook(this.studyId, dataSetId).subscribe({
      next: (book) => {
        this.store.codeBookView.set(book);
        if (this.store.saved() === null) {
          this.store.change((draft) => withoutGone(draft, book.content));
        }
      },
      error: (failure: unknown) => {
        this.problem.set(ApiProblem.from(failure));
      },
    });
  }

  /** The profile is only looked at for a caution; the bench works without it. */
  private readProfile(cutId: string): Subscription {
    this.store.cutView.set(null);
    return this.data.readCut(this.studyId, cutId).subscribe({
      next: (cut) => {
        this.store.cutView.set(cut);
      },
      error: () => {
        this.store.cutView.set(null);
      },
    });
  }
}
