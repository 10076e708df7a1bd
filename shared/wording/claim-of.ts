import {
  contrastTable,
  layerAt,
  pooledAt,
  printedTest,
  type AnalysisResult,
  type ContrastResult,
  type LayerResult,
  type PooledContrastResult,
  type ResultScope,
} from '#shared/analysis';
import { failure, success, type Result } from '#shared/core';
import { EFFECT_MEASURES, type EffectMeasureId } from '#shared/effects';
import { precisionBasisOf } from '#shared/format';
import type { FourfoldTable } from '#shared/stats';
import type { Claim, ClaimGroup, ClaimIssue } from './claim';

/** Which effect of a result a claim speaks of. */
export interface ClaimTarget {
  readonly analysisId: string;
  readonly indexLevelId: string;
  readonly scope: ResultScope;
}

/**
 * The claim that a result makes about one level against the reference within one scope.
 *
 * Gives an issue where the result has no such level or scope; an effect that is not estimable is no
 * issue of the claim, the sentence says so.
 */
export function claimOf(result: AnalysisResult, target: ClaimTarget): Result<Claim, ClaimIssue> {
  const { referenceLevelId } = result.frame.exposure;
  if (target.indexLevelId === referenceLevelId) {
    return failure({ code: 'levelIsReference', facts: { levelId: target.indexLevelId } });
  }
  const layer = countedLayer(result, target.scope);
  const contrast = contrastOf(result, layer, target);
  if (!layer || contrast === 'noScope') {
    return failure({ code: 'scopeNotInResult' });
  }
  const index = groupOf(result, layer, target.indexLevelId);
  const reference = groupOf(result, layer, referenceLevelId);
  return index && reference && contrast
    ? success({
        ...frameWords(result, target),
        index,
        reference,
        ...evidence(result, layer, contrast),
      })
    : failure({ code: 'levelNotInResult', facts: { levelId: target.indexLevelId } });
}

type AnyContrast = ContrastResult | PooledContrastResult;

/** Pooled claims count over all records. */
function countedLayer(result: AnalysisResult, scope: ResultScope): LayerResult | undefined {
  return scope.kind === 'pooled' ? result.crude : layerAt(result, scope);
}

function contrastOf(
  result: AnalysisResult,
  layer: LayerResult | undefined,
  { scope, indexLevelId }: ClaimTarget,
): AnyContrast | undefined | 'noScope' {
  if (scope.kind !== 'pooled') {
    return layer?.contrasts.find((contrast) => contrast.indexLevelId === indexLevelId);
  }
  return result.pooled.length === 0 ? 'noScope' : pooledAt(result, indexLevelId);
}

function groupOf(
  { frame }: AnalysisResult,
  layer: LayerResult,
  levelId: string,
): ClaimGroup | undefined {
  const level = frame.exposure.levels.find(({ id }) => id === levelId);
  const counted = layer.levels.find((candidate) => candidate.levelId === levelId);
  return level && counted && { level, count: counted.count, risk: counted.risk };
}

type FrameWords = Omit<
  Claim,
  'index' | 'reference' | 'measures' | 'exact' | 'test' | 'testQuantity'
>;

function frameWords(result: AnalysisResult, { analysisId, scope }: ClaimTarget): FrameWords {
  const { frame, specification } = result;
  return {
    analysisId,
    design: frame.design,
    peopleNoun: frame.peopleNoun,
    outcome: frame.outcome,
    exposureSentenceLabel: frame.exposure.sentenceLabel,
    groupPattern: frame.exposure.groupPattern ?? null,
    levelCount: frame.exposure.levels.length,
    scope,
    stratum:
      scope.kind === 'stratum'
        ? (frame.strata.find(({ id }) => id === scope.stratumId) ?? null)
        : null,
    strataLabel: strataWords(result),
    level: specification.level,
    planned: specification.standing.planned,
    precision: precisionBasisOf(result),
  };
}

/** The stratifying columns inside a sentence: "sex and class". */
function strataWords({ frame }: AnalysisResult): string | null {
  const columns = frame.strata[0]?.within?.map(({ columnLabel }) => columnLabel);
  return columns ? columns.join(' and ') : frame.strataLabel;
}

type Evidence = Pick<Claim, 'measures' | 'exact' | 'test' | 'testQuantity'>;

function evidence(result: AnalysisResult, layer: LayerResult, contrast: AnyContrast): Evidence {
  if ('conditionalIndependence' in contrast) {
    return {
      measures: contrast.measures,
      exact: { riskDifference: null, riskRatio: null, oddsRatio: null },
      test: contrast.conditionalIndependence,
      testQuantity: 'conditionalIndependence',
    };
  }
  const table = contrastTable(layer, contrast.indexLevelId);
  const { quantity, outcome } = printedTest(result, layer, contrast);
  return {
    measures: contrast.measures,
    exact: exactValues(table, contrast),
    test: outcome,
    testQuantity: quantity,
  };
}

function exactValues(
  table: FourfoldTable | undefined,
  { measures }: ContrastResult,
): Claim['exact'] {
  const exact = (id: EffectMeasureId): Claim['exact'][EffectMeasureId] => {
    const estimate = measures[id];
    const intervalId = estimate.ok ? estimate.value.interval.method : undefined;
    const fraction = table ? EFFECT_MEASURES[id].fraction(table, intervalId) : null;
    return fraction && { kind: 'fraction', ...fraction };
  };
  return {
    riskDifference: exact('riskDifference'),
    riskRatio: exact('riskRatio'),
    oddsRatio: exact('oddsRatio'),
  };
}
