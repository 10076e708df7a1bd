import {
  type AnalysisSpecification,
  defaultSpecification,
  keptLevels,
  type OtherMethodChoice,
  reverseContrast,
} from '#shared/analysis';
import type { CodeBook, CodeBookColumn } from '#shared/code-book';
import { EFFECT_MEASURES, type EffectMeasureId } from '#shared/effects';
import { likelyEventLevels } from './likely-event-levels';

/** A specification of which parts may not be picked yet; those are null. */
export type AnalysisDraft = Omit<AnalysisSpecification, 'outcome' | 'exposure'> & {
  readonly outcome: {
    readonly outcomeId: string | null;
    readonly columnId: string | null;
    readonly eventLevelIds: readonly string[];
  };
  readonly exposure: { readonly columnId: string | null; readonly referenceLevelId: string | null };
};

/** A part that an estimand's interval method is chosen for. */
export type Estimand = keyof AnalysisSpecification['methods'];

const NOTHING_PICKED = {
  outcome: { outcomeId: '', columnId: '', eventLevelIds: [] },
  exposure: { columnId: '', referenceLevelId: '' },
};

/** A draft in which nothing is picked but what is usual. */
export function emptyDraft(): AnalysisDraft {
  return {
    ...defaultSpecification(NOTHING_PICKED),
    outcome: { outcomeId: null, columnId: null, eventLevelIds: [] },
    exposure: { columnId: null, referenceLevelId: null },
  };
}

/** The specification that a draft stands for; null while a part of the contrast is not picked. */
export function specificationOf(draft: AnalysisDraft): AnalysisSpecification | null {
  const { outcomeId, columnId, eventLevelIds } = draft.outcome;
  const { columnId: exposureId, referenceLevelId } = draft.exposure;
  if (outcomeId === null || columnId === null || eventLevelIds.length === 0) return null;
  if (exposureId === null || referenceLevelId === null) return null;
  return {
    ...draft,
    outcome: { outcomeId, columnId, eventLevelIds },
    exposure: { columnId: exposureId, referenceLevelId },
  };
}

/** Which outcome of the study the analysis speaks of. */
export function withOutcomeWords(draft: AnalysisDraft, outcomeId: string): AnalysisDraft {
  return { ...draft, outcome: { ...draft.outcome, outcomeId } };
}

/** Counts the outcome by a column; what counts as the event is guessed where it is plain. */
export function withOutcomeColumn(draft: AnalysisDraft, column: CodeBookColumn): AnalysisDraft {
  const free = freed(draft, column.id);
  const eventLevelIds = likelyEventLevels(keptLevels(column, draft.restrictions), column);
  return { ...free, outcome: { ...free.outcome, columnId: column.id, eventLevelIds } };
}

/** Lets a level count as the event, or no longer. Levels keep the order of `column`. */
export function withEventLevelToggled(
  draft: AnalysisDraft,
  column: CodeBookColumn,
  levelId: string,
): AnalysisDraft {
  const order = keptLevels(column, draft.restrictions).map(({ id }) => id);
  const eventLevelIds = toggled(draft.outcome.eventLevelIds, levelId, order);
  return { ...draft, outcome: { ...draft.outcome, eventLevelIds } };
}

/** Compares the levels of a column, each against its reference level or else its first. */
export function withExposure(draft: AnalysisDraft, column: CodeBookColumn): AnalysisDraft {
  const levels = keptLevels(column, draft.restrictions);
  const named = levels.find(({ id }) => id === column.referenceLevelId);
  const referenceLevelId = (named ?? levels[0])?.id ?? null;
  const exposure = { columnId: column.id, referenceLevelId };
  return { ...freed(draft, column.id), exposure, trendScores: null };
}

/** Compares against another level. */
export function withReference(draft: AnalysisDraft, referenceLevelId: string): AnalysisDraft {
  const specification = specificationOf(draft);
  if (specification !== null) return reverseContrast(specification, referenceLevelId);
  return { ...draft, exposure: { ...draft.exposure, referenceLevelId } };
}

/**
 * Splits the counts by a column, or no longer; columns keep the order of the code book. Shares of
 * a standard population belong to the strata before, and go.
 */
export function withStratumToggled(
  draft: AnalysisDraft,
  codeBook: CodeBook,
  columnId: string,
): AnalysisDraft {
  const order = codeBook.columns.map(({ id }) => id);
  const stratumColumnIds = toggled(draft.stratumColumnIds, columnId, order);
  const adjustment = stratumColumnIds.length === 0 ? 'crude' : adjustmentFor(draft);
  const others = withOther(draft, { standardShares: undefined });
  return { ...others, stratumColumnIds, adjustment };
}

