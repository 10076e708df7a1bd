import { HttpClient, type HttpResponse } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type {
  DraftRequest,
  DraftView,
  NewReportRequest,
  ReportSummary,
  ReportView,
  StepsRequest,
  StepsView,
} from '#shared/api';
import { map, type Observable } from 'rxjs';
import { downloadedFile, type DownloadedFile } from './downloaded-file';
import { studyUrl } from './study-url';

/** File formats of a report's draft. */
export type DraftFormat = 'docx' | 'xlsx';

/** Reports of a study: steps, drafts and downloads. */
@Injectable({ providedIn: 'root' })
export class ReportsApi {
  private readonly http = inject(HttpClient);

  list(studyId: string): Observable<ReportSummary[]> {
    return this.http.get<ReportSummary[]>(studyUrl(studyId, 'reports'));
  }

  create(studyId: string, request: NewReportRequest): Observable<ReportView> {
    return this.http.post<ReportView>(studyUrl(studyId, 'reports'), request);
  }

  read(studyId: string, reportId: string): Observable<ReportView> {
    return this.http.get<ReportView>(studyUrl(studyId, 'reports', reportId));
  }

  remove(studyId: string, reportId: string): Observable<void> {
    return this.http.delete<undefined>(studyUrl(studyId, 'reports', reportId));
  }

  /** The steps after the one numbered `after`. */
  stepsAfter(studyId: string, reportId: string, after: number): Observable<StepsView> {
    const url = studyUrl(studyId, 'reports', reportId, 'steps');
    return this.http.get<StepsView>(url, { params: { after } });
  }

  /** Steps sent again under their ids are applied once. Stale ones fail with `staleEdit`. */
  submitSteps(studyId: string, reportId: string, request: StepsRequest): Observable<StepsView> {
    const url = studyUrl(studyId, 'reports', reportId, 'steps');
    return this.http.post<StepsView>(url, request);
  }

  putDraft(
    studyId: string,
    reportId: string,
    blockId: string,
    request: DraftRequest,
  ): Observable<DraftView> {
    const url = studyUrl(studyId, 'reports', reportId, 'drafts', blockId);
    return this.http.put<DraftView>(url, request);
  }

  discardDraft(studyId: string, reportId: string, blockId: string): Observable<void> {
    return this.http.delete<undefined>(studyUrl(studyId, 'reports', reportId, 'drafts', blockId));
  }

  download(studyId: string, reportId: string, format: DraftFormat): Observable<DownloadedFile> {
    const url = studyUrl(studyId, 'reports', reportId, 'exports', format);
    return this.http
      .get(url, { responseType: 'blob', observe: 'response' })
      .pipe(map((response: HttpResponse<Blob>) => downloadedFile(response, `report.${format}`)));
  }
}
