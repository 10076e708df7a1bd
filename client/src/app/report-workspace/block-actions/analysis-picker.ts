import { inject, Injectable } from '@angular/core';
import { Router } from '@angular/router';
import type { AnalysisSummary } from '#shared/api';
import type { PinnedAnalysis } from '#shared/report';
import { catchError, EMPTY, map, mergeMap, type Observable, of } from 'rxjs';
import { AnalysesApi } from '../../server-api/analyses-api';
import { CurrentStudy } from '../../session/current-study';
import { Dialogs } from '../../ui/dialog/dialogs';
import { Notices } from '../../ui/notices/notices';
import { ReportState } from '../report-store/report-state';
import { AnalysisPickerDialog } from './analysis-picker-dialog';
import { pinnedAnalysisOf } from './pinned-analysis-of';

/** Asks which analysis a block shows. */
@Injectable()
export class AnalysisPicker {
  private readonly api = inject(AnalysesApi);
  private readonly study = inject(CurrentStudy);
  private readonly state = inject(ReportState);
  private readonly dialogs = inject(Dialogs);
  private readonly notices = inject(Notices);
  private readonly router = inject(Router);

  /** The analysis with its result; nothing when none was chosen. Of one there is no choice. */
  pick(): Observable<PinnedAnalysis> {
    return this.api.list(this.studyId()).pipe(
      mergeMap((list) => this.choose(list)),
      mergeMap((analysisId) => this.read(analysisId)),
      catchError((failure: unknown) => {
        this.notices.refuse(failure);
        return EMPTY;
      }),
    );
  }

  /** The analysis with the result that the report shows, else with its present one. */
  read(analysisId: string): Observable<PinnedAnalysis> {
    const pinned = this.state.pins().get(analysisId);
    if (pinned !== undefined) return of(pinned);
    return this.api.read(this.studyId(), analysisId).pipe(map(pinnedAnalysisOf));
  }

  private choose(list: readonly AnalysisSummary[]): Observable<string> {
    const [only, ...others] = list;
    if (only === undefined) return this.sayThatThereIsNone();
    if (others.length === 0) return of(only.id);
    return this.dialogs.open<string>(AnalysisPickerDialog, list);
  }

  private sayThatThereIsNone(): Observable<never> {
    this.notices.offer('This study has no analysis yet.', 'Go to analyses', () => {
      void this.router.navigate(['/studies', this.studyId(), 'analyses']);
    });
    return EMPTY;
  }

  private studyId(): string {
    return this.study.study()?.id ?? '';
  }
}
