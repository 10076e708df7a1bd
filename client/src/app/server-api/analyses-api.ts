import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type {
  AnalysisChangeRequest,
  AnalysisSummary,
  AnalysisView,
  NewAnalysisRequest,
} from '#shared/api';
import type { Observable } from 'rxjs';
import { studyUrl } from './study-url';

/** Analyses of a study. */
@Injectable({ providedIn: 'root' })
export class AnalysesApi {
  private readonly http = inject(HttpClient);

  list(studyId: string): Observable<AnalysisSummary[]> {
    return this.http.get<AnalysisSummary[]>(studyUrl(studyId, 'analyses'));
  }

  create(studyId: string, request: NewAnalysisRequest): Observable<AnalysisView> {
    return this.http.post<AnalysisView>(studyUrl(studyId, 'analyses'), request);
  }

  read(studyId: string, analysisId: string): Observable<AnalysisView> {
    return this.http.get<AnalysisView>(studyUrl(studyId, 'analyses', analysisId));
  }

  /** Fails with 409 when stale, with code `reasonRequired` once a report uses the analysis. */
  change(
    studyId: string,
    analysisId: string,
    request: AnalysisChangeRequest,
  ): Observable<AnalysisView> {
    return this.http.put<AnalysisView>(studyUrl(studyId, 'analyses', analysisId), request);
  }

  /** Fails with 409 while a report uses the analysis. */
  remove(studyId: string, analysisId: string): Observable<void> {
    return this.http.delete<undefined>(studyUrl(studyId, 'analyses', analysisId));
  }
}
