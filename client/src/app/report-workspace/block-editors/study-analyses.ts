import { inject, Injectable, signal } from '@angular/core';
import type { AnalysisSummary } from '#shared/api';
import { AnalysesApi } from '../../server-api/analyses-api';
import { CurrentStudy } from '../../session/current-study';

/** The analyses of the study, fetched once a form offers them. */
@Injectable()
export class StudyAnalyses {
  private readonly api = inject(AnalysesApi);
  private readonly study = inject(CurrentStudy);
  private readonly fetched = signal<readonly AnalysisSummary[]>([]);
  readonly list = this.fetched.asReadonly();

  fetch(): void {
    const studyId = this.study.study()?.id;
    if (studyId === undefined) return;
    this.api.list(studyId).subscribe({
      next: (list) => {
        this.fetched.set(list);
      },
      error: () => {
        // The form then offers what it shows already.
        this.fetched.set([]);
      },
    });
  }
}
