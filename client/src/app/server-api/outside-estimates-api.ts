import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type { OutsideEstimateChangeRequest } from '#shared/api';
import type { OutsideEstimate, OutsideEstimateEntry } from '#shared/outside-estimates';
import type { Observable } from 'rxjs';
import { studyUrl } from './study-url';

/** The analysis that estimates stand beside. */
export interface EstimatePlace {
  readonly studyId: string;
  readonly analysisId: string;
}

/** Adjusted estimates that models outside computed, beside an analysis. */
@Injectable({ providedIn: 'root' })
export class OutsideEstimatesApi {
  private readonly http = inject(HttpClient);

  add(place: EstimatePlace, entry: OutsideEstimateEntry): Observable<OutsideEstimate> {
    return this.http.post<OutsideEstimate>(urlOf(place), entry);
  }

  /** Fails with 409 when somebody changed it since `baseVersion`. */
  change(
    place: EstimatePlace,
    estimateId: string,
    request: OutsideEstimateChangeRequest,
  ): Observable<OutsideEstimate> {
    return this.http.put<OutsideEstimate>(urlOf(place, estimateId), request);
  }

  remove(place: EstimatePlace, estimateId: string): Observable<void> {
    return this.http.delete<undefined>(urlOf(place, estimateId));
  }

  /** Takes all estimates of a file over, or fails with what is wrong in which line. */
  load(place: EstimatePlace, file: File): Observable<OutsideEstimate[]> {
    const form = new FormData();
    form.set('file', file);
    return this.http.post<OutsideEstimate[]>(urlOf(place, 'file'), form);
  }
}

function urlOf({ studyId, analysisId }: EstimatePlace, ...below: readonly string[]): string {
  return studyUrl(studyId, 'analyses', analysisId, 'outside-estimates', ...below);
}
