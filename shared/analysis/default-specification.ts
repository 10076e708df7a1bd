import { EFFECT_MEASURES } from '#shared/effects';
import type {
  AnalysisSpecification,
  AnalysisStanding,
  IntervalMethodChoice,
} from './specification';

/** The interval methods that an analysis starts with. */
export const DEFAULT_INTERVAL_METHODS: IntervalMethodChoice = {
  risk: 'wilson',
  riskDifference: EFFECT_MEASURES.riskDifference.defaultIntervalId,
  riskRatio: EFFECT_MEASURES.riskRatio.defaultIntervalId,
  oddsRatio: EFFECT_MEASURES.oddsRatio.defaultIntervalId,
};

/** The standing of an analysis of which nothing else was said: nothing is claimed for it. */
export const DEFAULT_STANDING: AnalysisStanding = {
  planned: 'postHoc',
  importance: 'secondary',
  analysisSet: 'all records',
};

/**
 * A specification with all that has a usual value filled in: level 0.95, the default methods,
 * Mantel–Haenszel adjustment when there are strata, scores 1, 2, 3 …, no restriction, post hoc.
 */
export function defaultSpecification(
  parts: Pick<AnalysisSpecification, 'outcome' | 'exposure'> & Partial<AnalysisSpecification>,
): AnalysisSpecification {
  const stratumColumnIds = parts.stratumColumnIds ?? [];
  return {
    schemaVersion: 1,
    stratumColumnIds,
    restrictions: [],
    level: 0.95,
    methods: DEFAULT_INTERVAL_METHODS,
    adjustment: stratumColumnIds.length > 0 ? 'mantelHaenszel' : 'crude',
    trendScores: null,
    standing: DEFAULT_STANDING,
    ...parts,
  };
}

/**
 * The same analysis seen from another reference level. With several levels the new one becomes the
 * reference of every contrast; scores, strata, methods and the rest stay.
 */
export function reverseContrast(
  specification: AnalysisSpecification,
  newReferenceLevelId: string,
): AnalysisSpecification {
  return {
    ...specification,
    exposure: { ...specification.exposure, referenceLevelId: newReferenceLevelId },
  };
}
