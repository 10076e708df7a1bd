import {
  computed,
  effect,
  inject,
  Injectable,
  linkedSignal,
  signal,
  untracked,
} from '@angular/core';
import {
  type AnalysisIssue,
  type AnalysisResult,
  computeAnalysis,
  frameOf,
  type ResultFrame,
  type ResultScope,
  takesTime,
  tallyRequestOf,
} from '#shared/analysis';
import type { AnalysisView, CodeBookView, CutView, DataSetView } from '#shared/api';
import type { Result } from '#shared/core';
import type { HouseStyle } from '#shared/house-style';
import type { ApiProblem } from '../../server-api/api-problem';
import { CurrentStudy } from '../../session/current-study';
import { PHRASEBOOK } from '../../ui/phrasebook';
import { type AnalysisDraft, emptyDraft, specificationOf } from '../draft/analysis-draft';
import { benchPrint } from '../print/bench-print';
import { columnById } from '../draft/column-choices';
import { ComputedAnswers } from '../computing/computed-answers';
import type { AnalysisTask } from '../computing/computing-task';
import { CountsStore, wantedCounts, type WantedCounts } from './counts-store';
import { type CutPlace, cutPlaceOf } from './cut-place';
import { repeatedIdentifiers } from './repeated-identifiers';
import { sameScope, scopesOf } from './result-scopes';

/** Where the bench stands: nothing to compute yet, at work, computed, or why it cannot. */
export type BenchState =
  | { readonly kind: 'unpicked' }
  | { readonly kind: 'counting' }
  | { readonly kind: 'refused'; readonly problem: ApiProblem }
  | { readonly kind: 'impossible'; readonly issue: AnalysisIssue }
  | { readonly kind: 'broken' }
  | { readonly kind: 'computed'; readonly result: AnalysisResult };

/** The analysis on the bench. Everything follows `draft`; only counts come from the server. */
@Injectable()
export class BenchStore {
  private readonly counts = inject(CountsStore);
  private readonly answers = inject(ComputedAnswers);
  private readonly current = inject(CurrentStudy);
  private readonly book = inject(PHRASEBOOK);

  readonly study = this.current.study;
  readonly mayEdit = computed(() => this.current.may('editData'));
  readonly dataSets = signal<readonly DataSetView[]>([]);
  readonly houseStyle = signal<HouseStyle | null>(null);
  readonly codeBookView = signal<CodeBookView | null>(null);
  readonly cutId = signal<string | null>(null);
  /** The cut's profile, from which repeated identifiers are seen. */
  readonly cutView = signal<CutView | null>(null);
  readonly name = signal('');
  readonly draft = signal<AnalysisDraft>(emptyDraft());
  readonly saved = signal<AnalysisView | null>(null);

  readonly codeBook = computed(() => this.codeBookView()?.content ?? null);
  readonly cut = computed<CutPlace | null>(() => cutPlaceOf(this.dataSets(), this.cutId()));
  readonly specification = computed(() => specificationOf(this.draft()));
  readonly outcome = computed(() => {
    const { outcomeId } = this.draft().outcome;
    return this.study()?.outcomes.find(({ id }) => id === outcomeId) ?? null;
  });

  readonly frame = computed<Result<ResultFrame, AnalysisIssue> | null>(() => {
    const [specification, codeBook, outcome, study] = [
      this.specification(),
      this.codeBook(),
      this.outcome(),
      this.study(),
    ];
    if (specification === null || codeBook === null || study === null) return null;
    return outcome === null ? null : frameOf(codeBook, specification, outcome, study);
  });

  readonly wanted = computed<WantedCounts | null>(() => this.findWanted(), {
    equal: (one, other) => one?.key === other?.key,
  });
  private readonly task = computed<AnalysisTask | null>(() => this.findTask());
  /** Names the task for the worker; null where the methods are light. */
  private readonly taskKey = computed(() => {
    const task = this.task();
    if (task === null || !takesTime(task.specification)) return null;
    return JSON.stringify([this.wanted()?.key, task.specification, task.frame]);
  });
  readonly state = computed<BenchState>(() => this.findState());

  /** The last result, kept in view while the next is counted. */
  readonly result = linkedSignal<BenchState, AnalysisResult | null>({
    source: this.state,
    computation: (state, before) => {
      if (state.kind === 'computed') return state.result;
      return state.kind === 'counting' || state.kind === 'broken' ? (before?.value ?? null) : null;
    },
  });

