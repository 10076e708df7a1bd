import { computed, inject, Injectable, signal } from '@angular/core';
import { Router } from '@angular/router';
import type { AnalysisView } from '#shared/api';
import type { Observable } from 'rxjs';
import { AnalysesApi } from '../../server-api/analyses-api';
import { ApiProblem } from '../../server-api/api-problem';
import { CurrentStudy } from '../../session/current-study';
import { Notices } from '../../ui/notices/notices';
import { isSameDraft } from '../draft/analysis-draft';
import { BenchLoader } from './bench-loader';
import { BenchStore } from './bench-store';
import { onTopOf } from './on-top';

/** Saves, copies and deletes the analysis on the bench. */
@Injectable()
export class AnalysisKeeper {
  private readonly store = inject(BenchStore);
  private readonly loader = inject(BenchLoader);
  private readonly api = inject(AnalysesApi);
  private readonly router = inject(Router);
  private readonly notices = inject(Notices);
  private readonly studyId = inject(CurrentStudy).study()?.id ?? '';

  readonly saving = signal(false);
  /** Why it was not saved. */
  readonly problem = signal<ApiProblem | null>(null);
  /** Somebody else's newer version, when saving met one. */
  readonly theirs = signal<AnalysisView | null>(null);

  /** Their version with one's own changes on top. */
  readonly onTop = computed(() => {
    const [theirs, saved] = [this.theirs(), this.store.saved()];
    if (theirs === null || saved === null) return null;
    const mine = { name: this.name(), specification: this.store.draft() };
    return onTopOf(theirs, mine, saved);
  });
  readonly isChanged = computed(() => {
    const saved = this.store.saved();
    if (saved === null) return this.store.specification() !== null;
    return (
      saved.name !== this.name() ||
      saved.cutId !== this.store.cutId() ||
      !isSameDraft(saved.specification, this.store.draft())
    );
  });
  /** Only what can be computed is kept. */
  readonly maySave = computed(
    () =>
      this.store.mayEdit() &&
      this.isChanged() &&
      !this.saving() &&
      this.store.state().kind === 'computed',
  );
  /** A report shows this analysis, so that a change of what it says needs a reason. */
  readonly needsReason = computed(() => {
    const saved = this.store.saved();
    if (saved === null || saved.usedIn.length === 0) return false;
    return (
      saved.cutId === this.store.cutId() && !isSameDraft(saved.specification, this.store.draft())
    );
  });

  /** Saves; over somebody's newer version both are shown. */
  save(reason: string | null, baseVersion = this.store.saved()?.version ?? 0): void {
    const request = this.request();
    if (request === null) return;
    const saved = this.store.saved();
    const sent =
      saved === null
        ? this.api.create(this.studyId, request)
        : this.api.change(this.studyId, saved.id, { ...request, baseVersion, reason });
    this.send(sent, (analysis) => {
      this.finish(analysis, saved === null);
    });
  }

  /** Makes another analysis of what is on the bench. */
  copy(): void {
    const request = this.request();
    if (request === null) return;
    const named = { ...request, name: `${request.name} (copy)`.slice(0, 200) };
    this.send(this.api.create(this.studyId, named), (analysis) => {
      this.notices.say(`${analysis.number} is a copy. It is on the bench now.`);
      this.show(analysis);
    });
  }

  remove(): void {
    const saved = this.store.saved();
    if (saved === null) return;
    this.send(this.api.remove(this.studyId, saved.id), () => {
      this.notices.say(`${saved.number} is deleted.`);
      void this.router.navigate(['/studies', this.studyId, 'analyses']);
    });
  }

  /** Puts the own changes on top of the newer version. */
  keepOwn(reason: string | null): void {
    const [theirs, onTop] = [this.theirs(), this.onTop()];
    this.theirs.set(null);
    if (theirs === null || onTop === null) return;
    this.store.name.set(onTop.name);
    this.store.draft.set(onTop.specification);
    this.save(reason, theirs.version);
  }

  /** Gives the own version up for the newer one. */
  takeTheirs(): void {
    const theirs = this.theirs();
    this.theirs.set(null);
    if (theirs !== null) this.loader.take(theirs);
  }

  /** Back to what is saved. */
  undo(): void {
    const saved = this.store.saved();
    if (saved !== null) this.loader.take(saved);
  }

  private name(): string {
    const name = this.store.name().trim();
    return name === '' ? this.store.suggestedName() : name;
  }

  private request(): Parameters<AnalysesApi['create']>[1] | null {
    const [cutId, specification] = [this.store.cutId(), this.store.specification()];
    if (cutId === null || specification === null) return null;
    return { name: this.name(), cutId, specification };
  }

  private send<Answer>(request: Observable<Answer>, done: (answer: Answer) => void): void {
    this.saving.set(true);
    this.problem.set(null);
    request.subscribe({
      next: (answer) => {
        this.saving.set(false);
        done(answer);
      },
      error: (failure: unknown) => {
        this.saving.set(false);
        this.refuse(ApiProblem.from(failure));
      },
    });
  }

  private refuse(problem: ApiProblem): void {
    const saved = this.store.saved();
    if (problem.status !== 409 || saved === null) {
      this.problem.set(problem);
      return;
    }
    this.api.read(this.studyId, saved.id).subscribe((current) => {
      if (current.version === saved.version) this.problem.set(problem);
      else this.theirs.set(current);
    });
  }

  private finish(analysis: AnalysisView, isNew: boolean): void {
    this.notices.say(isNew ? `Saved as ${analysis.number}.` : `${analysis.number} is saved.`);
    this.loader.take(analysis);
    if (isNew) this.show(analysis);
  }

  private show(analysis: AnalysisView): void {
    void this.router.navigate(['/studies', this.studyId, 'analyses', analysis.id], {
      replaceUrl: true,
    });
  }
}
