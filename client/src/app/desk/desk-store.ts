import { computed, inject, Injectable, signal } from '@angular/core';
import type { ReportSummary, StudySummary, StudyView } from '#shared/api';
import { forkJoin, map, type Observable, of, switchMap } from 'rxjs';
import { ApiProblem } from '../server-api/api-problem';
import { ReportsApi } from '../server-api/reports-api';
import { StudiesApi } from '../server-api/studies-api';
import { waitingOn } from './waiting';
import type { DueMilestone } from './week';

/** A study with the reports on it. */
export interface ShelvedStudy {
  readonly study: StudyView;
  readonly reports: readonly ReportSummary[];
}

type DeskState =
  | { readonly kind: 'loading' }
  | { readonly kind: 'ready'; readonly shelf: readonly ShelvedStudy[] }
  | { readonly kind: 'failed'; readonly problem: ApiProblem };

/** Everything that lies on a person's desk. */
@Injectable()
export class DeskStore {
  private readonly studiesApi = inject(StudiesApi);
  private readonly reportsApi = inject(ReportsApi);
  private readonly current = signal<DeskState>({ kind: 'loading' });

  readonly state = this.current.asReadonly();
  readonly shelf = computed(() => {
    const state = this.current();
    return state.kind === 'ready' ? state.shelf : [];
  });
  readonly waiting = computed(() =>
    this.shelf().flatMap(({ study, reports }) => waitingOn(study, reports)),
  );
  readonly milestones = computed(() => this.shelf().flatMap(({ study }) => dueOn(study)));
  /** Reports of every study, the last changed first. */
  readonly reports = computed(() =>
    this.shelf()
      .flatMap(({ reports }) => reports)
      .toSorted((one, other) => other.updatedAt.localeCompare(one.updatedAt)),
  );

  load(): void {
    this.studiesApi
      .list()
      .pipe(switchMap((studies) => this.shelved(studies)))
      .subscribe({
        next: (shelf) => {
          this.current.set({ kind: 'ready', shelf });
        },
        error: (failure: unknown) => {
          this.current.set({ kind: 'failed', problem: ApiProblem.from(failure) });
        },
      });
  }

  private shelved(studies: readonly StudySummary[]): Observable<readonly ShelvedStudy[]> {
    if (studies.length === 0) return of([]);
    return forkJoin(
      studies.map(({ id }) =>
        forkJoin([this.studiesApi.read(id), this.reportsApi.list(id)]).pipe(
          map(([study, reports]) => ({ study, reports })),
        ),
      ),
    );
  }
}

function dueOn(study: StudyView): readonly DueMilestone[] {
  return study.milestones.map((milestone) => ({
    ...milestone,
    studyId: study.id,
    studyTitle: study.title,
  }));
}
