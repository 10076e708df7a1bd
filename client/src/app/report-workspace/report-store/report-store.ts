import { computed, inject, Injectable, signal } from '@angular/core';
import { failure, type Result, success } from '#shared/core';
import { type Block, type Step, type StepIssue, visibleBlocks } from '#shared/report';
import { map, type Observable, tap } from 'rxjs';
import { ReportsApi } from '../../server-api/reports-api';
import { NOW } from '../../ui/clock';
import { newId } from '../../ui/new-id';
import type { EditConflict } from './edit-conflict';
import { type ReportPlace, ReportState } from './report-state';
import { ReportSync } from './report-sync';
import { makeStep, settleConflict, type SharedReport } from './shared-report';
import { blockWithId, type Chain, linkStep } from './step-chain';
import {
  EMPTY_HISTORY,
  undoSteps,
  type UndoIssue,
  type UndoStep,
  withAction,
} from './undo-history';

/**
 * The open report: what it holds, and the one way to change it.
 *
 * A change is a list of steps. They are applied here at once and sent in the background; `undo`
 * and `redo` are new steps. Provide it with the page, as it lives as long as one report is open.
 */
@Injectable()
export class ReportStore {
  private readonly api = inject(ReportsApi);
  private readonly state = inject(ReportState);
  private readonly sync = inject(ReportSync);
  private readonly now = inject(NOW);
  private readonly history = signal(EMPTY_HISTORY);

  readonly report = this.state.report;
  readonly conflicts = this.state.conflicts;
  readonly blocks = computed(() => {
    const report = this.report();
    return report === null ? [] : visibleBlocks(report);
  });
  readonly canUndo = computed(() => this.history().done.length > 0);
  readonly canRedo = computed(() => this.history().undone.length > 0);

  open(place: ReportPlace): Observable<void> {
    return this.api.read(place.studyId, place.reportId).pipe(
      tap((view) => {
        this.state.open(place, view);
        this.sync.start();
      }),
      map(() => undefined),
    );
  }

  block(blockId: string): Block | undefined {
    const report = this.report();
    return report === null ? undefined : blockWithId(report, blockId);
  }

  /**
   * Makes steps: all of them or, where one does not apply, none. Steps of one `groupId` are undone
   * together.
   */
  dispatch(steps: readonly Step[], groupId = newId()): Result<void, StepIssue> {
    const after = this.applied(this.shared(), steps, groupId);
    if (!after.ok) return after;
    this.history.update((history) => withAction(history, groupId));
    this.take(after.value);
    return success(undefined);
  }

  /** Takes back what this person did last. */
  undo(): Result<void, UndoIssue> {
    const groupId = this.history().done.at(-1);
    if (groupId === undefined) return failure('nothingToUndo');
    const taken = this.takeBack(groupId);
    this.history.update(({ done, undone }) => ({
      done: done.slice(0, -1),
      undone: taken.ok ? [...undone, taken.value] : undone,
    }));
    return taken.ok ? success(undefined) : taken;
  }

  /** Does again what was taken back last. */
  redo(): Result<void, UndoIssue> {
    const groupId = this.history().undone.at(-1);
    if (groupId === undefined) return failure('nothingToUndo');
    const taken = this.takeBack(groupId);
    this.history.update(({ done, undone }) => ({
      done: taken.ok ? [...done, taken.value] : done,
      undone: undone.slice(0, -1),
    }));
    return taken.ok ? success(undefined) : taken;
  }

  /** Puts this person's version over the newer one, which stays in the report's history. */
  keepMine(conflict: EditConflict): Result<void, StepIssue> {
    this.state.shared.update((shared) => shared && settleConflict(shared, conflict.blockId));
    return this.dispatch(this.stepsToMine(conflict));
  }

  /** Leaves the newer version; `undo` brings this person's back. */
  takeTheirs(conflict: EditConflict): void {
    this.state.shared.update((shared) => shared && settleConflict(shared, conflict.blockId));
  }

  private stepsToMine({ blockId, mine }: EditConflict): readonly Step[] {
    const present = this.block(blockId);
    if (present === undefined) return [];
    const replace: Step = {
      kind: 'replaceContent',
      blockId,
      baseVersion: present.version,
      content: mine,
    };
    return present.removedAt === null ? [replace] : [{ kind: 'restoreBlock', blockId }, replace];
  }

  private takeBack(groupId: string): Result<string, UndoIssue> {
    const shared = this.shared();
    const undoGroup = newId();
    const steps = undoSteps(shared.local, groupId, (chain, undo) => this.tried(chain, undo));
    if (!steps.ok) return steps;
    const after = this.applied(
      shared,
      steps.value.map((undo) => undo.step),
      undoGroup,
      steps.value,
    );
    if (!after.ok) return failure('changedSince');
    this.take(after.value);
    return success(undoGroup);
  }

  private tried(chain: Chain, { undoes, step }: UndoStep): Chain | null {
    const made = { id: newId(), groupId: '', undoes, step };
    const after = linkStep(chain, made, this.at());
    return after.ok ? after.value : null;
  }

  private applied(
    start: SharedReport,
    steps: readonly Step[],
    groupId: string,
    undos: readonly UndoStep[] = [],
  ): Result<SharedReport, StepIssue> {
    let shared = start;
    for (const [index, step] of steps.entries()) {
      const undoes = undos[index]?.undoes ?? null;
      const made = { id: newId(), groupId, undoes, step };
      const next = makeStep(shared, made, this.at());
      if (!next.ok) return next;
      shared = next.value;
    }
    return success(shared);
  }

  private take(shared: SharedReport): void {
    this.state.shared.set(shared);
    this.sync.send();
  }

  private at(): string {
    return this.now().toISOString();
  }

  private shared(): SharedReport {
    const shared = this.state.shared();
    if (shared === null) throw new Error('No report is open.');
    return shared;
  }
}