  readonly repeatedIdentifiers = computed(() =>
    repeatedIdentifiers(this.codeBook(), this.cutView()),
  );
  /** A name for who gives none: the outcome by the exposure. */
  readonly suggestedName = computed(() => {
    const exposure = columnById(this.codeBook(), this.draft().exposure.columnId);
    const outcome = this.outcome();
    if (outcome === null || exposure === null) return '';
    return `${outcome.noun} by ${exposure.sentenceLabel}`;
  });

  /** The result with what it is printed with. */
  readonly print = computed(() => {
    const [result, style] = [this.result(), this.houseStyle()];
    return result === null || style === null ? null : benchPrint(result, style, this.book);
  });

  readonly scopes = computed(() => {
    const result = this.result();
    return result === null ? [] : scopesOf(result);
  });
  /** The layer in view: the pooled one as soon as there are strata, until another is chosen. */
  readonly scope = linkedSignal<readonly ResultScope[], ResultScope>({
    source: this.scopes,
    computation: (scopes, before) => {
      const chosen = before !== undefined && before.source.length > 1 ? before.value : null;
      const kept = scopes.find((scope) => chosen !== null && sameScope(scope, chosen));
      return kept ?? scopes.find(({ kind }) => kind === 'pooled') ?? { kind: 'crude' };
    },
  });
  /** The level in view, compared with the reference; the last one unless another was chosen. */
  readonly levelId = linkedSignal<readonly string[], string | null>({
    source: computed(() => this.indexLevelIds()),
    computation: (ids, before) => ids.find((id) => id === before?.value) ?? ids.at(-1) ?? null,
  });

  constructor() {
    effect(() => {
      const wanted = this.wanted();
      if (wanted !== null) {
        untracked(() => {
          this.counts.want(wanted);
        });
      }
    });
    effect(() => {
      if (this.taskKey() !== null) {
        untracked(() => {
          this.computeAgain();
        });
      }
    });
  }

  change(change: (draft: AnalysisDraft) => AnalysisDraft): void {
    this.draft.update(change);
  }

  countAgain(): void {
    const wanted = this.wanted();
    if (wanted !== null) this.counts.again(wanted);
  }

  /** Has the worker compute what takes its time, unless it does or did so already. */
  computeAgain(): void {
    const [key, task] = [this.taskKey(), this.task()];
    if (key !== null && task !== null) this.answers.want<'analysis'>(key, task);
  }

  private indexLevelIds(): readonly string[] {
    const exposure = this.result()?.frame.exposure;
    if (exposure === undefined) return [];
    const ids = exposure.levels.map(({ id }) => id);
    return ids.filter((id) => id !== exposure.referenceLevelId);
  }

  private findWanted(): WantedCounts | null {
    const [study, cutId, view] = [this.study(), this.cutId(), this.codeBookView()];
    const specification = this.specification();
    if (study === null || cutId === null || view === null || specification === null) return null;
    if (this.frame()?.ok !== true) return null;
    const place = { studyId: study.id, cutId, codeBookNumber: view.number };
    return wantedCounts(place, tallyRequestOf(specification));
  }

  private findState(): BenchState {
    const [frame, specification, wanted] = [this.frame(), this.specification(), this.wanted()];
    if (frame === null || specification === null) return { kind: 'unpicked' };
    if (!frame.ok) return { kind: 'impossible', issue: frame.issue };
    if (wanted === null) return { kind: 'unpicked' };
    const counts = this.counts.known().get(wanted.key) ?? { kind: 'counting' };
    if (counts.kind !== 'counted') return counts;
    const task = this.task();
    return task === null ? { kind: 'counting' } : this.computedState(task);
  }

  /** Light methods at once; what takes its time comes from the worker. */
  private computedState({ specification, frame, tally }: AnalysisTask): BenchState {
    const key = this.taskKey();
    if (key === null) return stateOf(computeAnalysis(specification, frame, tally));
    const state = this.answers.stateOf<'analysis'>(key) ?? { kind: 'computing' };
    switch (state.kind) {
      case 'computing':
        return { kind: 'counting' };
      case 'broken':
        return { kind: 'broken' };
      case 'computed':
        return stateOf(state.answer);
    }
  }

  private findTask(): AnalysisTask | null {
    const [frame, specification, wanted] = [this.frame(), this.specification(), this.wanted()];
    if (frame?.ok !== true || specification === null || wanted === null) return null;
    const counts = this.counts.known().get(wanted.key);
    if (counts?.kind !== 'counted') return null;
    return { kind: 'analysis', specification, frame: frame.value, tally: counts.tally };
  }
}

function stateOf(computed: Result<AnalysisResult, AnalysisIssue>): BenchState {
  return computed.ok
    ? { kind: 'computed', result: computed.value }
    : { kind: 'impossible', issue: computed.issue };
}
