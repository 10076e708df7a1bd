import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type {
  MemberChangeRequest,
  Milestone,
  NewMemberRequest,
  NewStudyRequest,
  StudyChangeRequest,
  StudySummary,
  StudyView,
} from '#shared/api';
import type { OutcomeWords } from '#shared/analysis';
import type { Observable } from 'rxjs';
import { studyUrl } from './study-url';

/** Studies with their outcomes, milestones and members. */
@Injectable({ providedIn: 'root' })
export class StudiesApi {
  private readonly http = inject(HttpClient);

  list(): Observable<StudySummary[]> {
    return this.http.get<StudySummary[]>('/api/studies');
  }

  /** Whoever creates a study leads it. */
  create(request: NewStudyRequest): Observable<StudyView> {
    return this.http.post<StudyView>('/api/studies', request);
  }

  read(studyId: string): Observable<StudyView> {
    return this.http.get<StudyView>(studyUrl(studyId));
  }

  change(studyId: string, request: StudyChangeRequest): Observable<StudyView> {
    return this.http.patch<StudyView>(studyUrl(studyId), request);
  }

  putOutcome(studyId: string, outcome: OutcomeWords): Observable<StudyView> {
    return this.http.put<StudyView>(studyUrl(studyId, 'outcomes', outcome.id), outcome);
  }

  removeOutcome(studyId: string, outcomeId: string): Observable<StudyView> {
    return this.http.delete<StudyView>(studyUrl(studyId, 'outcomes', outcomeId));
  }

  putMilestone(studyId: string, milestone: Milestone): Observable<StudyView> {
    return this.http.put<StudyView>(studyUrl(studyId, 'milestones', milestone.id), milestone);
  }

  removeMilestone(studyId: string, milestoneId: string): Observable<StudyView> {
    return this.http.delete<StudyView>(studyUrl(studyId, 'milestones', milestoneId));
  }

  /** An address without an account gets one, and an invitation by mail. */
  addMember(studyId: string, request: NewMemberRequest): Observable<StudyView> {
    return this.http.post<StudyView>(studyUrl(studyId, 'members'), request);
  }

  changeMember(
    studyId: string,
    personId: string,
    request: MemberChangeRequest,
  ): Observable<StudyView> {
    return this.http.put<StudyView>(studyUrl(studyId, 'members', personId), request);
  }

  removeMember(studyId: string, personId: string): Observable<StudyView> {
    return this.http.delete<StudyView>(studyUrl(studyId, 'members', personId));
  }
}
