import { failure } from '#shared/core';
import type { Result } from '#shared/core';
import { EFFECT_MEASURES, EFFECT_MEASURE_IDS, designGivesRisk } from '#shared/effects';
import type { EffectMeasureId } from '#shared/effects';
import {
  FOURFOLD_TESTS,
  RISK_INTERVALS,
  TREND_TESTS,
  fisherOfFourfold,
  pearsonOfFourfold,
  pearsonOfTable,
} from '#shared/stats';
import type {
  Estimate,
  EstimationIssue,
  FourfoldTable,
  FourfoldTest,
  GroupCount,
  RiskIntervalId,
  TestOutcome,
  TrendTest,
} from '#shared/stats';
import type { ContrastResult, LayerResult, LevelResult, ResultFrame } from './analysis-result';
import { contrastTestId, registered, trendTestId } from './chosen-methods';
import type { AnalysisSpecification } from './specification';
import type { LayerCounts } from './tables';

/** Everything about one layer: each level, each contrast with the reference, the tests over all. */
export function computeLayer(
  specification: AnalysisSpecification,
  frame: ResultFrame,
  stratumId: string | null,
  counts: LayerCounts,
): LayerResult {
  const { levels, referenceLevelId } = frame.exposure;
  return {
    stratumId,
    total: totalOf([...counts.values()]),
    levels: levels.map(({ id }) => levelResult(specification, frame, id, countOf(counts, id))),
    contrasts: levels
      .filter(({ id }) => id !== referenceLevelId)
      .map(({ id }) => contrastResult(specification, frame, counts, id)),
    association: pearsonOfTable({
      counts: [...counts.values()].map(({ events, total }) => [events, total - events]),
    }),
    trend: trendOf(specification, frame, counts),
  };
}

/** Counts of a level; a level that the layer does not know is a bug. */
function countOf(counts: LayerCounts, levelId: string): GroupCount {
  const count = counts.get(levelId);
  if (!count) {
    throw new Error(`No counts for level ${levelId}`);
  }
  return count;
}

/** The fourfold table of a level against the reference. */
function tableOf(
  counts: LayerCounts,
  indexLevelId: string,
  referenceLevelId: string,
): FourfoldTable {
  return { index: countOf(counts, indexLevelId), reference: countOf(counts, referenceLevelId) };
}

function totalOf(counts: readonly GroupCount[]): GroupCount {
  return counts.reduce(
    (sum, { events, total }) => ({ events: sum.events + events, total: sum.total + total }),
    { events: 0, total: 0 },
  );
}

function levelResult(
  specification: AnalysisSpecification,
  frame: ResultFrame,
  levelId: string,
  count: GroupCount,
): LevelResult {
  const { events, total } = count;
  const risk = designGivesRisk(frame.design)
    ? shareEstimate(specification, count)
    : failure(NOT_GIVEN);
  return { levelId, count: { events, total }, risk };
}

const NOT_GIVEN: EstimationIssue = { code: 'notGivenByDesign' };

/** The share of events in a group with the interval that the analysis chose for shares. */
export function shareEstimate(
  { methods, level }: AnalysisSpecification,
  count: GroupCount,
): Result<Estimate, EstimationIssue> {
  const interval = RISK_INTERVALS[methods.risk as RiskIntervalId].interval(count, level);
  return interval.ok
    ? { ok: true, value: { value: count.events / count.total, interval: interval.value } }
    : interval;
}

function contrastResult(
  specification: AnalysisSpecification,
  frame: ResultFrame,
  counts: LayerCounts,
  indexLevelId: string,
): ContrastResult {
  const { referenceLevelId } = frame.exposure;
  const table = tableOf(counts, indexLevelId, referenceLevelId);
  const { methods, level } = specification;
  return {
    indexLevelId,
    referenceLevelId,
    measures: byMeasure((id) =>
      ifGiven(id, frame, () => EFFECT_MEASURES[id].estimate(table, methods[id], level)),
    ),
    pearson: pearsonOfFourfold(table),
    fisher: fisherOfFourfold(table),
    ...chosenTest(specification, table),
  };
}

/** The outcome of the chosen test; nothing where none was chosen. */
function chosenTest(
  specification: AnalysisSpecification,
  table: FourfoldTable,
): Pick<ContrastResult, 'test'> {
  const id = contrastTestId(specification);
  const test = id === null ? undefined : registered<FourfoldTest>(FOURFOLD_TESTS, id);
  return test ? { test: test.test(table) } : {};
}

/** One value for each effect measure. */
export function byMeasure<Value>(
  valueOf: (id: EffectMeasureId) => Value,
): Readonly<Record<EffectMeasureId, Value>> {
  const entries = EFFECT_MEASURE_IDS.map((id) => [id, valueOf(id)] as const);
  return Object.fromEntries(entries) as Record<EffectMeasureId, Value>;
}

/** What a measure gives, or `notGivenByDesign`. */
export function ifGiven<Value>(
  id: EffectMeasureId,
  frame: ResultFrame,
  compute: () => Result<Value, EstimationIssue>,
): Result<Value, EstimationIssue> {
  return EFFECT_MEASURES[id].givenBy(frame.design) ? compute() : failure(NOT_GIVEN);
}

function trendOf(
  specification: AnalysisSpecification,
  frame: ResultFrame,
  counts: LayerCounts,
): Result<TestOutcome, EstimationIssue> {
  const { ordered, levels } = frame.exposure;
  const { trendScores } = specification;
  if (!ordered && trendScores === null) {
    return failure({ code: 'notOrdered' });
  }
  const test = registered<TrendTest>(TREND_TESTS, trendTestId(specification));
  if (!test) {
    throw new Error(`No test for trend ${trendTestId(specification)}`);
  }
  return test.test(
    levels.map(({ id }, place) => ({
      ...countOf(counts, id),
      score: trendScores?.[id] ?? place + 1,
    })),
  );
}
