import { DestroyRef, inject, Injectable, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import type { DraftView } from '#shared/api';
import {
  catchError,
  debounceTime,
  EMPTY,
  groupBy,
  mergeMap,
  type Observable,
  Subject,
  switchMap,
} from 'rxjs';
import { ReportsApi } from '../../server-api/reports-api';
import { SessionStore } from '../../session/session-store';
import { NOW } from '../../ui/clock';
import { forget, keep, keptKeys, readKept } from './browser-storage';
import { type ReportPlace, ReportState } from './report-state';

const SERVER_WAIT_MILLISECONDS = 2_000;

/** Text that is being written, against one version of its block. */
export interface Draft {
  readonly blockId: string;
  readonly baseVersion: number;
  readonly content: unknown;
}

/**
 * Keeps text that is being written: in this browser at every change, on the server soon after.
 * Once the text has become a step the draft is dropped on both sides.
 */
@Injectable()
export class DraftKeeper {
  private readonly api = inject(ReportsApi);
  private readonly session = inject(SessionStore);
  private readonly state = inject(ReportState);
  private readonly now = inject(NOW);
  private readonly changes = new Subject<{ blockId: string; draft: Draft | null }>();
  private readonly onServer = new Set<string>();

  /** Whether text is being written that has not become a step yet. */
  readonly writing = signal(false);

  constructor() {
    this.changes
      .pipe(
        groupBy(({ blockId }) => blockId),
        mergeMap((ofBlock) =>
          ofBlock.pipe(
            debounceTime(SERVER_WAIT_MILLISECONDS),
            switchMap(({ blockId, draft }) => this.tell(blockId, draft)),
          ),
        ),
        takeUntilDestroyed(inject(DestroyRef)),
      )
      .subscribe();
  }

  keep(draft: Draft): void {
    this.writing.set(true);
    keep(this.key(draft.blockId), { ...draft, savedAt: this.now().toISOString() });
    this.changes.next({ blockId: draft.blockId, draft });
  }

  drop(blockId: string): void {
    this.writing.set(false);
    forget(this.key(blockId));
    this.changes.next({ blockId, draft: null });
  }

  /** What was being written when this person was last here, the newest of each block. */
  left(): readonly DraftView[] {
    for (const { blockId } of this.state.drafts()) this.onServer.add(blockId);
    const kept = keptKeys(this.key('')).flatMap((key) => draftOf(readKept(key)));
    const newest = new Map<string, DraftView>();
    for (const draft of [...this.state.drafts(), ...kept]) {
      const known = newest.get(draft.blockId);
      if (known === undefined || known.savedAt < draft.savedAt) newest.set(draft.blockId, draft);
    }
    return [...newest.values()];
  }

  /** A draft is a convenience: when the server cannot keep it, this browser still does. */
  private tell(blockId: string, draft: Draft | null): Observable<never> {
    const told = draft === null ? this.discard(blockId) : this.put(draft);
    return told.pipe(
      catchError(() => EMPTY),
      mergeMap(() => EMPTY),
    );
  }

  private put({ blockId, baseVersion, content }: Draft): Observable<unknown> {
    const { studyId, reportId } = this.place();
    this.onServer.add(blockId);
    return this.api.putDraft(studyId, reportId, blockId, { baseVersion, content });
  }

  private discard(blockId: string): Observable<unknown> {
    const { studyId, reportId } = this.place();
    if (!this.onServer.delete(blockId)) return EMPTY;
    return this.api.discardDraft(studyId, reportId, blockId);
  }

  private key(blockId: string): string {
    const person = this.session.person()?.id ?? '';
    return `evenhand.draft.${person}.${this.place().reportId}.${blockId}`;
  }

  private place(): ReportPlace {
    const place = this.state.place();
    if (place === null) throw new Error('No report is open.');
    return place;
  }
}

function draftOf(kept: unknown): readonly DraftView[] {
  const draft = kept as Partial<DraftView> | null;
  const readable =
    typeof draft?.blockId === 'string' &&
    typeof draft.baseVersion === 'number' &&
    typeof draft.savedAt === 'string';
  return readable ? [draft as DraftView] : [];
}
