import { computed, inject, Injectable, signal } from '@angular/core';
import type { StudyView } from '#shared/api';
import { mayDo, type StudyAction } from '#shared/permissions';
import { type Observable, tap } from 'rxjs';
import { StudiesApi } from '../server-api/studies-api';

/** The study that is open, and what this person may do on it. */
@Injectable({ providedIn: 'root' })
export class CurrentStudy {
  private readonly api = inject(StudiesApi);
  private readonly opened = signal<StudyView | null>(null);

  readonly study = this.opened.asReadonly();
  readonly role = computed(() => this.opened()?.role ?? null);

  /** Whether the person's role on the open study allows an action. Reads signals. */
  may(action: StudyAction): boolean {
    const role = this.role();
    return role !== null && mayDo(role, action);
  }

  /** Opens a study afresh. Fails with status 404 for whoever is no member. */
  open(studyId: string): Observable<StudyView> {
    if (this.opened()?.id !== studyId) this.opened.set(null);
    return this.api.read(studyId).pipe(
      tap((study) => {
        this.opened.set(study);
      }),
    );
  }

  /** Takes the study as a change left it. */
  take(study: StudyView): void {
    this.opened.set(study);
  }

  close(): void {
    this.opened.set(null);
  }
}
