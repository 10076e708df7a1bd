import { HttpClient, HttpRequest } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type {
  CodeBookChangeRequest,
  CodeBookView,
  CutView,
  DataSetView,
  ReadingOptions,
  RecordsPage,
  StoreCutRequest,
  TypedCountsRequest,
  UploadView,
} from '#shared/api';
import type { Tally, TallyRequest } from '#shared/tally';
import { mergeMap, type Observable } from 'rxjs';
import { studyUrl } from './study-url';
import { uploadEvent, type UploadEvent } from './upload-event';

/** A file to read, for a new data set (`dataSetId` null) or as the next cut of one. */
export interface NewUpload {
  readonly file: File;
  readonly options: ReadingOptions;
  readonly dataSetId: string | null;
}

/** A window of a cut's records. */
export interface RecordsWindow {
  readonly offset: number;
  readonly limit: number;
}

/** Uploads, cuts, code books and counts of a study. */
@Injectable({ providedIn: 'root' })
export class DataApi {
  private readonly http = inject(HttpClient);

  listDataSets(studyId: string): Observable<DataSetView[]> {
    return this.http.get<DataSetView[]>(studyUrl(studyId, 'data-sets'));
  }

  /** Sends a file; unsubscribing breaks it off. Reading it is followed by `readUpload`. */
  upload(studyId: string, upload: NewUpload): Observable<UploadEvent<UploadView>> {
    const url = studyUrl(studyId, 'uploads');
    const request = new HttpRequest<FormData>('POST', url, uploadForm(upload), {
      reportProgress: true,
    });
    return this.http.request<UploadView>(request).pipe(mergeMap(uploadEvent));
  }

  readUpload(studyId: string, uploadId: string): Observable<UploadView> {
    return this.http.get<UploadView>(studyUrl(studyId, 'uploads', uploadId));
  }

  /** Reads the file again in another way. */
  changeReadingOptions(
    studyId: string,
    uploadId: string,
    options: ReadingOptions,
  ): Observable<UploadView> {
    return this.http.put<UploadView>(studyUrl(studyId, 'uploads', uploadId, 'options'), options);
  }

  discardUpload(studyId: string, uploadId: string): Observable<void> {
    return this.http.delete<undefined>(studyUrl(studyId, 'uploads', uploadId));
  }

  storeCut(studyId: string, uploadId: string, request: StoreCutRequest): Observable<CutView> {
    return this.http.post<CutView>(studyUrl(studyId, 'uploads', uploadId, 'cut'), request);
  }

  storeTypedCounts(studyId: string, request: TypedCountsRequest): Observable<CutView> {
    return this.http.post<CutView>(studyUrl(studyId, 'typed-counts'), request);
  }

  readCut(studyId: string, cutId: string): Observable<CutView> {
    return this.http.get<CutView>(studyUrl(studyId, 'cuts', cutId));
  }

  readRecords(studyId: string, cutId: string, window: RecordsWindow): Observable<RecordsPage> {
    return this.http.get<RecordsPage>(studyUrl(studyId, 'cuts', cutId, 'records'), {
      params: { ...window },
    });
  }

  readCodeBook(studyId: string, dataSetId: string): Observable<CodeBookView> {
    return this.http.get<CodeBookView>(studyUrl(studyId, 'data-sets', dataSetId, 'code-book'));
  }

  /** Fails with status 409 and both versions in `facts` when somebody changed it meanwhile. */
  changeCodeBook(
    studyId: string,
    dataSetId: string,
    request: CodeBookChangeRequest,
  ): Observable<CodeBookView> {
    const url = studyUrl(studyId, 'data-sets', dataSetId, 'code-book');
    return this.http.put<CodeBookView>(url, request);
  }

  count(studyId: string, cutId: string, request: TallyRequest): Observable<Tally> {
    return this.http.post<Tally>(studyUrl(studyId, 'cuts', cutId, 'tallies'), request);
  }
}

function uploadForm(upload: NewUpload): FormData {
  const form = new FormData();
  form.set('options', JSON.stringify(upload.options));
  if (upload.dataSetId !== null) form.set('dataSetId', upload.dataSetId);
  form.set('file', upload.file);
  return form;
}
