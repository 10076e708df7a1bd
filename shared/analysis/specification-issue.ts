import { EFFECT_MEASURE_IDS, hasHomogeneity, hasInterval, hasPooling } from '#shared/effects';
import { FOURFOLD_TESTS, RISK_INTERVALS, TREND_TESTS } from '#shared/stats';
import type { RiskIntervalId } from '#shared/stats';
import type { AnalysisIssue } from './analysis-issue';
import { contrastTestId, homogeneityId, poolingId, trendTestId } from './chosen-methods';
import type { ResultFrame } from './analysis-result';
import type { AnalysisSpecification } from './specification';

/** Why a specification cannot be computed under a frame, whatever the counts; null if it can. */
export function issueOfSpecification(
  specification: AnalysisSpecification,
  frame: ResultFrame,
): AnalysisIssue | null {
  return (
    issueOfLevel(specification.level) ??
    issueOfMethods(specification) ??
    issueOfPooling(specification) ??
    issueOfTests(specification) ??
    issueOfScores(specification, frame) ??
    issueOfReference(specification, frame)
  );
}

function issueOfLevel(level: number): AnalysisIssue | null {
  return level > 0 && level < 1 ? null : { code: 'invalidLevel', facts: { level } };
}

function issueOfMethods({ methods }: AnalysisSpecification): AnalysisIssue | null {
  if (!isRiskInterval(methods.risk)) {
    return { code: 'unknownMethod', facts: { estimand: 'risk', methodId: methods.risk } };
  }
  const wrong = EFFECT_MEASURE_IDS.find((id) => !hasInterval(id, methods[id]));
  return wrong
    ? { code: 'unknownMethod', facts: { estimand: wrong, methodId: methods[wrong] } }
    : null;
}

function issueOfPooling(specification: AnalysisSpecification): AnalysisIssue | null {
  const chosen = EFFECT_MEASURE_IDS.flatMap((id) => [
    { id, methodId: poolingId(specification, id), has: hasPooling },
    { id, methodId: homogeneityId(specification, id), has: hasHomogeneity },
  ]);
  const wrong = chosen.find(({ id, methodId, has }) => !has(id, methodId));
  return wrong
    ? { code: 'unknownMethod', facts: { estimand: wrong.id, methodId: wrong.methodId } }
    : null;
}

function issueOfTests(specification: AnalysisSpecification): AnalysisIssue | null {
  const [contrast, trend] = [contrastTestId(specification), trendTestId(specification)];
  if (contrast !== null && !Object.hasOwn(FOURFOLD_TESTS, contrast)) {
    return { code: 'unknownMethod', facts: { estimand: 'contrastTest', methodId: contrast } };
  }
  return Object.hasOwn(TREND_TESTS, trend)
    ? null
    : { code: 'unknownMethod', facts: { estimand: 'trendTest', methodId: trend } };
}

/** Whether an id names an interval method for a risk. */
export function isRiskInterval(id: string): id is RiskIntervalId {
  return Object.hasOwn(RISK_INTERVALS, id);
}

function issueOfScores(
  { trendScores }: AnalysisSpecification,
  frame: ResultFrame,
): AnalysisIssue | null {
  const missing = frame.exposure.levels.find(
    ({ id }) => trendScores !== null && !Number.isFinite(trendScores[id]),
  );
  return missing ? { code: 'trendScoreMissing', facts: { levelId: missing.id } } : null;
}

function issueOfReference(
  { exposure }: AnalysisSpecification,
  frame: ResultFrame,
): AnalysisIssue | null {
  const levelId = exposure.referenceLevelId;
  const named = frame.exposure.referenceLevelId === levelId;
  const present = frame.exposure.levels.some(({ id }) => id === levelId);
  const facts = { columnId: exposure.columnId, levelId, role: 'reference' };
  return named && present ? null : { code: 'levelMissing', facts };
}
