import { contrastStrata, layerAt, poolingId, poolOver, type ResultScope } from '#shared/analysis';
import type { Result } from '#shared/core';
import { EFFECT_MEASURES, type EffectMeasureId } from '#shared/effects';
import { DIFFERENCE_SCALES, formatShareLimit, joinLimits } from '#shared/format';
import {
  type Estimate,
  type EstimationIssue,
  type FourfoldTable,
  type IntervalMethod,
  RISK_INTERVALS,
  type StratifiedTable,
} from '#shared/stats';
import { capitalised } from '#shared/wording';
import { type BenchPrint, estimateText } from '../print/bench-print';
import { tableAt } from '../print/estimate-rows';
import { type MethodAnswer, type MethodGroup, methodGroup } from './method-group';
import { answerTo, type MethodQuestion } from './method-question';

/** What methods that take their time gave so far; null where it was not computed. */
export type KnownAnswers = (question: MethodQuestion) => Result<Estimate, EstimationIssue> | null;

/** The interval methods for the measures of a contrast; none where there is no contrast. */
export function measureGroups(
  print: BenchPrint,
  measures: readonly EffectMeasureId[],
  place: { readonly scope: ResultScope; readonly levelId: string | null },
  known: KnownAnswers,
): readonly MethodGroup[] {
  const table = tableAt(print, place.scope, place.levelId);
  const contrast = layerAt(print.result, place.scope)?.contrasts.find(
    ({ indexLevelId }) => indexLevelId === place.levelId,
  );
  if (table === undefined || contrast === undefined) return [];
  return measures.map((id) => {
    const chosen = print.result.specification.methods[id];
    const answers: KnownAnswers = (question) =>
      question.methodId === chosen ? contrast.measures[id] : known(question);
    return measureGroup(print, id, table, answers);
  });
}

function measureGroup(
  print: BenchPrint,
  measure: EffectMeasureId,
  table: FourfoldTable,
  known: KnownAnswers,
): MethodGroup {
  const { level, methods } = print.result.specification;
  const { intervals, scale } = EFFECT_MEASURES[measure];
  const asked = (method: IntervalMethod<FourfoldTable>): MethodQuestion => ({
    measure,
    methodId: method.id,
    level,
    table,
  });
  return methodGroup(print, {
    estimand: measure,
    scale,
    factor: measureFactor(print, measure),
    methods: Object.values(intervals),
    chosenId: methods[measure],
    answerOf: (method) => answerOf(method, asked(method), known),
    printed: (estimate) => printedMeasure(print, measure, estimate, table),
  });
}

/** Light methods at once; one that takes its time only when it is known already. */
function answerOf(
  { effort }: IntervalMethod<FourfoldTable>,
  question: MethodQuestion,
  known: KnownAnswers,
): MethodAnswer {
  const estimate = effort === 'light' ? answerTo(question) : known(question);
  return estimate === null ? { kind: 'open', question } : { kind: 'computed', estimate };
}

/** The ways to pool each measure, for a contrast over strata. */
export function poolingGroups(
  print: BenchPrint,
  measures: readonly EffectMeasureId[],
  levelId: string | null,
): readonly MethodGroup[] {
  if (levelId === null) return [];
  const strata = contrastStrata(print.result, levelId);
  return measures.map((id) => poolingGroup(print, id, strata));
}

function poolingGroup(
  print: BenchPrint,
  measure: EffectMeasureId,
  strata: StratifiedTable,
): MethodGroup {
  const { specification } = print.result;
  const { poolings, scale } = EFFECT_MEASURES[measure];
  return methodGroup(print, {
    estimand: measure,
    scale,
    factor: measureFactor(print, measure),
    methods: Object.values(poolings),
    nameOf: ({ shortLabel }) => capitalised(shortLabel),
    chosenId: poolingId(specification, measure),
    answerOf: (method) => ({
      kind: 'computed',
      estimate: poolOver(strata, measure, method.id, {
        level: specification.level,
        frame: print.result.frame,
      }),
    }),
    printed: (estimate) => printedMeasure(print, measure, estimate, undefined),
  });
}

/** The methods for the risk of the level in view. */
export function riskGroup(
  print: BenchPrint,
  scope: ResultScope,
  levelId: string | null,
): MethodGroup | null {
  const level = layerAt(print.result, scope)?.levels.find((each) => each.levelId === levelId);
  if (level === undefined || level.count.total === 0) return null;
  const { specification } = print.result;
  const { percent } = print.decimals;
  const share = (value: number): string => formatShareLimit(value, percent, print.style).text;
  const value = level.count.events / level.count.total;
  return methodGroup(print, {
    estimand: 'risk',
    scale: 'share',
    factor: 100,
    methods: Object.values(RISK_INTERVALS),
    chosenId: specification.methods.risk,
    answerOf: (method) => {
      const interval = method.interval(level.count, specification.level);
      return {
        kind: 'computed',
        estimate: interval.ok ? { ok: true, value: { value, interval: interval.value } } : interval,
      };
    },
    printed: ({ interval: { lower, upper } }) => ({
      value: share(value),
      limits: joinLimits(share(lower), share(upper), print.style),
    }),
  });
}

function printedMeasure(
  print: BenchPrint,
  measure: EffectMeasureId,
  estimate: Estimate,
  table: FourfoldTable | undefined,
): { readonly value: string; readonly limits: string } {
  const text = estimateText(print, measure, estimate, table);
  const limits = joinLimits(text.lower.text, text.upper.text, print.style);
  return { value: text.value.text, limits };
}

function measureFactor({ style }: BenchPrint, measure: EffectMeasureId): number {
  return measure === 'riskDifference' ? DIFFERENCE_SCALES[style.difference.unit].scale : 1;
}