/** Keeps only records with one of these levels; null takes the restriction away. */
export function withRestriction(
  draft: AnalysisDraft,
  columnId: string,
  levelIds: readonly string[] | null,
): AnalysisDraft {
  const others = draft.restrictions.filter((each) => each.columnId !== columnId);
  const restrictions = levelIds === null ? others : [...others, { columnId, levelIds }];
  return { ...draft, restrictions };
}

/** The draft with another interval method for one estimand. */
export function withMethod(
  draft: AnalysisDraft,
  estimand: Estimand,
  methodId: string,
): AnalysisDraft {
  return { ...draft, methods: { ...draft.methods, [estimand]: methodId } };
}

/** The draft with a measure pooled in another way; the usual way is not written down. */
export function withPooling(
  draft: AnalysisDraft,
  measure: EffectMeasureId,
  poolingId: string,
): AnalysisDraft {
  const usual = EFFECT_MEASURES[measure].defaultPoolingId;
  return withOther(draft, {
    poolings: chosenBut(draft.otherMethods?.poolings, measure, poolingId, usual),
  });
}

/** The draft with the shares of a chosen standard population, by stratum. */
export function withStandardShares(
  draft: AnalysisDraft,
  standardShares: Readonly<Record<string, number>>,
): AnalysisDraft {
  return withOther(draft, { standardShares });
}

/** The draft with another test of a contrast; undefined leaves it to the expected counts. */
export function withContrastTest(draft: AnalysisDraft, testId: string | undefined): AnalysisDraft {
  return withOther(draft, { contrastTest: testId });
}

/** The draft with another test for trend; the usual one is not written down. */
export function withTrendTest(draft: AnalysisDraft, testId: string): AnalysisDraft {
  return withOther(draft, { trendTest: testId === USUAL_TREND_TEST ? undefined : testId });
}

const USUAL_TREND_TEST = 'cochranArmitage';

/** The draft with another test of whether a measure is the same in all strata. */
export function withHomogeneity(
  draft: AnalysisDraft,
  measure: EffectMeasureId,
  homogeneityId: string,
): AnalysisDraft {
  const usual = EFFECT_MEASURES[measure].defaultHomogeneityId;
  return withOther(draft, {
    homogeneities: chosenBut(draft.otherMethods?.homogeneities, measure, homogeneityId, usual),
  });
}

type ByMeasure = Readonly<Partial<Record<EffectMeasureId, string>>>;

function chosenBut(
  chosen: ByMeasure | undefined,
  measure: EffectMeasureId,
  id: string,
  usual: string,
): ByMeasure {
  const others = Object.entries(chosen ?? {}).filter(([key]) => key !== measure);
  return Object.fromEntries(id === usual ? others : [...others, [measure, id]]);
}

/** Only what is not usual is kept, so that going back gives the same draft as before. */
function withOther(draft: AnalysisDraft, change: OtherMethodChoice): AnalysisDraft {
  const { otherMethods, ...rest } = draft;
  const parts: readonly [string, unknown][] = Object.entries({ ...otherMethods, ...change });
  const kept = parts.filter(([, part]) => isGiven(part));
  return kept.length === 0 ? rest : { ...rest, otherMethods: Object.fromEntries(kept) };
}

function isGiven(part: unknown): boolean {
  if (typeof part === 'object' && part !== null) return Object.keys(part).length > 0;
  return part !== undefined;
}

/** Whether two drafts say the same analysis. */
export function isSameDraft(one: AnalysisDraft, other: AnalysisDraft): boolean {
  return JSON.stringify(ordered(one)) === JSON.stringify(ordered(other));
}

/** Takes a column out of every role, so that it can take another. */
function freed(draft: AnalysisDraft, columnId: string): AnalysisDraft {
  const { outcome, exposure } = draft;
  return {
    ...draft,
    outcome:
      outcome.columnId === columnId ? { ...outcome, columnId: null, eventLevelIds: [] } : outcome,
    exposure:
      exposure.columnId === columnId ? { columnId: null, referenceLevelId: null } : exposure,
    stratumColumnIds: draft.stratumColumnIds.filter((id) => id !== columnId),
  };
}

/** The first stratum brings the pooled estimate with it. */
function adjustmentFor(draft: AnalysisDraft): AnalysisDraft['adjustment'] {
  return draft.stratumColumnIds.length === 0 ? 'mantelHaenszel' : draft.adjustment;
}

function toggled(ids: readonly string[], id: string, order: readonly string[]): readonly string[] {
  const next = ids.includes(id) ? ids.filter((each) => each !== id) : [...ids, id];
  return next.toSorted((one, other) => order.indexOf(one) - order.indexOf(other));
}

/** Key order must not make two drafts differ. */
function ordered(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(ordered);
  if (typeof value !== 'object' || value === null) return value;
  const entries = Object.entries(value).sort(([one], [other]) => (one < other ? -1 : 1));
  return entries.map(([key, each]) => [key, ordered(each)]);
}
